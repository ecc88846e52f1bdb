package org.steamwitness.evaluate.lethality;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.DecimalReduction;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.ProbeChoice;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.Stretch;

class LethalityTest {

    private static final LethalityAim F0 = Bench.aim(121.1, 10, false);

    @Test
    void phasesAddUpToTheTotalAndTheLeastProbeGoverns() {
        Bench bench = bench();
        Lethality result = result(bench);
        ProbeLethality least = result.governing().orElseThrow();
        assertThat(least.channel().name()).isEqualTo("can-1");
        assertThat(least.perPhase().stream()
                        .mapToDouble(ProbeLethality.PhaseValue::seconds)
                        .sum())
                .isCloseTo(least.withCoolingSeconds(), within(1e-9));
        assertThat(least.countedSeconds(F0)).isEqualTo(least.toSteamOffSeconds());
        assertThat(least.toSteamOffSeconds()).isLessThan(least.withCoolingSeconds());
    }

    /** A shared error of e kelvin multiplies F by 10^(e/z): methods of the field, exact by the definition of z. */
    @Test
    void theIntervalIsWhatASharedErrorOfTheSensorWouldChange() {
        ProbeLethality least = result(bench()).governing().orElseThrow();
        double factor = Math.pow(10, 2 * 0.1 / 10);
        assertThat(least.highSeconds() / least.toSteamOffSeconds()).isCloseTo(factor, within(1e-9));
        assertThat(least.toSteamOffSeconds() / least.lowSeconds()).isCloseTo(factor, within(1e-9));
        assertThat(least.surelySeconds()).isBetween(least.lowSeconds(), least.toSteamOffSeconds());
    }

