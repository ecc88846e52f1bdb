package org.steamwitness.plan;

import java.util.Optional;

/**
 * One step of what the plan holds.
 *
 * @param hold band and duration
 * @param startsWithAny true if one of the starting channels in the band is enough, false if all have to be
 * @param interruptionFails true if leaving the band fails the step, false if the step starts again
 * @param equilibrationSeconds how long the slower probes may take to reach the band
 * @param excursion a dip that is tolerated
 */
public record HoldStep(
        Hold hold,
        boolean startsWithAny,
        boolean interruptionFails,
        double equilibrationSeconds,
        Optional<AllowedExcursion> excursion) {

    /**
     * A dip out of the band that the plan tolerates.
     *
     * @param depthKelvin how deep
     * @param longestSeconds how long
     * @param source who says that it may be tolerated
     */
    public record AllowedExcursion(double depthKelvin, double longestSeconds, String source) {

        /**
         * Checks the dip.
         *
         * @param depthKelvin how deep
         * @param longestSeconds how long
         * @param source who says so
         * @throws IllegalArgumentException if it has no depth or no length
         */
        public AllowedExcursion {
            if (!(depthKelvin > 0 && longestSeconds > 0)) {
                throw new IllegalArgumentException("depth and longest must exceed zero");
            }
        }
    }
}
