package org.steamwitness.evaluate.hold;

import java.util.Optional;
import org.steamwitness.evaluate.instruments.ChannelMeasure;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.uncertainty.SampleUncertainty;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.SegmentWalk;
import org.steamwitness.trace.Trace;

/**
 * What one temperature channel showed in the hold phase.
 *
 * @param channel the channel
 * @param lowestKelvin lowest sample
 * @param meanKelvin time-weighted mean
 * @param highestKelvin highest sample
 * @param lowestIndex index of the lowest sample, the first if there are several
 * @param samples how many samples were there
 * @param uncertainty of one sample; empty if the plan states none
 */
public record ProbeInHold(
        BoundChannel channel,
        double lowestKelvin,
        double meanKelvin,
        double highestKelvin,
        int lowestIndex,
        int samples,
        Optional<SampleUncertainty> uncertainty) {

    static Optional<ProbeInHold> of(Trace trace, ChannelMeasure measure, Phase hold, double longestGapSeconds) {
        BoundChannel channel = measure.channel();
        int samples = 0;
        int lowest = -1;
        double highest = Double.NEGATIVE_INFINITY;
        for (int i = hold.from(); i < hold.end(); i++) {
            double kelvin = channel.values().at(i);
            if (Double.isNaN(kelvin)) {
                continue;
            }
            samples++;
            lowest = lowest < 0 || kelvin < channel.values().at(lowest) ? i : lowest;
            highest = Math.max(highest, kelvin);
        }
        if (lowest < 0) {
            return Optional.empty();
        }
        Integral area = new Integral();
        SegmentWalk.Coverage coverage = new SegmentWalk(trace.seconds(), channel.values(), longestGapSeconds)
                .over(hold.from(), hold.end() - 1, area);
        double mean = coverage.coveredSeconds() > 0
                ? area.kelvinSeconds / coverage.coveredSeconds()
                : channel.values().at(lowest);
        return Optional.of(new ProbeInHold(
                channel,
                channel.values().at(lowest),
                mean,
                highest,
                lowest,
                samples,
                channel.commonUncertainty().isPresent() ? Optional.of(measure.uncertainty()) : Optional.empty()));
    }

    private static final class Integral implements SegmentWalk.Visitor {
        private double kelvinSeconds;

        @Override
        public void segment(double startSeconds, double startValue, double endSeconds, double endValue) {
            kelvinSeconds += (startValue + endValue) / 2 * (endSeconds - startSeconds);
        }
    }
}
