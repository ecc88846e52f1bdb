package org.steamwitness.evaluate.hold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.Place;

class HoldResultTest {

    private static final BoundChannel CHAMBER =
            Bench.temperature("chamber", Place.REFERENCE, 0.13, 100, 122, 122, 123, 122, 122, 100);
    private static final BoundChannel DRAIN =
            Bench.temperature("drain", Place.DRAIN, 0.13, 100, 121.5, 121.4, 121.9, 121.6, 121.2, 100);

    @Test
    void theMeanIsWeightedByTimeAndExtremesAreSamples() {
        ProbeInHold chamber =
                hold(Bench.at(0, 5, 10, 15, 20, 30, 35), CHAMBER).probes().get(0);
        assertThat(chamber.lowestKelvin()).isEqualTo(122 + 273.15);
        assertThat(chamber.lowestIndex()).isEqualTo(1);
        assertThat(chamber.highestKelvin()).isEqualTo(123 + 273.15);
        assertThat(chamber.meanKelvin()).isCloseTo(122.2 + 273.15, within(1e-9));
        assertThat(chamber.samples()).isEqualTo(5);
    }

    /** Law of propagation, JCGM 100:2008: two independent sensors of 0.13 K differ by 0.13 K times the root of two. */
    @Test
    void theSpreadNamesItsProbesAndCarriesBothUncertainties() {
        Spread spread = hold(Bench.every(5, 7), CHAMBER, DRAIN).spread().orElseThrow();
        assertThat(spread.kelvin()).isCloseTo(1.1, within(1e-9));
        assertThat(spread.index()).isEqualTo(3);
        assertThat(spread.hottest().name()).isEqualTo("chamber");
        assertThat(spread.coldest().name()).isEqualTo("drain");
        assertThat(spread.uncertaintyKelvin().orElseThrow()).isCloseTo(0.13 * Math.sqrt(2), within(0.02));
    }

    /** 0.13 K of which 0.12 K are shared leave 0.05 K to each sensor: 5, 12, 13 make a right-angled triangle. */
    @Test
    void whatBothSensorsShareDoesNotWidenTheirSpread() {
        BoundChannel first = Bench.sharing(flat("chamber", Place.REFERENCE, 122), 0.12);
        BoundChannel second = Bench.sharing(flat("drain", Place.DRAIN, 121.5), 0.12);
        assertThat(hold(Bench.every(5, 7), first, second)
                        .spread()
                        .orElseThrow()
                        .uncertaintyKelvin()
                        .orElseThrow())
                .isCloseTo(0.05 * Math.sqrt(2), within(1e-12));
        assertThat(hold(Bench.every(5, 7), first, flat("drain", Place.DRAIN, 121.5))
                        .spread()
                        .orElseThrow()
                        .uncertaintyKelvin()
                        .orElseThrow())
                .isCloseTo(0.13 * Math.sqrt(2), within(1e-12));
    }

    @Test
    void oneProbeHasNoSpread() {
        assertThat(hold(Bench.every(5, 7), CHAMBER).spread()).isEmpty();
        assertThat(hold(Bench.every(5, 7), CHAMBER, Bench.temperature("can-1", Place.PRODUCT, 0.1, 1, 2, 3, 4, 5, 6, 7))
                        .spread())
                .isEmpty();
    }

    private static BoundChannel flat(String name, Place place, double celsius) {
        return Bench.temperature(name, place, 0.13, celsius, celsius, celsius, celsius, celsius, celsius, celsius);
    }

    private static HoldResult hold(Bench bench, BoundChannel... channels) {
        bench.with(channels);
        Instruments instruments = Instruments.of(bench.trace(), bench.plan());
        return HoldResult.of(bench.trace(), bench.plan(), instruments, Phases.of(bench.trace(), bench.plan()));
    }
}
