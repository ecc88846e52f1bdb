package org.steamwitness.run;

import java.time.LocalTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.EnteredClocks;
import org.steamwitness.plan.LogPart;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/** Where in a log the run lies, and by which clock its times are told. */
final class RunPlace {

    private RunPlace() {}

    /** The part of the log that the run sheet names; empty if it holds no sample. */
    static Optional<Trace> part(Trace whole, LogPart part) {
        OptionalDouble from = seconds(whole, part.from());
        OptionalDouble to = seconds(whole, part.to());
        if (from.isEmpty()) {
            return Optional.empty();
        }
        double end = to.orElse(whole.lastSeconds());
        int first = whole.indexAtOrAfter(from.getAsDouble());
        int last = whole.indexAtOrAfter(end);
        last = last == whole.size() || whole.seconds().at(last) > end ? last - 1 : last;
        return first <= last ? Optional.of(whole.part(first, last)) : Optional.empty();
    }

    /** Times of an elapsed log count from its start. */
    private static OptionalDouble seconds(Trace whole, LocalTime time) {
        if (whole.clock().shows() == LogClock.Shows.ELAPSED) {
            double seconds = time.toSecondOfDay();
            return seconds <= whole.lastSeconds() ? OptionalDouble.of(seconds) : OptionalDouble.empty();
        }
        return whole.clock().secondsAt(time, whole.lastSeconds());
    }

    static Finding outside(Trace whole, LogPart part) {
        return new Finding(
                FindingKind.PART_OUTSIDE_LOG,
                Position.RUN,
                Map.of(
                        "from", part.from().toString(),
                        "to", part.to().toString(),
                        "first", whole.clock().timeOfDayAt(0),
                        "last", whole.clock().timeOfDayAt(whole.lastSeconds())));
    }

    static Trace set(Trace trace, EnteredClocks clocks) {
        return trace.withClock(trace.clock().readBeside(clocks.wall(), clocks.log()));
    }

    static Finding clockSet(EnteredClocks clocks) {
        return new Finding(
                FindingKind.CLOCK_SET,
                Position.RUN,
                Map.of("log", clocks.log().toString(), "wall", clocks.wall().toString()));
    }

    /** The log's own distance from UTC against that of the zone; empty if it tells none or both agree. */
    static Optional<Finding> zoneDiffers(Trace trace, ZoneId zone) {
        LogClock clock = trace.clock();
        ZoneOffset expected = zone.getRules().getOffset(clock.first());
        return clock.offset()
                .filter(own -> clock.date().isPresent() && !own.equals(expected))
                .map(own -> new Finding(
                        FindingKind.ZONE_DIFFERS,
                        Position.RUN,
                        Map.of("log", own.getId(), "zone", zone.getId(), "expected", expected.getId())));
    }

    static Finding several(Trace trace, List<Stretch> cycles) {
        return new Finding(
                FindingKind.SEVERAL_CYCLES,
                Position.RUN,
                Map.of(
                        "count", Integer.toString(cycles.size()),
                        "cycles",
                                cycles.stream()
                                        .map(c -> "at temperature from " + at(trace, c.from()) + " to "
                                                + at(trace, c.to()))
                                        .collect(Collectors.joining("; "))));
    }

    private static String at(Trace trace, int index) {
        return trace.clock().timeOfDayAt(trace.seconds().at(index)) + " (line " + trace.lineOf(index) + ")";
    }
}
