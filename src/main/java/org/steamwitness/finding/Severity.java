package org.steamwitness.finding;

/** How much a finding weighs. */
public enum Severity {
    /** Worth knowing. */
    NOTE("note"),
    /** A person has to look at it. */
    REVIEW("review"),
    /** The verdict can be undecided at best. */
    BLOCKS("blocks");

    private final String word;

    Severity(String word) {
        this.word = word;
    }

    /**
     * The word used in records.
     *
     * @return such as "review"
     */
    public String word() {
        return word;
    }
}
