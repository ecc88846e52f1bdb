package org.steamwitness.plan;

/**
 * How far a steam-contact probe may stand from saturation in the hold phase.
 *
 * @param airKelvin allowed distance below saturation
 * @param superheatKelvin allowed distance above saturation
 * @param shortestSeconds what is shorter is no episode, and what is joined by less is one
 */
public record SaturationTolerance(double airKelvin, double superheatKelvin, double shortestSeconds) {

    /**
     * Checks the tolerances.
     *
     * @param airKelvin allowed distance below saturation
     * @param superheatKelvin allowed distance above saturation
     * @param shortestSeconds what is shorter is no episode
     * @throws IllegalArgumentException if a tolerance is not above zero
     */
    public SaturationTolerance {
        if (!(airKelvin > 0) || !(superheatKelvin > 0)) {
            throw new IllegalArgumentException("the tolerances air and superheat must exceed zero");
        }
    }
}
