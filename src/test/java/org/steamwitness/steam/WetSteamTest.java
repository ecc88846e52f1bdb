package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WetSteamTest {

    private final FirstLawExamples examples = new FirstLawExamples();

    /** First-law examples A, B, D and F (reference/first-law-examples.csv): quality and energy from v and T. */
    @ParameterizedTest(name = "{0} at {2} degC and {1} m3/kg")
    @CsvSource({
        "A, 0.05, 20, x1, u1",
        "A, 0.05, 121.1, x2, u2",
        "B, 1, 60, x1, u1",
        "F, 0.59786488, 40, x2, u2",
    })
    void findsTheQualityFromVolumeAndTemperature(String id, double volume, double celsius, String x, String u) {
        WetSteam steam = WetSteam.ofKelvinVolume(celsius + 273.15, volume);
        assertThat(steam.quality()).isCloseTo(examples.value(id + " " + x), within(1e-3 * steam.quality()));
        assertThat(steam.internalEnergyJoulePerKilogram() / 1000).isCloseTo(examples.value(id + " " + u), within(0.3));
    }

    /** Example D of the same file: 1.0 kg and 0.8 kg in 0.012 m3 at 115 degC, from v and p. */
    @Test
    void findsTheQualityFromVolumeAndPressure() {
        double pascal = examples.value("D p") * 1000;
        assertThat(WetSteam.ofPascalVolume(pascal, 0.012).quality()).isCloseTo(examples.value("D x1"), within(1e-5));
        assertThat(WetSteam.ofPascalVolume(pascal, 0.015).quality()).isCloseTo(examples.value("D x2"), within(1e-5));
        assertThat(WetSteam.ofPascalVolume(pascal, 0.012).internalEnergyJoulePerKilogram() / 1000)
                .isCloseTo(examples.value("D U1"), within(0.3));
    }

    /** Example E of the same file: half a kilogram, heated at 101.325 kPa from liquid of 30 degC to x = 0.2. */
    @Test
    void heatsAtConstantPressureByTheEnthalpy() {
        SinglePhase cold = Region1.at(303.15, 101325);
        WetSteam hot = WetSteam.ofPascalQuality(101325, 0.2);
        assertThat(cold.enthalpyJoulePerKilogram() / 1000).isCloseTo(examples.value("E h1"), within(0.2));
        assertThat(hot.enthalpyJoulePerKilogram() / 1000).isCloseTo(examples.value("E h2"), within(0.2));
        assertThat(0.5e-3 * (hot.enthalpyJoulePerKilogram() - cold.enthalpyJoulePerKilogram()))
                .isCloseTo(examples.value("E Q"), within(0.3));
        assertThat(0.5e-3 * (hot.internalEnergyJoulePerKilogram() - cold.internalEnergyJoulePerKilogram()))
                .isCloseTo(examples.value("E dU"), within(0.3));
        assertThat(0.5e-3 * 101325 * (hot.cubicMetrePerKilogram() - cold.cubicMetrePerKilogram()))
                .isCloseTo(examples.value("E W"), within(0.017));
    }

    /**
     * IAPWS-95 at 121.1 degC (reference/saturation-iapws95.csv): half of each phase is the mean of s_f 1.539761 and s_g
     * 7.117525 kJ/(kg K).
     */
    @Test
    void weighsThePhasesByTheirMass() {
        Saturated line = Saturated.atKelvin(394.25);
        WetSteam half = WetSteam.ofKelvinQuality(394.25, 0.5);
        assertThat(half.kelvin()).isEqualTo(394.25);
        assertThat(half.pascal()).isEqualTo(line.vapour().pascal());
        assertThat(half.entropyJoulePerKilogramKelvin()).isCloseTo(1000 * (1.539761 + 7.117525) / 2, within(0.5));
        assertThat(WetSteam.ofKelvinQuality(394.25, 0).cubicMetrePerKilogram())
                .isEqualTo(line.liquid().cubicMetrePerKilogram());
        assertThat(WetSteam.ofKelvinQuality(394.25, 1).enthalpyJoulePerKilogram())
                .isCloseTo(line.vapour().enthalpyJoulePerKilogram(), within(1e-6));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1e-12, 1.000001, Double.NaN})
    void refusesAQualityThatNoMixtureHas(double quality) {
        assertThatThrownBy(() -> WetSteam.ofKelvinQuality(394.25, quality))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("vapour quality " + quality + " kg/kg lies outside 0.0 to 1.0 kg/kg");
    }

    @Test
    void refusesVolumesAndEnthalpiesOfOnePhase() {
        assertThatThrownBy(() -> WetSteam.ofKelvinVolume(394.25, 0.87)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> WetSteam.ofKelvinVolume(394.25, 0.00106)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> WetSteam.ofPascalEnthalpy(2e5, 2.71e6)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> WetSteam.ofPascalEnthalpy(2e5, 5.0e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> WetSteam.ofPascalVolume(2e5, Double.NaN)).isInstanceOf(OutOfRangeException.class);
    }

    @Property
    void theQualityComesBackFromVolumeAndEnthalpy(
            @ForAll @DoubleRange(min = 273.2, max = 623) double kelvin,
            @ForAll @DoubleRange(max = 1) @Scale(9) double quality) {
        WetSteam steam = WetSteam.ofKelvinQuality(kelvin, Math.min(Math.max(quality, 1e-6), 1 - 1e-6));
        assertThat(WetSteam.ofKelvinVolume(kelvin, steam.cubicMetrePerKilogram())
                        .quality())
                .isCloseTo(steam.quality(), within(1e-9));
        assertThat(WetSteam.ofPascalVolume(steam.pascal(), steam.cubicMetrePerKilogram())
                        .quality())
                .isCloseTo(steam.quality(), within(1e-9));
        assertThat(WetSteam.ofPascalEnthalpy(steam.pascal(), steam.enthalpyJoulePerKilogram())
                        .quality())
                .isCloseTo(steam.quality(), within(1e-9));
    }
}
