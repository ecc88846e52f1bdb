package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureReading;
import org.steamwitness.trace.Delimiter;
import org.steamwitness.trace.TimeForm;
import org.steamwitness.trace.Told;

class PlanLanguageTest {

    static final String FULL = """
            plan-format: 1
            id: R2-stew
            title: Retort R2
            revision: 3
            status: in-force
            basis: {document: SP-114, edition: "2026-02", by: process authority, date: 2026-02-20}
            equipment: R2
            process: retort
            medium: saturated-steam
            chamber:
              steam: supplied
              volume: 1.9 m3
              free-volume: 1.3 m3
              metal: {mass: 640 kg, material: stainless-steel, temperature: chamber}
              load: {mass: 410 kg, specific-heat: 3.55 kJ/(kg K), temperature: [can-1], probes: cold-spot}
              heat-loss: 28 W/K
              maximum-pressure: 3.0 bar(g)
            atmosphere: "altitude: 350 m"
            channels:
              - {name: chamber, column: T1, quantity: temperature, place: reference, unit: degC, required: yes}
              - {name: pressure, column: P1, quantity: pressure, place: chamber, unit: bar, datum: gauge,
                 corrections: [{at: 0.0 bar(g), add: 0.01 bar}, {at: 2.0 bar(g), add: -0.01 bar}]}
              - {name: can-1, column: T5, quantity: temperature, place: product, unit: degC, required: no,
                 corrections: [{at: 0.0 degC, add: 0.1 K}, {at: 121.0 degC, add: -0.2 K}]}
            hold:
              - {at-least: 121.1 degC, at-most: 124.1 degC, duration: 42 min, starts: {when: all, channels: [chamber]},
                 interruption: fails, equilibration: 30 s, allowed-excursion: {depth: 0.3 K, longest: 5 s, source: TD-1}}
              - {at-least: 110 degC, at-most: 115 degC, duration: 5 min, starts: {when: all, channels: [chamber]}}
            sampling: {hold: 5 s, elsewhere: 10 s}
            saturation: {air: 1.0 K, superheat: 2.0 K, judged: [heating, hold]}
            marks-decide: no
            mark-agreement: 60 s
            decision: {rule: simple}
            """;

