package org.steamwitness.evaluate.criteria;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One limit held against the measured value.
 *
 * @param id the same in every record of the plan
 * @param subject what is judged
 * @param what in words
 * @param where channel or channels
 * @param phase phase it is judged in
 * @param unit unit of value, limit, margin and uncertainty: "s", "K", "Pa" and their like, or that of a lethality
 * @param value measured value; empty if there is none
 * @param limit the plan's limit
 * @param atLeast true if the value has to reach the limit, false if it may not exceed it
 * @param uncertainty standard uncertainty of the value; empty if none is stated
 * @param index sample at which the value was read; empty if it belongs to no single sample
 * @param decision what it came to
 * @param why in words
 */
public record Criterion(
        String id,
        Subject subject,
        String what,
        String where,
        String phase,
        String unit,
        OptionalDouble value,
        double limit,
        boolean atLeast,
        OptionalDouble uncertainty,
        Optional<Integer> index,
        Decision decision,
        String why) {

    /**
     * How far the value lies on the right side of the limit.
     *
     * @return below zero on the wrong side; empty without a value
     */
    public OptionalDouble margin() {
        if (value.isEmpty()) {
            return OptionalDouble.empty();
        }
        double above = value.getAsDouble() - limit;
        return OptionalDouble.of(atLeast ? above : -above);
    }

    /**
     * The same, left open.
     *
     * @param reason why it can't be decided, in words
     * @return undecided if it was met or not met; otherwise unchanged
     */
    public Criterion leftOpen(String reason) {
        if (decision != Decision.MET && decision != Decision.NOT_MET) {
            return this;
        }
        return new Criterion(
                id,
                subject,
                what,
                where,
                phase,
                unit,
                value,
                limit,
                atLeast,
                uncertainty,
                index,
                Decision.UNDECIDED,
                why + "; " + reason);
    }

    /** What a criterion judges. */
    public enum Subject {
        /** Holding time or a temperature of the process: the heart of a verdict. */
        TIME_OR_TEMPERATURE,
        /** Agreement with saturation. */
        SATURATION,
        /** Lethality at a product probe. */
        LETHALITY,
        /** Any other limit that the plan sets. */
        OTHER
    }
}
