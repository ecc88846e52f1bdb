package org.steamwitness.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class ResolutionTest {

    @Test
    void findsTheStepBehindConversionToKelvin() {
        double[] kelvin = new double[40];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = (120 + i % 3 / 10.0) + 273.15;
        }
        assertThat(Resolution.of(Column.of(kelvin)).orElseThrow()).isCloseTo(0.1, within(1e-12));
    }

    @Test
    void doesNotTakeARareStepForTheResolution() {
        double[] values = new double[30];
        for (int i = 0; i < values.length; i++) {
            values[i] = i % 2;
        }
        values[10] += 0.25;
        assertThat(Resolution.of(Column.of(values)).orElseThrow()).isEqualTo(1);
    }

    @Test
    void saysNothingOfAChannelThatHardlyMoves() {
        assertThat(Resolution.of(Column.of(1, 1, 1, 2, 2, Double.NaN))).isEmpty();
        assertThat(Resolution.of(Column.of())).isEmpty();
        assertThat(Resolution.of(Column.of(Double.NaN))).isEmpty();
    }
}
