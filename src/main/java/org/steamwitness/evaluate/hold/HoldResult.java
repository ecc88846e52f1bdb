package org.steamwitness.evaluate.hold;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.evaluate.phase.HoldAttempt;
import org.steamwitness.evaluate.phase.HoldAttempt.EndedBy;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace;

/**
 * The hold as the samples prove it.
 *
 * @param provenSeconds from the first to the last sample inside the band; zero if it was never held
 * @param possibleSeconds from the sample before to the sample after; the truth lies between both
 * @param cutByLog whether a gap or an end of the log leaves open how long it was really held
 * @param probes what each temperature channel showed, in the order of the plan
 * @param spread greatest difference between steam-contact probes at one instant; empty with fewer than two of them
 * @param missingSamples samples of the starting channels that are missing in the hold phase
 */
public record HoldResult(
        double provenSeconds,
        double possibleSeconds,
        boolean cutByLog,
        List<ProbeInHold> probes,
        Optional<Spread> spread,
        List<MissingSamples> missingSamples) {

    /**
     * Measures the hold.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @param instruments what is known of the channels
     * @param phases the phases
     * @return its times and temperatures
     */
    public static HoldResult of(Trace trace, BoundPlan plan, Instruments instruments, Phases phases) {
        Optional<HoldAttempt> judged = phases.judged();
        if (judged.isEmpty()) {
            return new HoldResult(0, 0, false, List.of(), Optional.empty(), List.of());
        }
        HoldAttempt attempt = judged.get();
        Phase hold = phases.hold().orElseThrow();
        List<ProbeInHold> probes = instruments.channels().stream()
                .filter(m -> m.channel().kind() == QuantityKind.TEMPERATURE)
                .flatMap(m -> ProbeInHold.of(trace, m, hold, plan.longestGapSeconds()).stream())
                .toList();
        return new HoldResult(
                trace.seconds().at(attempt.to()) - trace.seconds().at(attempt.from()),
                attempt.latestEndSeconds() - attempt.earliestStartSeconds(),
                attempt.from() == 0
                        || phases.attempts().stream()
                                .anyMatch(a -> a.endedBy() == EndedBy.GAP || a.endedBy() == EndedBy.LOG_END),
                probes,
                Spread.greatest(plan.inSteam().stream().map(instruments::of).toList(), hold),
                missing(plan, hold));
    }

    private static List<MissingSamples> missing(BoundPlan plan, Phase hold) {
        List<MissingSamples> missing = new ArrayList<>();
        for (BoundChannel channel : plan.startChannels()) {
            int count = 0;
            for (int i = hold.from(); i < hold.end(); i++) {
                count += channel.values().missing(i) ? 1 : 0;
            }
            if (count > 0) {
                missing.add(new MissingSamples(channel, count));
            }
        }
        return List.copyOf(missing);
    }

    /**
     * Missing samples of one channel.
     *
     * @param channel a starting channel
     * @param samples how many, one or more
     */
    public record MissingSamples(BoundChannel channel, int samples) {}
}