    @Test
    void aGapCountsAsNothing() {
        Bench bench = Bench.at(0, 5, 10, 60, 65, 70)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, 122, 122, 122, 122, 122, 100),
                        Bench.temperature("can-1", Place.PRODUCT, 0.1, 121.1, 121.1, 121.1, 121.1, 121.1, 121.1))
                .aiming(F0);
        ProbeLethality probe = result(bench).probes().get(0);
        assertThat(probe.withCoolingSeconds()).isCloseTo(20, within(1e-9));
        assertThat(probe.coverage().lostSeconds()).isEqualTo(50);
    }

    /**
     * A0 600 is 10 min at 80 degC, 1 min at 90 degC or 100 min at 70 degC; A0 3000 is 5 min at 90 degC: EN ISO 15883,
     * annex B in sense, figures from memory, exact by the definition with 80 degC and z 10 K. The floor of 65 degC is the
     * same annex's, from a secondary source.
     */
    @ParameterizedTest
    @CsvSource({"80, 600, 600", "90, 60, 600", "70, 6000, 600", "90, 300, 3000", "64, 6000, 0"})
    void a0IsTheEquivalentTimeInSecondsAtEightyDegrees(double celsius, double seconds, double a0) {
        LethalityAim aim = new LethalityAim(
                "A0",
                80 + 273.15,
                10,
                OptionalDouble.of(65 + 273.15),
                LethalityUnit.SECOND,
                LethalityAim.Limits.atLeast(600),
                new ProbeChoice(Optional.empty(), List.of("washer")),
                true,
                Optional.empty());
        ProbeLethality probe = washed(aim, celsius, seconds).probes().get(0);
        assertThat(aim.unit().of(probe.countedSeconds(aim))).isCloseTo(a0, within(1e-6));
    }

    /** 15 min at 111 degC equal 1.5 min at 121 degC: a published equivalence of moist-heat sterilization. */
    @Test
    void reachesThePublishedEquivalence() {
        LethalityAim aim = new LethalityAim(
                "F",
                121 + 273.15,
                10,
                OptionalDouble.empty(),
                LethalityUnit.MINUTE,
                LethalityAim.Limits.atLeast(60),
                new ProbeChoice(Optional.empty(), List.of("washer")),
                true,
                Optional.empty());
        ProbeLethality probe = washed(aim, 111, 900).probes().get(0);
        assertThat(aim.unit().of(probe.countedSeconds(aim))).isCloseTo(1.5, within(1e-9));
    }

    /** The cook value C100, by its usual data 100 degC and z 33 K: 33 K hotter counts tenfold, by definition of z. */
    @Test
    void otherKineticsAreDataOfThePlan() {
        LethalityAim aim = new LethalityAim(
                "C100",
                100 + 273.15,
                33,
                OptionalDouble.empty(),
                LethalityUnit.MINUTE,
                new LethalityAim.Limits(OptionalDouble.empty(), OptionalDouble.of(6000)),
                new ProbeChoice(Optional.empty(), List.of("washer")),
                true,
                Optional.empty());
        assertThat(washed(aim, 133, 60).probes().get(0).countedSeconds(aim)).isCloseTo(600, within(1e-6));
        Bench bench = Bench.every(5, 3)
                .with(
                        Bench.temperature("hotter", Place.WATER, 0.1, 121, 121, 121),
                        Bench.temperature("washer", Place.WATER, 0.1, 120, 120, 120));
        LethalityAim both = new LethalityAim(
                "C100",
                100 + 273.15,
                33,
                OptionalDouble.empty(),
                LethalityUnit.MINUTE,
                aim.limits(),
                new ProbeChoice(Optional.empty(), List.of("washer", "hotter")),
                true,
                Optional.empty());
        Lethality most = result(bench.aiming(both));
        assertThat(most.governing().orElseThrow().channel().name()).isEqualTo("hotter");
        assertThat(most.least().orElseThrow().channel().name()).isEqualTo("washer");
    }

    /** Twelve decimal reductions of a spore with D 0.21 min take 2.52 min: the published 12 D cook of canned foods. */
    @Test
    void aDecimalReductionTimeTurnsLethalityIntoPowersOfTen() {
        DecimalReduction spores = new DecimalReduction("spores", 0.21 * 60, "12 D cook");
        assertThat(spores.powersOfTen(2.52 * 60)).isCloseTo(12, within(1e-12));
    }

    /** Two of four equal segments touch the sample outside saturation: half the time and half the lethality. */
    @Test
    void marksWhatASteamProbeGatheredOutsideSaturation() {
        Bench bench = Bench.every(5, 5)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, 121.1, 121.1, 121.1, 121.1, 121.1))
                .aiming(atChamber());
        ProbeLethality probe = Lethality.of(
                        bench.trace(),
                        bench.plan(),
                        Phases.of(bench.trace(), bench.plan()),
                        c -> Optional.of(List.of(new Stretch(2, 2))),
                        0)
                .get(0)
                .probes()
                .get(0);
        assertThat(probe.withCoolingSeconds()).isCloseTo(20, within(1e-9));
        assertThat(probe.marked().orElseThrow().seconds()).isEqualTo(10);
        assertThat(probe.marked().orElseThrow().lethalitySeconds()).isCloseTo(10, within(1e-9));
    }

    @Test
    void marksNothingBehindWhatCounts() {
        Bench bench = Bench.every(5, 7)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, 121.1, 121.1, 121.1, 121.1, 100, 90, 80))
                .aiming(Bench.aim(121.1, 10, false), atChamber());
        Function<BoundChannel, Optional<List<Stretch>>> cooling = c -> Optional.of(List.of(new Stretch(5, 6)));
        List<Lethality> results =
                Lethality.of(bench.trace(), bench.plan(), Phases.of(bench.trace(), bench.plan()), cooling, 0);
        assertThat(results.get(0).probes()).isEmpty();
        MarkedLethality marked = results.get(1).probes().get(0).marked().orElseThrow();
        assertThat(marked.seconds()).isZero();
        assertThat(marked.lethalitySeconds()).isZero();
    }

    @Test
    void theChoiceIsAPlaceOrNames() {
        Bench bench = bench().aiming(atChamber(), Bench.aim(121.1, 10, false));
        List<Lethality> results = Lethality.of(
                bench.trace(), bench.plan(), Phases.of(bench.trace(), bench.plan()), c -> Optional.empty(), 0);
        assertThat(results.get(0).probes()).extracting(p -> p.channel().name()).containsExactly("chamber");
        assertThat(results.get(0).probes().get(0).marked()).isEmpty();
        assertThat(results.get(1).probes()).extracting(p -> p.channel().name()).containsExactly("can-1", "can-2");
        assertThat(results.get(1).greatest().orElseThrow().channel().name()).isEqualTo("can-2");
    }

    @Test
    void theGreatestIsFoundWhereverItStands() {
        Bench bench = Bench.every(5, 3)
                .with(
                        Bench.temperature("can-1", Place.PRODUCT, 0.1, 121, 121, 121),
                        Bench.temperature("can-2", Place.PRODUCT, 0.1, 120, 120, 120))
                .aiming(F0);
        assertThat(result(bench).greatest().orElseThrow().channel().name()).isEqualTo("can-1");
        assertThat(result(bench).governing().orElseThrow().channel().name()).isEqualTo("can-2");
    }

    /** Without a mark steam-off is the last sample of the hold phase: what came behind it is cooling. */
    @Test
    void countsToSteamOffThroughStandingAndHeating() {
        Bench bench = Bench.every(5, 9)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, 20, 100, 122, 122, 122, 122, 100, 60, 60),
                        flat("can-1", 9))
                .marked(5, 10, Double.NaN)
                .aiming(F0);
        ProbeLethality probe = result(bench).probes().get(0);
        assertThat(probe.toSteamOffSeconds()).isCloseTo(25, within(1e-9));
        assertThat(probe.withCoolingSeconds()).isCloseTo(40, within(1e-9));
        assertThat(probe.perPhase()).hasSizeGreaterThan(3);
    }

    /** The mark lies between two samples: the one before it is the last that counts. */
    @Test
    void countsToTheSampleBeforeAnEnteredSteamOff() {
        Bench bench = Bench.every(5, 9)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, 20, 100, 122, 122, 122, 122, 122, 60, 60),
                        flat("can-1", 9))
                .marked(5, 10, 22)
                .aiming(F0);
        assertThat(result(bench).probes().get(0).toSteamOffSeconds()).isCloseTo(20, within(1e-9));
        bench.marked(5, 10, 25);
        assertThat(result(bench).probes().get(0).toSteamOffSeconds()).isCloseTo(25, within(1e-9));
    }

    private static BoundChannel flat(String name, int samples) {
        double[] celsius = new double[samples];
        Arrays.fill(celsius, 121.1);
        return Bench.temperature(name, Place.PRODUCT, 0.1, celsius);
    }

    /** The whole run is shifted by an hour: no sample moves against another, so nothing changes. */
    @Test
    void shiftingTimeChangesNothing() {
        Bench early = Bench.at(0, 5, 10, 20);
        Bench late = Bench.at(3600, 3605, 3610, 3620);
        assertThat(list(late).get(0)).isEqualTo(list(early).get(0));
    }

    private static List<Double> list(Bench bench) {
        bench.with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, 122, 122, 122, 122),
                        Bench.temperature("can-1", Place.PRODUCT, 0.1, 90, 110, 121, 100))
                .aiming(F0);
        return result(bench).probes().stream()
                .map(ProbeLethality::withCoolingSeconds)
                .toList();
    }

    @Test
    void refusesLimitsThatLeaveNoRoom() {
        assertThatThrownBy(() -> LethalityAim.Limits.atLeast(0)).hasMessage("the minimum must exceed zero");
        assertThatThrownBy(() -> new LethalityAim.Limits(OptionalDouble.of(60), OptionalDouble.of(59)))
                .hasMessageContaining("may not lie below the minimum");
        assertThatThrownBy(() -> new LethalityAim.Limits(OptionalDouble.empty(), OptionalDouble.of(0)))
                .hasMessageContaining("must exceed zero");
        assertThatThrownBy(() -> new DecimalReduction("spores", 0, "nobody"))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void withoutAProductProbeNothingGoverns() {
        Bench bench = Bench.every(5, 3)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, 122, 122, 122))
                .aiming(F0);
        assertThat(result(bench).governing()).isEmpty();
    }

    private static LethalityAim atChamber() {
        return new LethalityAim(
                "F0",
                121.1 + 273.15,
                10,
                OptionalDouble.empty(),
                LethalityUnit.MINUTE,
                LethalityAim.Limits.atLeast(10),
                new ProbeChoice(Optional.empty(), List.of("chamber")),
                false,
                Optional.empty());
    }

    private static Lethality washed(LethalityAim aim, double celsius, double seconds) {
        Bench bench = Bench.at(0, seconds)
                .bridging(seconds)
                .with(Bench.temperature("washer", Place.WATER, 0.1, celsius, celsius))
                .aiming(aim);
        return Lethality.of(
                        bench.trace(), bench.plan(), Phases.of(bench.trace(), bench.plan()), c -> Optional.empty(), 0)
                .get(0);
    }

    private static Bench bench() {
        return Bench.every(5, 7)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, 100, 122, 122, 122, 122, 100, 90),
                        Bench.temperature("can-1", Place.PRODUCT, 0.1, 80, 100, 110, 118, 120, 119, 110),
                        Bench.temperature("can-2", Place.PRODUCT, 0.1, 81, 101, 111, 119, 121, 120, 111))
                .aiming(F0);
    }

    private static Lethality result(Bench bench) {
        return Lethality.of(
                        bench.trace(),
                        bench.plan(),
                        Phases.of(bench.trace(), bench.plan()),
                        c -> Optional.empty(),
                        1.645)
                .get(0);
    }
}
