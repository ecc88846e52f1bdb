package org.steamwitness.plan;

import java.time.LocalTime;

/**
 * The log's clock and a trusted clock, read at the same moment.
 *
 * @param log what the log's clock showed
 * @param wall what the trusted clock showed
 */
public record EnteredClocks(LocalTime log, LocalTime wall) {

    private static final int DAY_SECONDS = 86_400;

    /**
     * How far the log's clock is ahead of the trusted one; midnight may lie between them.
     *
     * @return seconds, below zero if it is behind, within half a day
     */
    public double aheadSeconds() {
        double ahead = (log.toNanoOfDay() - wall.toNanoOfDay()) / 1e9;
        return ahead - DAY_SECONDS * Math.rint(ahead / DAY_SECONDS);
    }
}
