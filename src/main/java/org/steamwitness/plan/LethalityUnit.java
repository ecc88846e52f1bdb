package org.steamwitness.plan;

/** The unit in which a lethality is written and printed: trades that count F in minutes, and those that count seconds. */
public enum LethalityUnit {
    /** Minutes at the reference temperature. */
    MINUTE("min", 60),
    /** Seconds at the reference temperature, as A0 is counted. */
    SECOND("s", 1);

    private final String symbol;
    private final double seconds;

    LethalityUnit(String symbol, double seconds) {
        this.symbol = symbol;
        this.seconds = seconds;
    }

    /**
     * The symbol used in plans and records.
     *
     * @return "min" or "s"
     */
    public String symbol() {
        return symbol;
    }

    /**
     * A lethality in this unit.
     *
     * @param equivalentSeconds seconds at the reference temperature
     * @return the same in this unit
     */
    public double of(double equivalentSeconds) {
        return equivalentSeconds / seconds;
    }
}
