package org.steamwitness.evaluate.criteria;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.steamwitness.plan.DecisionRule;

/**
 * Decisions with measurement uncertainty, JCGM 106:2012: a value is on the right side of a limit if it lies there by z
 * standard uncertainties, z being the one-sided quantile of the conformance probability, and on the wrong side if it
 * lies there by as much; in between nothing is decided. The simple rule is the same with z = 0.
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
     * The probability that the true value lies between two limits, JCGM 106:2012, 7.3 and 7.4, for a normal
     * distribution around the measured value: Phi((upper - y)/u) - Phi((lower - y)/u).
     *
     * @param value measured value y
     * @param uncertainty its standard uncertainty u, above zero
     * @param lower lower limit; negative infinity if there is none
     * @param upper upper limit; infinity if there is none
     * @return probability, 0 to 1
     * @throws IllegalArgumentException if the uncertainty is not above zero or the limits are upside down
     */
    public static double conformance(double value, double uncertainty, double lower, double upper) {
        if (!(uncertainty > 0) || !(lower < upper)) {
            throw new IllegalArgumentException("a conformance probability needs an uncertainty above zero and limits in"
                    + " order, got " + uncertainty + ", " + lower + ", " + upper);
        }
        NormalDistribution normal = new NormalDistribution();
        double below =
                upper == Double.POSITIVE_INFINITY ? 1 : normal.cumulativeProbability((upper - value) / uncertainty);
        double under =
                lower == Double.NEGATIVE_INFINITY ? 0 : normal.cumulativeProbability((lower - value) / uncertainty);
        return below - under;
    }

    /**
     * Decides on a value that may not be below a limit.
     *
     * @param value measured value
     * @param uncertainty its standard uncertainty, zero or more
     * @param limit the limit, inclusive
     * @param z guard band in standard uncertainties
     * @return met, not met or undecided
     */
    public static Decision atLeast(double value, double uncertainty, double limit, double z) {
        return atLeast(value - z * uncertainty, value + z * uncertainty, limit);
    }

    /**
     * Decides on a value that may not exceed a limit.
     *
     * @param value measured value
     * @param uncertainty its standard uncertainty, zero or more
     * @param limit the limit, inclusive
     * @param z guard band in standard uncertainties
     * @return met, not met or undecided
     */
    public static Decision atMost(double value, double uncertainty, double limit, double z) {
        return atLeast(-value, uncertainty, -limit, z);
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

    /**
     * Decides on a value that may not exceed a limit, when the value is known to lie in an interval.
     *
     * @param surely what the value surely reaches
     * @param surelyNot what the value surely does not exceed
     * @param limit the limit
     * @return met, not met or undecided
     */
    static Decision atMost(double surely, double surelyNot, double limit) {
        return atLeast(-surelyNot, -surely, -limit);
    }
}
