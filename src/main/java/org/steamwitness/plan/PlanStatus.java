package org.steamwitness.plan;

/** Whether a plan is in use. */
public enum PlanStatus {
    /** Being worked on: criteria are shown, no verdict is given. */
    DRAFT("draft"),
    /** Approved and in use. */
    IN_FORCE("in-force");

    private final String word;

    PlanStatus(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return "draft" or "in-force"
     */
    public String word() {
        return word;
    }
}
