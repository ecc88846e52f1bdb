package org.steamwitness.record;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.steamwitness.evaluate.instruments.ChannelMeasure;
import org.steamwitness.plan.PlannedChannel;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace.SamplingInterval;

/** The record's part on channels. */
final class ChannelParts {

    private static final String NOT_EVALUATED = "this version of the program does not evaluate it";

    private final Evidence evidence;

    ChannelParts(Evidence evidence) {
        this.evidence = evidence;
    }

    List<ChannelPart> all() {
        return IntStream.range(0, evidence.plan().channels().size())
                .mapToObj(i -> part(evidence.plan().channels().get(i)))
                .toList();
    }

    private ChannelPart part(PlannedChannel planned) {
        SamplingInterval interval = evidence.trace().interval();
        Optional<ChannelMeasure> measure = evidence.evaluation().instruments().channels().stream()
                .filter(m -> m.channel().name().equals(planned.name()))
                .findFirst();
        boolean pressure = planned.rule().kind() == QuantityKind.PRESSURE;
        double perUnit = pressure ? 1e-3 : 1;
        return new ChannelPart(
                planned.name(),
                planned.rule().header(),
                planned.rule().kind().word(),
                planned.place().word(),
                planned.contact().word(),
                planned.rule().unit(),
                planned.rule().datum().word(),
                measure.map(ChannelMeasure::samples).orElseGet(() -> counted(planned, false)),
                measure.map(ChannelMeasure::missing).orElseGet(() -> counted(planned, true)),
                Given.numberOr(
                        scaled(measure.map(ChannelMeasure::resolution).orElse(OptionalDouble.empty()), perUnit),
                        "no step was seen often enough"),
                Given.numberOr(
                        scaled(measure.map(ChannelMeasure::noise).orElse(OptionalDouble.empty()), perUnit),
                        "too few samples at an even interval"),
                planned.uncertainty()
                        .map(u -> Given.ofNumber(u.standard() * perUnit))
                        .orElseGet(() -> Given.withheld("not stated", "plan: channels.uncertainty")),
                new ChannelPart.Interval(
                        Canonical.number(interval.medianSeconds()), Canonical.number(interval.longestSeconds())),
                correction(planned),
                planned.certificate()
                        .map(Given::of)
                        .orElseGet(() -> Given.withheld("not stated", "plan: channels.certificate")),
                planned.due()
                        .map(due -> Given.of(due.toString()))
                        .orElseGet(() -> Given.withheld("not stated", "plan: channels.due")),
                Given.withheld(NOT_EVALUATED),
                planned.mayStateUncertainty()
                        ? extreme(measure.map(ChannelMeasure::lowest), pressure)
                        : Given.withheld(NOT_EVALUATED),
                planned.mayStateUncertainty()
                        ? extreme(measure.map(ChannelMeasure::highest), pressure)
                        : Given.withheld(NOT_EVALUATED));
    }

    /** Samples of a channel that enters no result. */
    private int counted(PlannedChannel planned, boolean missing) {
        return evidence.trace().channels().stream()
                .filter(channel -> channel.rule().channel().equals(planned.name()))
                .findFirst()
                .map(channel -> (int) IntStream.range(0, channel.values().size())
                        .filter(i -> channel.values().missing(i) == missing)
                        .count())
                .orElse(0);
    }

    private boolean isBound(PlannedChannel planned) {
        return evidence.bound().channels().stream()
                .anyMatch(channel -> channel.name().equals(planned.name()));
    }

    private Given<String> correction(PlannedChannel planned) {
        if (planned.rule().datum() == Datum.GAUGE && !isBound(planned)) {
            return Given.withheld("the atmosphere is not known", "run sheet: atmosphere");
        }
        if (planned.rule().datum() == Datum.GAUGE) {
            return evidence.sheet()
                    .atmospherePascal()
                    .map(p -> Given.of("atmosphere of " + Canonical.kilopascal(p) + " kPa added"))
                    .orElseGet(() -> Given.withheld("not entered", "run sheet: atmosphere"));
        }
        return Given.of("none");
    }

    private static Given<Double> extreme(Optional<Double> value, boolean pressure) {
        return value.map(v -> Given.of(pressure ? Canonical.kilopascal(v) : Canonical.celsius(v)))
                .orElseGet(() -> Given.withheld("the absolute pressure is not known", "run sheet: atmosphere"));
    }

    private static OptionalDouble scaled(OptionalDouble value, double factor) {
        return value.isPresent() ? OptionalDouble.of(value.getAsDouble() * factor) : value;
    }
}
