package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TemperatureUnitTest {

    /** t/degC = T/K - 273.15 and t/degF = 1.8 t/degC + 32, both exact; 0 K is -459.67 degF. */
    @ParameterizedTest
    @CsvSource({
        "CELSIUS, 0, 273.15",
        "CELSIUS, 100, 373.15",
        "CELSIUS, -273.15, 0",
        "FAHRENHEIT, 32, 273.15",
        "FAHRENHEIT, 212, 373.15",
        "FAHRENHEIT, -459.67, 0",
        "KELVIN, 300, 300"
    })
    void followsTheDefinitionOfTheScales(TemperatureUnit unit, double value, double kelvin) {
        assertThat(unit.toKelvin(value)).isCloseTo(kelvin, within(1e-12));
        assertThat(unit.ofKelvin(kelvin)).isCloseTo(value, within(1e-12));
    }

    /** A difference knows no zero: 1.8 degF of difference are 1 K, and as a temperature 1.8 degF is 256.372... K. */
    @ParameterizedTest
    @CsvSource({"CELSIUS, 1, 1, 274.15", "FAHRENHEIT, 1.8, 1, 256.372222222222", "KELVIN, 1, 1, 1"})
    void keepsDifferenceAndTemperatureApart(TemperatureUnit unit, double value, double difference, double kelvin) {
        assertThat(unit.differenceToKelvin(value)).isEqualTo(difference);
        assertThat(unit.toKelvin(value)).isCloseTo(kelvin, within(1e-12));
    }

    @Property
    void comesBackFromKelvin(@ForAll TemperatureUnit unit, @ForAll @DoubleRange(min = 200, max = 1000) double kelvin) {
        assertThat(unit.toKelvin(unit.ofKelvin(kelvin))).isCloseTo(kelvin, within(1e-12 * kelvin));
    }

    @Property
    void aDifferenceOfTemperaturesIsTheDifference(
            @ForAll TemperatureUnit unit,
            @ForAll @DoubleRange(min = -50, max = 300) double from,
            @ForAll @DoubleRange(min = -50, max = 300) double to) {
        assertThat(unit.toKelvin(to) - unit.toKelvin(from)).isCloseTo(unit.differenceToKelvin(to - from), within(1e-9));
    }
}
