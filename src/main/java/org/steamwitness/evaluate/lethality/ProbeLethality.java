package org.steamwitness.evaluate.lethality;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.PhaseName;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.SegmentWalk;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/**
 * Lethality at one probe.
 *
 * @param channel the probe
 * @param perPhase one value a phase, in the order of the run; their sum is the total
 * @param toSteamOffSeconds up to the last sample at or before the entered steam-off, or else the last of the hold phase
 * @param withCoolingSeconds over the whole run
 * @param lowSeconds what counts towards the aim, if the sensor read high by its expanded uncertainty (k = 2)
 * @param highSeconds the same, if it read low
 * @param surelySeconds what counts towards the aim, if it read high by z standard uncertainties
 * @param surelyNotSeconds the same, if it read low
 * @param marked what of the counted it gathered outside saturation; empty if it was not held against saturation
 * @param coverage bridged and lost time
 */
public record ProbeLethality(
        BoundChannel channel,
        List<PhaseValue> perPhase,
        double toSteamOffSeconds,
        double withCoolingSeconds,
        double lowSeconds,
        double highSeconds,
        double surelySeconds,
        double surelyNotSeconds,
        Optional<MarkedLethality> marked,
        SegmentWalk.Coverage coverage) {

    /**
     * What counts towards the aim.
     *
     * @param aim the plan's
     * @return seconds at the reference temperature
     */
    public double countedSeconds(LethalityAim aim) {
        return aim.coolingCounted() ? withCoolingSeconds : toSteamOffSeconds;
    }

    static ProbeLethality of(Trace trace, BoundChannel probe, LethalityAim aim, Scope scope) {
        SegmentWalk walk = new SegmentWalk(trace.seconds(), probe.values(), scope.longestGapSeconds());
        List<PhaseValue> perPhase = new ArrayList<>();
        SegmentWalk.Coverage coverage = new SegmentWalk.Coverage(0, 0, 0);
        double all = 0;
        for (Phase phase : scope.phases()) {
            LethalityIntegral integral = new LethalityIntegral(aim, 0);
            coverage = coverage.plus(walk.over(phase.from(), phase.to(), integral));
            perPhase.add(new PhaseValue(phase, integral.seconds()));
            all += integral.seconds();
        }
        double common = probe.commonUncertainty().orElse(0);
        double toSteamOff = shifted(walk, aim, scope.steamOffIndex(), 0);
        int end = aim.coolingCounted() ? trace.size() - 1 : scope.steamOffIndex();
        return new ProbeLethality(
                probe,
                List.copyOf(perPhase),
                toSteamOff,
                all,
                shifted(walk, aim, end, -2 * common),
                shifted(walk, aim, end, 2 * common),
                shifted(walk, aim, end, -scope.z() * common),
                shifted(walk, aim, end, scope.z() * common),
                scope.outside().apply(probe).map(outside -> MarkedLethality.of(walk, aim, outside, end)),
                coverage);
    }

    private static double shifted(SegmentWalk walk, LethalityAim aim, int end, double offsetKelvin) {
        LethalityIntegral integral = new LethalityIntegral(aim, offsetKelvin);
        walk.over(0, end, integral);
        return integral.seconds();
    }

    /**
     * Lethality in one phase.
     *
     * @param phase the phase
     * @param seconds at the reference temperature
     */
    public record PhaseValue(Phase phase, double seconds) {}

    /**
     * What all probes share.
     *
     * @param phases the run's phases
     * @param steamOffIndex last sample that counts as before steam-off
     * @param longestGapSeconds longest time between two samples that a line may bridge
     * @param z standard uncertainties that make a value sure, one-sided
     * @param outside where a channel stood outside saturation; empty if it was not held against it
     */
    record Scope(
            List<Phase> phases,
            int steamOffIndex,
            double longestGapSeconds,
            double z,
            Function<BoundChannel, Optional<List<Stretch>>> outside) {

        /** The last sample at or before the entered mark; without one the last of the hold phase, or of the run. */
        static int steamOffIndex(Trace trace, BoundPlan plan, List<Phase> phases) {
            OptionalDouble mark = plan.marks().steamOffSeconds();
            if (mark.isPresent()) {
                int next = trace.indexAtOrAfter(mark.getAsDouble());
                boolean at = next < trace.size() && trace.seconds().at(next) == mark.getAsDouble();
                return at ? next : Math.max(0, next - 1);
            }
            return phases.stream()
                    .filter(p -> p.name() == PhaseName.HOLD)
                    .findFirst()
                    .map(p -> p.end() - 1)
                    .orElse(trace.size() - 1);
        }
    }
}
