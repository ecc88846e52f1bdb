package org.steamwitness.steam;

import java.util.OptionalDouble;

/**
 * A closed rigid vessel with its charge of water and dry air, valves shut. The specific volume of the water, v = V/m, is
 * fixed; with the temperature it gives the state of the water.
 *
 * <p>Convention for the air: it fills the vapour space alone, that is the free volume less the saturated liquid, V_gas =
 * V - m (1 - x) v_f(T) = m x v_g(T), and the whole free volume once the water is dry. There p_air = m_air R T / V_gas
 * with R = 287.055 J/(kg K), its energy is m_air c_v T with c_v = 718 J/(kg K), and the vessel's pressure is the sum of
 * both (Dalton). The air leaves the water's state alone: the liquid is that of the saturation line and not compressed by
 * the air, none dissolves, and the steam's pressure is p_sat(T) without enhancement factor.
 *
 * <p>States reach from 273.15 K to 623.15 K and up to the total pressure of 16.53 MPa that saturated steam has there.
 *
 * @param freeCubicMetre volume that water and air can take, load and fittings deducted, above zero
 * @param waterKilogram mass of the water, liquid and vapour together, above zero
 * @param airKilogram mass of the dry air, zero or above
 */
public record SealedVessel(double freeCubicMetre, double waterKilogram, double airKilogram) {

    /** With air, states are not sought from a pressure below the temperature of the densest water, in kelvin. */
    private static final double DENSEST_KELVIN = 277.15;

    private static final double LEAST_VOLUME = liquidVolume(Saturated.LOWEST_KELVIN);
    private static final double MOST_VOLUME =
            Region2.at(Region2.LOWEST_KELVIN, Region2.LOWEST_PASCAL).cubicMetrePerKilogram();

    /**
     * Refuses a charge that no temperature of the range could have.
     *
     * @param freeCubicMetre free volume in cubic metre, above zero
     * @param waterKilogram mass of water in kilogram, above zero
     * @param airKilogram mass of dry air in kilogram, zero or above
     * @throws OutOfRangeException if a mass or volume is not finite or lies below its range, if the liquid would leave no
     *     vapour space at 273.15 K, or if the steam could not reach 1 Pa there
     */
    public SealedVessel {
        OutOfRangeException.within("free volume", freeCubicMetre, Double.MIN_VALUE, Double.MAX_VALUE, "m3");
        OutOfRangeException.within("mass of water", waterKilogram, Double.MIN_VALUE, Double.MAX_VALUE, "kg");
        OutOfRangeException.within("mass of air", airKilogram, 0, Double.MAX_VALUE, "kg");
        double volume = freeCubicMetre / waterKilogram;
        if (!(volume > LEAST_VOLUME && volume <= MOST_VOLUME)) {
            throw new OutOfRangeException(
                    "free volume for each kilogram of water", volume, LEAST_VOLUME, MOST_VOLUME, "m3/kg");
        }
    }

    /**
     * A vessel that holds water and no air.
     *
     * @param freeCubicMetre free volume in cubic metre, above zero
     * @param waterKilogram mass of water in kilogram, above zero
     * @return the vessel
     * @throws OutOfRangeException as the constructor does
     */
    public static SealedVessel withoutAir(double freeCubicMetre, double waterKilogram) {
        return new SealedVessel(freeCubicMetre, waterKilogram, 0);
    }

    /**
     * Shuts air into this vessel at the temperature and pressure that the vapour space had when the valves closed. Its
     * mass is p_air V_gas / (R T), with p_air the pressure less that of the steam.
     *
     * @param kelvin temperature at closing, 273.15 K to 623.15 K
     * @param pascal absolute pressure at closing, from that of the steam alone to 16.53 MPa
     * @return the same vessel with that mass of air in place of its own
     * @throws OutOfRangeException if either lies outside its range or is NaN
     * @throws LiquidFullException if liquid fills the vessel at {@code kelvin}
     */
    public SealedVessel closedAt(double kelvin, double pascal) {
        VesselState airFree = new VesselState(this, waterAt(kelvin));
        double steamPascal = airFree.steamPascal();
        OutOfRangeException.within("closing: absolute pressure", pascal, steamPascal, Saturated.HIGHEST_PASCAL, "Pa");
        double air = (pascal - steamPascal) * airFree.gasCubicMetre() / (DryAir.GAS_CONSTANT * kelvin);
        return new SealedVessel(freeCubicMetre, waterKilogram, air);
    }

    /**
     * Specific volume of the water, v = V/m.
     *
     * @return cubic metre per kilogram
     */
    public double cubicMetrePerKilogram() {
        return freeCubicMetre / waterKilogram;
    }

