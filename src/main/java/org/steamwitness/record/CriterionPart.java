package org.steamwitness.record;

/**
 * One limit held against the measured value.
 *
 * @param id the same in every record of the plan
 * @param what in words
 * @param where channel or channels
 * @param phase phase it is judged in
 * @param unit unit of value, limit, margin and uncertainty
 * @param value measured value
 * @param limit the plan's limit
 * @param atLeast the limit, if the value has to reach it
 * @param atMost the limit, if the value may not exceed it
 * @param margin how far the value lies on the right side
 * @param atSeconds when the value was read
 * @param uncertainty standard uncertainty of the value
 * @param decision met, not met, undecided or not applicable
 * @param why in words
 * @param rule guarded or simple
 * @param source where the limit comes from
 * @param edition its edition
 */
public record CriterionPart(
        String id,
        String what,
        String where,
        String phase,
        String unit,
        Given<Double> value,
        double limit,
        Given<Double> atLeast,
        Given<Double> atMost,
        Given<Double> margin,
        Given<Double> atSeconds,
        Given<Double> uncertainty,
        String decision,
        String why,
        String rule,
        String source,
        String edition) {

    /**
     * The limit as people read it.
     *
     * @return "at least" or "at most"
     */
    public String side() {
        return atLeast.value().isPresent() ? "at least" : "at most";
    }
}
