package org.steamwitness.evaluate.phase;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/**
 * Tells several cycles in one log: each reaches the hold's temperature, and between two of them a starting channel falls
 * below half of the way from the log's coldest sample to that temperature. Steam that fails in the middle of a hold and
 * comes back does not fall so far. Common practice, no source.
 */
public final class Cycles {

    private static final int FEWEST_SAMPLES = 3;

    private Cycles() {}

    /**
     * Finds the cycles of a log.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @return from the first to the last sample of each at the hold's temperature or above
     */
    public static List<Stretch> of(Trace trace, BoundPlan plan) {
        double hot = plan.hold().atLeastKelvin();
        double coldest = coldest(plan, trace.size());
        double parting = coldest + (hot - coldest) / 2;
        List<Stretch> cycles = new ArrayList<>();
        int first = -1;
        int last = -1;
        int seen = 0;
        for (int i = 0; i < trace.size(); i++) {
            if (all(plan, i, hot)) {
                first = first < 0 ? i : first;
                last = i;
                seen++;
            } else if (first >= 0 && any(plan, i, parting)) {
                add(cycles, first, last, seen);
                first = -1;
                seen = 0;
            }
        }
        add(cycles, first, last, seen);
        return List.copyOf(cycles);
    }

    private static void add(List<Stretch> cycles, int first, int last, int seen) {
        if (first >= 0 && seen >= FEWEST_SAMPLES) {
            cycles.add(new Stretch(first, last));
        }
    }

    private static double coldest(BoundPlan plan, int size) {
        double coldest = Double.POSITIVE_INFINITY;
        for (BoundChannel channel : plan.startChannels()) {
            for (int i = 0; i < size; i++) {
                if (channel.values().at(i) < coldest) {
                    coldest = channel.values().at(i);
                }
            }
        }
        return coldest;
    }

    private static boolean all(BoundPlan plan, int index, double kelvin) {
        return plan.startChannels().stream().allMatch(c -> c.values().at(index) >= kelvin);
    }

    private static boolean any(BoundPlan plan, int index, double kelvin) {
        return plan.startChannels().stream().anyMatch(c -> c.values().at(index) < kelvin);
    }
}
