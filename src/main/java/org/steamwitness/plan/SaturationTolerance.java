package org.steamwitness.plan;

import java.util.List;

/**
 * How far a steam-contact probe may stand from saturation in the hold phase.
 *
 * @param airKelvin allowed distance below saturation
 * @param superheatKelvin allowed distance above saturation
 * @param shortestSeconds what is shorter is no episode, and what is joined by less is one
 * @param judged the phases in which the plan wants it judged
 */
public record SaturationTolerance(
        double airKelvin, double superheatKelvin, double shortestSeconds, List<PlannedPhase> judged) {

    /**
     * Checks the tolerances.
     *
     * @param airKelvin allowed distance below saturation
     * @param superheatKelvin allowed distance above saturation
     * @param shortestSeconds what is shorter is no episode
     * @param judged the phases in which the plan wants it judged
     * @throws IllegalArgumentException if a tolerance is not above zero
     */
    public SaturationTolerance {
        if (!(airKelvin > 0) || !(superheatKelvin > 0)) {
            throw new IllegalArgumentException("the tolerances air and superheat must exceed zero");
        }
        judged = List.copyOf(judged);
    }

    /**
     * Tolerances for the hold phase alone.
     *
     * @param airKelvin allowed distance below saturation
     * @param superheatKelvin allowed distance above saturation
     * @param shortestSeconds what is shorter is no episode
     */
    public SaturationTolerance(double airKelvin, double superheatKelvin, double shortestSeconds) {
        this(airKelvin, superheatKelvin, shortestSeconds, List.of(PlannedPhase.HOLD));
    }
}
