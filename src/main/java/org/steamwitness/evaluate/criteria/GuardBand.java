package org.steamwitness.evaluate.criteria;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.steamwitness.plan.DecisionRule;

/**
 * The guard band of a decision rule, JCGM 106:2012: a value is on the right side of a limit if it lies there by z
 * standard uncertainties, z being the one-sided quantile of the conformance probability.
 */
public final class GuardBand {

    private GuardBand() {}

    /**
     * The quantile of the normal distribution that belongs to a rule.
     *
     * @param rule the plan's
     * @return standard uncertainties; zero for the simple rule
     */
    public static double z(DecisionRule rule) {
        return rule.guarded() ? new NormalDistribution().inverseCumulativeProbability(rule.conformance()) : 0;
    }

    /**
     * Decides on a value that may not be below a limit, when the value is known to lie in an interval.
     *
     * @param surely what the value surely reaches
     * @param surelyNot what the value surely does not exceed
     * @param limit the limit
     * @return met, not met or undecided
     */
    static Decision atLeast(double surely, double surelyNot, double limit) {
        if (surely >= limit) {
            return Decision.MET;
        }
        return surelyNot < limit ? Decision.NOT_MET : Decision.UNDECIDED;
    }
}
