package org.steamwitness.plan;

/** A phase of a run, as plans and run sheets name it. */
public enum PlannedPhase {
    /** Closed, steam not yet on. */
    STANDING("standing"),
    /** Air driven or drawn out. */
    AIR_REMOVAL("air-removal"),
    /** From the removal of air to the hold. */
    HEATING("heating"),
    /** The slower probes catch up. */
    EQUILIBRATION("equilibration"),
    /** The hold. */
    HOLD("hold"),
    /** Steam let out. */
    EXHAUST("exhaust"),
    /** Drying by vacuum or heat. */
    DRYING("drying"),
    /** Cooling. */
    COOLING("cooling"),
    /** Leak test: air drawn out. */
    EVACUATION("evacuation"),
    /** Leak test: temperatures even out. */
    SETTLING("settling"),
    /** Leak test: the pressure is watched. */
    TEST("test");

    private final String word;

    PlannedPhase(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "air-removal"
     */
    public String word() {
        return word;
    }
}
