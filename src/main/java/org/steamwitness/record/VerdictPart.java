package org.steamwitness.record;

import java.util.List;

/**
 * All criteria and blocking findings together.
 *
 * @param outcome met, not met, undecided, nothing judged, or draft plan
 * @param because what made it so
 * @param closest the criterion with the least margin in proportion to its limit
 */
public record VerdictPart(String outcome, List<String> because, Given<Closest> closest) {

    /**
     * The closest call.
     *
     * @param criterion its id
     * @param margin how far on the right side of the limit
     * @param unit unit of the margin
     * @param channel where
     * @param seconds when
     */
    public record Closest(String criterion, double margin, String unit, String channel, Given<Double> seconds) {}
}
