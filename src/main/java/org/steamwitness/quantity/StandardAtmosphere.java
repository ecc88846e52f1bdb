package org.steamwitness.quantity;

/**
 * The barometer that an altitude lets one expect: the standard formula for the dry troposphere,
 * p = 101325 Pa (1 - 2.25577e-5 h)^5.25588. It stands in for a barometer beside the chamber only where a plan says so,
 * and its uncertainty is that of the weather, far wider than that of any barometer.
 */
public final class StandardAtmosphere {

    /** Lowest altitude, in metre. */
    public static final double LOWEST_METRE = -500;

    /** Highest altitude, in metre. */
    public static final double HIGHEST_METRE = 9000;

    /**
     * How far weather moves the barometer to either side, in pascal; any place within is taken as equally likely.
     * Common practice, no source.
     */
    public static final double WEATHER_HALF_WIDTH_PASCAL = 3000;

    private static final double SEA_LEVEL_PASCAL = 101_325;
    private static final double FALL_PER_METRE = 2.25577e-5;
    private static final double EXPONENT = 5.25588;

    private StandardAtmosphere() {}

    /**
     * The barometer at an altitude.
     *
     * @param altitudeMetre metre above sea level, -500 to 9000, both inclusive
     * @return absolute pressure in pascal
     * @throws IllegalArgumentException if the altitude lies outside that range or is NaN
     */
    public static double pascalAt(double altitudeMetre) {
        if (!covers(altitudeMetre)) {
            throw new IllegalArgumentException("standard atmosphere: altitude " + altitudeMetre + " m lies outside "
                    + LOWEST_METRE + " m to " + HIGHEST_METRE + " m");
        }
        return SEA_LEVEL_PASCAL * StrictMath.pow(1 - FALL_PER_METRE * altitudeMetre, EXPONENT);
    }

    /**
     * The standard uncertainty of that barometer: a rectangular distribution of the weather's half-width, a/sqrt(3).
     *
     * @return pascal, about 1732
     */
    public static double standardUncertaintyPascal() {
        return WEATHER_HALF_WIDTH_PASCAL / Math.sqrt(3);
    }

    /** Whether the formula holds there; never for NaN. */
    static boolean covers(double altitudeMetre) {
        return altitudeMetre >= LOWEST_METRE && altitudeMetre <= HIGHEST_METRE;
    }
}
