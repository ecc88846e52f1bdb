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
import org.junit.jupiter.params.provider.CsvSource;

class SteamAirTest {

    private static final double PASCAL_PER_PSI = 6894.757293168;
    private static final double ATMOSPHERE = 101325;

    /** Dalton's law on IAPWS-95 (reference/air-fraction.csv): 5e-4 in the fraction, 0.01 K. */
    @ParameterizedTest(name = "{0} degC at {1} kPa")
    @CsvFileSource(resources = "/reference/air-fraction.csv", useHeadersInDisplayName = true)
    void tellsAirAndDepartureFromSaturation(
            double celsius, double kilopascal, double psat, double y, double boiling, double departure) {
        double kelvin = celsius + 273.15;
        double pascal = kilopascal * 1000;
        assertThat(SteamAir.airMoleFraction(kelvin, pascal)).isCloseTo(y, within(5e-4));
        assertThat(SteamAir.departureKelvin(kelvin, pascal)).isCloseTo(departure, within(0.01));
        if (y > 0) {
            assertThat(SteamAir.kelvinAt(y, pascal)).isCloseTo(kelvin, within(0.01));
        }
    }

    /**
     * The classical table of temperature against gauge pressure and the share of air discharged
     * (reference/steam-air-gauge-table.csv): the air left keeps its cold partial pressure, (1 - f) of an atmosphere.
     */
    @ParameterizedTest(name = "{0} psi on the gauge, {1} of the air discharged")
    @CsvFileSource(resources = "/reference/steam-air-gauge-table.csv", useHeadersInDisplayName = true)
    void followsTheClassicalGaugeTable(double psi, double discharged, double table, double convention) {
        double pascal = psi * PASCAL_PER_PSI + ATMOSPHERE;
        double celsius = SteamAir.kelvinAt((1 - discharged) * ATMOSPHERE / pascal, pascal) - 273.15;
        assertThat(celsius).isCloseTo(convention, within(0.015));
        assertThat(celsius).isCloseTo(table, within(1.3));
    }

    /** A lower barometer lets steam at one gauge reading be colder (reference/altitude.csv), within 0.01 K. */
    @ParameterizedTest(name = "at {0} m")
    @CsvFileSource(resources = "/reference/altitude.csv", useHeadersInDisplayName = true)
    void boilsColderUnderALowerBarometer(double metre, double kilopascal, double boiling, double at15Psi) {
        double pascal = kilopascal * 1000;
        assertThat(SteamAir.kelvinAt(0, pascal) - 273.15).isCloseTo(boiling, within(0.011));
        assertThat(SteamAir.kelvinAt(0, pascal + 15 * PASCAL_PER_PSI) - 273.15).isCloseTo(at15Psi, within(0.011));
    }

    /** ASHRAE Handbook, Fundamentals, Psychrometrics: kg water per kg air is 0.621945 times the mole ratio. */
    @ParameterizedTest
    @CsvSource({"0.1", "0.5", "0.9"})
    void turnsMolesToMass(double moleFraction) {
        double air = SteamAir.airMassFraction(moleFraction);
        assertThat((1 - air) / air)
                .isCloseTo(0.621945 * (1 - moleFraction) / moleFraction, within(1e-4 * (1 - air) / air));
    }

    @Test
    void isAllSteamOrAllAirAtTheEnds() {
        assertThat(SteamAir.airMassFraction(0)).isZero();
        assertThat(SteamAir.airMassFraction(1)).isEqualTo(1);
        assertThat(SteamAir.kelvinAt(0, 2e5)).isEqualTo(Saturation.kelvinAt(2e5));
    }

    @Test
    void givesSuperheatAsANegativeFraction() {
        assertThat(SteamAir.airMoleFraction(396.65, 205695)).isNegative();
        assertThat(SteamAir.departureKelvin(396.65, 205695)).isPositive();
    }

    @Property
    void theTemperatureOfAMixtureGivesItsFractionBack(
            @ForAll @DoubleRange(min = 0, max = 0.99) @Scale(6) double moleFraction,
            @ForAll @DoubleRange(min = 1e5, max = 1e6) double pascal) {
        double kelvin = SteamAir.kelvinAt(moleFraction, pascal);
        assertThat(SteamAir.airMoleFraction(kelvin, pascal)).isCloseTo(moleFraction, within(1e-9));
        assertThat(SteamAir.departureKelvin(kelvin, pascal)).isLessThanOrEqualTo(1e-9);
    }

    @Test
    void refusesWhatNoMixtureHas() {
        assertThatThrownBy(() -> SteamAir.airMoleFraction(394.25, 0))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("air fraction: absolute pressure 0.0 Pa lies outside 1.0 to 2.2064E7 Pa");
        assertThatThrownBy(() -> SteamAir.airMoleFraction(Double.NaN, 2e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.airMoleFraction(394.25, Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.airMassFraction(-0.01))
                .hasMessage("air fraction -0.01 mol/mol lies outside 0.0 to 1.0 mol/mol");
        assertThatThrownBy(() -> SteamAir.airMassFraction(1.01)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.departureKelvin(Double.NaN, 2e5))
                .hasMessage("departure from saturation: temperature NaN K lies outside 273.15 to 1073.15 K");
        assertThatThrownBy(() -> SteamAir.departureKelvin(394.25, Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.kelvinAt(1.01, 2e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.kelvinAt(-0.01, 2e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> SteamAir.kelvinAt(1, 2e5)).isInstanceOf(OutOfRangeException.class);
    }
}
