package org.steamwitness.record;

import java.util.List;

/**
 * One lethality aim and what the product probes reached.
 *
 * @param name such as "F0"
 * @param referenceCelsius reference temperature
 * @param zKelvin temperature step that multiplies the lethal rate by ten
 * @param floorCelsius below it nothing counts
 * @param unit unit of every value here
 * @param minimum the plan's minimum
 * @param counted what counts towards it
 * @param perChannel one entry a product probe
 * @param governing the probe that reached least
 */
public record LethalityPart(
        String name,
        double referenceCelsius,
        double zKelvin,
        Given<Double> floorCelsius,
        String unit,
        double minimum,
        String counted,
        List<PerChannel> perChannel,
        Given<Governing> governing) {

    /**
     * What one probe reached.
     *
     * @param channel the probe
     * @param contact what touches it
     * @param toSteamOff up to the end of the hold phase
     * @param withCooling over the whole run
     * @param perPhase one value a phase
     * @param interval what counts towards the minimum, if the sensor was off by its expanded uncertainty (k = 2)
     * @param bridgedSeconds time over missing samples that a line bridged
     * @param lostSeconds time that counted as nothing
     * @param markedSeconds time at a steam-contact probe outside saturation
     */
    public record PerChannel(
            String channel,
            String contact,
            double toSteamOff,
            double withCooling,
            List<PhaseValue> perPhase,
            Given<Interval> interval,
            double bridgedSeconds,
            double lostSeconds,
            Given<Double> markedSeconds) {}

    /**
     * Lethality in one phase.
     *
     * @param phase name of the phase
     * @param phaseIndex its index
     * @param value in the unit of the aim
     */
    public record PhaseValue(String phase, int phaseIndex, double value) {}

    /**
     * An interval of values.
     *
     * @param low its lower end
     * @param high its upper end
     */
    public record Interval(double low, double high) {}

    /**
     * The probe that reached least.
     *
     * @param channel the probe
     * @param value what counts towards the minimum
     */
    public record Governing(String channel, double value) {}
}
