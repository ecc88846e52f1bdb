package org.steamwitness.plan;

import java.util.Optional;

/**
 * Water of a closed vessel, weighed before and after.
 *
 * @param beforeKilogram filled in
 * @param afterKilogram left over
 */
public record WeighedWater(Optional<Double> beforeKilogram, Optional<Double> afterKilogram) {}
