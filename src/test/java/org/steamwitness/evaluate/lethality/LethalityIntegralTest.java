package org.steamwitness.evaluate.lethality;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.ProbeChoice;

class LethalityIntegralTest {

    /** Closed form over piecewise straight temperatures, reference/lethality-segments.csv, to 1e-9 of the value. */
    @ParameterizedTest(name = "{0}")
    @CsvFileSource(resources = "/reference/lethality-segments.csv", delimiter = ';', useHeadersInDisplayName = true)
    void equalsTheClosedForm(
            String trace, String times, String temperatures, double reference, double z, double exact) {
        double[] t = numbers(times);
        double[] celsius = numbers(temperatures);
        LethalityIntegral integral = integral(reference, z, OptionalDouble.empty());
        for (int i = 1; i < t.length; i++) {
            integral.segment(t[i - 1], celsius[i - 1] + 273.15, t[i], celsius[i] + 273.15);
        }
        assertThat(integral.seconds()).isCloseTo(exact, within(1e-9 * exact + 5e-10));
    }

    /**
     * A published stepped example (an open textbook on unit operations in food processing, a can in a retort; typed
     * from memory): z 10 K, reference 121 degC, printed sum 2.64, and 2.6568 recomputed without its rounding.
     */
    @Test
    void reachesThePublishedSteppedExample() {
        double[] celsius = {80, 90, 95, 100, 105, 108, 109, 110, 107, 100, 90, 80, 70};
        double[] minutes = {11, 8, 6, 10, 12, 6, 8, 17, 2, 2, 2, 8, 6};
        LethalityIntegral integral = integral(121, 10, OptionalDouble.empty());
        double start = 0;
        for (int i = 0; i < celsius.length; i++) {
            integral.segment(start, celsius[i] + 273.15, start + minutes[i], celsius[i] + 273.15);
            start += minutes[i];
        }
        assertThat(integral.seconds()).isCloseTo(2.64, within(0.02)).isCloseTo(2.6568, within(5e-5));
    }

    /** By definition: a time at the reference temperature counts as that time, whatever z is. */
    @Property
    void theReferenceTemperatureGivesTheElapsedTime(@ForAll @DoubleRange(min = 5, max = 40) double z) {
        LethalityIntegral integral = integral(121.11, z, OptionalDouble.empty());
        integral.segment(0, 121.11 + 273.15, 900, 121.11 + 273.15);
        assertThat(integral.seconds()).isCloseTo(900, within(1e-9));
    }

    @Property
    void splittingASegmentChangesNothing(
            @ForAll @DoubleRange(min = 60, max = 140) double from,
            @ForAll @DoubleRange(min = 60, max = 140) double to,
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double share) {
        double middle = from + (to - from) * share;
        double whole = piece(from, to, 100, OptionalDouble.empty());
        double parts = piece(from, middle, 100 * share, OptionalDouble.empty())
                + piece(middle, to, 100 * (1 - share), OptionalDouble.empty());
        assertThat(parts).isCloseTo(whole, within(1e-11 * whole));
    }

    @Property
    void theSeriesJoinsTheClosedForm(@ForAll @DoubleRange(min = 0.03, max = 0.06) double step) {
        double a = Math.log(10) * step / 10;
        double exact = Math.pow(10, (110 - 121.11) / 10) * Math.expm1(a) / a;
        assertThat(piece(110, 110 + step, 1, OptionalDouble.empty())).isCloseTo(exact, within(1e-12 * exact));
    }

    /** expm1(a)/a at steps on both sides of where the series takes over, to the last digits of a double. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1e-9, 1e-5, 0.001, 0.01, 0.02, 0.03, 0.04, 0.0434, 0.0435, 0.05, -0.01, -0.04, -0.0434})
    void theSeriesIsExactToTheLastDigits(double step) {
        LethalityIntegral integral = integral(0, 10, OptionalDouble.empty());
        integral.segment(0, 273.15, 1, 273.15 + step);
        double a = Math.log(10) * (273.15 + step - 273.15) / 10;
        double exact = a == 0 ? 1 : Math.expm1(a) / a;
        assertThat(integral.seconds()).isCloseTo(exact, within(Math.abs(a) < 1e-2 ? 3e-15 : 3e-14));
    }

    @Test
    void aSegmentThatOnlyTouchesTheFloorCountsAsNothingMore() {
        assertThat(piece(100, 90, 10, OptionalDouble.of(100))).isZero();
        assertThat(piece(90, 100, 10, OptionalDouble.of(100))).isZero();
    }

    @Property
    void hotterIsNeverLess(
            @ForAll @DoubleRange(min = 60, max = 140) double from,
            @ForAll @DoubleRange(min = 60, max = 140) double to,
            @ForAll @DoubleRange(min = 0.01, max = 5) double more) {
        assertThat(piece(from + more, to + more, 60, OptionalDouble.of(100)))
                .isGreaterThanOrEqualTo(piece(from, to, 60, OptionalDouble.of(100)));
    }

    @Test
    void cutsASegmentWhereItCrossesTheFloor() {
        double above = piece(100, 120, 50, OptionalDouble.empty());
        assertThat(piece(80, 120, 100, OptionalDouble.of(100))).isCloseTo(above, within(1e-12 * above));
        assertThat(piece(120, 80, 100, OptionalDouble.of(100))).isCloseTo(above, within(1e-12 * above));
        assertThat(piece(80, 99, 100, OptionalDouble.of(100))).isZero();
        assertThat(piece(100, 100, 10, OptionalDouble.of(100))).isPositive();
    }

    private static double piece(double from, double to, double seconds, OptionalDouble floorCelsius) {
        LethalityIntegral integral = integral(121.11, 10, floorCelsius);
        integral.segment(0, from + 273.15, seconds, to + 273.15);
        return integral.seconds();
    }

    private static LethalityIntegral integral(double reference, double z, OptionalDouble floorCelsius) {
        OptionalDouble floor = floorCelsius.isPresent()
                ? OptionalDouble.of(floorCelsius.getAsDouble() + 273.15)
                : OptionalDouble.empty();
        return new LethalityIntegral(
                new LethalityAim(
                        "F",
                        reference + 273.15,
                        z,
                        floor,
                        LethalityUnit.MINUTE,
                        LethalityAim.Limits.atLeast(60),
                        ProbeChoice.PRODUCT,
                        true,
                        Optional.empty()),
                0);
    }

    private static double[] numbers(String text) {
        return Arrays.stream(text.split(" ", -1))
                .mapToDouble(Double::parseDouble)
                .toArray();
    }
}
