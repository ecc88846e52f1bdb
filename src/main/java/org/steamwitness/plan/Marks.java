package org.steamwitness.plan;

import java.util.OptionalDouble;

/**
 * Instants that people entered by hand, in seconds from the first sample.
 *
 * @param steamOnSeconds steam let in
 * @param ventClosedSeconds vents closed
 * @param steamOffSeconds steam shut off
 */
public record Marks(OptionalDouble steamOnSeconds, OptionalDouble ventClosedSeconds, OptionalDouble steamOffSeconds) {}
