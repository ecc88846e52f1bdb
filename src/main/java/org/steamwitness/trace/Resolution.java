package org.steamwitness.trace;

import java.util.Arrays;
import java.util.OptionalDouble;

/** The smallest step that a channel takes, as its log shows it. */
public final class Resolution {

    /** A step has to be seen this often to count; common practice, no source. */
    private static final int SEEN_AT_LEAST = 5;

    /** Steps are told apart to a millionth of the unit: what is less comes from conversion between units. */
    private static final double FINEST = 1e-6;

    private Resolution() {}

    /**
     * Measures the resolution: the smallest step between neighbouring samples, other than none, seen at least five
     * times.
     *
     * @param values samples in SI units, NaN where missing
     * @return the step in the column's unit, or empty if no step was seen often enough
     */
    public static OptionalDouble of(Column values) {
        long[] steps = new long[values.size()];
        int count = 0;
        double last = Double.NaN;
        for (int i = 0; i < values.size(); i++) {
            if (values.missing(i)) {
                continue;
            }
            long step = StrictMath.round(Math.abs(values.at(i) - last) / FINEST);
            if (step > 0) {
                steps[count++] = step;
            }
            last = values.at(i);
        }
        Arrays.sort(steps, 0, count);
        for (int i = 0; i + SEEN_AT_LEAST <= count; i++) {
            if (steps[i] == steps[i + SEEN_AT_LEAST - 1]) {
                return OptionalDouble.of(steps[i] * FINEST);
            }
        }
        return OptionalDouble.empty();
    }
}
