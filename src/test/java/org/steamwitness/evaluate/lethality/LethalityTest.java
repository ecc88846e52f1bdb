package org.steamwitness.evaluate.lethality;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.Place;

class LethalityTest {

    private static final LethalityAim F0 =
            new LethalityAim("F0", 121.1 + 273.15, 10, OptionalDouble.empty(), 10, false);

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

    @Test
    void withoutAProductProbeNothingGoverns() {
        Bench bench = Bench.every(5, 3)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, 122, 122, 122))
                .aiming(F0);
        assertThat(result(bench).governing()).isEmpty();
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
        return Lethality.of(bench.trace(), bench.plan(), Phases.of(bench.trace(), bench.plan()), 1.645)
                .get(0);
    }
}
