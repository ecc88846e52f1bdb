package org.steamwitness.intake;

import java.util.Arrays;

/**
 * Tells a channel that is read every so many rows and whose value the logger repeats in between. Its changes all fall on
 * the same step of a regular count, which those of a coarse or steady channel don't. Repeated values are no samples.
 * Common practice, no source.
 */
final class HeldValues {

    private static final int MOST_ROWS = 60;
    private static final int FEWEST_CHANGES = 20;
    private static final double REGULAR_SHARE = 0.97;

    /** A channel that changes more often than in every second row is read in every row. */
    private static final double LARGEST_CHANGING_SHARE = 0.55;

    /** So many changes show already that there is no regular count. */
    private static final int LOOKED_AT_FIRST = 500;

    private HeldValues() {}

    /** Rows from one reading of the channel to the next; 1 if it is read in every row. */
    static int everyRows(double[] values, int rows) {
        int[] changes = new int[rows];
        int count = 0;
        for (int i = 1; i < rows; i++) {
            if (values[i] != values[i - 1] && !(Double.isNaN(values[i]) && Double.isNaN(values[i - 1]))) {
                changes[count++] = i;
            }
        }
        if (count < FEWEST_CHANGES || count > LARGEST_CHANGING_SHARE * rows) {
            return 1;
        }
        int first = Math.min(count, LOOKED_AT_FIRST);
        for (int every = MOST_ROWS; every > 1; every--) {
            if (regular(changes, first, every) >= 0 && regular(changes, count, every) >= 0) {
                return every;
            }
        }
        return 1;
    }

    /** Makes repeated values missing. */
    static void drop(double[] values, int rows, int every) {
        int[] changes = new int[rows];
        int count = 0;
        for (int i = 1; i < rows; i++) {
            if (values[i] != values[i - 1]) {
                changes[count++] = i;
            }
        }
        int step = Math.max(0, regular(changes, count, every));
        double[] read = Arrays.copyOf(values, rows);
        for (int i = 0; i < rows; i++) {
            boolean repeated = i > 0 && read[i] == read[i - 1] && i % every != step;
            values[i] = repeated ? Double.NaN : values[i];
        }
    }

    /** The step of the count on which almost all changes fall; -1 if there is none. */
    private static int regular(int[] changes, int count, int every) {
        int[] onStep = new int[every];
        for (int i = 0; i < count; i++) {
            onStep[changes[i] % every]++;
        }
        for (int step = 0; step < every; step++) {
            if (onStep[step] >= REGULAR_SHARE * count) {
                return step;
            }
        }
        return -1;
    }
}
