package org.steamwitness.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class LagCompensatedTest {

    private static final double NONE = Double.NaN;

    /** A sensor of first order on a ramp of r K/s shows r tau less than the truth: 6 K/min and 10 s give 1.0 K. */
    @Test
    void takesTheErrorOnARampAway() {
        double[] seconds = new double[40];
        double[] shown = new double[40];
        for (int i = 0; i < 40; i++) {
            seconds[i] = i;
            shown[i] = 300 + 0.1 * i - 1.0;
        }
        LagCompensated column = compensated(seconds, shown, 10);
        for (int i = 0; i < 40; i++) {
            assertThat(column.at(i)).isCloseTo(300 + 0.1 * i, within(1e-9));
        }
    }

    /** The centred slope is that of the local quadratic, so a parabola is no obstacle away from the ends. */
    @Test
    void findsTheSlopeOfAParabola() {
        double[] seconds = new double[30];
        double[] values = new double[30];
        for (int i = 0; i < 30; i++) {
            seconds[i] = 5 * i;
            values[i] = 300 + 0.002 * seconds[i] * seconds[i];
        }
        Slope slope = new Slope(Column.of(seconds), Column.of(values), 10);
        assertThat(slope.at(12)).isCloseTo(0.004 * 60, within(1e-9));
    }

    /** Least squares over seven evenly spaced samples: variance 1/(28 dt^2), from the sum of squares of -3 to 3. */
    @Test
    void knowsHowMuchNoiseItAdds() {
        double[] seconds = {0, 5, 10, 15, 20, 25, 30};
        LagCompensated column = compensated(seconds, new double[] {1, 2, 3, 4, 5, 6, 7}, 20);
        assertThat(column.slope().noiseGainAt(3)).isCloseTo(1 / (5 * Math.sqrt(28)), within(1e-12));
        assertThat(column.noiseFactorAt(3)).isCloseTo(Math.sqrt(1 + 16 / 28.0), within(1e-12));
        assertThat(compensated(seconds, seconds, 0).noiseFactorAt(3)).isEqualTo(1);
    }

    @Test
    void neitherReachesOverAGapNorInventsASlope() {
        Slope slope = new Slope(Column.of(0, 5, 10, 60, 65, 70), Column.of(1, 2, 3, 100, 90, 80), 10);
        assertThat(slope.at(2)).isCloseTo(0.2, within(1e-12));
        assertThat(slope.at(3)).isCloseTo(-2, within(1e-12));
        Slope alone = new Slope(Column.of(0, 50, 100), Column.of(1, 2, NONE), 10);
        assertThat(alone.at(1)).isNaN();
        assertThat(alone.at(2)).isNaN();
        assertThat(compensated(new double[] {0, 50}, new double[] {1, 2}, 5).at(1))
                .isEqualTo(2);
        assertThat(compensated(new double[] {0, 50}, new double[] {1, 2}, 5).noiseFactorAt(1))
                .isEqualTo(1);
    }

    private static LagCompensated compensated(double[] seconds, double[] values, double lagSeconds) {
        Column column = Column.of(values);
        return new LagCompensated(column, new Slope(Column.of(seconds), column, 10), lagSeconds);
    }

    /** A plateau that ends in a fall of 2 K a second: up to the last sample of the plateau nothing is added. */
    @Test
    void aBendIsNotSmearedOverThePlateauBeforeIt() {
        double[] times = new double[20];
        double[] values = new double[20];
        for (int i = 0; i < 20; i++) {
            times[i] = i * 5;
            values[i] = i <= 10 ? 395 : 395 - 10 * (i - 10);
        }
        Column seconds = Column.of(times);
        Column read = Column.of(values);
        LagCompensated actual = new LagCompensated(read, new Slope(seconds, read, 10), 6);
        for (int i = 3; i <= 10; i++) {
            assertThat(actual.at(i)).isCloseTo(395, within(1e-9));
        }
        assertThat(actual.at(14)).isCloseTo(355 - 12, within(1e-9));
    }
}
