package org.steamwitness.evaluate.saturation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.trace.Place;

class SaturationCheckTest {

    private static final double Z_95 = 1.6449;

    /**
     * Dalton's law with saturation pressures of IAPWS-95, reference/air-fraction.csv: 5e-4 in the air fraction, 0.01 K
     * in the departure.
     */
    @ParameterizedTest(name = "{0} degC at {1} kPa")
    @CsvFileSource(resources = "/reference/air-fraction.csv", useHeadersInDisplayName = true)
    void agreesWithDaltonsLaw(
            double celsius, double kilopascal, double saturation, double air, double boiling, double departure) {
        Departure measured = departure(0.1, 1, celsius, kilopascal);
        assertThat(measured.airFractionAt(0)).isCloseTo(air, within(5e-4));
        assertThat(measured.kelvinAt(0)).isCloseTo(departure, within(0.01));
    }

    /** Law of propagation with slopes of IAPWS-95, reference/uncertainty-dT.csv, to 1e-4 K. */
    @ParameterizedTest(name = "{0} degC, u(T) {2} K, u(p) {3} kPa")
    @CsvFileSource(resources = "/reference/uncertainty-dT.csv", useHeadersInDisplayName = true)
    void propagatesBothUncertainties(double celsius, double slope, double uKelvin, double uKilopascal, double u) {
        double kilopascal = org.steamwitness.steam.Saturation.pascalAt(celsius + 273.15) / 1000;
        assertThat(departure(uKelvin, uKilopascal, celsius, kilopascal).uncertaintyAt(0))
                .isCloseTo(u, within(1e-4));
    }

    @Test
    void cleanSteamHasNoEpisode() {
        SaturationCheck check = check(series(122, 30), 0.1, 1);
        assertThat(check.episodes()).isEmpty();
        assertThat(check.notJudged()).isEmpty();
    }

    @Test
    void aDeepDipIsConfirmedAir() {
        double[] celsius = series(122, 30);
        Arrays.fill(celsius, 10, 16, 120.3);
        List<Episode> episodes = check(celsius, 0.1, 1).episodes();
        assertThat(episodes).hasSize(1);
        Episode episode = episodes.get(0);
        assertThat(episode.confirmed()).isTrue();
        assertThat(episode.kind()).isEqualTo(Episode.Kind.AIR);
        assertThat(episode.from()).isEqualTo(10);
        assertThat(episode.to()).isEqualTo(15);
        assertThat(episode.worstKelvin()).isCloseTo(-1.7, within(0.01));
        assertThat(episode.airFractionHighest()).isBetween(0.04, 0.06);
    }

    @Test
    void aDipWithinTheUncertaintyIsOnlyPossible() {
        double[] celsius = series(122, 30);
        Arrays.fill(celsius, 10, 16, 120.8);
        assertThat(check(celsius, 0.1, 1).episodes())
                .extracting(Episode::confirmed)
                .containsExactly(false);
    }

    @Test
    void whatIsHotterThanSaturationIsSuperheat() {
        double[] celsius = series(122, 30);
        Arrays.fill(celsius, 10, 16, 124.0);
        double[] kilopascal = series(205, 30);
        List<Episode> episodes = check(celsius, kilopascal, 0.05, 0.1).episodes();
        assertThat(episodes).extracting(Episode::kind).containsOnly(Episode.Kind.SUPERHEAT);
    }

    @Test
    void joinsWhatLiesCloseTogetherAndForgetsWhatIsShort() {
        double[] celsius = series(122, 40);
        celsius[5] = 120.0;
        celsius[20] = 120.0;
        celsius[21] = 120.0;
        celsius[23] = 120.0;
        List<Episode> episodes = check(celsius, 0.1, 1).episodes();
        assertThat(episodes).hasSize(1);
        assertThat(episodes.get(0).from()).isEqualTo(20);
        assertThat(episodes.get(0).to()).isEqualTo(23);
    }

    /** Two samples 5 s apart lasted 5 s at least and 15 s at most: possible, with 10 s as the shortest. */
    @Test
    void whatMayHaveLastedLongEnoughIsPossible() {
        double[] celsius = series(122, 40);
        Arrays.fill(celsius, 5, 7, 118.0);
        assertThat(check(celsius, 0.1, 1).episodes())
                .extracting(Episode::confirmed)
                .containsExactly(false);
    }

    @Test
    void faultCodesOfAProbeAreCountedAndNotJudged() {
        double[] celsius = series(122, 30);
        celsius[12] = 850;
        celsius[13] = -200;
        SaturationCheck check = check(celsius, 0.1, 1);
        assertThat(check.episodes()).isEmpty();
        assertThat(check.perPhase()).anyMatch(p -> p.states().getOrDefault(SampleState.NOT_JUDGED, 0) == 2);
    }

    @Test
    void samplesOffTheSaturationLineAreNotJudged() {
        assertThat(departure(0.1, 1, 20, 0.3).kelvinAt(0)).isNaN();
        assertThat(departure(0.1, 1, Double.NaN, 205).kelvinAt(0)).isNaN();
        assertThat(departure(0.1, 1, 850, 205).kelvinAt(0)).isNaN();
        assertThat(departure(0.1, 1, -200, 205).kelvinAt(0)).isNaN();
    }

    /** 1 K of tolerance and 1.645 u at 122 degC: 0.155 K/kPa gives 3.3 % of air a kelvin (IAPWS-95). */
    @Test
    void saysHowLittleAirItCouldHaveShown() {
        SaturationCheck check = check(series(122, 30), 0.1, 1);
        Phases phases = phases(series(122, 30));
        assertThat(check.smallestAirFraction(phases.hold().orElseThrow()).orElseThrow())
                .isCloseTo((1 + Z_95 * 0.183) / (211.6 * 0.1507), within(5e-4));
    }

    private static Departure departure(double uKelvin, double uKilopascal, double celsius, double kilopascal) {
        Bench bench = Bench.at(0)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, uKelvin, celsius),
                        Bench.pressure(uKilopascal, kilopascal));
        Instruments instruments = Instruments.of(bench.trace(), bench.plan());
        return new Departure(
                instruments.channels().get(0),
                instruments.channels().get(1),
                SaturationColumns.of(instruments.channels().get(1).channel().values()),
                bench.trace().seconds(),
                bench.plan());
    }

    private static SaturationCheck check(double[] celsius, double uKelvin, double uKilopascal) {
        return check(celsius, series(211.589, celsius.length), uKelvin, uKilopascal);
    }

    private static SaturationCheck check(double[] celsius, double[] kilopascal, double uKelvin, double uKilopascal) {
        Bench bench = Bench.every(5, celsius.length)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, uKelvin, series(122, celsius.length)),
                        Bench.temperature("drain", Place.DRAIN, uKelvin, celsius),
                        Bench.pressure(uKilopascal, kilopascal));
        Instruments instruments = Instruments.of(bench.trace(), bench.plan());
        Phases phases = Phases.of(bench.trace(), bench.plan());
        return SaturationCheck.of(bench.trace(), bench.plan(), instruments, phases, Z_95);
    }

    private static Phases phases(double[] celsius) {
        Bench bench = Bench.every(5, celsius.length).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius));
        return Phases.of(bench.trace(), bench.plan());
    }

    private static double[] series(double value, int size) {
        double[] values = new double[size];
        Arrays.fill(values, value);
        return values;
    }
}
