package org.steamwitness.record;

import java.util.List;

/**
 * The hold.
 *
 * @param steps one entry a step that the plan asks for
 */
public record HoldPart(List<Step> steps) {

    /**
     * One step.
     *
     * @param atLeastCelsius lowest temperature of the band
     * @param atMostCelsius highest temperature of the band
     * @param requiredSeconds how long the plan asks for
     * @param attempts every stretch inside the band
     * @param provenSeconds from the first to the last sample of the longest attempt
     * @param possibleSeconds to the samples or marks around it
     * @param equilibrationSeconds time until every load probe joined
     * @param perChannel what each temperature channel showed
     * @param spreadKelvin greatest difference between steam-contact probes
     * @param driftKelvinPerMinute how the reference drifted
     */
    public record Step(
            double atLeastCelsius,
            double atMostCelsius,
            double requiredSeconds,
            List<Attempt> attempts,
            double provenSeconds,
            double possibleSeconds,
            Given<Double> equilibrationSeconds,
            List<PerChannel> perChannel,
            Given<Spread> spreadKelvin,
            Given<Double> driftKelvinPerMinute) {}

    /**
     * A stretch inside the band.
     *
     * @param startSeconds first sample
     * @param endSeconds last sample
     * @param endedBy what ended it
     */
    public record Attempt(double startSeconds, double endSeconds, String endedBy) {}

    /**
     * What one channel showed in the hold phase.
     *
     * @param channel its name
     * @param lowest lowest sample, degrees Celsius
     * @param mean time-weighted mean
     * @param highest highest sample
     * @param lowestAtSeconds when it was lowest
     * @param uncertainty standard uncertainties of these temperatures, kelvin
     */
    public record PerChannel(
            String channel,
            double lowest,
            double mean,
            double highest,
            double lowestAtSeconds,
            Given<Uncertainty> uncertainty) {}

    /**
     * Standard uncertainties of one channel's temperatures, in kelvin.
     *
     * @param lowest of the lowest sample
     * @param mean of the mean, in which noise averages out
     * @param highest of the highest sample
     */
    public record Uncertainty(double lowest, double mean, double highest) {}

    /**
     * Difference between steam-contact probes at one instant.
     *
     * @param highest the greatest
     * @param atSeconds when
     * @param hottest the hottest channel then
     * @param coldest the coldest channel then
     * @param uncertainty standard uncertainty of the difference, without what both sensors share, kelvin
     */
    public record Spread(double highest, double atSeconds, String hottest, String coldest, Given<Double> uncertainty) {}
}
