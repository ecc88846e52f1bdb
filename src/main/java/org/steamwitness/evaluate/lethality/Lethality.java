package org.steamwitness.evaluate.lethality;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.Trace;

/**
 * One lethality aim of the plan and what the product probes reached.
 *
 * @param aim reference temperature, z, floor and minimum
 * @param probes one entry a product probe, in the order of the plan; empty if there is none
 */
public record Lethality(LethalityAim aim, List<ProbeLethality> probes) {

    /**
     * Integrates lethality at all product probes.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @param phases the phases
     * @param z standard uncertainties that make a value sure, one-sided
     * @return one entry an aim
     */
    public static List<Lethality> of(Trace trace, BoundPlan plan, Phases phases, double z) {
        ProbeLethality.Scope scope = new ProbeLethality.Scope(phases.phases(), plan.longestGapSeconds(), z);
        List<Lethality> all = new ArrayList<>();
        for (LethalityAim aim : plan.lethality()) {
            List<ProbeLethality> probes = new ArrayList<>();
            for (BoundChannel probe : plan.inProduct()) {
                probes.add(ProbeLethality.of(trace, probe, aim, scope));
            }
            all.add(new Lethality(aim, List.copyOf(probes)));
        }
        return List.copyOf(all);
    }

    /**
     * The probe that reached least, which governs.
     *
     * @return empty if there is no product probe
     */
    public Optional<ProbeLethality> governing() {
        return probes.stream().min(Comparator.comparingDouble(p -> p.countedSeconds(aim)));
    }
}
