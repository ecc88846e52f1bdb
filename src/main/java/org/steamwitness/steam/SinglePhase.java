package org.steamwitness.steam;

/**
 * Water of one phase, liquid or vapour. Every property follows from the Gibbs energy and its derivatives: IAPWS
 * R7-97(2012), Tables 3 and 12. {@link Region1} and {@link Region2} give such states.
 *
 * @param kelvin temperature in kelvin
 * @param pascal absolute pressure in pascal
 * @param gibbs the dimensionless Gibbs energy g/(R T) and its derivatives
 */
public record SinglePhase(double kelvin, double pascal, Gibbs gibbs) implements Water {

    /** Specific gas constant of water, Eq. (1), in joule per kilogram and kelvin. */
    static final double GAS_CONSTANT = 461.526;

    @Override
    public double cubicMetrePerKilogram() {
        return GAS_CONSTANT * kelvin / pascal * gibbs.byPi();
    }

    @Override
    public double internalEnergyJoulePerKilogram() {
        return GAS_CONSTANT * kelvin * (gibbs.byTau() - gibbs.byPi());
    }

    @Override
    public double enthalpyJoulePerKilogram() {
        return GAS_CONSTANT * kelvin * gibbs.byTau();
    }

    @Override
    public double entropyJoulePerKilogramKelvin() {
        return GAS_CONSTANT * (gibbs.byTau() - gibbs.value());
    }

    /**
     * Specific heat capacity at constant pressure c_p.
     *
     * @return joule per kilogram and kelvin
     */
    public double isobaricHeatJoulePerKilogramKelvin() {
        return -GAS_CONSTANT * gibbs.byTauTau();
    }

    /**
     * Speed of sound w.
     *
     * @return metre per second
     */
    public double soundMetrePerSecond() {
        double slope = gibbs.byPi() - gibbs.byPiTau();
        double stiffness = slope * slope / gibbs.byTauTau() - gibbs.byPiPi();
        return Math.sqrt(GAS_CONSTANT * kelvin * gibbs.byPi() * gibbs.byPi() / stiffness);
    }
}
