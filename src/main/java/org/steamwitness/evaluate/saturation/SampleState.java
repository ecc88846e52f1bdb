package org.steamwitness.evaluate.saturation;

/** What one sample says of the steam around its probe. */
public enum SampleState {
    /** Within the tolerance. */
    SATURATED("saturated"),
    /** Below the tolerance, within the uncertainty. */
    POSSIBLE_AIR("possible air"),
    /** Below the tolerance beyond the uncertainty. */
    CONFIRMED_AIR("confirmed air"),
    /** Above the tolerance, within the uncertainty. */
    POSSIBLE_SUPERHEAT("possible superheat"),
    /** Above the tolerance beyond the uncertainty. */
    CONFIRMED_SUPERHEAT("confirmed superheat"),
    /** A sample is missing, or the pressure lies off the saturation line. */
    NOT_JUDGED("not judged");

    private final String word;

    SampleState(String word) {
        this.word = word;
    }

    boolean outside() {
        return this != SATURATED && this != NOT_JUDGED;
    }

    /**
     * The word used in records.
     *
     * @return such as "possible air"
     */
    public String word() {
        return word;
    }
}
