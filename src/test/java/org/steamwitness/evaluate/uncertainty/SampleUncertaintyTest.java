package org.steamwitness.evaluate.uncertainty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SampleUncertaintyTest {

    private static final int TRIALS = 20_000;

    /** By the law of propagation, JCGM 100:2008, 5.1.2, in whole-numbered triangles. */
    @Test
    void joinsPartsByTheRootOfTheirSquares() {
        SampleUncertainty u = new SampleUncertainty(3, 4);
        assertThat(u.ofSample()).isEqualTo(5);
        assertThat(u.ofExtreme()).isEqualTo(5);
        assertThat(u.ofMean(1)).isEqualTo(5);
        assertThat(u.ofMean(1e12)).isCloseTo(3, within(1e-9));
        assertThat(u.withCommon(4)).isEqualTo(new SampleUncertainty(5, 4));
        assertThat(u.withRandom(3)).isEqualTo(new SampleUncertainty(3, 5));
        assertThat(u.times(-2)).isEqualTo(new SampleUncertainty(6, 8));
        assertThat(u.and(new SampleUncertainty(4, 3))).isEqualTo(new SampleUncertainty(5, 5));
    }

    @Test
    void whatTwoChannelsShareCancelsInTheirDifference() {
        SampleUncertainty one = new SampleUncertainty(5, 0);
        assertThat(one.ofDifference(one, 5)).isZero();
        assertThat(one.ofDifference(one, 3)).isCloseTo(Math.sqrt(32), within(1e-12));
        assertThat(one.ofDifference(new SampleUncertainty(12, 0), 0)).isEqualTo(13);
        assertThat(new SampleUncertainty(0, 3).ofDifference(new SampleUncertainty(0, 4), 0))
                .isEqualTo(5);
    }

    /**
     * Monte Carlo in place of the formula, JCGM 101:2008 in sense: 95 % of the differences between measured and true
     * value have to lie within 1.96 standard uncertainties, 93 to 97 % of them do.
     */
    @ParameterizedTest
    @CsvSource({"0.10, 0.05, 0.02", "0.02, 0.10, 0.00", "0.20, 0.00, 0.15"})
    void coversMeansAndDifferencesAsAMonteCarloDoes(double common, double random, double shared) {
        Random dice = new Random(106);
        SampleUncertainty u = new SampleUncertainty(common, random);
        double own = Math.sqrt(common * common - shared * shared);
        int meanInside = 0;
        int differenceInside = 0;
        for (int trial = 0; trial < TRIALS; trial++) {
            double both = shared * dice.nextGaussian();
            double first = both + own * dice.nextGaussian();
            double second = both + own * dice.nextGaussian();
            double sum = 0;
            for (int i = 0; i < 9; i++) {
                sum += first + random * dice.nextGaussian();
            }
            meanInside += Math.abs(sum / 9) <= 1.96 * u.ofMean(9) ? 1 : 0;
            double difference = first + random * dice.nextGaussian() - second - random * dice.nextGaussian();
            differenceInside += Math.abs(difference) <= 1.96 * u.ofDifference(u, shared) ? 1 : 0;
        }
        assertThat(meanInside / (double) TRIALS).isBetween(0.93, 0.97);
        assertThat(differenceInside / (double) TRIALS).isBetween(0.93, 0.97);
    }

    @Test
    void refusesWhatIsNoUncertainty() {
        assertThatThrownBy(() -> new SampleUncertainty(-1, 0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new SampleUncertainty(0, Double.NaN)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new SampleUncertainty(1 / 0.0, 0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new SampleUncertainty(1, 1).ofMean(0.5)).isInstanceOf(IllegalArgumentException.class);
        SampleUncertainty small = new SampleUncertainty(1, 0);
        assertThatThrownBy(() -> small.ofDifference(new SampleUncertainty(2, 0), 1.5))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
