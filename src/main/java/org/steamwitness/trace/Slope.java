package org.steamwitness.trace;

/**
 * How fast a column changes at a sample: the straight line by least squares through the sample and up to three present
 * neighbours on each side. Over evenly spaced samples that is the slope of a local quadratic at its centre. Where the
 * column bends sharply, as when steam is shut off, a line across the bend belongs to neither side: then the line through
 * the neighbours of the smoother side is taken.
 */
public final class Slope {

    private static final int REACH = 3;

    /** A line that scatters so many times more than one to a side crosses a bend; common practice, no source. */
    private static final double BEND = 4;

    /** Less scatter than this, in kelvin or pascal, is no bend. */
    private static final double SMALLEST_BEND = 0.2;

    private final Column seconds;
    private final Column values;
    private final double longestGapSeconds;

    /**
     * Prepares the slopes of a column.
     *
     * @param seconds times, strictly rising
     * @param values samples at these times, NaN where missing
     * @param longestGapSeconds no line reaches over a longer time between two samples
     */
    public Slope(Column seconds, Column values, double longestGapSeconds) {
        this.seconds = seconds;
        this.values = values;
        this.longestGapSeconds = longestGapSeconds;
    }

    /**
     * The slope at a sample.
     *
     * @param index of the sample
     * @return units of the column per second; NaN if the sample is missing or stands alone
     */
    public double at(int index) {
        return around(index).slope;
    }

    /**
     * By how much noise of the samples makes the slope uncertain.
     *
     * @param index of a sample whose slope is not NaN
     * @return standard deviation of the slope for samples of unit standard deviation, per second
     */
    public double noiseGainAt(int index) {
        return 1 / Math.sqrt(around(index).squares);
    }

    private Line around(int index) {
        if (values.missing(index)) {
            return new Line(Double.NaN, 0, 0);
        }
        int first = reach(index, -1);
        int last = reach(index, 1);
        Line across = line(index, first, last);
        if (index - first < REACH || last - index < REACH) {
            return across;
        }
        Line before = line(index, first, index);
        Line after = line(index, index, last);
        Line smoother = before.scatter <= after.scatter ? before : after;
        return across.scatter > BEND * smoother.scatter + SMALLEST_BEND ? smoother : across;
    }

    /** The line by least squares through the present samples of a stretch around a sample. */
    private Line line(int index, int first, int last) {
        double meanTime = 0;
        double meanValue = 0;
        int count = 0;
        for (int i = first; i <= last; i++) {
            if (!values.missing(i)) {
                count++;
                meanTime += (seconds.at(i) - seconds.at(index) - meanTime) / count;
                meanValue += (values.at(i) - values.at(index) - meanValue) / count;
            }
        }
        double squares = 0;
        double products = 0;
        double spread = 0;
        for (int i = first; i <= last; i++) {
            if (!values.missing(i)) {
                double time = seconds.at(i) - seconds.at(index) - meanTime;
                double value = values.at(i) - values.at(index) - meanValue;
                squares += time * time;
                products += time * value;
                spread += value * value;
            }
        }
        if (count < 2) {
            return new Line(Double.NaN, squares, 0);
        }
        double residual = Math.max(0, spread - products * products / squares);
        return new Line(products / squares, squares, count > 2 ? Math.sqrt(residual / (count - 2)) : 0);
    }

    /** The furthest sample to one side that the line may use. */
    private int reach(int index, int step) {
        int furthest = index;
        int taken = 0;
        for (int i = index + step; i >= 0 && i < values.size() && taken < REACH; i += step) {
            if (!values.missing(i)) {
                if (Math.abs(seconds.at(i) - seconds.at(furthest)) > longestGapSeconds) {
                    break;
                }
                furthest = i;
                taken++;
            }
        }
        return furthest;
    }

    private record Line(double slope, double squares, double scatter) {}
}
