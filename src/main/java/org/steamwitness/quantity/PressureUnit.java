package org.steamwitness.quantity;

/** Units of pressure with their factors; the datum, absolute or gauge, is told apart in {@link Datum}. */
public enum PressureUnit {
    /** Pascal. */
    PASCAL("Pa", 1),
    /** Hectopascal. */
    HECTOPASCAL("hPa", 100),
    /** Kilopascal. */
    KILOPASCAL("kPa", 1e3),
    /** Megapascal. */
    MEGAPASCAL("MPa", 1e6),
    /** Bar, exactly 100 kPa. */
    BAR("bar", 1e5),
    /** Millibar, exactly 100 Pa. */
    MILLIBAR("mbar", 100),
    /** Pound-force per square inch: 0.45359237 kg, 9.80665 m/s2 and 0.0254 m are exact. */
    PSI("psi", 0.45359237 * 9.80665 / (0.0254 * 0.0254)),
    /** Kilogram-force per square centimetre, exactly 98,066.5 Pa. */
    KILOGRAM_FORCE_PER_SQUARE_CENTIMETRE("kgf/cm2", 98_066.5);

    private final String symbol;
    private final double pascal;

    PressureUnit(String symbol, double pascal) {
        this.symbol = symbol;
        this.pascal = pascal;
    }

    /**
     * The unit as plans and run sheets write it.
     *
     * @return such as "kPa"
     */
    public String symbol() {
        return symbol;
    }

    /**
     * Converts a pressure or a difference of pressures; the datum stays what it was.
     *
     * @param value in this unit
     * @return pascal
     */
    public double toPascal(double value) {
        return value * pascal;
    }
}
