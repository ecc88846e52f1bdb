package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PrintedTest {

    @ParameterizedTest
    @CsvSource({
        "121.05, 1, 121.1",
        "121.04, 1, 121.0",
        "-0.04, 1, 0.0",
        "2.5, 0, 3",
        "-2.5, 0, -3",
        "1e6, 2, 1000000.00"
    })
    void roundsHalfAwayFromZero(double value, int decimals, String text) {
        assertThat(Printed.fixed(value, decimals)).isEqualTo(text);
    }

    @Test
    void bringsAReadingThatWentThroughKelvinBack() {
        double celsius = TemperatureUnit.CELSIUS.ofKelvin(TemperatureUnit.CELSIUS.toKelvin(121.1));
        assertThat(celsius).isNotEqualTo(121.1);
        assertThat(Printed.twelveDigits(celsius)).isEqualTo(121.1);
        assertThat(1 / Printed.twelveDigits(-0.0)).isPositive();
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0 s",
        "12.5, 12.5 s",
        "59.96, 60 s",
        "60, 1 min 00 s",
        "70, 1 min 10 s",
        "2745, 45 min 45 s",
        "3600, 1 h 00 min 00 s",
        "3725, 1 h 02 min 05 s"
    })
    void printsDurationsAsPeopleSayThem(double seconds, String text) {
        assertThat(Printed.duration(seconds)).isEqualTo(text);
    }

    @Test
    void signsDifferences() {
        assertThat(Printed.signed(0.254, 2)).isEqualTo("+0.25");
        assertThat(Printed.signed(-0.254, 2)).isEqualTo("-0.25");
    }

    @Test
    void heedsNoLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            assertThat(Printed.fixed(1234.5, 1)).isEqualTo("1234.5");
        } finally {
            Locale.setDefault(before);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "394.25, CELSIUS, 1, 121.1 degC",
        "394.261111111111, FAHRENHEIT, 2, 250.00 degF",
        "394.25, KELVIN, 2, 394.25 K"
    })
    void printsTemperaturesAsPlansWriteThem(double kelvin, TemperatureUnit unit, int decimals, String text) {
        assertThat(Printed.temperature(kelvin, unit, decimals)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "205000, BAR, ABSOLUTE, 2, 2.05 bar(a)",
        "205000, KILOPASCAL, ABSOLUTE, 1, 205.0 kPa(a)",
        "103421.359397525, PSI, GAUGE, 1, 15.0 psi(g)",
        "-90000, BAR, GAUGE, 1, -0.9 bar(g)"
    })
    void printsPressuresAsPlansWriteThem(double pascal, PressureUnit unit, Datum datum, int decimals, String text) {
        assertThat(Printed.pressure(pascal, unit, datum, decimals)).isEqualTo(text);
    }

    @Property
    void whatIsPrintedIsReadBack(
            @ForAll @DoubleRange(min = 200, max = 700) double kelvin,
            @ForAll @DoubleRange(min = -1e5, max = 5e6) double pascal,
            @ForAll TemperatureUnit temperature,
            @ForAll PressureUnit pressure) {
        assertThat(QuantityText.kelvin(Printed.temperature(kelvin, temperature, 9)))
                .isCloseTo(kelvin, within(1e-9));
        PressureReading read = QuantityText.pressure(Printed.pressure(pascal, pressure, Datum.GAUGE, 12));
        assertThat(read.datum()).isEqualTo(Datum.GAUGE);
        assertThat(read.pascal()).isCloseTo(pascal, within(1e-11 * Math.abs(pascal) + 1e-5));
    }

    /** A number as people write it comes back to the letter. */
    @Property
    void whatIsReadIsPrintedAgain(@ForAll @IntRange(min = -9_999, max = 99_999) int hundredths) {
        String number = Printed.fixed(hundredths / 100.0, 2);
        for (TemperatureUnit unit : new TemperatureUnit[] {TemperatureUnit.CELSIUS, TemperatureUnit.FAHRENHEIT}) {
            String text = number + " " + unit.symbol();
            assertThat(Printed.temperature(QuantityText.kelvin(text), unit, 2)).isEqualTo(text);
        }
        for (PressureUnit unit : PressureUnit.values()) {
            double pascal = QuantityText.pascalDifference(number + " " + unit.symbol());
            assertThat(Printed.fixed(unit.ofPascal(pascal), 2)).isEqualTo(number);
        }
    }
}
