package org.steamwitness.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** A run that meets its plan no longer does once the plan asks for more than this version judges. */
class UnheededPlanTest {

    @Test
    void theSampleItselfMeetsItsPlan() throws IOException {
        assertThat(Samples.saturatedSteam().record().verdict().outcome()).isEqualTo("met");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            process: retort         | process: gravity
            process: retort         | process: study
            atmosphere: entered     | 'atmosphere: {altitude: 350 m}'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nsampling: {hold: 5 s}'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nmark-agreement: 60 s'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nmarks-decide: no'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nchamber: {steam: supplied, maximum-pressure: 3.0 bar(g)}'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nlimits: [{what: spread, at-most: 1.5 K}]'
            longest-gap: 10 s       | 'longest-gap: 10 s\\nlimits: [{what: vent, any-of: [{time: 5 min, temperature: 107.2 degC}]}]'
            {when: all,             | {when: any,
            set-point: 122.0 degC   | interruption: fails
            set-point: 122.0 degC   | equilibration: 30 s
            set-point: 122.0 degC   | 'allowed-excursion: {depth: 0.3 K, longest: 5 s, source: TD-1}'
            place: drain,           | 'place: drain, corrections: [{at: 121 degC, add: 0.1 K}],'
            shortest: 10 s          | 'judged: [heating]'
            """)
    void nothingThatIsNotJudgedPassesInSilence(String from, String to) throws IOException {
        CycleRecord record = Samples.changed(
                        UnheededPlanTest::same,
                        plan -> {
                            String changed = plan.replace(from, to.replace("\\n", "\n"));
                            assertThat(changed).isNotEqualTo(plan);
                            return changed;
                        },
                        UnheededPlanTest::same)
                .record();
        assertThat(record.verdict().outcome()).isEqualTo("undecided");
        assertKeepsItsShape(record);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            run-format: 1 | 'corrections: [{channel: can-1, reason: slipped, by: J., at: 2026-03-14T10:31+00:00}]' | undecided
            run-format: 1 | 'readings: [{at: 08:45, indicating: 121.6 degC}]'                                   | met
            run-format: 1 | 'events: [{at: 08:50, what: door alarm}]'                                           | met
            """)
    void entriesAreHeededOrNamed(String after, String entry, String outcome) throws IOException {
        CycleRecord record = Samples.changed(
                        UnheededPlanTest::same,
                        UnheededPlanTest::same,
                        sheet -> sheet.replace(after, after + "\n" + entry))
                .record();
        assertThat(record.verdict().outcome()).isEqualTo(outcome);
        assertThat(record.findings())
                .extracting(FindingPart::text)
                .anyMatch(text -> text.contains(entry.substring(0, entry.indexOf(':')))
                        || text.contains("channel can-1 left out"));
        assertKeepsItsShape(record);
    }

    @Test
    void aLimitCarriesItsOwnSourceEditionRuleAndUnits() throws IOException {
        CycleRecord record = Samples.changed(
                        UnheededPlanTest::same,
                        plan -> plan + "limits: [{what: initial-temperature, at-least: 60 degC, source: study TD-07,"
                                + " edition: \"2\", decision: {rule: simple}}, {what: pressure, phase: hold,"
                                + " at-most: 1.4 bar(g)}]\n",
                        UnheededPlanTest::same)
                .record();
        CriterionPart own = criterion(record, "limit-1-initial-temperature-least");
        assertThat(own.limit()).isEqualTo(60);
        assertThat(own.unit()).isEqualTo("°C");
        assertThat(own.source()).isEqualTo("study TD-07");
        assertThat(own.edition()).isEqualTo("2");
        assertThat(own.rule()).isEqualTo("simple");
        assertThat(own.why()).isEqualTo("not judged by this version");
        CriterionPart other = criterion(record, "limit-2-pressure-most");
        assertThat(other.limit()).isEqualTo(140);
        assertThat(other.unit()).isEqualTo("kPa gauge");
        assertThat(other.source()).isEqualTo("SP-114");
        assertThat(other.rule()).isEqualTo("guarded");
        assertKeepsItsShape(record);
    }

    @Test
    void aChannelThatIsNotEvaluatedIsCountedAndNamed() throws IOException {
        CycleRecord record = Samples.changed(
                        UnheededPlanTest::same,
                        plan -> plan.replace(
                                        "hold:\n",
                                        "  - {name: turns, column: T3 free space, quantity: rotation, place: load, unit: rpm}\nhold:\n")
                                .replaceFirst("  - \\{name: free-space[^\n]*\n[^\n]*\n", ""),
                        UnheededPlanTest::same)
                .record();
        assertThat(record.verdict().outcome()).isEqualTo("met");
        assertThat(record.channels())
                .filteredOn(channel -> channel.name().equals("turns"))
                .singleElement()
                .satisfies(channel -> {
                    assertThat(channel.quantity()).isEqualTo("rotation");
                    assertThat(channel.samples())
                            .isEqualTo(record.channels().get(0).samples());
                    assertThat(channel.highest().value()).isEmpty();
                });
        assertThat(record.findings())
                .extracting(FindingPart::text)
                .contains("The channel turns measures rotation, which this version reads and does not evaluate.");
        assertKeepsItsShape(record);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            pulses, at-least: 4                              | 4   | 1
            temperature-rate, over: 1 min, at-most: 2 K/min  | 2   | K/min
            pressure-rate, over: 30 s, at-most: 0.3 bar/min  | 30  | kPa/min
            flow, at-least: 120 kg/h                         | 120 | kg/h
            level, at-least: 0.15 m                          | 150 | mm
            rotation, at-least: 10 rpm                       | 10  | 1/min
            overpressure, at-least: 0.2 bar                  | 20  | kPa
            pulse-depth, at-most: 50 mbar(a)                 | 5   | kPa absolute
            total-time, at-most: 2 h                         | 7200 | s
            """)
    void limitsAreToldInTheUnitsThatPeopleRead(String limit, double figure, String unit) throws IOException {
        CycleRecord record = Samples.changed(
                        UnheededPlanTest::same,
                        plan -> plan + "limits: [{what: " + limit + "}]\n",
                        UnheededPlanTest::same)
                .record();
        CriterionPart part = record.criteria().get(record.criteria().size() - 1);
        assertThat(part.limit()).isCloseTo(figure, within(1e-9));
        assertThat(part.unit()).isEqualTo(unit);
        assertKeepsItsShape(record);
    }

    private static String same(String text) {
        return text;
    }

    private static CriterionPart criterion(CycleRecord record, String id) {
        return record.criteria().stream()
                .filter(criterion -> criterion.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private static void assertKeepsItsShape(CycleRecord record) {
        JsonMapper json = new JsonMapper();
        JsonNode shape = json.readTree(UnheededPlanTest.class.getResourceAsStream("schema/record-1.schema.json"));
        JsonNode tree = json.readTree(new String(RecordJson.write(record), StandardCharsets.UTF_8));
        assertThat(SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                        .getSchema(shape)
                        .validate(tree))
                .isEmpty();
    }
}
