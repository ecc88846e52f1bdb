package org.steamwitness.steam;

/**
 * The state of water in equilibrium: one phase, or liquid and vapour together. Energies and entropies count from the
 * liquid at the triple point, as IAPWS R7-97(2012) sets them.
 */
public sealed interface Water permits SinglePhase, WetSteam {

    /**
     * Temperature.
     *
     * @return kelvin
     */
    double kelvin();

    /**
     * Absolute pressure of the water alone.
     *
     * @return pascal
     */
    double pascal();

    /**
     * Specific volume v.
     *
     * @return cubic metre per kilogram
     */
    double cubicMetrePerKilogram();

    /**
     * Specific internal energy u.
     *
     * @return joule per kilogram
     */
    double internalEnergyJoulePerKilogram();

    /**
     * Specific enthalpy h = u + p v.
     *
     * @return joule per kilogram
     */
    double enthalpyJoulePerKilogram();

    /**
     * Specific entropy s.
     *
     * @return joule per kilogram and kelvin
     */
    double entropyJoulePerKilogramKelvin();
}
