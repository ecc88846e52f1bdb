package org.steamwitness.steam;

import java.util.function.ToDoubleFunction;

/**
 * Liquid and vapour in equilibrium. Volume, energies and entropy are those of the two phases, weighed by their masses: y
 * = y_f + x (y_g - y_f).
 *
 * @param line both phases
 * @param quality vapour quality x: the mass of vapour in the mass of water, kilogram per kilogram, 0 to 1
 */
public record WetSteam(Saturated line, double quality) implements Water {

    /**
     * Refuses a quality that no mixture has.
     *
     * @param line both phases
     * @param quality vapour quality, 0 to 1
     * @throws OutOfRangeException if {@code quality} lies outside 0 to 1 or is NaN
     */
    public WetSteam {
        OutOfRangeException.within("vapour quality", quality, 0, 1, "kg/kg");
    }

    /**
     * Wet steam of a known quality at a temperature.
     *
     * @param kelvin temperature, 273.15 K to 623.15 K
     * @param quality vapour quality, 0 to 1
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static WetSteam ofKelvinQuality(double kelvin, double quality) {
        return new WetSteam(Saturated.atKelvin(kelvin), quality);
    }

    /**
     * Wet steam of a known quality at a pressure.
     *
     * @param pascal absolute pressure, 611.213 Pa to 16.53 MPa
     * @param quality vapour quality, 0 to 1
     * @return the state
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static WetSteam ofPascalQuality(double pascal, double quality) {
        return new WetSteam(Saturated.atPascal(pascal), quality);
    }

    /**
     * Wet steam of a known volume at a temperature: x = (v - v_f)/(v_g - v_f).
     *
     * @param kelvin temperature, 273.15 K to 623.15 K
     * @param cubicMetrePerKilogram specific volume, from boiling liquid to dry saturated steam
     * @return the state
     * @throws OutOfRangeException if the temperature lies outside its range, the quality outside 0 to 1, or either is
     *     NaN
     */
    public static WetSteam ofKelvinVolume(double kelvin, double cubicMetrePerKilogram) {
        return ofVolume(Saturated.atKelvin(kelvin), cubicMetrePerKilogram);
    }

    /**
     * Wet steam of a known volume at a pressure: x = (v - v_f)/(v_g - v_f).
     *
     * @param pascal absolute pressure, 611.213 Pa to 16.53 MPa
     * @param cubicMetrePerKilogram specific volume, from boiling liquid to dry saturated steam
     * @return the state
     * @throws OutOfRangeException if the pressure lies outside its range, the quality outside 0 to 1, or either is NaN
     */
    public static WetSteam ofPascalVolume(double pascal, double cubicMetrePerKilogram) {
        return ofVolume(Saturated.atPascal(pascal), cubicMetrePerKilogram);
    }

    /**
     * Wet steam of a known enthalpy at a pressure: x = (h - h_f)/(h_g - h_f).
     *
     * @param pascal absolute pressure, 611.213 Pa to 16.53 MPa
     * @param joulePerKilogram specific enthalpy, from boiling liquid to dry saturated steam
     * @return the state
     * @throws OutOfRangeException if the pressure lies outside its range, the quality outside 0 to 1, or either is NaN
     */
    public static WetSteam ofPascalEnthalpy(double pascal, double joulePerKilogram) {
        Saturated line = Saturated.atPascal(pascal);
        return new WetSteam(line, quality(line, Water::enthalpyJoulePerKilogram, joulePerKilogram));
    }

    static WetSteam ofVolume(Saturated line, double cubicMetrePerKilogram) {
        return new WetSteam(line, quality(line, Water::cubicMetrePerKilogram, cubicMetrePerKilogram));
    }

    @Override
    public double kelvin() {
        return line.liquid().kelvin();
    }

    @Override
    public double pascal() {
        return line.liquid().pascal();
    }

    @Override
    public double cubicMetrePerKilogram() {
        return mixed(Water::cubicMetrePerKilogram);
    }

    @Override
    public double internalEnergyJoulePerKilogram() {
        return mixed(Water::internalEnergyJoulePerKilogram);
    }

    @Override
    public double enthalpyJoulePerKilogram() {
        return mixed(Water::enthalpyJoulePerKilogram);
    }

    @Override
    public double entropyJoulePerKilogramKelvin() {
        return mixed(Water::entropyJoulePerKilogramKelvin);
    }

    private double mixed(ToDoubleFunction<Water> property) {
        double ofLiquid = property.applyAsDouble(line.liquid());
        return ofLiquid + quality * (property.applyAsDouble(line.vapour()) - ofLiquid);
    }

    private static double quality(Saturated line, ToDoubleFunction<Water> property, double value) {
        double ofLiquid = property.applyAsDouble(line.liquid());
        return (value - ofLiquid) / (property.applyAsDouble(line.vapour()) - ofLiquid);
    }
}
