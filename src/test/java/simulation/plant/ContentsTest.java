package simulation.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Rigid vessels, tight: worked examples of the first law, and limits. */
class ContentsTest {

    private final Water water = new Water();

    @Test
    void wetVesselTakesTheHeatOfExampleA() throws IOException {
        Example example = new Example("A");
        Contents vessel = new Contents(water, 0.025, 0.5, 0, 20);
        assertThat(vessel.state().quality()).isCloseTo(example.value("x1"), Example.CLOSE);
        vessel.heat(example.value("Q") * 1e3);
        assertThat(vessel.state().celsius()).isCloseTo(121.1, within(0.05));
        assertThat(vessel.state().pascal()).isCloseTo(example.value("p2") * 1e3, Example.CLOSE);
        assertThat(vessel.state().quality()).isCloseTo(example.value("x2"), Example.CLOSE);
        assertThat(vessel.joule() / 0.5).isCloseTo(example.value("u2") * 1e3, Example.CLOSE);
    }

    @Test
    void vesselDriesOutAsInExampleB() throws IOException {
        Example example = new Example("B");
        Contents vessel = new Contents(water, 0.1, 0.1, 0, 60);
        double before = vessel.joule();
        vessel.heat(example.value("Q_to_dryout") * 0.9999e3);
        assertThat(vessel.state().dry()).isFalse();
        assertThat(vessel.state().celsius()).isCloseTo(example.value("T_dryout"), within(0.1));
        vessel.heat((example.value("Q") - example.value("Q_to_dryout") * 0.9999) * 1e3);
        assertThat(vessel.state().dry()).isTrue();
        assertThat(vessel.state().pascal()).isCloseTo(example.value("p2") * 1e3, Example.CLOSE);
        assertThat(vessel.state().celsius() - water.celsius(vessel.state().pascal()))
                .isCloseTo(example.value("superheat"), Percentage.withPercentage(5));
        assertThat(new Contents(water, 0.1, 0.1, 0, 140).joule() - before)
                .isCloseTo(example.value("Q") * 1e3, Example.CLOSE);
    }

    @Test
    void airStaysInTheVesselAsInExampleC() throws IOException {
        Example example = new Example("C");
        Contents air = Contents.moistAir(water, 0.02, 20, 101_325, 1, 0.3 - example.value("x1") * 0.3);
        assertThat(air.airKg()).isCloseTo(example.value("m_air"), Example.CLOSE);
        Contents vessel = new Contents(water, 0.02, 0.3, example.value("m_air"), 20);
        double before = vessel.joule();
        Contents hot = new Contents(water, 0.02, 0.3, example.value("m_air"), 115);
        assertThat(hot.joule() - before).isCloseTo(example.value("Q") * 1e3, Example.CLOSE);
        vessel.heat(example.value("Q") * 1e3);
        GasState state = vessel.state();
        assertThat(state.celsius()).isCloseTo(115, within(0.1));
        assertThat(state.airPascal()).isCloseTo(example.value("p_air2") * 1e3, Example.CLOSE);
        assertThat(state.pascal()).isCloseTo(example.value("p_total2") * 1e3, Example.CLOSE);
        assertThat(state.airShare()).isCloseTo(example.value("y_air_equiv"), Example.CLOSE);
    }

    @Test
    void steamShutInCondensesAsInExampleF() throws IOException {
        Example example = new Example("F");
        Contents vessel = new Contents(water, 0.1, example.value("m"), 0, 134);
        vessel.heat(example.value("Q") * 1e3);
        assertThat(vessel.state().celsius()).isCloseTo(40, within(0.1));
        assertThat(vessel.state().liquidKg()).isCloseTo(example.value("condensate"), Example.CLOSE);
    }

    @Test
    void withoutAirAWetVesselFollowsTheSaturationLine() {
        Contents vessel = new Contents(water, 0.03, 0.4, 0, 15);
        while (vessel.state().celsius() < 150) {
            vessel.heat(9_000);
            assertThat(water.celsius(vessel.state().pascal()))
                    .isCloseTo(vessel.state().celsius(), within(1e-6));
        }
    }

    @Test
    void airAloneIsAnIdealGas() {
        Contents vessel = new Contents(water, 0.5, 0, 0.6, 20);
        double before = vessel.state().pascal();
        vessel.heat(0.6 * 718 * 100);
        assertThat(vessel.state().celsius()).isCloseTo(120, within(1e-6));
        assertThat(vessel.state().pascal()).isCloseTo(before * 393.15 / 293.15, Percentage.withPercentage(1e-6));
    }

    @Test
    void aVesselFullOfLiquidIsRefused() {
        Contents vessel = new Contents(water, 0.01, 9.6, 0, 20);
        assertThatThrownBy(() -> vessel.heat(9.6 * 4200 * 120)).isInstanceOf(IllegalStateException.class);
    }
}
