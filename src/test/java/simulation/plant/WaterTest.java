package simulation.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Between its knots and beside the saturation line the interpolated water agrees with IAPWS-95. */
class WaterTest {

    private final Water water = new Water();

    static List<double[]> heldOutRows() {
        return Water.rows().stream()
                .filter(row -> row[0] >= 1 && row[0] % 5 != 0)
                .toList();
    }

    static List<double[]> superheatedStates() throws IOException {
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                WaterTest.class.getResourceAsStream("/reference/single-phase-iapws95.csv"), StandardCharsets.UTF_8))) {
            return lines.lines()
                    .filter(line -> line.startsWith("superheated"))
                    .map(line -> List.of(line.split(",", -1)))
                    .map(cells -> cells.subList(1, 6).stream()
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .filter(state -> state[1] <= 510 && state[0] <= 180)
                    .toList();
        }
    }

    @Test
    void rowsAreHeldOutAllAlongTheRangeOfCycles() {
        assertThat(heldOutRows()).hasSizeGreaterThan(25);
    }

    @ParameterizedTest
    @MethodSource("heldOutRows")
    void agreesWithTheRowsBetweenItsKnots(double[] row) {
        double celsius = row[0];
        assertThat(water.pascal(celsius)).isCloseTo(row[1] * 1e3, Percentage.withPercentage(0.002));
        assertThat(water.celsius(row[1] * 1e3)).isCloseTo(celsius, within(0.001));
        assertThat(water.vf(celsius)).isCloseTo(row[2], Percentage.withPercentage(0.002));
        assertThat(water.vg(celsius)).isCloseTo(row[3], Percentage.withPercentage(0.003));
        assertThat(water.uf(celsius)).isCloseTo(row[4] * 1e3, within(20.0));
        assertThat(water.ug(celsius)).isCloseTo(row[5] * 1e3, within(20.0));
        assertThat(water.hf(celsius)).isCloseTo(row[6] * 1e3, within(20.0));
        assertThat(water.hg(celsius)).isCloseTo(row[8] * 1e3, within(40.0));
        assertThat(water.celsiusOfLiquid(water.hf(celsius))).isCloseTo(celsius, within(1e-8));
    }

    @ParameterizedTest
    @MethodSource("superheatedStates")
    void drySteamOfChambersAgreesWithStatesThatItsSplinesHaveNotSeen(double[] row) {
        double celsius = row[0];
        double volume = row[2];
        assertThat(water.dryPascal(celsius, volume)).isCloseTo(row[1] * 1e3, Percentage.withPercentage(0.2));
        assertThat(water.dryEnergy(celsius, volume)).isCloseTo(row[3] * 1e3, within(5_000.0));
        assertThat(water.dryEnthalpy(celsius, row[1] * 1e3)).isCloseTo(row[4] * 1e3, within(5_000.0));
    }

    @Test
    void drySteamBeginsWhereTheSaturationLineEnds() {
        for (double celsius = 3; celsius < 198; celsius += 2.7) {
            assertThat(water.dryPascal(celsius, water.vg(celsius)))
                    .isCloseTo(water.pascal(celsius), Percentage.withPercentage(1e-9));
            assertThat(water.dryEnergy(celsius, water.vg(celsius))).isCloseTo(water.ug(celsius), within(1e-4));
        }
    }
}
