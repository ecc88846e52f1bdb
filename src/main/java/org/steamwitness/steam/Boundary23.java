package org.steamwitness.steam;

/**
 * The boundary between steam (region 2) and the neighbourhood of the critical point (region 3, not described here):
 * IAPWS R7-97(2012), Eqs. (5) and (6), constants of Table 1. It meets the saturation line at 623.15 K.
 */
public final class Boundary23 {

    /** Lowest temperature, in kelvin. */
    public static final double LOWEST_KELVIN = 623.15;

    /** Highest temperature, in kelvin. */
    public static final double HIGHEST_KELVIN = 863.15;

    private static final double N1 = 0.34805185628969e3;
    private static final double N2 = -0.11671859879975e1;
    private static final double N3 = 0.10192970039326e-2;
    private static final double N4 = 0.57254459862746e3;
    private static final double N5 = 0.13918839778870e2;

    private static final double PASCAL_PER_MEGAPASCAL = 1e6;

    /** Lowest absolute pressure, that of 623.15 K, in pascal. */
    public static final double LOWEST_PASCAL = pascalOf(LOWEST_KELVIN);

    /** Highest absolute pressure, in pascal. */
    public static final double HIGHEST_PASCAL = 100e6;

    private Boundary23() {}

    /**
     * Pressure of the boundary, Eq. (5).
     *
     * @param kelvin temperature, 623.15 K to 863.15 K
     * @return absolute pressure in pascal
     * @throws OutOfRangeException if {@code kelvin} lies outside that range or is NaN
     */
    public static double pascalAt(double kelvin) {
        OutOfRangeException.within("boundary 2/3: temperature", kelvin, LOWEST_KELVIN, HIGHEST_KELVIN, "K");
        return pascalOf(kelvin);
    }

    /**
     * Temperature of the boundary, Eq. (6).
     *
     * @param pascal absolute pressure, 16.5291643 MPa to 100 MPa
     * @return temperature in kelvin
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     */
    public static double kelvinAt(double pascal) {
        OutOfRangeException.within("boundary 2/3: absolute pressure", pascal, LOWEST_PASCAL, HIGHEST_PASCAL, "Pa");
        return N4 + Math.sqrt((pascal / PASCAL_PER_MEGAPASCAL - N5) / N3);
    }

    private static double pascalOf(double kelvin) {
        return (N1 + N2 * kelvin + N3 * kelvin * kelvin) * PASCAL_PER_MEGAPASCAL;
    }
}
