package org.steamwitness.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class NoiseTest {

    @Test
    void seesTheNoiseThroughARampAndAStep() {
        Random random = new Random(7);
        double[] seconds = new double[4000];
        double[] values = new double[4000];
        for (int i = 0; i < values.length; i++) {
            seconds[i] = 5 * i;
            values[i] = 0.02 * i + (i > 2000 ? 15 : 0) + 0.05 * random.nextGaussian();
        }
        assertThat(Noise.of(Column.of(seconds), Column.of(values)).orElseThrow())
                .isCloseTo(0.05, within(0.003));
    }

    @Test
    void isZeroWhereTheResolutionHidesIt() {
        double[] seconds = new double[100];
        double[] values = new double[100];
        for (int i = 0; i < values.length; i++) {
            seconds[i] = i;
            values[i] = Math.floor(i / 10.0);
        }
        assertThat(Noise.of(Column.of(seconds), Column.of(values))).hasValue(0);
    }

    @Test
    void saysNothingOfFewOrUnevenSamples() {
        double[] seconds = new double[60];
        double[] values = new double[60];
        for (int i = 0; i < values.length; i++) {
            seconds[i] = i + (i % 2) * 0.5;
            values[i] = i % 3;
        }
        assertThat(Noise.of(Column.of(seconds), Column.of(values))).isEmpty();
        assertThat(Noise.of(Column.of(0, 1, 2), Column.of(1, 2, 1))).isEmpty();
        assertThat(Noise.of(Column.of(), Column.of())).isEmpty();
    }
}