    @Test
    void readsWhatAPlanMaySay() {
        Plan plan = read(FULL).value().orElseThrow();
        Chamber chamber = plan.chamber().orElseThrow();
        assertThat(chamber.raisedInside()).isFalse();
        assertThat(chamber.volumeCubicMetre()).hasValue(1.9);
        assertThat(chamber.metal()).contains(new Chamber.Metal(640, Material.STAINLESS_STEEL, List.of("chamber")));
        assertThat(chamber.load())
                .contains(new Chamber.Load(
                        new LoadHeat.Stated(410, 3550), List.of("can-1"), Chamber.LoadProbes.COLD_SPOT));
        assertThat(chamber.maximumPressure()).contains(new PressureReading(300_000, Datum.GAUGE));
        assertThat(plan.atmosphere()).isEqualTo(new AtmosphereSource.Altitude(350, "350 m"));
        assertThat(plan.channels()).extracting(PlannedChannel::required).containsExactly(true, true, false);
        assertThat(plan.channels().get(1).corrections())
                .containsExactly(new SensorCorrection(0, 1000), new SensorCorrection(200_000, -1000));
        assertThat(plan.channels().get(2).corrections().get(1)).isEqualTo(new SensorCorrection(121 + 273.15, -0.2));
        assertThat(plan.steps()).hasSize(2);
        assertThat(plan.steps().get(0).interruptionFails()).isTrue();
        assertThat(plan.steps().get(0).equilibrationSeconds()).isEqualTo(30);
        assertThat(plan.steps().get(0).excursion()).contains(new HoldStep.AllowedExcursion(0.3, 5, "TD-1"));
        assertThat(plan.steps().get(1).interruptionFails()).isFalse();
        assertThat(plan.hold().orElseThrow().durationSeconds()).isEqualTo(2520);
        assertThat(plan.sampling()).contains(new Sampling(OptionalDouble.of(5), OptionalDouble.of(10)));
        assertThat(plan.saturation().orElseThrow().judged()).containsExactly(PlannedPhase.HEATING, PlannedPhase.HOLD);
        assertThat(plan.marksDecide()).isFalse();
        assertThat(plan.markAgreementSeconds()).hasValue(60);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            entered                | entered
            '"channel: pressure"'  | channel: pressure
            '{channel: pressure}'  | channel: pressure
            '{altitude: 350 m}'    | altitude: 350 m
            """)
    void takesTheAtmosphereFromThreeSources(String written, String words) {
        String text = FULL.replace("\"altitude: 350 m\"", written);
        assertThat(read(text).value().orElseThrow().atmosphere().words()).isEqualTo(words);
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void everyProcessHasAWordAndOnlyALeakTestHasNoHold(CycleProcess process) {
        String text = FULL.replace("process: retort", "process: " + process.word());
        if (!process.holds()) {
            assertThat(messages(read(text))).singleElement().asString().contains("hold: unknown key");
            text = text.replaceAll("(?s)\nhold:.*\nsampling", "\nsampling");
        }
        Plan plan = read(text).value().orElseThrow();
        assertThat(plan.process()).isEqualTo(process);
        assertThat(plan.hold().isPresent()).isEqualTo(process != CycleProcess.LEAK_TEST);
    }

    @Test
    void asksForLittleUnlessAPlanSaysSo() {
        Plan plan = read(FULL.replaceAll("(?s)sampling:.*?\n", "")
                        .replaceAll("marks-decide:.*\n", "")
                        .replaceAll("mark-agreement:.*\n", "")
                        .replace(", judged: [heating, hold]", ""))
                .value()
                .orElseThrow();
        assertThat(plan.sampling()).isEqualTo(Optional.empty());
        assertThat(plan.marksDecide()).isTrue();
        assertThat(plan.markAgreementSeconds()).isEmpty();
        assertThat(plan.saturation().orElseThrow().judged()).containsExactly(PlannedPhase.HOLD);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            free-volume: 1.3 m3   | free-volume: 2.3 m3  | p.yaml:11:3: chamber: free-volume may not exceed volume
            steam: supplied       | steam: bought        | p.yaml:11:10: chamber.steam: "bought" is not one of: raised-inside, supplied
            temperature: chamber} | temperature: shell}  | p.yaml:10:1: chamber: temperature names "shell", which is no temperature channel
            '"altitude: 350 m"'   | '"channel: can-1"'   | p.yaml:18:1: atmosphere: channel names "can-1", which is no pressure channel
            '"altitude: 350 m"'   | '{}'                 | p.yaml:18:13: atmosphere: expected either channel or altitude
            '"altitude: 350 m"'   | sea level            | p.yaml:18:13: atmosphere: "sea level" is not one of: entered, channel: NAME, altitude: 350 m
            at: 2.0 bar(g)        | at: 3.0 bar(a)       | p.yaml:22:58: channels[1].corrections[1].at: "3.0 bar(a)" is not counted as the channel is; expected (g)
            at: 121.0 degC        | at: 0.0 degC         | p.yaml:23:5: channels[2]: the corrections must stand in rising order of at
            interruption: fails   | interruption: stops  | p.yaml:27:20: hold[0].interruption: "stops" is not one of: fails, restarts
            depth: 0.3 K          | depth: 0 K           | p.yaml:27:67: hold[0].allowed-excursion: depth and longest must exceed zero
            'longest: 5 s, source: TD-1' | 'longest: 5 s' | p.yaml:27:67: hold[0].allowed-excursion.source: required key is missing
            judged: [heating      | judged: [boiling     | p.yaml:30:53: saturation.judged[0]: "boiling" is not one of: standing, air-removal, heating, equilibration, hold, exhaust, drying, cooling, evacuation, settling, test
            marks-decide: no      | marks-decide: false  | p.yaml:31:15: marks-decide: "false" is not one of: yes, no
            """)
    void namesEachMistakeWithItsPlace(String from, String to, String message) {
        assertThat(FULL).contains(from);
        assertThat(messages(read(FULL.replace(from, to)))).containsExactly(message);
    }

    @Test
    void namesWhatItDoesNotJudge() {
        Plan plan =
                read(FULL.replace("process: retort", "process: cooker")).value().orElseThrow();
        RunSheet sheet = RunSheet.read("r.yaml", RunSheetReadingTest.FULL.getBytes(StandardCharsets.UTF_8))
                .value()
                .orElseThrow();
        assertThat(UnjudgedDemands.of(plan, sheet))
                .containsExactly(
                        "process: cooker",
                        "chamber.maximum-pressure",
                        "atmosphere: altitude: 350 m",
                        "corrections of channel pressure",
                        "corrections of channel can-1",
                        "hold steps after the first: 1",
                        "hold.interruption: fails",
                        "hold.equilibration",
                        "hold.allowed-excursion",
                        "sampling",
                        "saturation.judged: heating, hold",
                        "marks-decide: no",
                        "mark-agreement",
                        "correction: start of hold moved to 08:28",
                        "correction: channel can-1 left out");
    }

