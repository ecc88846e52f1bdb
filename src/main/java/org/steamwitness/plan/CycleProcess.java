package org.steamwitness.plan;

/** What kind of cycle a plan describes. */
public enum CycleProcess {
    /** A food retort. */
    RETORT("retort"),
    /** A steriliser for porous loads: air is drawn out in pulses. */
    POROUS_LOAD("porous-load"),
    /** A steriliser for fluids in sealed containers. */
    FLUIDS("fluids"),
    /** A steriliser whose air is displaced downwards. */
    GRAVITY("gravity"),
    /** A closed vessel that raises steam from its own water. */
    COOKER("cooker"),
    /** A test of air leakage under vacuum; it has no hold. */
    LEAK_TEST("leak-test"),
    /** A study of heat distribution or penetration. */
    STUDY("study");

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

    /**
     * Tells whether such a cycle holds a temperature.
     *
     * @return false for a leak test
     */
    public boolean holds() {
        return this != LEAK_TEST;
    }
}
