package org.steamwitness.plan;

import java.util.OptionalDouble;

/**
 * How often a log has to sample at least.
 *
 * @param holdSeconds longest interval in the hold
 * @param elsewhereSeconds longest interval in all other phases
 */
public record Sampling(OptionalDouble holdSeconds, OptionalDouble elsewhereSeconds) {}
