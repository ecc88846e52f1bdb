package org.steamwitness.record;

/**
 * The plan that the run was held against.
 *
 * @param id its id
 * @param title what it is for
 * @param revision its revision
 * @param status draft or in force
 * @param basis where its figures come from
 * @param equipment the chamber
 * @param process kind of cycle
 * @param medium what heats the load
 * @param decision how values are held against limits
 */
public record PlanPart(
        String id,
        String title,
        int revision,
        String status,
        Basis basis,
        String equipment,
        String process,
        String medium,
        Decision decision) {

    /**
     * Where the plan's figures come from.
     *
     * @param document name or number
     * @param edition its edition
     * @param by who answers for it
     * @param date when
     */
    public record Basis(String document, String edition, String by, String date) {}

    /**
     * How values are held against limits.
     *
     * @param rule guarded or simple
     * @param conformance least probability that a value called met conforms
     */
    public record Decision(String rule, Given<Double> conformance) {}
}
