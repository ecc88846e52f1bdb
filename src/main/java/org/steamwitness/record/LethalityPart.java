package org.steamwitness.record;

import java.util.List;

/**
 * One lethality aim and what its probes reached.
 *
 * @param name such as "F0"
 * @param referenceCelsius reference temperature
 * @param zKelvin temperature step that multiplies the lethal rate by ten
 * @param floorCelsius below it nothing counts
 * @param unit unit of every value here
 * @param minimum the plan's minimum
 * @param maximum the plan's maximum
 * @param counted what counts towards them
 * @param probes which channels the plan wants it of
 * @param perChannel one entry a probe
 * @param governing the probe that reached least, or most where the plan sets a maximum alone
 * @param decimalReduction what the governing probe's lethality reduces, and how far
 */
public record LethalityPart(
        String name,
        double referenceCelsius,
        double zKelvin,
        Given<Double> floorCelsius,
        String unit,
        Given<Double> minimum,
        Given<Double> maximum,
        String counted,
        String probes,
        List<PerChannel> perChannel,
        Given<Governing> governing,
        Given<Reduction> decimalReduction) {

    /**
     * Which probe governs, in a word.
     *
     * @return "least" or "greatest"
     */
    public String governs() {
        return maximum.value().isPresent() && minimum.value().isEmpty() ? "greatest" : "least";
    }

    /**
     * What one probe reached.
     *
     * @param channel the probe
     * @param contact what touches it
     * @param toSteamOff up to the end of the hold phase
     * @param withCooling over the whole run
     * @param perPhase one value a phase
     * @param interval what counts towards the limits, if the sensor was off by its expanded uncertainty (k = 2)
     * @param bridgedSeconds time over missing samples that a line bridged
     * @param lostSeconds time that counted as nothing
     * @param markedSeconds time at a steam-contact probe outside saturation
     * @param markedValue what was gathered in it
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
            Given<Double> markedSeconds,
            Given<Double> markedValue) {}

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
     * The probe that governs.
     *
     * @param channel the probe
     * @param value what counts towards the limits
     */
    public record Governing(String channel, double value) {}

    /**
     * A decimal reduction at the governing probe.
     *
     * @param of what is reduced
     * @param timeMinutes time at the reference temperature that reduces it by a power of ten
     * @param source where that time comes from
     * @param powersOfTen by how many powers of ten the counted lethality reduces it
     */
    public record Reduction(String of, double timeMinutes, String source, double powersOfTen) {}
}