    /**
     * The temperature at which the last liquid evaporates, v_g(T) = v.
     *
     * @return kelvin; empty when the vessel is dry already at 273.15 K, still wet at 623.15 K, or fills with liquid
     */
    public OptionalDouble dryOutKelvin() {
        double volume = cubicMetrePerKilogram();
        boolean onTheLine =
                volume <= vapourVolume(Saturated.LOWEST_KELVIN) && volume >= vapourVolume(Saturated.HIGHEST_KELVIN);
        return onTheLine
                ? OptionalDouble.of(Root.between(
                        Saturated.LOWEST_KELVIN, Saturated.HIGHEST_KELVIN, t -> 1 - volume / vapourVolume(t)))
                : OptionalDouble.empty();
    }

    /**
     * The temperature at which liquid fills the vessel, v_f(T) = v.
     *
     * @return kelvin; empty when there is vapour space up to 623.15 K
     */
    public OptionalDouble liquidFullKelvin() {
        double volume = cubicMetrePerKilogram();
        return volume <= liquidVolume(Saturated.HIGHEST_KELVIN)
                ? OptionalDouble.of(
                        Root.between(Saturated.LOWEST_KELVIN, Saturated.HIGHEST_KELVIN, t -> liquidVolume(t) - volume))
                : OptionalDouble.empty();
    }

    /**
     * The state at a temperature.
     *
     * @param kelvin temperature, 273.15 K to 623.15 K
     * @return the state, wet or superheated
     * @throws OutOfRangeException if {@code kelvin} lies outside that range or is NaN, or the total pressure exceeds
     *     16.53 MPa
     * @throws LiquidFullException if liquid fills the vessel at {@code kelvin}
     */
    public VesselState atKelvin(double kelvin) {
        VesselState state = new VesselState(this, waterAt(kelvin));
        OutOfRangeException.within(
                "sealed vessel: absolute pressure",
                state.totalPascal(),
                Region2.LOWEST_PASCAL,
                Saturated.HIGHEST_PASCAL,
                "Pa");
        return state;
    }

    /**
     * The state at a total pressure.
     *
     * @param pascal absolute pressure of steam and air together, from that of the coldest state to that of 623.15 K, at
     *     most 16.53 MPa; with air the coldest state is that at 277.15 K, since colder water swells
     * @return the state, wet or superheated
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     * @throws LiquidFullException if the vessel holds no air and liquid fills it at {@code pascal}
     */
    public VesselState atPascal(double pascal) {
        OutOfRangeException.within(
                "sealed vessel: absolute pressure", pascal, Region2.LOWEST_PASCAL, Saturated.HIGHEST_PASCAL, "Pa");
        return new VesselState(this, airKilogram == 0 ? waterAlone(pascal) : waterAt(kelvinWithAir(pascal)));
    }

    private Water waterAt(double kelvin) {
        double volume = cubicMetrePerKilogram();
        Saturated line = Saturated.atKelvin(kelvin);
        requireVapourSpace(line);
        return volume <= line.vapour().cubicMetrePerKilogram()
                ? WetSteam.ofVolume(line, volume)
                : Superheated.ofKelvinVolume(kelvin, volume);
    }

    private Water waterAlone(double pascal) {
        double volume = cubicMetrePerKilogram();
        if (pascal >= Saturated.LOWEST_PASCAL) {
            Saturated line = Saturated.atPascal(pascal);
            requireVapourSpace(line);
            if (volume <= line.vapour().cubicMetrePerKilogram()) {
                return WetSteam.ofVolume(line, volume);
            }
        }
        SinglePhase steam = Superheated.ofPascalVolume(pascal, volume);
        OutOfRangeException.within(
                "sealed vessel: temperature", steam.kelvin(), Saturated.LOWEST_KELVIN, Saturated.HIGHEST_KELVIN, "K");
        return steam;
    }

    private void requireVapourSpace(Saturated line) {
        double volume = cubicMetrePerKilogram();
        if (volume <= line.liquid().cubicMetrePerKilogram()) {
            throw new LiquidFullException(liquidFullKelvin().orElseThrow(), volume);
        }
    }

    private double kelvinWithAir(double pascal) {
        OptionalDouble full = liquidFullKelvin();
        double hottest = full.orElse(Saturated.HIGHEST_KELVIN);
        OutOfRangeException.within(
                "sealed vessel with air: absolute pressure",
                pascal,
                totalPascal(DENSEST_KELVIN),
                full.isPresent() ? Saturated.HIGHEST_PASCAL : totalPascal(hottest),
                "Pa");
        return Root.between(DENSEST_KELVIN, hottest, t -> pascal - totalPascal(t));
    }

    /** Total pressure; beyond all bounds where no vapour space is left to the air. */
    private double totalPascal(double kelvin) {
        return cubicMetrePerKilogram() <= liquidVolume(kelvin)
                ? Double.POSITIVE_INFINITY
                : new VesselState(this, waterAt(kelvin)).totalPascal();
    }

    private static double liquidVolume(double kelvin) {
        return Region1.unguarded(kelvin, Saturation.pascalAt(kelvin)).cubicMetrePerKilogram();
    }

    private static double vapourVolume(double kelvin) {
        return Region2.unguarded(kelvin, Saturation.pascalAt(kelvin)).cubicMetrePerKilogram();
    }
}
