package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ThrottlingTest {

    private final FirstLawExamples examples = new FirstLawExamples();

    /** First-law example J (reference/first-law-examples.csv): steam of 400 kPa let out to 101.325 kPa. */
    @ParameterizedTest(name = "of quality {1}")
    @CsvSource({"J0.95, 0.95", "J0.97, 0.97"})
    void driesWetSteam(String id, double quality) {
        WetSteam supply = WetSteam.ofPascalQuality(4e5, quality);
        assertThat(supply.enthalpyJoulePerKilogram() / 1000).isCloseTo(examples.value(id + " h"), within(0.3));
        Water arrived = Throttling.to(101325, supply.enthalpyJoulePerKilogram());
        assertThat(arrived).isInstanceOf(WetSteam.class);
        assertThat(((WetSteam) arrived).quality()).isCloseTo(examples.value(id + " x2"), within(1e-4));
    }

    /** The same example with dry steam: it arrives superheated. */
    @Test
    void superheatsDrySteam() {
        double supply = Saturated.atPascal(4e5).vapour().enthalpyJoulePerKilogram();
        Water arrived = Throttling.to(101325, supply);
        assertThat(arrived).isInstanceOf(SinglePhase.class);
        assertThat(arrived.kelvin() - 273.15).isCloseTo(examples.value("J1.00 T2"), within(0.1));
        assertThat(SteamAir.departureKelvin(arrived.kelvin(), arrived.pascal()))
                .isCloseTo(examples.value("J1.00 superheat"), within(0.1));
    }

    /** First-law example I of the same file: liquid of 121.1 degC vented to 101.325 kPa in one stage. */
    @Test
    void flashesLiquid() {
        Water arrived =
                Throttling.to(101325, Saturated.atKelvin(394.25).liquid().enthalpyJoulePerKilogram());
        assertThat(((WetSteam) arrived).quality()).isCloseTo(examples.value("I single_stage"), within(4e-5));
        assertThat(arrived.pascal()).isEqualTo(101325);
    }

    @Test
    void keepsDrySaturatedSteamOnTheLine() {
        Water dry = Throttling.to(101325, Saturated.atPascal(101325).vapour().enthalpyJoulePerKilogram());
        assertThat(dry)
                .isInstanceOfSatisfying(
                        WetSteam.class, steam -> assertThat(steam.quality()).isEqualTo(1));
    }

    @Test
    void refusesWhatDoesNotBoilBehindTheValve() {
        assertThatThrownBy(() -> Throttling.to(101325, 4e5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Throttling.to(101325, Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Throttling.to(Double.NaN, 2.7e6)).isInstanceOf(OutOfRangeException.class);
    }
}