    /** Each row: a limit, and how it reads. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            what: initial-temperature, at-least: 60 degC                   | initial-temperature, at least 60 degC
            what: time-to-steam-on, at-most: 15 min                        | time-to-steam-on, at most 15 min
            'what: vent, any-of: [{time: 5 min, temperature: 107.2 degC}, {time: 7 min, temperature: 104.4 degC}]' | vent, 5 min at 107.2 degC or 7 min at 104.4 degC
            what: come-up-time, at-least: 3 min, at-most: 12 min           | come-up-time, at least 3 min, at most 12 min
            what: process-time, at-least: 42 min                           | process-time, at least 42 min
            what: holding-time, at-most: 60 min                            | holding-time, at most 60 min
            what: temperature, phase: hold, channels: [chamber], which: mean, at-most: 122 degC | temperature, hold, chamber, mean, at most 122 degC
            what: pressure, phase: cooling, at-least: 1.0 bar(g), at-most: 1.4 bar(g) | pressure, cooling, at least 1.0 bar(g), at most 1.4 bar(g)
            'what: spread, places: [reference, product], phase: hold, at-most: 1.5 K, alert: 1.0 K' | spread, hold, reference, product, at most 1.5 K
            what: recorder-against-indicating, at-most: 0.5 K              | recorder-against-indicating, at most 0.5 K
            what: probe-against-reference, from: 0 s, until: 60 s, at-most: 0.5 K     | probe-against-reference, at most 0.5 K
            what: pulses, at-least: 4                                      | pulses, at least 4
            what: pulse-depth, at-most: 50 mbar(a)                         | pulse-depth, at most 50 mbar(a)
            what: pulse-peak, at-least: 1.5 bar(a)                         | pulse-peak, at least 1.5 bar(a)
            what: cook-value, at-most: 90 min                              | cook-value, at most 90 min
            what: equilibration, at-most: 15 s                             | equilibration, at most 15 s
            what: temperature-rate, over: 1 min, at-most: 2 K/min          | temperature-rate, at most 2 K/min
            what: pressure-rate, over: 30 s, phase: cooling, at-most: 0.3 bar/min | pressure-rate, cooling, at most 0.3 bar/min
            what: overpressure, at-least: 0.2 bar                          | overpressure, at least 0.2 bar
            what: saturation, phase: heating, at-most: 2 K                 | saturation, heating, at most 2 K
            what: lethality, at-least: 6 min                               | lethality, at least 6 min
            what: air-leakage, over: 10 min, settle: 5 min, start-pressure: 7 kPa(a), at-most: 1.3 mbar/min         | air-leakage, at most 1.3 mbar/min
            what: drying, at-least: 10 min                                 | drying, at least 10 min
            what: drying, at-most: 60 mbar(a)                              | drying, at most 60 mbar(a)
            what: cooling-end-temperature, at-most: 40 degC                | cooling-end-temperature, at most 40 degC
            what: load-temperature-at-release, at-most: 80 degC            | load-temperature-at-release, at most 80 degC
            what: flow, at-least: 120 kg/h                                 | flow, at least 120 kg/h
            what: level, at-least: 150 mm                                  | level, at least 150 mm
            what: rotation, at-least: 10 rpm                               | rotation, at least 10 rpm
            what: total-time, at-most: 2 h                                 | total-time, at most 2 h
            what: jacket-above-chamber, at-most: 2 K                       | jacket-above-chamber, at most 2 K
            """)
    void readsEveryLimit(String written, String words) {
        Plan plan = read(FULL + "limits: [{" + written + ", source: TD-07, edition: 2}]\n")
                .value()
                .orElseThrow();
        assertThat(plan.limits()).singleElement().satisfies(limit -> {
            assertThat(limit.words()).isEqualTo(words);
            assertThat(limit.source()).contains("TD-07");
            assertThat(limit.edition()).contains("2");
        });
    }

    /** Each row: a limit, and what is wrong with it. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            what: taste, at-least: 3                             | limits[0].what: "taste" is not one of: initial-temperature, *
            what: spread                                         | limits[0]: a limit needs at-least, at-most or any-of
            what: spread, at-most: 1.5 degC                      | limits[0].at-most: "1.5 degC": a difference of temperatures is written in kelvin, here 1.5 K; *
            what: pressure, at-most: 2 bar                       | limits[0].at-most: "2 bar" does not say what it is counted from; *
            what: pressure, at-least: 1 bar(g), at-most: 3 bar(a) | limits[0]: at-least and at-most must be counted from the same datum
            what: come-up-time, at-least: 12 min, at-most: 3 min | limits[0]: at-least may not lie above at-most
            what: pressure-rate, at-most: 0.3 bar/min            | limits[0].over: required key is missing: a rate needs its window, such as 30 s
            what: level, over: 30 s, at-least: 150 mm            | limits[0].over: this limit has no window of time
            'what: spread, any-of: [{time: 5 min, temperature: 107.2 degC}]' | limits[0].any-of: only the vent has ways of which any suffices
            'what: vent, at-least: 5 min, any-of: [{time: 5 min, temperature: 107.2 degC}]' | limits[0]: any-of stands alone, without at-least and at-most
            'what: spread, places: [reference], channels: [chamber], at-most: 1 K' | limits[0].channels: places are named too; expected one of both
            'what: spread, channels: [drain], at-most: 1 K'      | limits: spread.channels names "drain", which is not among the channels
            what: spread, which: most, at-most: 1 K              | limits[0].which: "most" is not one of: each, any, mean, end
            what: pulses, at-most: 50 mbar(a)                    | limits[0].at-most: "50 mbar(a)" is not a whole number such as 4
            'what: spread, at-most: 1 K, alert: 2 K'             | limits[0]: the alert must lie inside the limit
            'what: spread, at-least: 0 K, at-most: 1 K, alert: 0.5 K' | limits[0]: an alert needs either at-least or at-most beside it
            'what: probe-against-reference, from: 60 s, until: 60 s, at-most: 1 K' | limits[0]: from must come before until
            what: spread, settle: 5 min, at-most: 1 K            | limits[0].settle: unknown key; *
            what: cook-value, name: C100, at-most: 90 min        | limits: name is "C100", which is no lethality of this plan
            what: pulses, at-least: four                         | limits[0].at-least: "four" is not a whole number such as 4
            'what: spread, at-most: 1 K, decision: {rule: guarded, conformance: 95 %}' | channels: a guarded decision needs the uncertainty of channel "chamber"; *
            """)
    void namesMistakesOfLimits(String written, String message) {
        String wanted =
                "p.yaml:[0-9:]+ " + java.util.regex.Pattern.quote(message).replace("*", "\\E.*\\Q");
        assertThat(messages(read(FULL + "limits: [{" + written + "}]\n"))).anyMatch(line -> line.matches(wanted));
    }

    static final String READING = """
            reading: {encoding: windows-1252, delimiter: semicolon, decimal-mark: comma, thousands-mark: space,
              header-line: 4, time-columns: [Date, Time], time-format: day-month-year, quoted-line-breaks: no,
              missing-codes: ["---"], largest-refused-share: 1 %}
            """;

    @Test
    void readsHowALogIsWritten() {
        assertThat(read(FULL + READING).value().orElseThrow().reading())
                .isEqualTo(new Told(
                        Optional.of("windows-1252"),
                        Optional.of(Delimiter.SEMICOLON),
                        Optional.of(','),
                        Optional.of(' '),
                        OptionalInt.of(4),
                        List.of("Date", "Time"),
                        Optional.of(TimeForm.DAY_MONTH_YEAR),
                        false,
                        Set.of("---"),
                        OptionalDouble.of(0.01)));
        assertThat(messages(read(FULL + READING.replace("decimal-mark: comma", "decimal-mark: dot"))))
                .containsExactly("p.yaml:34:71: reading.decimal-mark: \"dot\" is not one of: full stop, comma");
        assertThat(messages(read(FULL + READING.replace("thousands-mark: space", "thousands-mark: comma"))))
                .containsExactly("p.yaml:34:10: reading: decimal-mark and thousands-mark must differ");
    }

    /** Without quotes YAML would take the mark for the start of a key; columns stay those of the file. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            status: in-force       | status: ?              | p.yaml:5:9: status: open place: fill in one of: draft, in-force
            duration: 42 min       | duration: ?            | p.yaml:26:59: hold[0].duration: open place: fill in a duration such as 42 min
            place: product         | place: ?               | p.yaml:23:61: channels[2].place: open place: fill in one of: reference, chamber, drain, free-space, load, product, jacket, wall, water, supply, ambient
            'temperature: [can-1]' | 'temperature: [?]'     | p.yaml:15:69: chamber.load.temperature[0]: open place: fill in text
            mark-agreement: 60 s   | 'mark-agreement: ?   # ask' | p.yaml:32:17: mark-agreement: open place: fill in a duration such as 60 s
            title: Retort R2       | 'title: What is it ?'  | ''
            title: Retort R2       | 'title: "a: ?, b"'     | ''
            """)
    void aBareQuestionMarkIsAnOpenPlaceToo(String from, String to, String message) {
        assertThat(FULL).contains(from);
        AsWritten<Plan> read = read(FULL.replace(from, to));
        assertThat(messages(read)).isEqualTo(message.isEmpty() ? List.of() : List.of(message));
        assertThat(read.problems()).allMatch(problem -> problem.kind() == FindingKind.OPEN_PLACE);
        read.value().ifPresent(plan -> assertThat(plan.title()).contains("?"));
    }

    /** A mistake in one key must not make its neighbours unknown. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            'what: spread, phase: simmer, at-most: 1 K, source: TD-1'       | limits[0].phase: "simmer" is not one of: *
            'what: air-leakage, over: "?", settle: 5 min, at-most: 1 Pa/s'  | limits[0].over: open place: *
            'what: air-leakage, over: 1 min, settle: 5, at-most: 1 Pa/s, source: TD-1' | limits[0].settle: "5" is not a duration *
            """)
    void oneMistakeGivesOneMessage(String limit, String message) {
        String wanted =
                "p.yaml:[0-9:]+ " + java.util.regex.Pattern.quote(message).replace("*", "\\E.*\\Q");
        assertThat(messages(read(FULL + "limits: [{" + limit + "}]\n")))
                .singleElement()
                .asString()
                .matches(wanted);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            'mass: 410 kg, composition: {water: 50 %, fat: 20 %}' | chamber.load: the shares of the composition make up 70.0 %; expected 98 % to 102 %
            'mass: 410 kg'                                        | chamber.load: expected one of: specific-heat, composition, materials
            'mass: heavy, specific-heat: 3.55 kJ/(kg K)'          | chamber.load.mass: "heavy" is not a mass such as 640 kg; *
            'materials: [{mass: 2 kg, material: mud}]'            | chamber.load.materials[0].material: "mud" is not one of: *
            """)
    void namesMistakesOfALoad(String written, String message) {
        String wanted =
                "p.yaml:[0-9:]+ " + java.util.regex.Pattern.quote(message).replace("*", "\\E.*\\Q");
        String text = FULL.replace("mass: 410 kg, specific-heat: 3.55 kJ/(kg K)", written);
        assertThat(text).isNotEqualTo(FULL);
        assertThat(messages(read(text))).singleElement().asString().matches(wanted);
    }

    @Test
    void readsOtherQuantitiesInTheirUnits() {
        String text = FULL.replace(
                "required: yes}",
                "required: yes}\n  - {name: w, column: W, quantity: flow, place: water, unit: kg/h}"
                        + "\n  - {name: l, column: L, quantity: level, place: water, unit: mm}"
                        + "\n  - {name: n, column: N, quantity: rotation, place: load, unit: rpm}"
                        + "\n  - {name: v, column: V, quantity: state, place: drain, unit: 0/1}");
        Plan plan = read(text).value().orElseThrow();
        assertThat(plan.channels().subList(1, 5))
                .extracting(channel -> channel.rule().toSi().applyAsDouble(3600))
                .containsExactly(1.0, 3.6, 60.0, 3600.0);
        assertThat(messages(read(text.replace("unit: mm", "unit: inch"))))
                .singleElement()
                .asString()
                .endsWith("channels[2].unit: \"inch\" is not one of: m, mm");
        assertThat(messages(read(text.replace("unit: mm", "unit: mm, lag: {value: 6 s, uncertainty: 2 s}"))))
                .singleElement()
                .asString()
                .contains("channels[2].lag: unknown key");
    }

    @Test
    void anOpenPlaceSaysWhatToFillIn() {
        String text = FULL.replace("duration: 42 min", "duration: \"?\"")
                .replace("status: in-force", "status: \"?\"")
                .replace(
                        "basis: {document: SP-114, edition: \"2026-02\", by: process authority, date: 2026-02-20}",
                        "basis: \"?\"");
        assertThat(messages(read(text)))
                .containsExactly(
                        "p.yaml:5:9: status: open place: fill in one of: draft, in-force",
                        "p.yaml:6:8: basis: open place: fill in keys and values, one level deeper",
                        "p.yaml:26:59: hold[0].duration: open place: fill in a duration such as 42 min");
    }

    static List<String> messages(AsWritten<?> read) {
        return read.problems().stream()
                .map(f -> f.position().text() + ": " + f.text())
                .toList();
    }

    static AsWritten<Plan> read(String text) {
        return Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
    }
}
