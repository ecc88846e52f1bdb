package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.steamwitness.steam.Saturation;

class StandardAtmosphereTest {

    /**
     * Against reference/altitude.csv: the barometer to the three decimals printed, the boiling point and the temperature
     * of steam at 15 psi(g) within 0.02 K, the gauge pressure that steam of 121.1 degC needs within 0.02 kPa.
     */
    @ParameterizedTest(name = "{0} m")
    @CsvFileSource(resources = "/reference/altitude.csv", useHeadersInDisplayName = true)
    void agreesWithTheTableOfAltitudes(
            double metre,
            String kilopascal,
            double boilingCelsius,
            double celsiusAt15Psi,
            double kilopascalNeeded,
            double psiNeeded) {
        double barometer = StandardAtmosphere.pascalAt(metre);
        assertThat(Printed.fixed(barometer / 1000, 3)).isEqualTo(kilopascal);
        assertThat(celsius(Saturation.kelvinAt(barometer))).isCloseTo(boilingCelsius, within(0.02));
        double steam = QuantityText.pressure("15 psi(g)").absolutePascal(barometer);
        assertThat(celsius(Saturation.kelvinAt(steam))).isCloseTo(celsiusAt15Psi, within(0.02));
        double needed = Saturation.pascalAt(QuantityText.kelvin("121.1 degC")) - barometer;
        assertThat(needed / 1000).isCloseTo(kilopascalNeeded, within(0.02));
        assertThat(PressureUnit.PSI.ofPascal(needed)).isCloseTo(psiNeeded, within(0.01));
    }

    /** The formula at the ends of its range, worked apart from the program in decimal arithmetic of 40 digits. */
    @ParameterizedTest
    @CsvSource({"0, 101325.0", "-500, 107477.512603687", "9000, 30742.4233585641"})
    void holdsFromBelowTheSeaToTheHighestMountains(double metre, double pascal) {
        assertThat(StandardAtmosphere.pascalAt(metre)).isCloseTo(pascal, within(1e-6));
    }

    @Property
    void fallsWithAltitude(@ForAll @DoubleRange(min = -500, max = 8999) double metre) {
        assertThat(StandardAtmosphere.pascalAt(metre + 1)).isLessThan(StandardAtmosphere.pascalAt(metre));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-500.001, 9000.001, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesWhatLiesOutsideItsRange(double metre) {
        assertThatThrownBy(() -> StandardAtmosphere.pascalAt(metre))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("standard atmosphere: altitude " + metre + " m lies outside -500.0 m to 9000.0 m");
    }

    /** Rectangular half-width of 3 kPa: variance a squared over three. */
    @Test
    void isAsUncertainAsTheWeather() {
        double u = StandardAtmosphere.standardUncertaintyPascal();
        assertThat(u * u).isCloseTo(3000.0 * 3000.0 / 3, within(1e-6));
        assertThat(u).isCloseTo(1732.05, within(0.01));
    }

    @Test
    void everyAltitudeGivesAnAtmosphereThatARunSheetMayState() {
        for (double metre : new double[] {StandardAtmosphere.LOWEST_METRE, StandardAtmosphere.HIGHEST_METRE}) {
            String text = Printed.fixed(StandardAtmosphere.pascalAt(metre), 0) + " Pa";
            assertThat(QuantityText.atmospherePascal(text)).isPositive();
        }
    }

    private static double celsius(double kelvin) {
        return TemperatureUnit.CELSIUS.ofKelvin(kelvin);
    }
}
