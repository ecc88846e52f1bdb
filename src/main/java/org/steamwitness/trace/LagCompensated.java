package org.steamwitness.trace;

/**
 * A temperature column as its sensor would have shown it without its lag of the first order: T + tau dT/dt with the
 * slope of {@link Slope}. A view beside the column as read, which stays what it is; it serves the check against
 * saturation alone, and only with a lag that the plan states.
 *
 * @param read the column as read
 * @param slope its slope
 * @param lagSeconds tau, zero or more
 */
public record LagCompensated(Column read, Slope slope, double lagSeconds) implements Column {

    @Override
    public int size() {
        return read.size();
    }

    @Override
    public double at(int index) {
        double kelvin = read.at(index);
        if (lagSeconds == 0 || Double.isNaN(kelvin)) {
            return kelvin;
        }
        double perSecond = slope.at(index);
        return Double.isNaN(perSecond) ? kelvin : kelvin + lagSeconds * perSecond;
    }

    /**
     * By how much compensation makes the noise of a sample larger.
     *
     * @param index of a sample that is not missing
     * @return factor on its random part, one or more
     */
    public double noiseFactorAt(int index) {
        if (lagSeconds == 0 || Double.isNaN(slope.at(index))) {
            return 1;
        }
        double gain = lagSeconds * slope.noiseGainAt(index);
        return Math.sqrt(1 + gain * gain);
    }
}
