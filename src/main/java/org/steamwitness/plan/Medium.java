package org.steamwitness.plan;

/** What heats the load. */
public enum Medium {
    /** Steam without air: every steam-contact probe has to stand at saturation. */
    SATURATED_STEAM("saturated-steam", true),
    /** Steam that holds air on purpose. */
    STEAM_AIR("steam-air", false),
    /** Water under a cushion of air. */
    WATER("water", false);

    private final String word;
    private final boolean saturated;

    Medium(String word, boolean saturated) {
        this.word = word;
        this.saturated = saturated;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "saturated-steam"
     */
    public String word() {
        return word;
    }

    /**
     * Tells whether the medium is meant to stand at saturation.
     *
     * @return false for media that hold air on purpose
     */
    public boolean saturated() {
        return saturated;
    }
}
