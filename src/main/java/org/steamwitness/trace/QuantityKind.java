package org.steamwitness.trace;

/** What a channel measures. */
public enum QuantityKind {
    /** Temperature, in kelvin inside the program. */
    TEMPERATURE("temperature"),
    /** Pressure, in pascal inside the program, counted from the channel's datum. */
    PRESSURE("pressure"),
    /** Mass flow, in kilogram per second inside the program. */
    FLOW("flow"),
    /** Level of water, in metre inside the program. */
    LEVEL("level"),
    /** Rotation of the load, in turns per second inside the program. */
    ROTATION("rotation"),
    /** Whether a valve or a drive is open or on: 1, or shut or off: 0. */
    STATE("state");

    private final String word;

    QuantityKind(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "temperature"
     */
    public String word() {
        return word;
    }
}
