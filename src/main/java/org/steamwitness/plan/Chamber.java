package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.quantity.PressureReading;

/**
 * The chamber with what is in it, as far as an energy balance needs it.
 *
 * @param raisedInside true if steam is raised from the vessel's own water, false if it is supplied
 * @param volumeCubicMetre of the empty chamber
 * @param freeVolumeCubicMetre of what the load leaves free
 * @param metal the metal that is heated
 * @param load the load that is heated
 * @param heatLossWattPerKelvin lost for each kelvin above the surroundings
 * @param maximumPressure what the chamber may carry
 */
public record Chamber(
        boolean raisedInside,
        OptionalDouble volumeCubicMetre,
        OptionalDouble freeVolumeCubicMetre,
        Optional<Metal> metal,
        Optional<Load> load,
        OptionalDouble heatLossWattPerKelvin,
        Optional<PressureReading> maximumPressure) {

    /**
     * Checks the volumes.
     *
     * @param raisedInside true if steam is raised from the vessel's own water
     * @param volumeCubicMetre of the empty chamber
     * @param freeVolumeCubicMetre of what the load leaves free
     * @param metal the metal that is heated
     * @param load the load that is heated
     * @param heatLossWattPerKelvin lost for each kelvin above the surroundings
     * @param maximumPressure what the chamber may carry
     * @throws IllegalArgumentException if more is free than there is
     */
    public Chamber {
        if (freeVolumeCubicMetre.orElse(0) > volumeCubicMetre.orElse(Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("free-volume may not exceed volume");
        }
    }

    /**
     * The metal that is heated.
     *
     * @param massKilogram its mass
     * @param material what it is made of
     * @param channels whose temperature it is assumed to have
     */
    public record Metal(double massKilogram, Material material, List<String> channels) {}

    /**
     * The load that is heated.
     *
     * @param heat its mass and specific heat, or what it is made of
     * @param channels that measure it
     * @param probes what these measure of it
     */
    public record Load(LoadHeat heat, List<String> channels, LoadProbes probes) {}

    /** What the load's probes measure. */
    public enum LoadProbes {
        /** The point that heats last: a bound, not the mean. */
        COLD_SPOT("cold-spot"),
        /** The mean over the mass. */
        MASS_AVERAGE("mass-average");

        private final String word;

        LoadProbes(String word) {
            this.word = word;
        }

        /**
         * The word used in plans.
         *
         * @return "cold-spot" or "mass-average"
         */
        public String word() {
            return word;
        }
    }
}
