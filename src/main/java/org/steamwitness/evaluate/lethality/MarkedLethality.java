package org.steamwitness.evaluate.lethality;

import java.util.List;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.SegmentWalk;
import org.steamwitness.trace.Stretch;

/**
 * The share of a lethality that a steam-contact probe gathered while it stood outside saturation: air or dry heat kill
 * less than the saturated steam that the kinetics are made for. A segment is marked if either end is.
 *
 * @param seconds time outside saturation
 * @param lethalitySeconds what it added to the lethality, seconds at the reference temperature
 */
public record MarkedLethality(double seconds, double lethalitySeconds) {

    /**
     * Sums up what was gathered outside saturation.
     *
     * @param walk over the probe's samples
     * @param aim the kinetics
     * @param outside where it stood outside saturation
     * @param end index of the last sample that counts
     * @return time and lethality
     */
    static MarkedLethality of(SegmentWalk walk, LethalityAim aim, List<Stretch> outside, int end) {
        LethalityIntegral integral = new LethalityIntegral(aim, 0);
        double seconds = 0;
        for (Stretch stretch : outside) {
            int from = Math.max(0, stretch.from() - 1);
            int to = Math.min(end, stretch.to() + 1);
            if (from < to) {
                seconds += walk.over(from, to, integral).coveredSeconds();
            }
        }
        return new MarkedLethality(seconds, integral.seconds());
    }
}
