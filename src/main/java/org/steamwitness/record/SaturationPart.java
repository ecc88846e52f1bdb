package org.steamwitness.record;

import java.util.List;

/**
 * Steam-contact probes held against saturation.
 *
 * @param tolerance how far they may stand from it
 * @param judgedPhases phases in which that is judged
 * @param smallestAirFraction mole fraction of air that every probe would have confirmed all through the hold phase
 * @param perPhase what each probe showed in each phase
 * @param episodes stretches outside the tolerance in judged phases
 */
public record SaturationPart(
        Given<Tolerance> tolerance,
        List<String> judgedPhases,
        Given<Double> smallestAirFraction,
        List<PerPhase> perPhase,
        List<EpisodePart> episodes) {

    /**
     * Tolerances.
     *
     * @param airKelvin allowed distance below saturation
     * @param superheatKelvin allowed distance above saturation
     */
    public record Tolerance(double airKelvin, double superheatKelvin) {}

    /**
     * What one probe showed in one phase.
     *
     * @param phase name of the phase
     * @param phaseIndex its index
     * @param channel the probe
     * @param states how many samples were in each state
     * @param departureKelvin its departures
     * @param airFraction equivalent mole fraction of air; below zero it is none
     */
    public record PerPhase(
            String phase,
            int phaseIndex,
            String channel,
            StateCounts states,
            Given<DepartureKelvin> departureKelvin,
            Given<AirFraction> airFraction) {}

    /**
     * How many samples were in each state.
     *
     * @param saturated within the tolerance
     * @param possibleAir below it, within the uncertainty
     * @param confirmedAir below it, beyond the uncertainty
     * @param possibleSuperheat above it, within the uncertainty
     * @param confirmedSuperheat above it, beyond the uncertainty
     * @param notJudged without a sample, or off the saturation line
     */
    public record StateCounts(
            int saturated,
            int possibleAir,
            int confirmedAir,
            int possibleSuperheat,
            int confirmedSuperheat,
            int notJudged) {}

    /**
     * Departures from saturation.
     *
     * @param lowest least
     * @param mean mean
     * @param highest greatest
     * @param rms root of the mean square
     * @param uncertainty standard uncertainty of the least
     */
    public record DepartureKelvin(double lowest, double mean, double highest, double rms, double uncertainty) {}

    /**
     * Equivalent air.
     *
     * @param mean mean mole fraction
     * @param highest highest mole fraction
     */
    public record AirFraction(double mean, double highest) {}

    /**
     * A stretch in which a probe left saturation.
     *
     * @param id its number in the record
     * @param kind air or superheat
     * @param certainty confirmed or possible
     * @param phase name of the phase
     * @param judged whether saturation is judged there
     * @param channels the probes
     * @param startSeconds first sample
     * @param endSeconds last sample
     * @param durationSeconds between both
     * @param worstKelvin departure furthest from saturation
     * @param meanKelvin mean departure
     * @param airFractionHighest highest equivalent mole fraction of air
     * @param uncertaintyKelvin standard uncertainty of the worst departure
     * @param diagnosis what it is consistent with
     */
    public record EpisodePart(
            String id,
            String kind,
            String certainty,
            String phase,
            boolean judged,
            List<String> channels,
            double startSeconds,
            double endSeconds,
            double durationSeconds,
            double worstKelvin,
            double meanKelvin,
            double airFractionHighest,
            double uncertaintyKelvin,
            Given<String> diagnosis) {}
}
