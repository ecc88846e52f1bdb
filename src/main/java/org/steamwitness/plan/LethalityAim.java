package org.steamwitness.plan;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A lethality that the plan asks for: F = integral of 10^((T - T_ref)/z) dt, in time at the reference temperature.
 *
 * @param name such as "F0"
 * @param referenceKelvin temperature at which a minute counts as a minute
 * @param zKelvin temperature step that multiplies the lethal rate by ten
 * @param floorKelvin below it nothing counts; empty if all counts
 * @param unit in which it is written and printed
 * @param limits what it has to reach and may not exceed
 * @param probes the channels that it is wanted of
 * @param coolingCounted whether lethality after the hold phase counts towards the limits
 * @param reduction what a decimal reduction at the reference temperature takes, where the plan says so
 */
public record LethalityAim(
        String name,
        double referenceKelvin,
        double zKelvin,
        OptionalDouble floorKelvin,
        LethalityUnit unit,
        Limits limits,
        ProbeChoice probes,
        boolean coolingCounted,
        Optional<DecimalReduction> reduction) {

    /**
     * Checks the kinetics.
     *
     * @param name such as "F0"
     * @param referenceKelvin temperature at which a minute counts as a minute
     * @param zKelvin temperature step that multiplies the lethal rate by ten
     * @param floorKelvin below it nothing counts
     * @param unit in which it is written and printed
     * @param limits what it has to reach and may not exceed
     * @param probes the channels that it is wanted of
     * @param coolingCounted whether lethality after the hold phase counts
     * @param reduction what a decimal reduction takes
     * @throws IllegalArgumentException if z is not above zero
     */
    public LethalityAim {
        if (!(zKelvin > 0)) {
            throw new IllegalArgumentException("z must exceed zero");
        }
    }

    /**
     * What a lethality has to reach and may not exceed, in seconds at the reference temperature.
     *
     * @param leastSeconds every probe has to reach it; empty if the plan sets no minimum
     * @param mostSeconds no probe may exceed it; empty if the plan sets no maximum
     */
    public record Limits(OptionalDouble leastSeconds, OptionalDouble mostSeconds) {

        /**
         * Checks that the limits leave room.
         *
         * @param leastSeconds every probe has to reach it
         * @param mostSeconds no probe may exceed it
         * @throws IllegalArgumentException if a limit is not above zero or the maximum lies below the minimum
         */
        public Limits {
            if (!(leastSeconds.orElse(1) > 0)) {
                throw new IllegalArgumentException("the minimum must exceed zero");
            }
            if (!(mostSeconds.orElse(Double.POSITIVE_INFINITY) >= leastSeconds.orElse(Double.MIN_VALUE))) {
                throw new IllegalArgumentException("the maximum must exceed zero and may not lie below the minimum");
            }
        }

        /**
         * Tells whether the plan sets a maximum and no minimum.
         *
         * @return true if the probe that reached most governs
         */
        public boolean maximumAlone() {
            return mostSeconds.isPresent() && leastSeconds.isEmpty();
        }

        /**
         * A minimum alone.
         *
         * @param leastSeconds every probe has to reach it
         * @return limits without a maximum
         */
        public static Limits atLeast(double leastSeconds) {
            return new Limits(OptionalDouble.of(leastSeconds), OptionalDouble.empty());
        }
    }
}
