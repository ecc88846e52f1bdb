package org.steamwitness.trace;

/** Samples of one channel in SI units, in the order of the log; a missing sample is NaN. Never changes. */
public interface Column {

    /**
     * How many samples there are, missing ones included.
     *
     * @return zero or more
     */
    int size();

    /**
     * One sample.
     *
     * @param index 0 to {@code size() - 1}
     * @return the value, or NaN where the sample is missing
     */
    double at(int index);

    /**
     * Tells whether a sample is missing.
     *
     * @param index 0 to {@code size() - 1}
     * @return true where there is no value
     */
    default boolean missing(int index) {
        return Double.isNaN(at(index));
    }

    /**
     * The same column with a constant added, computed on the walk.
     *
     * @param offset in the unit of the column
     * @return a view; this column stays as it is
     */
    default Column plus(double offset) {
        Column read = this;
        return new Column() {
            @Override
            public int size() {
                return read.size();
            }

            @Override
            public double at(int index) {
                return read.at(index) + offset;
            }
        };
    }

    /**
     * A part of the column.
     *
     * @param from index of the first sample
     * @param to index of the last sample
     * @return a view; this column stays as it is
     */
    default Column part(int from, int to) {
        Column read = this;
        return new Column() {
            @Override
            public int size() {
                return to - from + 1;
            }

            @Override
            public double at(int index) {
                return read.at(from + index);
            }
        };
    }

    /**
     * A column that holds its own copy of the values.
     *
     * @param values samples in SI units, NaN where missing
     * @return an immutable column
     */
    static Column of(double... values) {
        double[] own = values.clone();
        return new Column() {
            @Override
            public int size() {
                return own.length;
            }

            @Override
            public double at(int index) {
                return own[index];
            }
        };
    }
}
