package org.steamwitness.evaluate.instruments;

import java.util.OptionalDouble;
import org.steamwitness.evaluate.uncertainty.SampleUncertainty;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Noise;
import org.steamwitness.trace.Resolution;

/**
 * What the log shows of one channel.
 *
 * @param channel the channel
 * @param samples samples that have a value
 * @param missing samples that have none
 * @param resolution smallest step seen often, in kelvin or pascal; empty if the channel hardly moved
 * @param noise standard deviation of what neighbouring samples do not share; empty if the samples can't tell
 * @param lowest lowest value, in kelvin or absolute pascal
 * @param highest highest value
 */
public record ChannelMeasure(
        BoundChannel channel,
        int samples,
        int missing,
        OptionalDouble resolution,
        OptionalDouble noise,
        double lowest,
        double highest) {

    /** Standard deviation of a rectangle of width one: JCGM 100:2008, 4.3.7. */
    private static final double RECTANGLE = Math.sqrt(12);

    /**
     * Measures a channel.
     *
     * @param seconds times of the samples
     * @param channel with one value at least
     * @return its measure
     */
    static ChannelMeasure of(Column seconds, BoundChannel channel) {
        Column values = channel.values();
        int missing = 0;
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < values.size(); i++) {
            if (values.missing(i)) {
                missing++;
            } else {
                lowest = Math.min(lowest, values.at(i));
                highest = Math.max(highest, values.at(i));
            }
        }
        return new ChannelMeasure(
                channel,
                values.size() - missing,
                missing,
                Resolution.of(values),
                Noise.of(seconds, values),
                lowest,
                highest);
    }

    /**
     * The standard uncertainty of a sample: what the plan states as common, and as random the noise and the share of
     * one step of the resolution, q/sqrt(12).
     *
     * @return in kelvin or pascal; without a statement of the plan its random part alone
     */
    public SampleUncertainty uncertainty() {
        return new SampleUncertainty(channel.commonUncertainty().orElse(0), noise.orElse(0))
                .withRandom(resolution.orElse(0) / RECTANGLE);
    }
}
