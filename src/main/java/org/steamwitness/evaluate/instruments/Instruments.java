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
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace;

/**
 * What the log shows of its channels and its sampling.
 *
 * @param channels one measure a channel, in the order of the plan
 * @param findings gaps in the sampling and channels that never change
 */
public record Instruments(List<ChannelMeasure> channels, List<Finding> findings) {

    /** Fewer samples may be alike by chance; common practice, no source. */
    private static final int FEWEST_FOR_STILLNESS = 60;

    private static final double PASCAL_PER_KILOPASCAL = 1e3;

    /**
     * Measures all channels.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @return measures and findings
     */
    public static Instruments of(Trace trace, BoundPlan plan) {
        List<ChannelMeasure> channels = plan.channels().stream()
                .map(c -> ChannelMeasure.of(trace.seconds(), c))
                .toList();
        List<Finding> findings = new ArrayList<>(gaps(trace, plan.longestGapSeconds()));
        channels.stream()
                .filter(Instruments::standsStill)
                .map(Instruments::still)
                .forEach(findings::add);
        return new Instruments(channels, List.copyOf(findings));
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

    /** Whole runs heat up and cool down: a channel that shows one value throughout measured nothing. */
    private static boolean standsStill(ChannelMeasure measure) {
        return measure.samples() >= FEWEST_FOR_STILLNESS && measure.lowest() == measure.highest();
    }

    private static Finding still(ChannelMeasure measure) {
        boolean pressure = measure.channel().kind() == QuantityKind.PRESSURE;
        String value = pressure
                ? Printed.fixed(measure.lowest() / PASCAL_PER_KILOPASCAL, 2) + " kPa absolute"
                : Printed.fixed(TemperatureUnit.CELSIUS.ofKelvin(measure.lowest()), 2) + " °C";
        return new Finding(
                FindingKind.CHANNEL_NEVER_CHANGES,
                Position.RUN,
                Map.of(
                        "channel", measure.channel().name(),
                        "value", value,
                        "samples", Integer.toString(measure.samples())));
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
