package org.steamwitness.plan;

/** What touches a product probe. */
public enum Contact {
    /** The product, inside a sealed container. */
    SEALED("sealed"),
    /** The chamber's steam. */
    STEAM("steam");

    private final String word;

    Contact(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return "sealed" or "steam"
     */
    public String word() {
        return word;
    }
}
