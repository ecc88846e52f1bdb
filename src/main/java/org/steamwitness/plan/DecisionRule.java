package org.steamwitness.plan;

/**
 * How a measured value is held against a limit.
 *
 * @param guarded true if the uncertainty counts, false if the value alone decides
 * @param conformance the least probability, 0.5 to 1 exclusive, that a value called met conforms
 */
public record DecisionRule(boolean guarded, double conformance) {

    /** The value alone decides. */
    public static final DecisionRule SIMPLE = new DecisionRule(false, 0.5);

    /**
     * The word used in plans and records.
     *
     * @return "guarded" or "simple"
     */
    public String word() {
        return guarded ? "guarded" : "simple";
    }
}
