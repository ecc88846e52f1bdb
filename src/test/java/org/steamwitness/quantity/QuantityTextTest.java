package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityTextTest {

    /**
     * Every unit of every quantity. The factors are those of the definitions: the SI prefixes, the minute, the hour and
     * the litre; 0 degC = 273.15 K and t/degF = 1.8 t/degC + 32; pound 0.45359237 kg and foot 0.3048 m (international
     * yard and pound agreement of 1959); kWh = 3.6 MJ.
     */
    @ParameterizedTest(name = "{0}: {1} is {2}")
    @CsvSource({
        "TEMPERATURE, 121.1 degC, 394.25",
        "TEMPERATURE, 0 degC, 273.15",
        "TEMPERATURE, 212 degF, 373.15",
        "TEMPERATURE, 250 degF, 394.261111111111",
        "TEMPERATURE, 240 degF, 388.705555555556",
        "TEMPERATURE, 394.25 K, 394.25",
        "TEMPERATURE, -40 degF, 233.15",
        "TEMPERATURE, -40 degC, 233.15",
        "TEMPERATURE, 0.000001 K, 0.000001",
        "DIFFERENCE, 0.25 K, 0.25",
        "DIFFERENCE, -0.2 K, -0.2",
        "DIFFERENCE, +0.1 K, 0.1",
        "DURATION, 10 s, 10",
        "DURATION, 15 min, 900",
        "DURATION, 15min, 900",
        "DURATION, 1.5 h, 5400",
        "DURATION, 0 s, 0",
        "PRESSURE_DIFFERENCE, 0.02 bar, 2000",
        "PRESSURE_DIFFERENCE, -3 hPa, -300",
        "ATMOSPHERE, 1008 hPa, 100800",
        "ATMOSPHERE, 300 hPa, 30000",
        "ATMOSPHERE, 1200 hPa, 120000",
        "ATMOSPHERE, 100.8 kPa(a), 100800",
        "ATMOSPHERE, 760 mmHg, 101325.0144354",
        "ATMOSPHERE, 29.92 inHg, 101320.75888",
        "ATMOSPHERE, 1 atm, 101325",
        "MASS, 640 kg, 640",
        "MASS, 850 g, 0.85",
        "MASS, 1 lb, 0.45359237",
        "VOLUME, 1.9 m3, 1.9",
        "VOLUME, 22 l, 0.022",
        "VOLUME, 22 dm3, 0.022",
        "VOLUME, 850 ml, 0.00085",
        "LENGTH, 1.2 m, 1.2",
        "LENGTH, 73 mm, 0.073",
        "LENGTH, 3 ft, 0.9144",
        "ALTITUDE, 350 m, 350",
        "ALTITUDE, -500 m, -500",
        "ALTITUDE, 9000 m, 9000",
        "ALTITUDE, 2000 ft, 609.6",
        "SPECIFIC_HEAT, 3.55 kJ/(kg K), 3550",
        "SPECIFIC_HEAT, 500 J/(kg K), 500",
        "ENERGY, 900 kJ, 900000",
        "ENERGY, 12 MJ, 12000000",
        "ENERGY, 2.5 kWh, 9000000",
        "ENERGY, 0 kJ, 0",
        "FRACTION, 95 %, 0.95",
        "FRACTION, 95%, 0.95",
        "FRACTION, 0.97, 0.97",
        "FRACTION, 0, 0",
        "FRACTION, 1, 1",
        "FRACTION, 100 %, 1",
        "TEMPERATURE_RATE, 6 K/min, 0.1",
        "TEMPERATURE_RATE, -0.1 K/s, -0.1",
        "PRESSURE_RATE, 0.3 bar/min, 500",
        "PRESSURE_RATE, 0.3 bar/s, 30000",
        "PRESSURE_RATE, 1.2 mbar/min, 2",
        "PRESSURE_RATE, 6 kPa/min, 100",
        "PRESSURE_RATE, -2 kPa/s, -2000",
        "PRESSURE_RATE, 1 psi/min, 114.912621552806",
        "PRESSURE_RATE, 60 kgf/cm2/min, 98066.5",
        "MASS_FLOW, 1800 kg/h, 0.5",
        "MASS_FLOW, 3 kg/min, 0.05",
        "MASS_FLOW, 0 kg/h, 0",
        "ROTATION, 12 1/min, 0.2",
        "ROTATION, 12 rpm, 0.2",
        "ROTATION, 0 rpm, 0",
        "POWER, 9 kW, 9000",
        "POWER, 750 W, 750",
        "POWER, 0 W, 0",
        "HEAT_LOSS, 28 W/K, 28",
        "HEAT_LOSS, 0 W/K, 0"
    })
    void readsEveryUnitByItsDefinition(Reader reader, String text, double si) {
        assertThat(reader.read(text)).isCloseTo(si, within(1e-12 * Math.abs(si) + 1e-300));
    }

    /** Every quantity text that the pattern of a plan and of a run sheet holds, as written there. */
    @ParameterizedTest(name = "{1}")
    @CsvSource({
        "VOLUME, 1.9 m3, 1.9",
        "VOLUME, 1.3 m3, 1.3",
        "MASS, 640 kg, 640",
        "MASS, 410 kg, 410",
        "SPECIFIC_HEAT, 3.55 kJ/(kg K), 3550",
        "HEAT_LOSS, 28 W/K, 28",
        "PRESSURE, 3.0 bar(g), 300000",
        "PRESSURE, 205 kPa(a), 205000",
        "ALTITUDE, 350 m, 350",
        "DIFFERENCE, 0.25 K, 0.25",
        "DIFFERENCE, 0.2 K, 0.2",
        "DIFFERENCE, 0.1 K, 0.1",
        "DURATION, 6 s, 6",
        "DURATION, 2 s, 2",
        "PRESSURE_DIFFERENCE, 0.02 bar, 2000",
        "TEMPERATURE, 0.0 degC, 273.15",
        "TEMPERATURE, 121.0 degC, 394.15",
        "DIFFERENCE, -0.2 K, -0.2",
        "TEMPERATURE, 121.1 degC, 394.25",
        "TEMPERATURE, 124.1 degC, 397.25",
        "TEMPERATURE, 122.0 degC, 395.15",
        "DURATION, 42 min, 2520",
        "DURATION, 30 s, 30",
        "DURATION, 10 s, 10",
        "DURATION, 5 s, 5",
        "DIFFERENCE, 1.0 K, 1",
        "DIFFERENCE, 2.0 K, 2",
        "TEMPERATURE, 121.11 degC, 394.26",
        "DIFFERENCE, 10 K, 10",
        "DURATION, 6.0 min, 360",
        "DURATION, 5 min, 300",
        "TEMPERATURE, 107.2 degC, 380.35",
        "DURATION, 7 min, 420",
        "TEMPERATURE, 104.4 degC, 377.55",
        "DIFFERENCE, 1.5 K, 1.5",
        "PRESSURE_RATE, 0.3 bar/min, 500",
        "FRACTION, 95 %, 0.95",
        "ATMOSPHERE, 1008 hPa, 100800",
        "TEMPERATURE, 68.0 degC, 341.15",
        "MASS, 1.20 kg, 1.2",
        "MASS, 0.93 kg, 0.93",
        "TEMPERATURE, 107.8 degC, 380.95",
        "TEMPERATURE, 121.6 degC, 394.75",
        "PRESSURE, 1.07 bar(g), 107000"
    })
    void readsThePatternOfPlanAndRunSheet(Reader reader, String text, double si) {
        assertThat(reader.read(text)).isCloseTo(si, within(1e-13 * Math.abs(si)));
    }

    @ParameterizedTest
    @CsvSource({
        "205 kPa(a), 205000, ABSOLUTE",
        "0 kPa(a), 0, ABSOLUTE",
        "3.0 bar(g), 300000, GAUGE",
        "15 psi(g), 103421.359397525, GAUGE",
        "1 kgf/cm2(a), 98066.5, ABSOLUTE",
        "700 mbar(a), 70000, ABSOLUTE",
        "0.3 MPa(a), 300000, ABSOLUTE",
        "-20 kPa(g), -20000, GAUGE",
        "-1.2 bar(g), -120000, GAUGE",
        "-28 inHg(g), -94818.892, GAUGE"
    })
    void readsPressuresWithTheirDatum(String text, double pascal, Datum datum) {
        PressureReading reading = QuantityText.pressure(text);
        assertThat(reading.pascal()).isCloseTo(pascal, within(1e-9));
        assertThat(reading.datum()).isEqualTo(datum);
    }

    @ParameterizedTest
    @EnumSource(PressureUnit.class)
    void readsEveryUnitOfPressureInEveryPlace(PressureUnit unit) {
        double pascal = unit.toPascal(3);
        assertThat(QuantityText.pressure("3 " + unit.symbol() + "(g)").pascal()).isEqualTo(pascal);
        assertThat(QuantityText.pascalDifference("3 " + unit.symbol())).isEqualTo(pascal);
        assertThat(RateText.pressureRatePascalPerSecond("3 " + unit.symbol() + "/s"))
                .isEqualTo(pascal);
        assertThat(RateText.pressureRatePascalPerSecond("3 " + unit.symbol() + "/min"))
                .isEqualTo(pascal / 60);
    }

    /** A limit and a sample of the same number must be equal, or a hold at the limit would be decided by rounding. */
    @Property
    void aTextIsEqualToALoggedNumberToTheLastBit(@ForAll @IntRange(max = 15_000) int hundredths) {
        String number = Printed.fixed(hundredths / 100.0, 2);
        double logged = Double.parseDouble(number);
        for (TemperatureUnit unit : TemperatureUnit.values()) {
            if (unit.toKelvin(logged) > 0) {
                assertThat(QuantityText.kelvin(number + " " + unit.symbol())).isEqualTo(unit.toKelvin(logged));
            }
        }
        assertThat(QuantityText.pressure(number + " psi(a)").pascal()).isEqualTo(PressureUnit.PSI.toPascal(logged));
    }

    @Test
    void heedsNoLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            assertThat(QuantityText.kelvin("121.1 degC")).isEqualTo(394.25);
            Locale.setDefault(Locale.forLanguageTag("tr-TR"));
            assertThat(QuantityText.seconds("15 min")).isEqualTo(900);
        } finally {
            Locale.setDefault(before);
        }
    }
}
