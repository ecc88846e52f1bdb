package org.steamwitness.steam;

/**
 * Boiling liquid and dry saturated steam of one temperature: IAPWS R7-97(2012), regions 1 and 2 on the line of region 4.
 * From 273.15 K to 623.15 K; the stretch up to the critical point belongs to region 3 and is refused.
 *
 * @param liquid the liquid, subscript f
 * @param vapour the steam, subscript g
 */
public record Saturated(SinglePhase liquid, SinglePhase vapour) {

    /** Lowest temperature, in kelvin. */
    public static final double LOWEST_KELVIN = Saturation.LOWEST_KELVIN;

    /** Highest temperature, in kelvin. */
    public static final double HIGHEST_KELVIN = Region1.HIGHEST_KELVIN;

    /** Lowest absolute pressure, in pascal. */
    public static final double LOWEST_PASCAL = Saturation.LOWEST_PASCAL;

    /** Highest absolute pressure, that of 623.15 K, in pascal. */
    public static final double HIGHEST_PASCAL = Saturation.pascalAt(HIGHEST_KELVIN);

    /**
     * Refuses two phases that are not in equilibrium.
     *
     * @param liquid the liquid
     * @param vapour the steam
     * @throws IllegalArgumentException if temperature or pressure differ, or the liquid is not the denser one
     */
    public Saturated {
        if (liquid.kelvin() != vapour.kelvin()
                || liquid.pascal() != vapour.pascal()
                || liquid.cubicMetrePerKilogram() >= vapour.cubicMetrePerKilogram()) {
            throw new IllegalArgumentException("not in equilibrium: liquid at " + liquid.kelvin() + " K, "
                    + liquid.pascal() + " Pa and vapour at " + vapour.kelvin() + " K, " + vapour.pascal() + " Pa");
        }
    }

    /**
     * Both phases at a temperature.
     *
     * @param kelvin temperature, 273.15 K to 623.15 K
     * @return liquid and vapour
     * @throws OutOfRangeException if {@code kelvin} lies outside that range or is NaN
     */
    public static Saturated atKelvin(double kelvin) {
        OutOfRangeException.within("saturated water: temperature", kelvin, LOWEST_KELVIN, HIGHEST_KELVIN, "K");
        return unguarded(kelvin, Saturation.pascalAt(kelvin));
    }

    /**
     * Both phases at a pressure.
     *
     * @param pascal absolute pressure, 611.213 Pa to that of 623.15 K, 16.53 MPa
     * @return liquid and vapour
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     */
    public static Saturated atPascal(double pascal) {
        OutOfRangeException.within("saturated water: absolute pressure", pascal, LOWEST_PASCAL, HIGHEST_PASCAL, "Pa");
        return unguarded(Saturation.kelvinAt(pascal), pascal);
    }

    /**
     * Enthalpy of evaporation h_g - h_f.
     *
     * @return joule per kilogram
     */
    public double evaporationJoulePerKilogram() {
        return vapour.enthalpyJoulePerKilogram() - liquid.enthalpyJoulePerKilogram();
    }

    private static Saturated unguarded(double kelvin, double pascal) {
        return new Saturated(Region1.unguarded(kelvin, pascal), Region2.unguarded(kelvin, pascal));
    }
}
