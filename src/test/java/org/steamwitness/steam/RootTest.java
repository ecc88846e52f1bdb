package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RootTest {

    /** The square root of two, the cosine's fixed point (0.739085133215160641655) and ten: known numbers. */
    @Test
    void findsKnownNumbers() {
        assertThat(Root.between(0, 2, x -> x * x - 2)).isCloseTo(Math.sqrt(2), within(1e-15));
        assertThat(Root.between(0, 1, x -> x - StrictMath.cos(x))).isCloseTo(0.7390851332151607, within(1e-15));
        assertThat(Root.between(1, 1e8, x -> 1 - 10 / x)).isCloseTo(10, within(1e-14));
        assertThat(Root.between(0, 3, x -> x < 1 ? Double.NEGATIVE_INFINITY : x - 2))
                .isCloseTo(2, within(1e-15));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 3})
    void findsAZeroAtEitherEnd(double zero) {
        assertThat(Root.between(1, 3, x -> x - zero)).isEqualTo(zero);
        assertThat(Root.between(1, 3, x -> zero - x)).isEqualTo(zero);
    }

    /** Bisection would take some fifty evaluations; interpolation takes a fifth of that on a smooth function. */
    @Test
    void needsFewEvaluationsAndStaysInside() {
        List<Double> asked = new ArrayList<>();
        double root = Root.between(300, 600, x -> {
            asked.add(x);
            return StrictMath.exp(x / 50) - 2000;
        });
        assertThat(root).isCloseTo(50 * StrictMath.log(2000), within(1e-12));
        assertThat(asked).hasSizeLessThan(15).allMatch(x -> x >= 300 && x <= 600);
    }

    @Test
    void refusesEndsOfOneSign() {
        assertThatThrownBy(() -> Root.between(0, 1, x -> x + 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no change of sign between 0.0 (1.0) and 1.0 (2.0)");
        assertThatThrownBy(() -> Root.between(0, 1, x -> Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    }
}
