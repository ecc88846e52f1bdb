package org.steamwitness.steam;

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

class SaturationTest {

    /** IAPWS R7-97(2012), Table 35: equal when printed to the nine digits given. */
    @ParameterizedTest(name = "water boils at {0} K under {1} MPa")
    @CsvSource({"300, 3.53658941e-03", "500, 2.63889776", "600, 12.3443146"})
    void reachesThePressuresOfTable35(double kelvin, double megapascal) {
        assertThat(Digits.nine(Saturation.pascalAt(kelvin) / 1e6)).isEqualTo(Digits.nine(megapascal));
    }

    /** IAPWS R7-97(2012), Table 36: equal when printed to the nine digits given. */
    @ParameterizedTest(name = "under {0} MPa water boils at {1} K")
    @CsvSource({"0.1, 372.755919", "1, 453.035632", "10, 584.149488"})
    void boilsAtTheTemperaturesOfTable36(double megapascal, double kelvin) {
        assertThat(Digits.nine(Saturation.kelvinAt(megapascal * 1e6))).isEqualTo(Digits.nine(kelvin));
    }

    /**
     * Against IAPWS-95 (reference/saturation-iapws95.csv): IF97 deviates by at most 2.5e-4 in pressure, 0.01 K in
     * temperature, and the slopes agree within 1e-3.
     */
    @ParameterizedTest(name = "{0} degC")
    @CsvFileSource(resources = "/reference/saturation-iapws95.csv", useHeadersInDisplayName = true)
    void staysNearTheScientificFormulation(
            double celsius,
            double kilopascal,
            double vf,
            double vg,
            double uf,
            double ug,
            double hf,
            double hfg,
            double hg,
            double sf,
            double sg,
            double kelvinPerKilopascal) {
        double kelvin = celsius + 273.15;
        assertThat(Saturation.pascalAt(kelvin) / 1000).isCloseTo(kilopascal, within(2.5e-4 * kilopascal));
        assertThat(Saturation.kelvinAt(kilopascal * 1000)).isCloseTo(kelvin, within(0.01));
        assertThat(Saturation.kelvinPerPascalAt(kilopascal * 1000) * 1000)
                .isCloseTo(kelvinPerKilopascal, within(1e-3 * kelvinPerKilopascal));
    }

    @Property
    void roundTripsClose(@ForAll @DoubleRange(min = 273.2, max = 647) double kelvin) {
        assertThat(Saturation.kelvinAt(Saturation.pascalAt(kelvin))).isCloseTo(kelvin, within(1e-9));
    }

    @Property
    void theSlopeIsThatOfTheLine(@ForAll @DoubleRange(min = 700, max = 2e6) double pascal) {
        double step = pascal * 1e-4;
        double chord = (Saturation.kelvinAt(pascal + step) - Saturation.kelvinAt(pascal - step)) / (2 * step);
        assertThat(Saturation.kelvinPerPascalAt(pascal)).isCloseTo(chord, within(1e-6 * chord));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 611.2, 22.0641e6, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesPressuresOffTheLine(double pascal) {
        assertThatThrownBy(() -> Saturation.kelvinAt(pascal))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("saturation temperature: absolute pressure " + pascal
                        + " Pa lies outside 611.213 to 2.2064E7 Pa");
        assertThatThrownBy(() -> Saturation.kelvinPerPascalAt(pascal)).isInstanceOf(OutOfRangeException.class);
    }

    @Test
    void refusesTemperaturesOffTheLine() {
        assertThatThrownBy(() -> Saturation.pascalAt(273.14))
                .hasMessage("saturation pressure: temperature 273.14 K lies outside 273.15 to 647.096 K");
        assertThatThrownBy(() -> Saturation.pascalAt(Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Saturation.pascalAt(647.1)).isInstanceOf(OutOfRangeException.class);
    }
}
