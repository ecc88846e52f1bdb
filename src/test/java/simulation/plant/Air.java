package simulation.plant;

/** Dry air as an ideal gas; its energy counts from 0 degC. */
public final class Air {

    /** Gas constant in J/(kg K). */
    public static final double GAS_CONSTANT = 287.055;

    /** Heat capacity at constant volume in J/(kg K). */
    public static final double CV = 718;

    private Air() {}

    static double energy(double celsius) {
        return CV * celsius;
    }

    static double enthalpy(double celsius) {
        return CV * celsius + GAS_CONSTANT * (celsius + 273.15);
    }
}
