package org.steamwitness.plan;

/** What kind of cycle a plan describes. */
public enum CycleProcess {
    /** A food retort. */
    RETORT("retort");

    private final String word;

    CycleProcess(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "retort"
     */
    public String word() {
        return word;
    }
}
