package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.plan.BoundPlan;

/** All criteria of a plan. */
public final class Criteria {

    private Criteria() {}

    /**
     * Holds all results against the plan's limits.
     *
     * @param plan the bound plan
     * @param phases the phases
     * @param hold the hold
     * @param saturation the saturation check
     * @param lethality the lethality results
     * @return in a fixed order
     */
    public static List<Criterion> of(
            BoundPlan plan, Phases phases, HoldResult hold, SaturationCheck saturation, List<Lethality> lethality) {
        List<Criterion> criteria = new ArrayList<>();
        criteria.add(HoldingTime.of(plan, hold));
        SaturationAgreement.of(saturation, phases, plan.longestGapSeconds()).ifPresent(criteria::add);
        lethality.stream().map(l -> LethalityLimits.of(l, hold.cutByLog())).forEach(criteria::addAll);
        criteria.addAll(UnjudgedLimits.of(plan.limits()));
        if (plan.unheeded().isEmpty()) {
            return List.copyOf(criteria);
        }
        String reason = "not decided, since this version does not heed " + String.join(", ", plan.unheeded());
        return criteria.stream().map(criterion -> criterion.leftOpen(reason)).toList();
    }
}
