package org.steamwitness.plan;

import java.util.Optional;

/**
 * Where a probe was put in this run.
 *
 * @param channel channel of the plan
 * @param serial the probe's own number
 * @param position in words
 */
public record PlacedProbe(String channel, Optional<String> serial, Optional<String> position) {}
