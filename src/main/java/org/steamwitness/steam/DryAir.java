package org.steamwitness.steam;

/** Dry air as an ideal gas of constant heat capacity, in the range of steam chambers. */
final class DryAir {

    /** Specific gas constant, in joule per kilogram and kelvin. */
    static final double GAS_CONSTANT = 287.055;

    /** Specific heat capacity at constant volume, in joule per kilogram and kelvin. */
    static final double ISOCHORIC_HEAT = 718;

    /** Molar mass, in kilogram per kilomole. */
    static final double MOLAR_MASS = 28.965;

    /** The temperature at which the energy counts as zero, in kelvin: the triple point of water, as for water. */
    static final double ZERO_KELVIN = 273.16;

    private DryAir() {}

    /** Internal energy m c_v (T - 273.16 K) in joule. */
    static double joule(double kilogram, double kelvin) {
        return kilogram * ISOCHORIC_HEAT * (kelvin - ZERO_KELVIN);
    }
}
