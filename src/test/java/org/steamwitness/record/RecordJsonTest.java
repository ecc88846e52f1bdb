package org.steamwitness.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.steamwitness.evaluate.Evaluation;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

class RecordJsonTest {

    private static final double FROZEN_LETHALITY = 11.1312627009;
    private static final double FROZEN_SMALLEST_AIR = 0.041449744192;

    @Test
    void writesWithheldValuesAsObjectsAndNeverNull() throws IOException {
        String json = text(Samples.saturatedSteam().record());
        assertThat(json).doesNotContain("null", "NaN", "Infinity", "\r").endsWith("}\n");
        JsonNode energy = new JsonMapper().readTree(json).get("energy");
        assertThat(energy.get("withheld").asString()).isEqualTo("this version of the program does not evaluate energy");
        assertThat(energy.get("missing").isArray()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesNumbersThatAreNotFinite(double value) throws IOException {
        CycleRecord sound = Samples.saturatedSteam().record();
        LethalityPart aim = new LethalityPart(
                "F0",
                value,
                10,
                Given.withheld("none"),
                "min",
                Given.of(6.0),
                Given.withheld("none"),
                "whole run",
                "product",
                List.of(),
                Given.withheld("none"),
                Given.withheld("none"));
        CycleRecord broken = new CycleRecord(
                sound.schema(),
                sound.provenance(),
                sound.reading(),
                sound.run(),
                sound.plan(),
                sound.channels(),
                sound.phases(),
                sound.pulses(),
                sound.saturation(),
                sound.hold(),
                List.of(aim),
                sound.energy(),
                sound.airLeakage(),
                sound.criteria(),
                sound.verdict(),
                sound.findings(),
                sound.notJudged(),
                sound.cautions());
        assertThatThrownBy(() -> RecordJson.write(broken)).hasMessageContaining("finite numbers only");
    }

    @Test
    void readsItsOwnProvenanceAndNoOther() throws IOException {
        CycleRecord record = Samples.saturatedSteam().record();
        assertThat(RecordJson.provenanceIn(RecordJson.write(record))).contains(record.provenance());
        assertThat(RecordJson.provenanceIn("{}".getBytes(StandardCharsets.UTF_8)))
                .isEmpty();
        assertThat(RecordJson.provenanceIn("no json".getBytes(StandardCharsets.UTF_8)))
                .isEmpty();
    }

    /**
     * Our own results for the sample run under evaluation rules 3. A change here needs a decision, a line in the
     * change log and a higher evaluation number.
     */
    @Tag("frozen")
    @Test
    void keepsTheResultsOfTheSampleUnderItsEvaluationNumber() throws IOException {
        CycleRecord record = Samples.saturatedSteam().record();
        assertThat(Evaluation.NUMBER).isEqualTo(3);
        assertThat(record.hold().steps().get(0).provenSeconds()).isEqualTo(2745);
        assertThat(record.lethality().get(0).governing().value().orElseThrow().value())
                .isCloseTo(FROZEN_LETHALITY, within(1e-9));
        assertThat(record.saturation().smallestAirFraction().value().orElseThrow())
                .isCloseTo(FROZEN_SMALLEST_AIR, within(1e-12));
    }

    /**
     * The lethality of the sample's least product probe by another way: the midpoint rule over a thousand slices of
     * each interval, straight from the text of the log.
     */
    @Test
    void theLethalityOfTheSampleIsThatOfAPlainSum() throws IOException {
        List<String> rows = Files.readAllLines(Path.of("sample-logs", "R2-0314.csv"));
        double minutes = 0;
        for (int i = 2; i < rows.size(); i++) {
            double from = Double.parseDouble(rows.get(i - 1).split(",", -1)[5]);
            double to = Double.parseDouble(rows.get(i).split(",", -1)[5]);
            for (int slice = 0; slice < 1000; slice++) {
                double celsius = from + (to - from) * (slice + 0.5) / 1000;
                minutes += Math.pow(10, (celsius - 121.11) / 10) * 5 / 60 / 1000;
            }
        }
        LethalityPart.Governing least = Samples.saturatedSteam()
                .record()
                .lethality()
                .get(0)
                .governing()
                .value()
                .orElseThrow();
        assertThat(least.channel()).isEqualTo("can-1");
        assertThat(least.value()).isCloseTo(minutes, within(1e-6 * minutes));
    }

    private static String text(CycleRecord record) {
        return new String(RecordJson.write(record), StandardCharsets.UTF_8);
    }
}
