package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.Optional;

/**
 * An instant that a person noted.
 *
 * @param at by the log's clock
 * @param indicatingKelvin what the indicating instrument showed then
 */
public record EnteredMark(LocalTime at, Optional<Double> indicatingKelvin) {}
