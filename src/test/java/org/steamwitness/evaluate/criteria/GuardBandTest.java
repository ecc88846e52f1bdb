package org.steamwitness.evaluate.criteria;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

class GuardBandTest {

    /**
     * JCGM 106:2012, clause 7, two published examples (0.92 and 0.66; typed from memory, confirmed by recomputation), and
     * own rows by the normal distribution, reference/conformity.csv, to 5e-6.
     */
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "/reference/conformity.csv", useHeadersInDisplayName = true)
    void agreesWithTheExamplesOfJcgm106(
            String example, Double lower, Double upper, double y, double u, Double published, double recomputed) {
        double probability = GuardBand.conformance(
                y,
                u,
                lower == null ? Double.NEGATIVE_INFINITY : lower,
                upper == null ? Double.POSITIVE_INFINITY : upper);
        assertThat(probability).isCloseTo(recomputed, within(5e-6));
        if (published != null) {
            assertThat(probability).isCloseTo(published, within(5e-3));
        }
    }

    /** By definition: a value that is just met at 95 % conforms with 95 %. */
    @Test
    void theGuardBandIsWhereTheConformanceProbabilityIsReached() {
        double z = 1.6448536269514722;
        assertThat(GuardBand.conformance(121 + z * 0.25, 0.25, 121, Double.POSITIVE_INFINITY))
                .isCloseTo(0.95, within(1e-9));
        assertThat(GuardBand.atLeast(121 + z * 0.25 + 1e-9, 0.25, 121, z)).isEqualTo(Decision.MET);
        assertThat(GuardBand.atLeast(121 + z * 0.25 - 1e-9, 0.25, 121, z)).isEqualTo(Decision.UNDECIDED);
    }

    @ParameterizedTest
    @CsvSource({
        "121.5, 0.25, 1.645, MET",
        "121.3, 0.25, 1.645, UNDECIDED",
        "120.7, 0.25, 1.645, UNDECIDED",
        "120.5, 0.25, 1.645, NOT_MET",
        "121.0, 0.25, 0, MET",
        "120.999, 0.25, 0, NOT_MET",
        "121.0, 0, 1.645, MET"
    })
    void heedsALowerLimit(double value, double uncertainty, double z, Decision decision) {
        assertThat(GuardBand.atLeast(value, uncertainty, 121, z)).isEqualTo(decision);
        assertThat(GuardBand.atMost(-value, uncertainty, -121, z)).isEqualTo(decision);
    }

    @Test
    void refusesAnUncertaintyOfZeroAndLimitsUpsideDown() {
        assertThatThrownBy(() -> GuardBand.conformance(1, 0, 0, 2)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> GuardBand.conformance(1, 1, 2, 2)).isInstanceOf(IllegalArgumentException.class);
    }
}
