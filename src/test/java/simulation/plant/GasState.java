package simulation.plant;

/**
 * What water and air in a rigid space come to.
 *
 * @param celsius temperature
 * @param steamPascal partial pressure of the vapour
 * @param airPascal partial pressure of the air
 * @param vapourKg vapour
 * @param liquidKg liquid in equilibrium with it
 * @param airKg air
 * @param dewCelsius temperature at which the vapour begins to condense
 * @param vapourEnthalpy enthalpy of the vapour, J/kg
 */
public record GasState(
        double celsius,
        double steamPascal,
        double airPascal,
        double vapourKg,
        double liquidKg,
        double airKg,
        double dewCelsius,
        double vapourEnthalpy) {

    /** Total pressure, absolute. */
    public double pascal() {
        return steamPascal + airPascal;
    }

    /** Share of air in the gas, by amount of substance. */
    public double airShare() {
        return airPascal / pascal();
    }

    /** Vapour's share of the water's mass. */
    public double quality() {
        return vapourKg / (vapourKg + liquidKg);
    }

    /** Whether no liquid is left. */
    public boolean dry() {
        return liquidKg <= 0;
    }
}
