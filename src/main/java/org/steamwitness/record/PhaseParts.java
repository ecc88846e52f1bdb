package org.steamwitness.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.PhaseName;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.Marks;
import org.steamwitness.trace.Column;

/** The record's part on phases. */
final class PhaseParts {

    private final Evidence evidence;

    PhaseParts(Evidence evidence) {
        this.evidence = evidence;
    }

    List<PhasePart> all() {
        List<PhasePart> parts = new ArrayList<>();
        for (Phase phase : evidence.evaluation().phases().phases()) {
            parts.add(part(phase, parts.size() + 1));
        }
        return List.copyOf(parts);
    }

    private PhasePart part(Phase phase, int index) {
        double start = evidence.trace().seconds().at(phase.from());
        double end = evidence.trace().seconds().at(phase.to());
        return new PhasePart(
                phase.name().word(),
                index,
                Canonical.number(start),
                Canonical.number(end),
                Canonical.number(end - start),
                local(start),
                local(end),
                phase.foundBy().word(),
                mark(phase, start),
                course(phase, evidence.bound().pressure(), Canonical::kilopascal),
                course(phase, evidence.bound().startChannels().stream().findFirst(), Canonical::celsius));
    }

    private Given<PhasePart.Mark> mark(Phase phase, double start) {
        OptionalDouble entered = markOf(phase.name());
        return entered.isPresent()
                ? Given.of(new PhasePart.Mark(
                        Canonical.number(entered.getAsDouble()), Canonical.number(start - entered.getAsDouble())))
                : Given.withheld("no mark was entered for this boundary");
    }

    private OptionalDouble markOf(PhaseName name) {
        Marks marks = evidence.bound().marks();
        return switch (name) {
            case AIR_REMOVAL -> marks.steamOnSeconds();
            case HEATING -> marks.ventClosedSeconds();
            case COOLING -> marks.steamOffSeconds();
            default -> OptionalDouble.empty();
        };
    }

    private static Given<PhasePart.Course> course(
            Phase phase, Optional<BoundChannel> channel, DoubleUnaryOperator unit) {
        if (channel.isEmpty()) {
            return Given.withheld("the chamber's absolute pressure is not known");
        }
        Column values = channel.get().values();
        int first = -1;
        int last = -1;
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        double sum = 0;
        int count = 0;
        for (int i = phase.from(); i < phase.end(); i++) {
            if (!values.missing(i)) {
                first = first < 0 ? i : first;
                last = i;
                lowest = Math.min(lowest, values.at(i));
                highest = Math.max(highest, values.at(i));
                sum += values.at(i);
                count++;
            }
        }
        if (count == 0) {
            return Given.withheld("no sample in this phase");
        }
        return Given.of(new PhasePart.Course(
                unit.applyAsDouble(values.at(first)),
                unit.applyAsDouble(values.at(last)),
                unit.applyAsDouble(lowest),
                unit.applyAsDouble(highest),
                unit.applyAsDouble(sum / count)));
    }

    private Given<String> local(double seconds) {
        return evidence.trace()
                .clock()
                .localAt(seconds)
                .map(Given::of)
                .orElseGet(() -> Given.withheld("the log tells the time since its start alone"));
    }
}
