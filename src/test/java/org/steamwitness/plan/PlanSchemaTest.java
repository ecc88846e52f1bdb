package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The published shapes of plan and run sheet refuse what the program refuses. */
class PlanSchemaTest {

    private static final JsonMapper JSON = new JsonMapper();
    private static final String LIMITS = """
            limits:
              - {what: vent, any-of: [{time: 5 min, temperature: 107.2 degC}], source: schedule}
              - {what: spread, places: [reference, drain], phase: hold, at-most: 1.5 K, alert: 1.0 K}
              - {what: pressure-rate, over: 30 s, phase: cooling, at-most: 0.3 bar/min}
              - {what: pulses, at-least: 4}
              - {what: air-leakage, at-most: 1.3 mbar/min, decision: {rule: simple}}
            """;
    static final Schema PLAN = schema("plan-1");
    private static final Schema SHEET = schema("run-1");

    @Test
    void theSampleKeepsBothShapes() throws IOException {
        assertThat(PLAN.validate(tree(sample("R2-0314.plan.yaml")))).isEmpty();
        assertThat(SHEET.validate(tree(sample("R2-0314.run.yaml")))).isEmpty();
    }

    @Test
    void lagAndScanDelayKeepTheShape() throws IOException {
        String text = sample("R2-0314.plan.yaml")
                .replace("longest-gap: 10 s", "longest-gap: 10 s\nscan-delay: 2 s")
                .replace("place: drain, ", "place: drain, lag: {value: 6 s, uncertainty: 2 s}, ");
        Plan plan = Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8))
                .value()
                .orElseThrow();
        assertThat(plan.channels().get(1).lag()).contains(new PlannedChannel.Lag(6, 1));
        assertThat(plan.scanDelaySeconds()).isEqualTo(2);
        assertThat(PLAN.validate(tree(text))).isEmpty();
    }

    @Test
    void everyEntryKeepsBothShapes() {
        assertThat(PLAN.validate(tree(PlanLanguageTest.FULL + PlanLanguageTest.READING + LIMITS)))
                .isEmpty();
        assertThat(PlanLanguageTest.read(PlanLanguageTest.FULL + PlanLanguageTest.READING + LIMITS)
                        .problems())
                .isEmpty();
        assertThat(SHEET.validate(tree(RunSheetReadingTest.FULL))).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            steam: supplied       | steam: bought
            heat-loss: 28 W/K     | heat-loss: 28 W
            material: stainless-steel | material: wood
            '"altitude: 350 m"'   | '"altitude: 350"'
            required: no          | required: perhaps
            add: 0.1 K            | add: 0.1 degC
            interruption: fails   | interruption: stops
            'longest: 5 s, source: TD-1' | 'longest: 5 s'
            marks-decide: no      | marks-decide: never
            sampling: {hold: 5 s  | sampling: {hold: 5
            judged: [heating      | judged: [boiling
            decimal-mark: comma   | decimal-mark: dot
            largest-refused-share: 1 % | largest-refused-share: 2
            what: spread          | what: taste
            at-most: 1.5 K        | at-most: 1.5 degC
            'over: 30 s, '        | ''
            at-most: 0.3 bar/min  | at-most: 0.3 bar
            'at-least: 4}'        | 'at-least: four}'
            'temperature: 107.2 degC}' | 'pressure: 1 bar(g)}'
            process: retort       | process: leak-test
            """)
    void refusesBrokenEntriesAsTheProgramDoes(String from, String to) {
        String whole = PlanLanguageTest.FULL + PlanLanguageTest.READING + LIMITS;
        assertThat(whole).contains(from);
        String text = whole.replace(from, to);
        assertThat(PlanLanguageTest.read(text).problems()).isNotEmpty();
        assertThat(PLAN.validate(tree(text))).isNotEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            wall: 08:13:05      | wall: noon
            after: 930 g        | after: 930
            'indicating: 121.6 degC, pressure: 1.07 bar(g)' | ''
            'starts: 08:28'     | 'starts: 08:28, ends: 08:29'
            'reason: slipped, ' | ''
            'result: passed, '  | ''
            """)
    void refusesBrokenSheetEntriesAsTheProgramDoes(String from, String to) {
        assertThat(RunSheetReadingTest.FULL).contains(from);
        String text = RunSheetReadingTest.FULL.replace(from, to);
        assertThat(RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8))
                        .problems())
                .isNotEmpty();
        assertThat(SHEET.validate(tree(text))).isNotEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            plan-format: 1         | plan-format: 2
            title: Retort          | titel: Retort
            revision: 3            | revision: 0
            revision: 3            | revision: three
            status: in-force       | status: released
            process: retort        | process: cannery
            process: retort        | process:
            medium: saturated-steam | medium: air
            atmosphere: entered    | atmosphere: 1013 hPa
            121.1 degC             | 121,1 degC
            121.1 degC             | 121.1
            121.1 degC             | 121.1 K(a)
            42 min                 | 42
            42 min                 | 42 minutes
            42 min                 | -42 min
            datum: gauge           | datum: gage
            datum: gauge,          | ''
            quantity: pressure     | quantity: flow
            place: drain           | place: sewer
            contact: sealed        | contact: dry
            coverage: 2            | coverage: 7
            calibration: 0.02 bar  | calibration: 0.02 K
            calibration: 0.2 K     | calibration: 0.2 degC
            due: 2027-01-15        | due: 15.01.2027
            longest-gap: 10 s      | 'longest-gap: 10 s\nscan-delay: 2'
            'unit: degC,\n     uncertainty' | 'unit: degC, lag: {value: 6 s},\n     uncertainty'
            'unit: bar, '          | 'unit: bar, lag: {value: 6 s, uncertainty: 2 s}, '
            air: 1.0 K             | air: 1.0 degC
            {when: all,            | {when: any,
            conformance: 95 %      | conformance: 0.95
            rule: guarded          | rule: strict
            {rule: guarded, conformance: 95 %} | {rule: simple, conformance: 95 %}
            floor: none            | floor: nothing
            channels: product      | channels: jacket
            channels: product      | channels: []
            minimum: 6.0 min       | unit: h
            minimum: 6.0 min       | decimal-reduction: {of: spores, time: 12 s}
            cooling: counted       | cooling: yes
            required: [zone        | required: [zon
            id: R2-stew-73x111     | id: [R2]
            """)
    void refusesBrokenPlansAsTheProgramDoes(String from, String to) throws IOException {
        String text = sample("R2-0314.plan.yaml").replace(from.replace("\\n", "\n"), to.replace("\\n", "\n"));
        assertThat(text).isNotEqualTo(sample("R2-0314.plan.yaml"));
        assertThat(Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8)).problems())
                .isNotEmpty();
        assertThat(PLAN.validate(tree(text))).isNotEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            run-format: 1          | run-format: 3
            run: R2-0314           | runs: R2-0314
            revision: 3            | revision: 3.5
            atmosphere: 1008 hPa   | atmosphere: 1008
            atmosphere: 1008 hPa   | atmosphere: 1.0 bar(g)
            count: 1240            | count: many
            count: 1240            | count: 0
            lots: [L2291]          | lots: []
            68.0 degC              | warm
            steam-on: 08:12        | steam-on: 8:12
            vent-closed: 08:19     | vent-closed: 25:19
            steam-off: 09:10       | steam-of: 09:10
            at: 2026-03-14T10:31+00:00 | at: 2026-03-14
            by: operator 4,        | ''
            """)
    void refusesBrokenRunSheetsAsTheProgramDoes(String from, String to) throws IOException {
        String text = sample("R2-0314.run.yaml").replace(from, to);
        assertThat(text).isNotEqualTo(sample("R2-0314.run.yaml"));
        assertThat(RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8))
                        .problems())
                .isNotEmpty();
        assertThat(SHEET.validate(tree(text))).isNotEmpty();
    }

    private static Schema schema(String name) {
        return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(JSON.readTree(PlanSchemaTest.class.getResourceAsStream("schema/" + name + ".schema.json")));
    }

    static JsonNode tree(String yaml) {
        return JSON.valueToTree(new Load(LoadSettings.builder().build()).loadFromString(yaml));
    }

    private static String sample(String name) throws IOException {
        return Files.readString(Path.of("sample-logs", name));
    }
}
