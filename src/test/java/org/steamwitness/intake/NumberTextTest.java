package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {

    /** Against the platform's own correctly rounded parser, bit for bit. */
    @Property(tries = 5000)
    void readsEveryDecimalToTheNearestDouble(
            @ForAll @LongRange(min = -9_999_999_999_999_999L, max = 9_999_999_999_999_999L) long digits,
            @ForAll @IntRange(min = 0, max = 18) int scale) {
        String text = BigDecimal.valueOf(digits, scale).toPlainString();
        assertThat(NumberText.read(text)).hasValue(Double.parseDouble(text));
    }

    @ParameterizedTest
    @CsvSource({"121.3, 121.3", "-0.5, -0.5", "+3, 3", "1.234E+02, 123.4", "7., 7", "0, 0"})
    void readsWhatLoggersWrite(String text, double value) {
        assertThat(NumberText.read(text)).hasValue(value);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "-",
                ".",
                ".5",
                "1,5",
                "2,O4",
                "NaN",
                "Infinity",
                "1e400",
                "0x10",
                "1d",
                "1 2",
                "--1",
                "1.2.3",
                "OPEN",
                "٣"
            })
    void refusesEverythingElse(String text) {
        assertThat(NumberText.read(text)).isEmpty();
    }
}
