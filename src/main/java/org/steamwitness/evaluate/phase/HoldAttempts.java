package org.steamwitness.evaluate.phase;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.evaluate.phase.HoldAttempt.EndedBy;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Trace;

/**
 * Finds every stretch in which all starting channels stay in the hold's band, after the vents were closed and before
 * steam was shut off. To stay means at least three samples and five seconds; common practice, no source. Boundaries
 * are samples, never interpolated crossings.
 */
final class HoldAttempts {

    private static final int FEWEST_SAMPLES = 3;
    private static final double SHORTEST_SECONDS = 5;

    private final Trace trace;
    private final BoundPlan plan;
    private final double opensSeconds;
    private final double closesSeconds;
    private final List<HoldAttempt> attempts = new ArrayList<>();

    private int first = -1;
    private int last = -1;
    private int inside;

    private HoldAttempts(Trace trace, BoundPlan plan) {
        this.trace = trace;
        this.plan = plan;
        this.opensSeconds = plan.marks().ventClosedSeconds().orElse(0);
        this.closesSeconds = plan.marks().steamOffSeconds().orElse(Double.POSITIVE_INFINITY);
    }

    static List<HoldAttempt> of(Trace trace, BoundPlan plan) {
        return new HoldAttempts(trace, plan).find();
    }

    private List<HoldAttempt> find() {
        Column seconds = trace.seconds();
        for (int i = trace.indexAtOrAfter(opensSeconds); i < trace.size(); i++) {
            if (seconds.at(i) > closesSeconds) {
                end(EndedBy.STEAM_OFF, closesSeconds);
                return attempts;
            }
            if (first >= 0 && seconds.at(i) - seconds.at(last) > plan.longestGapSeconds()) {
                end(EndedBy.GAP, seconds.at(last + 1));
            }
            switch (stateAt(i)) {
                case INSIDE -> {
                    first = first < 0 ? i : first;
                    last = i;
                    inside++;
                }
                case OUTSIDE -> end(EndedBy.LEFT_BAND, seconds.at(i));
                case UNKNOWN -> {
                    // bridged by the next sample, unless the gap grows too long
                }
            }
        }
        end(EndedBy.LOG_END, trace.lastSeconds());
        return attempts;
    }

    private void end(EndedBy reason, double latestEndSeconds) {
        if (first >= 0) {
            Column seconds = trace.seconds();
            if (inside >= FEWEST_SAMPLES && seconds.at(last) - seconds.at(first) >= SHORTEST_SECONDS) {
                double before = seconds.at(Math.max(0, first - 1));
                attempts.add(new HoldAttempt(
                        first,
                        last,
                        Math.max(before, Math.min(opensSeconds, seconds.at(first))),
                        latestEndSeconds,
                        reason));
            }
        }
        first = -1;
        inside = 0;
    }

    private State stateAt(int index) {
        State state = State.INSIDE;
        for (BoundChannel channel : plan.startChannels()) {
            if (channel.values().missing(index)) {
                state = State.UNKNOWN;
            } else if (!plan.hold().contains(channel.values().at(index))) {
                return State.OUTSIDE;
            }
        }
        return state;
    }

    private enum State {
        INSIDE,
        OUTSIDE,
        UNKNOWN
    }
}
