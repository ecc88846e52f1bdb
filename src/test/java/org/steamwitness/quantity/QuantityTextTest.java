package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityTextTest {

    /** 250 degF is 121.11 degC and 212 degF is 100 degC by the definition of the scales. */
    @ParameterizedTest
    @CsvSource({
        "121.1 degC, 394.25",
        "0 degC, 273.15",
        "212 degF, 373.15",
        "250 degF, 394.261111111111",
        "394.25 K, 394.25",
        "-40 degF, 233.15",
        "-40 degC, 233.15"
    })
    void readsTemperatures(String text, double kelvin) {
        assertThat(QuantityText.kelvin(text)).isCloseTo(kelvin, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"10 s, 10", "15 min, 900", "1.5 h, 5400", "0 s, 0"})
    void readsDurations(String text, double seconds) {
        assertThat(QuantityText.seconds(text)).isEqualTo(seconds);
    }

    /** 1 psi = 6894.757293168 Pa from the exact pound, standard gravity and inch; the others are exact by definition. */
    @ParameterizedTest
    @CsvSource({
        "205 kPa(a), 205000, ABSOLUTE",
        "3.0 bar(g), 300000, GAUGE",
        "15 psi(g), 103421.359397527, GAUGE",
        "1 kgf/cm2(a), 98066.5, ABSOLUTE",
        "700 mbar(a), 70000, ABSOLUTE",
        "-20 kPa(g), -20000, GAUGE"
    })
    void readsPressuresWithTheirDatum(String text, double pascal, Datum datum) {
        PressureReading reading = QuantityText.pressure(text);
        assertThat(reading.pascal()).isCloseTo(pascal, within(1e-6));
        assertThat(reading.datum()).isEqualTo(datum);
    }

    @Test
    void makesGaugeAbsoluteByTheAtmosphereAlone() {
        assertThat(QuantityText.pressure("1.04 bar(g)").absolutePascal(100_800)).isCloseTo(204_800, within(1e-6));
        assertThat(QuantityText.pressure("205 kPa(a)").absolutePascal(100_800)).isEqualTo(205_000);
    }

    @Test
    void asksForTheDatumOfAPressure() {
        assertThatThrownBy(() -> QuantityText.pressure("3.0 bar"))
                .isInstanceOf(QuantityException.class)
                .hasMessage("\"3.0 bar\" does not say what it is counted from; write 3.0 bar(a) for absolute or"
                        + " 3.0 bar(g) for gauge");
    }

    @Test
    void refusesATemperatureWhereADifferenceIsMeant() {
        assertThatThrownBy(() -> QuantityText.kelvinDifference("1.0 degC"))
                .hasMessage("\"1.0 degC\": unknown unit degC; known here: K");
    }

    @Test
    void refusesSeaLevelConfusionAndGaugeAtmospheres() {
        assertThat(QuantityText.atmospherePascal("1008 hPa")).isEqualTo(100_800);
        assertThatThrownBy(() -> QuantityText.atmospherePascal("1008 kPa")).isInstanceOf(QuantityException.class);
        assertThatThrownBy(() -> QuantityText.atmospherePascal("0 bar(g)")).isInstanceOf(QuantityException.class);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "121,1 degC", "121.1", "degC", "1e3 degC", "NaN degC", "121.1 degC(g)", "-300 degC", "0x10 K"
            })
    void refusesWhatIsNoTemperature(String text) {
        assertThatThrownBy(() -> QuantityText.kelvin(text)).isInstanceOf(QuantityException.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"-1 s", "15", "15 minutes", "15 min(a)", "1:30 min"})
    void refusesWhatIsNoDuration(String text) {
        assertThatThrownBy(() -> QuantityText.seconds(text)).isInstanceOf(QuantityException.class);
    }
}
