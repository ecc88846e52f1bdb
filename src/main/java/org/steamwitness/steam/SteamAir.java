package org.steamwitness.steam;

/**
 * Steam with air over wet surfaces, by Dalton's law: p = p_sat(T) + p_air. The enhancement factor is left out; it makes
 * the steam's share larger by 0.25 % at a tenth of air and 121 degC.
 */
public final class SteamAir {

    private static final double WATER_MOLAR_MASS = 18.015;

    private SteamAir() {}

    /**
     * Equivalent air mole fraction y = 1 - p_sat(T)/p: the air that would explain the temperature if nothing else was
     * wrong. Below zero it is no air at all but superheat, or sensors that disagree; it is given as it comes out.
     *
     * @param kelvin temperature, 273.15 K to 647.096 K
     * @param pascal absolute pressure, 1 Pa to 22.064 MPa
     * @return mole of air per mole of mixture, below 1, negative where the steam is superheated
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static double airMoleFraction(double kelvin, double pascal) {
        OutOfRangeException.within(
                "air fraction: absolute pressure", pascal, Region2.LOWEST_PASCAL, Saturation.HIGHEST_PASCAL, "Pa");
        return 1 - Saturation.pascalAt(kelvin) / pascal;
    }

    /**
     * Mass fraction of air w = 28.965 y / (28.965 y + 18.015 (1 - y)).
     *
     * @param moleFraction mole of air per mole of mixture, 0 to 1
     * @return kilogram of air per kilogram of mixture
     * @throws OutOfRangeException if {@code moleFraction} lies outside that range or is NaN
     */
    public static double airMassFraction(double moleFraction) {
        OutOfRangeException.within("air fraction", moleFraction, 0, 1, "mol/mol");
        double air = DryAir.MOLAR_MASS * moleFraction;
        return air / (air + WATER_MOLAR_MASS * (1 - moleFraction));
    }

    /**
     * Departure from saturation d = T - T_sat(p): negative with air or a wet, cold sensor, positive with superheat.
     *
     * @param kelvin temperature, 273.15 K to 1073.15 K
     * @param pascal absolute pressure, 611.213 Pa to 22.064 MPa
     * @return departure in kelvin
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static double departureKelvin(double kelvin, double pascal) {
        OutOfRangeException.within(
                "departure from saturation: temperature", kelvin, Region2.LOWEST_KELVIN, Region2.HIGHEST_KELVIN, "K");
        return kelvin - Saturation.kelvinAt(pascal);
    }

    /**
     * Temperature of steam saturated in a mixture with air: T_sat of the steam's share (1 - y) p.
     *
     * @param moleFraction mole of air per mole of mixture, 0 to 1
     * @param pascal absolute pressure of the mixture; the steam's share of it from 611.213 Pa to 22.064 MPa
     * @return temperature in kelvin
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static double kelvinAt(double moleFraction, double pascal) {
        OutOfRangeException.within("air fraction", moleFraction, 0, 1, "mol/mol");
        return Saturation.kelvinAt((1 - moleFraction) * pascal);
    }
}
