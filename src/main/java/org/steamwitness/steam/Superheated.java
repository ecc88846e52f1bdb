package org.steamwitness.steam;

import java.util.function.ToDoubleFunction;

/**
 * Steam of region 2 found from another pair than temperature and pressure: Eq. (15) of IAPWS R7-97(2012), solved for the
 * missing one to a few units in the last place. The range is that of {@link Region2}, its edge included: dry saturated
 * steam counts.
 */
public final class Superheated {

    private Superheated() {}

    /**
     * Steam of a known volume at a temperature.
     *
     * @param kelvin temperature, 273.15 K to 1073.15 K
     * @param cubicMetrePerKilogram specific volume, from the highest pressure of the region at {@code kelvin} to 1 Pa
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN; a smaller volume is that of wet steam
     */
    public static SinglePhase ofKelvinVolume(double kelvin, double cubicMetrePerKilogram) {
        double highest = Region2.highestPascalAt(kelvin);
        double least = Region2.unguarded(kelvin, highest).cubicMetrePerKilogram();
        double most = Region2.unguarded(kelvin, Region2.LOWEST_PASCAL).cubicMetrePerKilogram();
        if (!(cubicMetrePerKilogram >= least && cubicMetrePerKilogram <= most)) {
            throw new OutOfRangeException(
                    "steam, region 2, at " + kelvin + " K: volume", cubicMetrePerKilogram, least, most, "m3/kg");
        }
        double pascal = Root.between(
                Region2.LOWEST_PASCAL,
                highest,
                p -> p * (Region2.unguarded(kelvin, p).cubicMetrePerKilogram() - cubicMetrePerKilogram));
        return Region2.unguarded(kelvin, pascal);
    }

    /**
     * Steam of a known volume at a pressure.
     *
     * @param pascal absolute pressure, 1 Pa to 100 MPa
     * @param cubicMetrePerKilogram specific volume, from the lowest temperature of the region at {@code pascal} to
     *     1073.15 K
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN; a smaller volume is that of wet steam
     */
    public static SinglePhase ofPascalVolume(double pascal, double cubicMetrePerKilogram) {
        return ofPascal(pascal, "volume", cubicMetrePerKilogram, "m3/kg", Water::cubicMetrePerKilogram);
    }

    /**
     * Steam of a known enthalpy at a pressure.
     *
     * @param pascal absolute pressure, 1 Pa to 100 MPa
     * @param joulePerKilogram specific enthalpy, from the lowest temperature of the region at {@code pascal} to 1073.15
     *     K
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN; a smaller enthalpy is that of wet steam
     */
    public static SinglePhase ofPascalEnthalpy(double pascal, double joulePerKilogram) {
        return ofPascal(pascal, "enthalpy", joulePerKilogram, "J/kg", Water::enthalpyJoulePerKilogram);
    }

    /**
     * Steam of a known internal energy at a pressure, as in an evacuated vessel filled without loss of heat, where u
     * becomes the enthalpy of the supply.
     *
     * @param pascal absolute pressure, 1 Pa to 100 MPa
     * @param joulePerKilogram specific internal energy, from the lowest temperature of the region at {@code pascal} to
     *     1073.15 K
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN; a smaller energy is that of wet steam
     */
    public static SinglePhase ofPascalInternalEnergy(double pascal, double joulePerKilogram) {
        return ofPascal(pascal, "internal energy", joulePerKilogram, "J/kg", Water::internalEnergyJoulePerKilogram);
    }

    private static SinglePhase ofPascal(
            double pascal, String what, double value, String unit, ToDoubleFunction<Water> property) {
        double coldest = Region2.lowestKelvinAt(pascal);
        double least = property.applyAsDouble(Region2.unguarded(coldest, pascal));
        double most = property.applyAsDouble(Region2.unguarded(Region2.HIGHEST_KELVIN, pascal));
        if (!(value >= least && value <= most)) {
            throw new OutOfRangeException("steam, region 2, at " + pascal + " Pa: " + what, value, least, most, unit);
        }
        double kelvin = Root.between(
                coldest, Region2.HIGHEST_KELVIN, t -> property.applyAsDouble(Region2.unguarded(t, pascal)) - value);
        return Region2.unguarded(kelvin, pascal);
    }
}
