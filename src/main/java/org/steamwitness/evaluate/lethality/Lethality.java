package org.steamwitness.evaluate.lethality;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/**
 * One lethality aim of the plan and what its probes reached.
 *
 * @param aim kinetics, limits and choice of probes
 * @param probes one entry a probe, in the order of the plan; empty if the plan has none such
 */
public record Lethality(LethalityAim aim, List<ProbeLethality> probes) {

    /**
     * Integrates lethality at all probes of all aims.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @param phases the phases
     * @param outside where a channel stood outside saturation; empty if it was not held against it
     * @param z standard uncertainties that make a value sure, one-sided
     * @return one entry an aim
     */
    public static List<Lethality> of(
            Trace trace,
            BoundPlan plan,
            Phases phases,
            Function<BoundChannel, Optional<List<Stretch>>> outside,
            double z) {
        ProbeLethality.Scope scope = new ProbeLethality.Scope(
                phases.phases(),
                ProbeLethality.Scope.steamOffIndex(trace, plan, phases.phases()),
                plan.longestGapSeconds(),
                z,
                outside);
        return plan.lethality().stream()
                .map(aim -> new Lethality(
                        aim,
                        plan.probesOf(aim).stream()
                                .map(probe -> ProbeLethality.of(trace, probe, aim, scope))
                                .toList()))
                .toList();
    }

    /**
     * The probe that governs: the one that reached most where the plan sets a maximum alone, else the one that reached
     * least.
     *
     * @return empty if there is no probe
     */
    public Optional<ProbeLethality> governing() {
        return aim.limits().maximumAlone() ? greatest() : least();
    }

    /**
     * The probe that reached least, which governs a minimum.
     *
     * @return empty if there is no probe
     */
    public Optional<ProbeLethality> least() {
        return probes.stream().min(Comparator.comparingDouble(p -> p.countedSeconds(aim)));
    }

    /**
     * The probe that reached most, which governs a maximum.
     *
     * @return empty if there is no probe
     */
    public Optional<ProbeLethality> greatest() {
        return probes.stream().max(Comparator.comparingDouble(p -> p.countedSeconds(aim)));
    }
}
