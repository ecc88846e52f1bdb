package org.steamwitness.plan;

import java.util.OptionalDouble;

/**
 * A lethality that the plan asks for.
 *
 * @param name such as "F0"
 * @param referenceKelvin temperature at which a minute counts as a minute
 * @param zKelvin temperature step that multiplies the lethal rate by ten
 * @param floorKelvin below it nothing counts; empty if all counts
 * @param minimumSeconds least lethality of every product channel
 * @param coolingCounted whether lethality after the hold phase counts towards the minimum
 */
public record LethalityAim(
        String name,
        double referenceKelvin,
        double zKelvin,
        OptionalDouble floorKelvin,
        double minimumSeconds,
        boolean coolingCounted) {

    /**
     * Checks the kinetics.
     *
     * @param name such as "F0"
     * @param referenceKelvin temperature at which a minute counts as a minute
     * @param zKelvin temperature step that multiplies the lethal rate by ten
     * @param floorKelvin below it nothing counts
     * @param minimumSeconds least lethality of every product channel
     * @param coolingCounted whether lethality after the hold phase counts
     * @throws IllegalArgumentException if z or the minimum is not above zero
     */
    public LethalityAim {
        if (!(zKelvin > 0)) {
            throw new IllegalArgumentException("z must exceed zero");
        }
        if (!(minimumSeconds > 0)) {
            throw new IllegalArgumentException("the minimum must exceed zero");
        }
    }
}
