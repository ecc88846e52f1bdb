package org.steamwitness.trace;

/** What a channel measures. */
public enum QuantityKind {
    /** Temperature, in kelvin inside the program. */
    TEMPERATURE("temperature"),
    /** Pressure, in pascal inside the program, counted from the channel's datum. */
    PRESSURE("pressure");

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
