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
import org.junit.jupiter.params.provider.EnumSource;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The published shapes of plan and run sheet refuse what the program refuses. */
class PlanSchemaTest {

    private static final JsonMapper JSON = new JsonMapper();
    private static final Schema PLAN = schema("plan-1");
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
            {when: all,            | {when: some,
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

    @Test
    void everythingThatMayBeSaidKeepsTheShape() {
        String full = PlanLanguageTest.FULL + PlanLanguageTest.READING;
        assertThat(PlanLanguageTest.messages(PlanLanguageTest.read(full))).isEmpty();
        assertThat(PLAN.validate(tree(full))).isEmpty();
        assertThat(SHEET.validate(tree(RunSheetReadingTest.FULL))).isEmpty();
    }

    /** Each row: one more section, or one in the place of another. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            '"altitude: 350 m"' | entered
            '"altitude: 350 m"' | '{channel: pressure}'
            '"altitude: 350 m"' | '{altitude: -20 m}'
            mass: 410 kg, specific-heat: 3.55 kJ/(kg K) | 'mass: 410 kg, composition: {water: 0.7, protein: 12 %, fat: 10 %, carbohydrate: 6 %, fibre: 1 %, ash: 0.01}'
            mass: 410 kg, specific-heat: 3.55 kJ/(kg K) | 'materials: [{mass: 12 kg, material: glass}, {mass: 30 kg, material: water}]'
            required: no,     | 'required: no, lag: {value: 6 s, uncertainty: 2 s},'
            required: yes}    | 'required: yes}\n  - {name: water, column: W, quantity: flow, place: water, unit: kg/h}'
            required: yes}    | 'required: yes}\n  - {name: level, column: L, quantity: level, place: water, unit: mm}'
            required: yes}    | 'required: yes}\n  - {name: turns, column: N, quantity: rotation, place: load, unit: rpm}'
            required: yes}    | 'required: yes}\n  - {name: vent, column: V, quantity: state, place: drain, unit: 0/1}'
            when: all         | when: any
            decision: {rule: simple} | 'decision: {rule: simple}\nlimits: [{what: spread, at-most: 1 K, decision: {rule: simple}, alert: 0.5 K, which: each}]'
            """)
    void saysYesTogether(String from, String to) {
        String text = PlanLanguageTest.FULL.replace(from, to.replace("\\n", "\n"));
        assertThat(text).isNotEqualTo(PlanLanguageTest.FULL);
        assertThat(PlanLanguageTest.messages(PlanLanguageTest.read(text))).isEmpty();
        assertThat(PLAN.validate(tree(text))).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(LimitKind.class)
    void everyKindOfLimitIsInTheShape(LimitKind kind) {
        for (Measure measure : kind.measures()) {
            String example = measure.expected().replaceFirst(".* such as ", "");
            String figure = kind == LimitKind.VENT
                    ? "any-of: [{time: 5 min, temperature: 225 degF}]"
                    : "at-most: " + example + (kind.overTime() ? ", over: 30 s" : "");
            String text = PlanLanguageTest.FULL + "limits: [{what: " + kind.word() + ", " + figure
                    + ", phase: hold, places: [chamber], source: TD-07, edition: 2}]\n";
            assertThat(PlanLanguageTest.messages(PlanLanguageTest.read(text))).isEmpty();
            assertThat(PLAN.validate(tree(text))).isEmpty();
            String other = text.replace(figure, "at-most: 3 furlong" + (kind.overTime() ? ", over: 30 s" : ""));
            assertThat(PlanLanguageTest.read(other).problems()).isNotEmpty();
            assertThat(PLAN.validate(tree(other))).isNotEmpty();
        }
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void presetsKeepTheShapeOnceFilledInAndNotBefore(CycleProcess process) {
        String preset = Preset.of(process).text();
        String filled = Filled.plan(preset);
        assertThat(PLAN.validate(tree(preset))).isNotEmpty();
        assertThat(PLAN.validate(tree(filled))).isEmpty();
        Plan plan = PlanLanguageTest.read(filled).value().orElseThrow();
        String sheet = RunSheetDraft.of(plan);
        assertThat(SHEET.validate(tree(sheet))).isNotEmpty();
        assertThat(SHEET.validate(tree(Filled.runSheet(sheet)))).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            steam: supplied       | steam: bought
            volume: 1.9 m3        | volume: 1.9
            volume: 1.9 m3        | volume: -1.9 m3
            material: stainless-steel | material: gold
            temperature: chamber} | temperature: []}
            'mass: 640 kg, '      | ''
            mass: 410 kg,         | 'mass: 410 kg, materials: [{mass: 12 kg, material: glass}],'
            mass: 410 kg, specific-heat: 3.55 kJ/(kg K) | 'mass: 410 kg, composition: {protein: 12 %}'
            specific-heat: 3.55 kJ/(kg K) | specific-heat: 3.55 kJ/kg
            'specific-heat: 3.55 kJ/(kg K), ' | ''
            probes: cold-spot     | probes: centre
            heat-loss: 28 W/K     | heat-loss: 28 W
            3.0 bar(g)            | 3.0 bar
            steam: supplied       | 'steam: supplied\n  colour: grey'
            '"altitude: 350 m"'   | sea level
            '"altitude: 350 m"'   | '{channel: pressure, altitude: 350 m}'
            required: yes         | required: always
            required: no          | '"required": "?"'
            corrections: [{at: 0.0 bar(g) | corrections: [{at: 0.0 bar
            add: -0.2 K           | add: -0.2
            unit: bar             | unit: degC
            quantity: pressure    | quantity: flow
            interruption: fails   | interruption: stops
            equilibration: 30 s   | equilibration: soon
            'depth: 0.3 K, '      | ''
            'source: TD-1'        | 'because: TD-1'
            duration: 42 min      | duration: "?"
            sampling: {hold: 5 s  | sampling: {hold: 5
            judged: [heating      | judged: [boiling
            marks-decide: no      | marks-decide: maybe
            mark-agreement: 60 s  | mark-agreement: 60
            process: retort       | process: leak-test
            process: retort       | process: oven
            'saturation: {air: 1.0 K, superheat: 2.0 K, judged: [heating, hold]}' | ''
            title: Retort R2      | title: "?"
            date: 2026-02-20      | date: 2026-13-20
            encoding: windows-1252 | encoding: EBCDIC
            delimiter: semicolon  | delimiter: ;
            decimal-mark: comma   | decimal-mark: dot
            thousands-mark: space | thousands-mark: dots
            header-line: 4        | header-line: -1
            '[Date, Time]'        | '[Date, Time, Zone]'
            day-month-year        | dd.MM.yyyy
            quoted-line-breaks: no | quoted-line-breaks: never
            largest-refused-share: 1 % | largest-refused-share: many
            what: spread          | what: taste
            what: spread          | what: come-up-time
            at-most: 1.5 K        | at-most: 1.5 degC
            'at-most: 1.5 K, '    | ''
            alert: 1.0 K          | alert: soon
            phase: hold           | phase: simmer
            'places: [reference], ' | 'places: [reference], channels: [chamber], '
            'places: [reference], ' | 'places: [sewer], '
            'places: [reference], ' | 'over: 30 s, '
            'places: [reference], ' | 'any-of: [{time: 5 min, temperature: 107.2 degC}], '
            which: each           | which: most
            'source: TD-07'       | 'source: "?"'
            what: spread          | what: vent
            limits: [{            | 'limits: [{what: pressure-rate, at-most: 0.3 bar/min}, {'
            limits: [{            | 'limits: [{what: pulses, at-least: four}, {'
            limits: [{            | 'limits: [{what: spread, settle: 5 min, at-most: 1 K}, {'
            """)
    void refusesBrokenSectionsAsTheProgramDoes(String from, String to) {
        String whole = PlanLanguageTest.FULL + PlanLanguageTest.READING
                + "limits: [{what: spread, places: [reference], phase: hold, at-most: 1.5 K, alert: 1.0 K, which: each,"
                + " source: TD-07}]\n";
        assertThat(PlanLanguageTest.messages(PlanLanguageTest.read(whole))).isEmpty();
        assertThat(PLAN.validate(tree(whole))).isEmpty();
        String text = whole.replace(from, to.replace("\\n", "\n"));
        assertThat(text).isNotEqualTo(whole);
        assertThat(PlanLanguageTest.read(text).problems()).isNotEmpty();
        assertThat(PLAN.validate(tree(text))).isNotEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            to: 10:10}            | to: noon}
            from: 08:05,          | ''
            wall: 08:13:05        | wall: 8:13
            before: 1.20 kg       | before: 1.20 l
            before: 1.20 kg       | weighed: 1.20 kg
            zone: Europe/Lisbon   | zone: "?"
            at: 08:19, indicating | indicating
            indicating: 107.8 degC | indicating: 107.8
            timing-started: 08:27 | timing-started: "?"
            timing-started: 08:27 | timer-started: 08:27
            '08:45, indicating: 121.6 degC, pressure: 1.07 bar(g)' | '08:45'
            1.07 bar(g)           | 1.07 bar
            'channel: can-1, serial' | serial
            serial: P-17          | number: P-17
            'lot: CI-9, '         | ''
            'result: passed, '    | ''
            phase: hold           | phase: simmer
            starts: 08:28         | 'starts: 08:28, ends: 08:29'
            'starts: 08:28, '     | ''
            'reason: slipped, '   | ''
            2026-03-14T10:32+00:00 | 2026-03-14
            what: door alarm      | what: ""
            'at: 08:50, '         | ''
            'events: ['           | 'signed: ['
            """)
    void refusesBrokenEntriesAsTheProgramDoes(String from, String to) {
        String text = RunSheetReadingTest.FULL.replace(from, to);
        assertThat(text).isNotEqualTo(RunSheetReadingTest.FULL);
        assertThat(RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8))
                        .problems())
                .isNotEmpty();
        assertThat(SHEET.validate(tree(text))).isNotEmpty();
    }

    private static Schema schema(String name) {
        return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(JSON.readTree(PlanSchemaTest.class.getResourceAsStream("schema/" + name + ".schema.json")));
    }

    private static JsonNode tree(String yaml) {
        return JSON.valueToTree(new Load(LoadSettings.builder().build()).loadFromString(yaml));
    }

    private static String sample(String name) throws IOException {
        return Files.readString(Path.of("sample-logs", name));
    }
}
