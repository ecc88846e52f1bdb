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
import org.junit.jupiter.params.provider.CsvFileSource;

class SuperheatedTest {

    private final FirstLawExamples examples = new FirstLawExamples();

    /**
     * The superheated states of IAPWS-95 (reference/single-phase-iapws95.csv), found from other pairs: pressure within
     * 2.5e-4, temperature within the 0.11 kJ/kg and 9e-5 of volume by which IF97 differs there. The liquid ones are refused.
     */
    @ParameterizedTest(name = "{0} water at {1} degC and {2} kPa")
    @CsvFileSource(resources = "/reference/single-phase-iapws95.csv", useHeadersInDisplayName = true)
    void findsTheStatesOfTheScientificFormulation(
            String phase, double celsius, double kilopascal, double v, double u, double h) {
        double kelvin = celsius + 273.15;
        double pascal = kilopascal * 1000;
        if (phase.equals("compressed")) {
            assertThatThrownBy(() -> Superheated.ofKelvinVolume(kelvin, v)).isInstanceOf(OutOfRangeException.class);
            assertThatThrownBy(() -> Superheated.ofPascalEnthalpy(pascal, h * 1000))
                    .isInstanceOf(OutOfRangeException.class);
            return;
        }
        assertThat(Superheated.ofKelvinVolume(kelvin, v).pascal()).isCloseTo(pascal, within(2.5e-4 * pascal));
        assertThat(Superheated.ofPascalVolume(pascal, v).kelvin()).isCloseTo(kelvin, within(2e-4 * kelvin));
        assertThat(Superheated.ofPascalEnthalpy(pascal, h * 1000).kelvin()).isCloseTo(kelvin, within(0.11));
        assertThat(Superheated.ofPascalInternalEnergy(pascal, u * 1000).kelvin())
                .isCloseTo(kelvin, within(0.11));
    }

    /** First-law example H (reference/first-law-examples.csv): evacuated tank, u2 is the enthalpy of the supply. */
    @Test
    void heatsSteamThatFillsAnEvacuatedTank() {
        double supply = Saturated.atPascal(304226).vapour().enthalpyJoulePerKilogram();
        SinglePhase inside = Superheated.ofPascalInternalEnergy(304226, supply);
        assertThat(inside.kelvin() - 273.15).isCloseTo(examples.value("H T2"), within(0.1));
        assertThat(inside.kelvin() - Saturation.kelvinAt(304226)).isCloseTo(examples.value("H superheat"), within(0.1));
    }

    @Property
    void theStateComesBackFromEveryPair(
            @ForAll @DoubleRange(min = 273.15, max = 1073.15) double kelvin,
            @ForAll @DoubleRange(min = 0, max = 1) @Scale(6) double part) {
        double highest = Region2.highestPascalAt(kelvin);
        double pascal = Math.max(1, part * part * part * part * highest * 0.999);
        SinglePhase state = Region2.at(kelvin, pascal);
        double v = state.cubicMetrePerKilogram();
        assertThat(Superheated.ofKelvinVolume(kelvin, v).pascal()).isCloseTo(pascal, within(1e-9 * pascal));
        assertThat(Superheated.ofPascalVolume(pascal, v).kelvin()).isCloseTo(kelvin, within(1e-9 * kelvin));
        assertThat(Superheated.ofPascalEnthalpy(pascal, state.enthalpyJoulePerKilogram())
                        .kelvin())
                .isCloseTo(kelvin, within(1e-9 * kelvin));
        assertThat(Superheated.ofPascalInternalEnergy(pascal, state.internalEnergyJoulePerKilogram())
                        .kelvin())
                .isCloseTo(kelvin, within(1e-9 * kelvin));
    }

    @Test
    void takesDrySaturatedSteamAsItsEdge() {
        SinglePhase dry = Saturated.atKelvin(394.25).vapour();
        assertThat(Superheated.ofKelvinVolume(394.25, dry.cubicMetrePerKilogram())
                        .pascal())
                .isEqualTo(dry.pascal());
        SinglePhase thin = Region2.at(394.25, 1);
        assertThat(Superheated.ofKelvinVolume(394.25, thin.cubicMetrePerKilogram())
                        .pascal())
                .isEqualTo(1);
        SinglePhase boiled = Saturated.atPascal(2e5).vapour();
        assertThat(Superheated.ofPascalEnthalpy(2e5, boiled.enthalpyJoulePerKilogram())
                        .kelvin())
                .isEqualTo(boiled.kelvin());
        SinglePhase hot = Region2.at(1073.15, 2e5);
        assertThat(Superheated.ofPascalEnthalpy(2e5, hot.enthalpyJoulePerKilogram())
                        .kelvin())
                .isEqualTo(1073.15);
    }

    @Test
    void refusesWetSteamAndNamesTheRange() {
        assertThatThrownBy(() -> Superheated.ofKelvinVolume(394.25, 0.5))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("steam, region 2, at 394.25 K: volume 0.5 m3/kg lies outside "
                        + Saturated.atKelvin(394.25).vapour().cubicMetrePerKilogram() + " to "
                        + Region2.at(394.25, 1).cubicMetrePerKilogram() + " m3/kg");
        assertThatThrownBy(() -> Superheated.ofPascalEnthalpy(2e5, 2.5e6))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessageStartingWith("steam, region 2, at 200000.0 Pa: enthalpy 2500000.0 J/kg lies outside");
        assertThatThrownBy(() -> Superheated.ofPascalVolume(2e5, 0.5))
                .hasMessageStartingWith("steam, region 2, at 200000.0 Pa: volume 0.5 m3/kg lies outside");
        assertThatThrownBy(() -> Superheated.ofPascalInternalEnergy(2e5, 2.4e6))
                .hasMessageStartingWith("steam, region 2, at 200000.0 Pa: internal energy 2400000.0 J/kg lies outside");
    }

    @Test
    void refusesWhatIsTooThinTooHotOrMissing() {
        assertThatThrownBy(() -> Superheated.ofKelvinVolume(394.25, 2e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Superheated.ofKelvinVolume(Double.NaN, 1)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Superheated.ofKelvinVolume(394.25, Double.NaN))
                .isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Superheated.ofPascalEnthalpy(2e5, 5e6)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Superheated.ofPascalEnthalpy(2e5, Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Superheated.ofPascalEnthalpy(Double.NaN, 3e6)).isInstanceOf(OutOfRangeException.class);
    }
}
