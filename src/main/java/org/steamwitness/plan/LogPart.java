package org.steamwitness.plan;

import java.time.LocalTime;

/**
 * The part of a log that holds the run, by the log's clock.
 *
 * @param from first instant
 * @param to last instant; earlier than the first if the run passes midnight
 */
public record LogPart(LocalTime from, LocalTime to) {

    /**
     * Checks the part.
     *
     * @param from first instant
     * @param to last instant
     * @throws IllegalArgumentException if both are the same
     */
    public LogPart {
        if (from.equals(to)) {
            throw new IllegalArgumentException("from and to must differ");
        }
    }
}
