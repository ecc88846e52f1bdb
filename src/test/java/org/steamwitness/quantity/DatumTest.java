package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DatumTest {

    @ParameterizedTest
    @CsvSource({
        "1.04 bar(g), 100800, 204800",
        "-0.9 bar(g), 100800, 10800",
        "0 bar(g), 84556, 84556",
        "-100.8 kPa(g), 100800, 0",
        "205 kPa(a), 100800, 205000"
    })
    void gaugeBecomesAbsoluteByTheAtmosphereAlone(String text, double atmosphere, double absolute) {
        assertThat(QuantityText.pressure(text).absolutePascal(atmosphere)).isCloseTo(absolute, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, 0, -1, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void gaugeWithoutAStatedAtmosphereStaysUnknown(double atmosphere) {
        String message = "a gauge pressure becomes absolute only by a stated atmosphere, not by " + atmosphere + " Pa";
        assertThatThrownBy(() -> Datum.GAUGE.toAbsolute(atmosphere))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
        PressureReading reading = QuantityText.pressure("1.04 bar(g)");
        assertThatThrownBy(() -> reading.absolutePascal(atmosphere)).hasMessage(message);
    }

    @Test
    void absoluteNeedsNoAtmosphere() {
        assertThat(Datum.ABSOLUTE.toAbsolute(Double.NaN)).isZero();
        assertThat(QuantityText.pressure("205 kPa(a)").absolutePascal(Double.NaN))
                .isEqualTo(205_000);
    }

    @Test
    void aVacuumIsNeverDeeperThanTheAtmosphere() {
        PressureReading reading = QuantityText.pressure("-1.02 bar(g)");
        assertThat(reading.absolutePascal(103_000)).isCloseTo(1000, within(1e-9));
        assertThatThrownBy(() -> reading.absolutePascal(100_800))
                .isInstanceOf(QuantityException.class)
                .hasMessage("-102.000 kPa(g) lies below vacuum under an atmosphere of 100.800 kPa");
    }

    @Test
    void aReadingIsAPressure() {
        assertThatThrownBy(() -> new PressureReading(-1, Datum.ABSOLUTE))
                .isInstanceOf(QuantityException.class)
                .hasMessage("-1.0 Pa(a) is no pressure");
        assertThatThrownBy(() -> new PressureReading(Double.NaN, Datum.GAUGE)).hasMessage("NaN Pa(g) is no pressure");
        assertThat(new PressureReading(0, Datum.ABSOLUTE).pascal()).isZero();
        assertThat(new PressureReading(-1, Datum.GAUGE).pascal()).isEqualTo(-1);
    }

    @ParameterizedTest
    @CsvSource({"ABSOLUTE, absolute, a", "GAUGE, gauge, g"})
    void isNamedInAWordAndALetter(Datum datum, String word, String mark) {
        assertThat(datum.word()).isEqualTo(word);
        assertThat(datum.mark()).isEqualTo(mark);
    }
}
