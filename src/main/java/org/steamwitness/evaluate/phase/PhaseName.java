package org.steamwitness.evaluate.phase;

/** The purposes a stretch of a run can have. */
public enum PhaseName {
    /** Before steam is let in. */
    STANDING("standing"),
    /** Steam drives the air out. */
    AIR_REMOVAL("air removal"),
    /** From the end of air removal to the hold. */
    HEATING("heating"),
    /** The temperatures stay in the band. */
    HOLD("hold"),
    /** After steam was shut off. */
    COOLING("cooling"),
    /** Whatever fits none. */
    UNDETERMINED("undetermined");

    private final String word;

    PhaseName(String word) {
        this.word = word;
    }

    /**
     * The word used in records.
     *
     * @return such as "air removal"
     */
    public String word() {
        return word;
    }
}
