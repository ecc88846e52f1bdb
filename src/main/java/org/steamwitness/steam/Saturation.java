package org.steamwitness.steam;

/**
 * The saturation line of water: IAPWS R7-97(2012), region 4, Eqs. (29) to (31), constants of Table 34. The same
 * quadratic is solved for pressure and for temperature, so a round trip closes to rounding.
 */
public final class Saturation {

    /** Lowest temperature of the line, in kelvin. */
    public static final double LOWEST_KELVIN = 273.15;

    /** Highest temperature of the line, the critical one, in kelvin. */
    public static final double HIGHEST_KELVIN = 647.096;

    /** Lowest absolute pressure of the line, in pascal. */
    public static final double LOWEST_PASCAL = 611.213;

    /** Highest absolute pressure of the line, the critical one, in pascal. */
    public static final double HIGHEST_PASCAL = 22.064e6;

    private static final double N1 = 0.11670521452767e4;
    private static final double N2 = -0.72421316703206e6;
    private static final double N3 = -0.17073846940092e2;
    private static final double N4 = 0.12020824702470e5;
    private static final double N5 = -0.32325550322333e7;
    private static final double N6 = 0.14915108613530e2;
    private static final double N7 = -0.48232657361591e4;
    private static final double N8 = 0.40511340542057e6;
    private static final double N9 = -0.23855557567849e0;
    private static final double N10 = 0.65017534844798e3;

    /** Pressures that differ by less than this part are taken as equal: far above rounding, far below any sensor. */
    static final double ROUNDING = 1e-9;

    private static final double PASCAL_PER_MEGAPASCAL = 1e6;

    private Saturation() {}

    /**
     * Saturation pressure, Eq. (30).
     *
     * @param kelvin temperature, 273.15 K to 647.096 K
     * @return absolute pressure in pascal
     * @throws OutOfRangeException if {@code kelvin} lies outside that range or is NaN
     */
    public static double pascalAt(double kelvin) {
        OutOfRangeException.within("saturation pressure: temperature", kelvin, LOWEST_KELVIN, HIGHEST_KELVIN, "K");
        double theta = kelvin + N9 / (kelvin - N10);
        double a = theta * theta + N1 * theta + N2;
        double b = N3 * theta * theta + N4 * theta + N5;
        double c = N6 * theta * theta + N7 * theta + N8;
        double fourthRoot = 2 * c / (-b + Math.sqrt(b * b - 4 * a * c));
        double squared = fourthRoot * fourthRoot;
        return squared * squared * PASCAL_PER_MEGAPASCAL;
    }

    /**
     * Saturation temperature, Eq. (31).
     *
     * @param pascal absolute pressure, 611.213 Pa to 22.064 MPa
     * @return temperature in kelvin
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     */
    public static double kelvinAt(double pascal) {
        OutOfRangeException.within(
                "saturation temperature: absolute pressure", pascal, LOWEST_PASCAL, HIGHEST_PASCAL, "Pa");
        double beta = Math.sqrt(Math.sqrt(pascal / PASCAL_PER_MEGAPASCAL));
        double e = beta * beta + N3 * beta + N6;
        double f = N1 * beta * beta + N4 * beta + N7;
        double g = N2 * beta * beta + N5 * beta + N8;
        double d = 2 * g / (-f - Math.sqrt(f * f - 4 * e * g));
        return (N10 + d - Math.sqrt((N10 + d) * (N10 + d) - 4 * (N9 + N10 * d))) / 2;
    }

    /**
     * Slope of the saturation temperature over pressure, Eq. (31) differentiated.
     *
     * @param pascal absolute pressure, 611.213 Pa to 22.064 MPa
     * @return dT_sat/dp in kelvin per pascal
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     */
    public static double kelvinPerPascalAt(double pascal) {
        OutOfRangeException.within(
                "slope of the saturation temperature: absolute pressure", pascal, LOWEST_PASCAL, HIGHEST_PASCAL, "Pa");
        double beta = Math.sqrt(Math.sqrt(pascal / PASCAL_PER_MEGAPASCAL));
        double e = beta * beta + N3 * beta + N6;
        double f = N1 * beta * beta + N4 * beta + N7;
        double g = N2 * beta * beta + N5 * beta + N8;
        double eSlope = 2 * beta + N3;
        double fSlope = 2 * N1 * beta + N4;
        double gSlope = 2 * N2 * beta + N5;
        double root = Math.sqrt(f * f - 4 * e * g);
        double rootSlope = (f * fSlope - 2 * (eSlope * g + e * gSlope)) / root;
        double below = -f - root;
        double d = 2 * g / below;
        double dSlope = (2 * gSlope * below + 2 * g * (fSlope + rootSlope)) / (below * below);
        double outer = Math.sqrt((N10 + d) * (N10 + d) - 4 * (N9 + N10 * d));
        double kelvinPerBeta = dSlope * (1 - (d - N10) / outer) / 2;
        return kelvinPerBeta * beta / (4 * pascal);
    }
}
