package org.steamwitness.evaluate.saturation;

import java.util.List;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.Stretch;

/**
 * Where one steam-contact probe stood outside the tolerance, over the whole run, whatever the uncertainty.
 *
 * @param channel the probe
 * @param stretches in order of time, each as long as it lasts
 */
public record OutsideSaturation(BoundChannel channel, List<Stretch> stretches) {}
