package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {

    private static final NumberText PLAIN = new NumberText(NumberForm.PLAIN);

    /** Against the platform's own correctly rounded parser, bit for bit. */
    @Property(tries = 5000)
    void readsEveryDecimalToTheNearestDouble(
            @ForAll @LongRange(min = -9_999_999_999_999_999L, max = 9_999_999_999_999_999L) long digits,
            @ForAll @IntRange(min = 0, max = 18) int scale) {
        String text = BigDecimal.valueOf(digits, scale).toPlainString();
        assertThat(PLAIN.read(text)).isEqualTo(Double.parseDouble(text));
    }

    @ParameterizedTest
    @CsvSource({
        "121.3, 121.3",
        "-0.5, -0.5",
        "−0.5, -0.5",
        "+3, 3",
        "1.234E+02, 123.4",
        "7., 7",
        "0, 0",
        "' 121.3 ', 121.3",
        "121.3 degC, 121.3",
        "121.3°C, 121.3",
        "1e400, Infinity"
    })
    void readsWhatLoggersWrite(String text, double value) {
        assertThat(PLAIN.read(text)).isEqualTo(value);
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
                "0x10",
                "1d",
                "1 2",
                "--1",
                "1.2.3",
                "OPEN",
                "٣"
            })
    void refusesEverythingElse(String text) {
        assertThat(PLAIN.read(text)).isNaN();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            ,  | -  | 121,3      | 121.3
            ,  | .  | 1.234,5    | 1234.5
            ,  | .  | 12.345.678 | 12345678
            .  | ,  | 1,234.5    | 1234.5
            .  | ’  | 1’234.5    | 1234.5
            ,  | -  | 121,3 °C   | 121.3
            ,  | -  | 1,5E2      | 150
            ,  | -  | 121.3      | NaN
            .  | -  | 1,234.5    | NaN
            ,  | .  | 1.23,5     | NaN
            """)
    void readsOtherMarksAndNeverMistakesOneForTheOther(char decimal, String thousands, String text, double value) {
        Optional<Character> group = thousands.equals("-") ? Optional.empty() : Optional.of(thousands.charAt(0));
        assertThat(new NumberText(new NumberForm(decimal, group)).read(text)).isEqualTo(Double.valueOf(value));
    }

    @ParameterizedTest
    @ValueSource(strings = {"121.3 O", "2O", "1.0 apples", "C", "12 C4"})
    void takesNoUnknownUnit(String text) {
        assertThat(PLAIN.read(text)).isNaN();
    }
}
