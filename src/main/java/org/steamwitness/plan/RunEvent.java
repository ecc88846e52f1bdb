package org.steamwitness.plan;

import java.time.LocalTime;

/**
 * Something that happened in the run.
 *
 * @param at by the log's clock
 * @param what in words
 */
public record RunEvent(LocalTime at, String what) {}
