package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
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
    @CsvSource({"0, 0 s", "12.5, 12.5 s", "59.96, 60 s", "60, 1 min 00 s", "2745, 45 min 45 s", "3725, 1 h 02 min 05 s"
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
}
