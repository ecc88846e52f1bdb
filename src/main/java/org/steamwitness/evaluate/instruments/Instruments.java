package org.steamwitness.evaluate.instruments;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.quantity.Printed;
import org.steamwitness.trace.Trace;

/**
 * What the log shows of its channels and its sampling.
 *
 * @param channels one measure a channel, in the order of the plan
 * @param findings gaps in the sampling
 */
public record Instruments(List<ChannelMeasure> channels, List<Finding> findings) {

    /**
     * Measures all channels.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @return measures and findings
     */
    public static Instruments of(Trace trace, BoundPlan plan) {
        return new Instruments(
                plan.channels().stream().map(ChannelMeasure::of).toList(), gaps(trace, plan.longestGapSeconds()));
    }

    /**
     * The measure of one channel.
     *
     * @param channel one of the plan's
     * @return its measure
     */
    public ChannelMeasure of(BoundChannel channel) {
        return channels.stream()
                .filter(m -> m.channel().equals(channel))
                .findFirst()
                .orElseThrow();
    }

    private static List<Finding> gaps(Trace trace, double longestGapSeconds) {
        List<Finding> gaps = new ArrayList<>();
        for (int i = 1; i < trace.size(); i++) {
            double step = trace.seconds().at(i) - trace.seconds().at(i - 1);
            if (step > longestGapSeconds) {
                gaps.add(new Finding(
                        FindingKind.GAP,
                        Position.ofLine("log", trace.lineOf(i - 1)),
                        Map.of(
                                "duration", Printed.duration(step),
                                "at", trace.clock().timeOfDayAt(trace.seconds().at(i - 1)),
                                "allowed", Printed.duration(longestGapSeconds))));
            }
        }
        return gaps;
    }
}
