package org.steamwitness.quantity;

/**
 * Units of pressure with their factors; the datum, absolute or gauge, is told apart in {@link Datum}. All factors are
 * exact by definition but the two columns of mercury, which are conventional.
 */
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
    /** Kilogram-force per square centimetre, exactly 98,066.5 Pa by standard gravity, 9.80665 m/s2. */
    KILOGRAM_FORCE_PER_SQUARE_CENTIMETRE("kgf/cm2", 98_066.5),
    /** Standard atmosphere, exactly 101,325 Pa; a unit, and never a stand-in for the barometer. */
    STANDARD_ATMOSPHERE("atm", 101_325),
    /** Conventional millimetre of mercury: mercury of 13,595.1 kg/m3 under standard gravity. */
    MILLIMETRE_OF_MERCURY("mmHg", 133.322387415),
    /** Conventional inch of mercury, rounded to seven digits as tables of factors give it. */
    INCH_OF_MERCURY("inHg", 3386.389);

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

    /**
     * Converts a pressure or a difference of pressures back; the datum stays what it was.
     *
     * @param pascal in pascal
     * @return the value in this unit
     */
    public double ofPascal(double pascal) {
        return pascal / this.pascal;
    }
}
