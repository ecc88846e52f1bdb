package org.steamwitness.trace;

import java.util.Arrays;
import java.util.OptionalDouble;

/**
 * The noise of a channel, as its log shows it: what is left of neighbouring samples when every straight line is taken
 * away. A second difference x(i-1) - 2 x(i) + x(i+1) of white noise has a variance of 6 sigma^2; ramps cancel in it,
 * and its median size tells sigma whatever a few steps and spikes do.
 */
public final class Noise {

    /** Median of |x| for a normal variable of unit standard deviation: the quantile of 0.75. */
    private static final double MEDIAN_OF_NORMAL = 0.6744897501960817;

    private static final double SECOND_DIFFERENCE = Math.sqrt(6);
    private static final int FEWEST = 20;

    private Noise() {}

    /**
     * Measures the noise. Fewer than twenty second differences between neighbours that are all present and evenly
     * spaced to a tenth say nothing.
     *
     * @param seconds times of the samples
     * @param values samples in SI units, NaN where missing
     * @return standard deviation in the column's unit, zero where the resolution hides it; empty if nothing can be said
     */
    public static OptionalDouble of(Column seconds, Column values) {
        double[] sizes = new double[Math.max(0, values.size() - 2)];
        int count = 0;
        for (int i = 1; i < values.size() - 1; i++) {
            double before = seconds.at(i) - seconds.at(i - 1);
            double after = seconds.at(i + 1) - seconds.at(i);
            double second = values.at(i - 1) - 2 * values.at(i) + values.at(i + 1);
            if (!Double.isNaN(second) && Math.abs(after - before) <= 0.1 * before) {
                sizes[count++] = Math.abs(second);
            }
        }
        if (count < FEWEST) {
            return OptionalDouble.empty();
        }
        Arrays.sort(sizes, 0, count);
        double median = (sizes[(count - 1) / 2] + sizes[count / 2]) / 2;
        return OptionalDouble.of(median / MEDIAN_OF_NORMAL / SECOND_DIFFERENCE);
    }
}
