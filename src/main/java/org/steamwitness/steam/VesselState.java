package org.steamwitness.steam;

/**
 * What a sealed vessel holds at one moment: wet or superheated steam, and air in the vapour space. Energies count from
 * the triple point of water, for water and air alike, so that differences of two states are heats.
 *
 * @param vessel the vessel and its charge
 * @param water the state of the water
 */
public record VesselState(SealedVessel vessel, Water water) {

    /** Whether liquid is left. A vessel full of liquid has no state here. */
    public enum Phase {
        /** Liquid and vapour in equilibrium. */
        WET,
        /** Vapour alone. */
        SUPERHEATED
    }

    private static final double VOLUME_PART = 1e-9;

    /**
     * Refuses water that does not fill the vessel.
     *
     * @param vessel the vessel and its charge
     * @param water the state of the water
     * @throws IllegalArgumentException if the water's volume differs from the vessel's by more than a part in 1e9
     */
    public VesselState {
        double own = vessel.cubicMetrePerKilogram();
        if (!(Math.abs(water.cubicMetrePerKilogram() - own) <= VOLUME_PART * own)) {
            throw new IllegalArgumentException("the vessel holds water of " + own + " m3/kg, the state has "
                    + water.cubicMetrePerKilogram() + " m3/kg");
        }
    }

    /**
     * Temperature of water and air.
     *
     * @return kelvin
     */
    public double kelvin() {
        return water.kelvin();
    }

    /**
     * Wet or superheated.
     *
     * @return the phase
     */
    public Phase phase() {
        return water instanceof WetSteam ? Phase.WET : Phase.SUPERHEATED;
    }

    /**
     * Vapour quality x: the part of the water's mass that is vapour.
     *
     * @return kilogram per kilogram, 1 when superheated
     */
    public double quality() {
        return water instanceof WetSteam wet ? wet.quality() : 1;
    }

    /**
     * Volume of the vapour space, which steam and air share.
     *
     * @return cubic metre
     */
    public double gasCubicMetre() {
        if (water instanceof WetSteam wet) {
            return vessel.waterKilogram() * wet.quality() * wet.line().vapour().cubicMetrePerKilogram();
        }
        return vessel.freeCubicMetre();
    }

    /**
     * Partial pressure of the steam: saturation while wet, that of the formula once superheated.
     *
     * @return pascal
     */
    public double steamPascal() {
        return water.pascal();
    }

    /**
     * Partial pressure of the air in the vapour space.
     *
     * @return pascal, zero without air
     */
    public double airPascal() {
        return vessel.airKilogram() * DryAir.GAS_CONSTANT * kelvin() / gasCubicMetre();
    }

    /**
     * Absolute pressure of the vessel, steam and air together.
     *
     * @return pascal
     */
    public double totalPascal() {
        return steamPascal() + airPascal();
    }

    /**
     * Internal energy of the water.
     *
     * @return joule
     */
    public double waterJoule() {
        return vessel.waterKilogram() * water.internalEnergyJoulePerKilogram();
    }

    /**
     * Internal energy of the air.
     *
     * @return joule
     */
    public double airJoule() {
        return DryAir.joule(vessel.airKilogram(), kelvin());
    }
}
