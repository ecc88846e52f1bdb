package org.steamwitness.evaluate.instruments;

import java.util.OptionalDouble;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Resolution;

/**
 * What the log shows of one channel.
 *
 * @param channel the channel
 * @param samples samples that have a value
 * @param missing samples that have none
 * @param resolution smallest step seen often, in kelvin or pascal; empty if the channel hardly moved
 * @param lowest lowest value, in kelvin or absolute pascal
 * @param highest highest value
 */
public record ChannelMeasure(
        BoundChannel channel, int samples, int missing, OptionalDouble resolution, double lowest, double highest) {

    /** Standard deviation of a rectangle of width one: JCGM 100:2008, 4.3.7. */
    private static final double RECTANGLE = Math.sqrt(12);

    /**
     * Measures a channel.
     *
     * @param channel with one value at least
     * @return its measure
     */
    static ChannelMeasure of(BoundChannel channel) {
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
        return new ChannelMeasure(channel, values.size() - missing, missing, Resolution.of(values), lowest, highest);
    }

    /**
     * The part of a sample's standard uncertainty that is its own: its share of one step of the resolution.
     *
     * @return in kelvin or pascal; zero if no step was seen
     */
    public double randomUncertainty() {
        return resolution.orElse(0) / RECTANGLE;
    }

    /**
     * The standard uncertainty of one sample, common and random part together.
     *
     * @return in kelvin or pascal; the random part alone if the plan states nothing
     */
    public double sampleUncertainty() {
        double common = channel.commonUncertainty().orElse(0);
        double random = randomUncertainty();
        return Math.sqrt(common * common + random * random);
    }
}
