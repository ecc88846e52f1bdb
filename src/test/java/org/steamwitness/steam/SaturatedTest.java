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

class SaturatedTest {

    /**
     * Against IAPWS-95 (reference/saturation-iapws95.csv): v_f within 3e-5, v_g within 2e-4, energies within 0.2 kJ/kg,
     * entropies within 5e-4 kJ/(kg K).
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
            double sg) {
        Saturated line = Saturated.atKelvin(celsius + 273.15);
        assertThat(line.liquid().pascal() / 1000).isCloseTo(kilopascal, within(2.5e-4 * kilopascal));
        assertThat(line.liquid().cubicMetrePerKilogram()).isCloseTo(vf, within(3e-5 * vf));
        assertThat(line.vapour().cubicMetrePerKilogram()).isCloseTo(vg, within(2e-4 * vg));
        assertThat(line.liquid().internalEnergyJoulePerKilogram() / 1000).isCloseTo(uf, within(0.2));
        assertThat(line.vapour().internalEnergyJoulePerKilogram() / 1000).isCloseTo(ug, within(0.2));
        assertThat(line.liquid().enthalpyJoulePerKilogram() / 1000).isCloseTo(hf, within(0.2));
        assertThat(line.evaporationJoulePerKilogram() / 1000).isCloseTo(hfg, within(0.2));
        assertThat(line.vapour().enthalpyJoulePerKilogram() / 1000).isCloseTo(hg, within(0.2));
        assertThat(line.liquid().entropyJoulePerKilogramKelvin() / 1000).isCloseTo(sf, within(5e-4));
        assertThat(line.vapour().entropyJoulePerKilogramKelvin() / 1000).isCloseTo(sg, within(5e-4));
    }

    /** The same rows from the pressure: temperature within 0.01 K. */
    @ParameterizedTest(name = "{1} kPa")
    @CsvFileSource(resources = "/reference/saturation-iapws95.csv", useHeadersInDisplayName = true)
    void findsTheSamePhasesFromThePressure(double celsius, double kilopascal, double vf, double vg) {
        Saturated line = Saturated.atPascal(kilopascal * 1000);
        assertThat(line.vapour().kelvin()).isCloseTo(celsius + 273.15, within(0.01));
        assertThat(line.liquid().pascal()).isEqualTo(kilopascal * 1000);
        assertThat(line.liquid().cubicMetrePerKilogram()).isCloseTo(vf, within(3e-5 * vf));
        assertThat(line.vapour().cubicMetrePerKilogram()).isCloseTo(vg, within(5e-4 * vg));
    }

    /** Clausius and Clapeyron: dT/dp = T (v_g - v_f)/(h_g - h_f), 6.3e-5 apart at most over 1 to 200 degC on IF97. */
    @Property
    void theSlopeOfTheLineIsThatOfClapeyron(@ForAll @DoubleRange(min = 274.15, max = 473.15) double kelvin) {
        Saturated line = Saturated.atKelvin(kelvin);
        double clapeyron = kelvin
                * (line.vapour().cubicMetrePerKilogram() - line.liquid().cubicMetrePerKilogram())
                / line.evaporationJoulePerKilogram();
        assertThat(Saturation.kelvinPerPascalAt(line.vapour().pascal()))
                .isCloseTo(clapeyron, within(6.35e-5 * clapeyron));
    }

    @Property
    void temperatureAndPressureLeadToTheSamePhases(@ForAll @DoubleRange(min = 273.2, max = 623.1) double kelvin) {
        Saturated line = Saturated.atKelvin(kelvin);
        Saturated back = Saturated.atPascal(line.liquid().pascal());
        assertThat(back.vapour().kelvin()).isCloseTo(kelvin, within(1e-9));
        assertThat(back.vapour().cubicMetrePerKilogram())
                .isCloseTo(
                        line.vapour().cubicMetrePerKilogram(),
                        within(1e-9 * line.vapour().cubicMetrePerKilogram()));
    }

    /** T (s_g - s_f) = h_g - h_f: one Gibbs energy for both phases, which the two fits share within 12 J/kg. */
    @Property
    void evaporationIsReversible(@ForAll @DoubleRange(min = 273.16, max = 623.15) double kelvin) {
        Saturated line = Saturated.atKelvin(kelvin);
        double heat = kelvin
                * (line.vapour().entropyJoulePerKilogramKelvin() - line.liquid().entropyJoulePerKilogramKelvin());
        assertThat(heat).isCloseTo(line.evaporationJoulePerKilogram(), within(12.0));
    }

    @Property
    void warmerSteamIsDenserAndTakesLessToEvaporate(@ForAll @DoubleRange(min = 273.2, max = 622) double kelvin) {
        Saturated cold = Saturated.atKelvin(kelvin);
        Saturated warm = Saturated.atKelvin(kelvin + 0.5);
        assertThat(warm.vapour().pascal()).isGreaterThan(cold.vapour().pascal());
        assertThat(warm.vapour().cubicMetrePerKilogram())
                .isLessThan(cold.vapour().cubicMetrePerKilogram());
        assertThat(warm.evaporationJoulePerKilogram()).isLessThan(cold.evaporationJoulePerKilogram());
        assertThat(warm.liquid().enthalpyJoulePerKilogram())
                .isGreaterThan(cold.liquid().enthalpyJoulePerKilogram());
    }

    @Test
    void takesTheEdgesOfItsRange() {
        assertThat(Saturated.atKelvin(273.15).liquid().kelvin()).isEqualTo(273.15);
        assertThat(Saturated.atKelvin(623.15).liquid().pascal()).isEqualTo(Saturated.HIGHEST_PASCAL);
        assertThat(Saturated.atPascal(611.213).liquid().pascal()).isEqualTo(611.213);
        assertThat(Saturated.atPascal(Saturated.HIGHEST_PASCAL).liquid().kelvin())
                .isCloseTo(623.15, within(1e-9));
    }

    @Test
    void refusesWhatLiesOffTheLineOrNearTheCriticalPoint() {
        assertThatThrownBy(() -> Saturated.atKelvin(623.16))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("saturated water: temperature 623.16 K lies outside 273.15 to 623.15 K");
        assertThatThrownBy(() -> Saturated.atKelvin(Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Saturated.atPascal(600))
                .hasMessageStartingWith("saturated water: absolute pressure 600.0 Pa lies outside 611.213 to");
        assertThatThrownBy(() -> Saturated.atPascal(16.6e6)).isInstanceOf(OutOfRangeException.class);
    }

    @Test
    void refusesPhasesThatAreNotInEquilibrium() {
        SinglePhase liquid = Region1.at(394.25, 1e6);
        SinglePhase steam = Region2.at(394.25, 1e5);
        SinglePhase warmer = Region2.at(500, 1e6);
        assertThatThrownBy(() -> new Saturated(liquid, steam))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("not in equilibrium: liquid at 394.25 K, 1000000.0 Pa and vapour at 394.25 K, 100000.0 Pa");
        assertThatThrownBy(() -> new Saturated(liquid, warmer)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Saturated(liquid, liquid)).isInstanceOf(IllegalArgumentException.class);
    }
}
