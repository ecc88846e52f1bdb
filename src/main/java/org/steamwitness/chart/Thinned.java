package org.steamwitness.chart;

import java.util.Arrays;
import org.jfree.data.DomainOrder;
import org.jfree.data.xy.AbstractXYDataset;
import org.steamwitness.trace.Column;

/**
 * One curve with no more points than a picture can show. The samples are cut into as many slices as the picture has
 * columns; of each slice the first, lowest, highest and last sample stay, so that no extreme is lost. A missing sample
 * breaks the line.
 */
final class Thinned extends AbstractXYDataset {

    private static final long serialVersionUID = 1L;
    private static final int COLUMNS = 500;
    private static final double MILLISECONDS = 1e3;

    private final String name;
    private final double[] milliseconds;
    private final double[] values;

    private Thinned(String name, double[] milliseconds, double[] values) {
        this.name = name;
        this.milliseconds = milliseconds;
        this.values = values;
    }

    /**
     * Thins a curve.
     *
     * @param name shown in the legend
     * @param startMilliseconds added to every time
     * @param seconds times of the samples
     * @param values the samples
     */
    static Thinned of(String name, double startMilliseconds, Column seconds, Column values) {
        int size = values.size();
        double[] x = new double[Math.min(size, 5 * COLUMNS)];
        double[] y = new double[x.length];
        int kept = 0;
        if (size <= 5 * COLUMNS) {
            for (int i = 0; i < size; i++, kept++) {
                x[kept] = startMilliseconds + seconds.at(i) * MILLISECONDS;
                y[kept] = values.at(i);
            }
        } else {
            int[] slice = new int[5];
            for (int c = 0; c < COLUMNS; c++) {
                int count =
                        keep(values, (int) ((long) size * c / COLUMNS), (int) ((long) size * (c + 1) / COLUMNS), slice);
                for (int k = 0; k < count; k++, kept++) {
                    x[kept] = startMilliseconds + seconds.at(slice[k]) * MILLISECONDS;
                    y[kept] = values.at(slice[k]);
                }
            }
        }
        return new Thinned(name, Arrays.copyOf(x, kept), Arrays.copyOf(y, kept));
    }

    /** First, lowest, highest, one missing and last sample of a slice, in order of time and each once. */
    private static int keep(Column values, int from, int end, int[] kept) {
        int lowest = -1;
        int highest = -1;
        int missing = -1;
        for (int i = from; i < end; i++) {
            double value = values.at(i);
            if (Double.isNaN(value)) {
                missing = i;
            } else {
                lowest = lowest < 0 || value < values.at(lowest) ? i : lowest;
                highest = highest < 0 || value > values.at(highest) ? i : highest;
            }
        }
        int[] wanted = Arrays.stream(new int[] {from, lowest, highest, missing, end - 1})
                .filter(i -> i >= 0)
                .sorted()
                .distinct()
                .toArray();
        System.arraycopy(wanted, 0, kept, 0, wanted.length);
        return wanted.length;
    }

    @Override
    public DomainOrder getDomainOrder() {
        return DomainOrder.ASCENDING;
    }

    @Override
    public int getSeriesCount() {
        return 1;
    }

    @Override
    public Comparable<String> getSeriesKey(int series) {
        return name;
    }

    @Override
    public int getItemCount(int series) {
        return values.length;
    }

    @Override
    public double getXValue(int series, int item) {
        return milliseconds[item];
    }

    @Override
    public double getYValue(int series, int item) {
        return values[item];
    }

    @Override
    public Number getX(int series, int item) {
        return milliseconds[item];
    }

    @Override
    public Number getY(int series, int item) {
        return values[item];
    }
}
