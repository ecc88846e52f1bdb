package org.steamwitness.evaluate.phase;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.phase.Phase.FoundBy;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.Trace;

/** Lays the phases of a retort run end to end: marks set what they name, the samples set the hold and the cooling. */
final class PhaseFinder {

    private final Trace trace;
    private final BoundPlan plan;
    private final Optional<HoldAttempt> hold;
    private final List<Phase> phases = new ArrayList<>();

    PhaseFinder(Trace trace, BoundPlan plan, Optional<HoldAttempt> hold) {
        this.trace = trace;
        this.plan = plan;
        this.hold = hold;
    }

    List<Phase> find() {
        int end = trace.size();
        int holdFrom = hold.map(HoldAttempt::from).orElse(end);
        int holdEnd = hold.map(h -> h.to() + 1).orElse(end);
        int steamOn = index(plan.marks().steamOnSeconds(), holdFrom);
        int ventMark = index(plan.marks().ventClosedSeconds(), holdFrom);
        boolean steamOnKnown = plan.marks().steamOnSeconds().isPresent();
        int ventClosed = steamOnKnown ? Math.max(steamOn, ventMark) : ventMark;
        boolean ventKnown = plan.marks().ventClosedSeconds().isPresent();

        add(
                steamOnKnown ? PhaseName.STANDING : PhaseName.UNDETERMINED,
                0,
                steamOnKnown ? steamOn : Math.min(ventClosed, holdFrom),
                FoundBy.TRACE);
        if (steamOnKnown) {
            add(
                    ventKnown ? PhaseName.AIR_REMOVAL : PhaseName.UNDETERMINED,
                    steamOn,
                    ventKnown ? ventClosed : holdFrom,
                    FoundBy.MARK);
        }
        if (ventKnown) {
            add(hold.isPresent() ? PhaseName.HEATING : PhaseName.UNDETERMINED, ventClosed, holdFrom, FoundBy.MARK);
        }
        if (hold.isPresent()) {
            add(PhaseName.HOLD, holdFrom, holdEnd, FoundBy.TRACE);
            boolean steamOffKnown = plan.marks().steamOffSeconds().isPresent();
            int cooling = steamOffKnown
                    ? Math.max(holdEnd, index(plan.marks().steamOffSeconds(), end))
                    : firstLeftForGood(holdEnd);
            add(PhaseName.UNDETERMINED, holdEnd, cooling, FoundBy.TRACE);
            add(PhaseName.COOLING, cooling, end, steamOffKnown ? FoundBy.MARK : FoundBy.TRACE);
        }
        return List.copyOf(phases);
    }

    private int index(OptionalDouble mark, int highest) {
        return mark.isPresent() ? Math.min(trace.indexAtOrAfter(mark.getAsDouble()), highest) : highest;
    }

    /** First sample behind the hold after which the starting channels never reach the band again. */
    private int firstLeftForGood(int holdEnd) {
        int left = trace.size();
        while (left > holdEnd && !anyReachesBand(left - 1)) {
            left--;
        }
        return left;
    }

    private boolean anyReachesBand(int index) {
        return plan.startChannels().stream()
                .map(BoundChannel::values)
                .anyMatch(v -> !v.missing(index) && v.at(index) >= plan.hold().atLeastKelvin());
    }

    private void add(PhaseName name, int from, int end, FoundBy foundBy) {
        if (from < end) {
            boolean last = end == trace.size();
            phases.add(new Phase(name, from, last ? end - 1 : end, last, foundBy));
        }
    }
}
