package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.finding.Finding;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;

class PlanReadingTest {

    private static final String PLAN = sample("R2-0314.plan.yaml");
    private static final String SHEET = sample("R2-0314.run.yaml");

    @Test
    void readsThePlanOfTheSample() {
        Plan plan = plan(PLAN).value().orElseThrow();
        assertThat(plan.id()).isEqualTo("R2-stew-73x111");
        assertThat(plan.status()).isEqualTo(PlanStatus.IN_FORCE);
        assertThat(plan.hold().orElseThrow().atLeastKelvin()).isEqualTo(121.1 + 273.15);
        assertThat(plan.hold().orElseThrow().durationSeconds()).isEqualTo(2520);
        assertThat(plan.channels())
                .extracting(PlannedChannel::name)
                .containsExactly("chamber", "drain", "free-space", "pressure", "can-1", "can-2");
        PlannedChannel pressure = plan.channels().get(3);
        assertThat(pressure.rule().datum()).isEqualTo(Datum.GAUGE);
        assertThat(pressure.rule().toSi().applyAsDouble(1.04)).isEqualTo(104_000);
        assertThat(pressure.uncertainty().orElseThrow().standard()).isEqualTo(1000);
        assertThat(plan.channels().get(0).uncertainty().orElseThrow().standard())
                .isCloseTo(Math.sqrt(0.04 + 0.01) / 2, within(1e-15));
        assertThat(plan.lethality().get(0).floorKelvin()).isEmpty();
        assertThat(plan.decision()).isEqualTo(new DecisionRule(true, 0.95));
    }

    @Test
    void readsKineticsOfEveryKind() {
        String text = PLAN.replace("  - {name: F0,", """
                          - {name: A0, reference: 80 degC, z: 10 K, floor: 65 degC, unit: s, minimum: 600 s,
                             channels: [drain, chamber], cooling: not-counted}
                          - {name: C100, reference: 100 degC, z: 33 K, floor: none, maximum: 90 min, channels: load,
                             cooling: counted, decimal-reduction: {of: thiamine, time: 2.5 h, source: SP-120}}
                          - {name: F0,""".stripTrailing())
                .replaceFirst("drift: 0.1 K", "drift: 0.1 K, shared: 0.12 K");
        Plan plan = plan(text).value().orElseThrow();
        LethalityAim a0 = plan.lethality().get(0);
        assertThat(a0.unit()).isEqualTo(LethalityUnit.SECOND);
        assertThat(a0.limits()).isEqualTo(LethalityAim.Limits.atLeast(600));
        assertThat(a0.probes().words()).isEqualTo("drain, chamber");
        assertThat(a0.coolingCounted()).isFalse();
        LethalityAim cook = plan.lethality().get(1);
        assertThat(cook.unit()).isEqualTo(LethalityUnit.MINUTE);
        assertThat(cook.limits().leastSeconds()).isEmpty();
        assertThat(cook.limits().mostSeconds()).hasValue(5400);
        assertThat(cook.probes().place()).contains(Place.LOAD);
        assertThat(cook.reduction()).contains(new DecimalReduction("thiamine", 9000, "SP-120"));
        assertThat(plan.channels().get(0).uncertainty().orElseThrow().sharedStandard())
                .isEqualTo(0.06);
    }

    @Test
    void readsTheRunSheetOfTheSample() {
        RunSheet sheet = sheet(SHEET).value().orElseThrow();
        assertThat(sheet.run()).isEqualTo("R2-0314");
        assertThat(sheet.atmospherePascal()).hasValue(100_800.0);
        assertThat(sheet.product().orElseThrow().lots()).containsExactly("L2291");
        assertThat(sheet.steamOff()).contains(java.time.LocalTime.of(9, 10));
    }

    /** Each row: what to change in the sample's plan, and the one message that this has to give. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            title: Retort            | titel: Retort            | p.yaml:4:1: titel: unknown key; known keys here: *
            revision: 3              | revision: three          | p.yaml:5:11: revision: "three" is not a whole number from 1 to 9999
            revision: 3              | revision: 0              | p.yaml:5:11: revision: "0" is not a whole number from 1 to 9999
            status: in-force         | status: released         | p.yaml:6:9: status: "released" is not one of: draft, in-force
            process: retort          | process:                 | p.yaml:9:9: process: is empty; expected one of: retort, porous-load, fluids, gravity, cooker, leak-test, study
            121.1 degC               | 121,1 degC               | p.yaml:26:13: hold.at-least: "121,1 degC" is not a temperature such as 121.1 degC; known units: degC, degF, K
            42 min                   | 42                       | p.yaml:29:13: hold.duration: "42" is not a duration such as 15 min; known units: s, min, h
            at-most: 124.1 degC      | at-most: 120.0 degC      | p.yaml:26:3: hold: at-least must lie below at-most
            channels: [chamber, drain] | channels: [chamber, dran] | p.yaml:25:1: hold: starts.channels names "dran", which is not among the channels
            datum: gauge             | datum: gage              | p.yaml:19:90: channels[3].datum: "gage" is not one of: absolute, gauge
            datum: gauge,            | ''                       | p.yaml:19:5: channels[3].datum: required key is missing
            unit: bar,               | unit: Bar,               | p.yaml:19:78: channels[3].unit: "Bar" is not one of: Pa, hPa, kPa, MPa, bar, mbar, psi, kgf/cm2, atm, mmHg, inHg
            {calibration: 0.02 bar   | {calibration: 0.02 bar(g) | p.yaml:20:33: channels[3].uncertainty.calibration: "0.02 bar(g)" is not a pressure difference such as 0.02 bar; known units: Pa, hPa, kPa, MPa, bar, mbar, psi, kgf/cm2, atm, mmHg, inHg
            name: drain              | name: chamber            | p.yaml:12:1: channels: two channels are named "chamber"
            air: 1.0 K               | air: 0 K                 | p.yaml:32:13: saturation: the tolerances air and superheat must exceed zero
            conformance: 95 %        | conformance: 50 %        | p.yaml:35:40: decision.conformance: "50 %" is too low; expected more than 50 % and less than 100 %
            floor: none              | floor: nothing           | p.yaml:34:56: lethality[0].floor: "nothing" is not a temperature such as 121.1 degC; known units: degC, degF, K
            minimum: 6.0 min         | minimum: 0 min           | p.yaml:34:5: lethality[0]: the minimum must exceed zero
            minimum: 6.0 min         | maximum: 0 min           | p.yaml:34:5: lethality[0]: the maximum must exceed zero and may not lie below the minimum
            channels: product        | channels: jacket         | p.yaml:34:90: lethality[0].channels: "jacket" is not one of: product, load; or list channels
            channels: product        | channels: [can-3]        | p.yaml:33:1: lethality: channels names "can-3", which is no temperature channel
            channels: product        | channels: [pressure]     | p.yaml:33:1: lethality: channels names "pressure", which is no temperature channel
            minimum: 6.0 min         | unit: h                  | p.yaml:34:68: lethality[0].unit: "h" is not one of: min, s
            drift: 0.1 K             | shared: 0.3 K            | p.yaml:14:19: channels[0].uncertainty: shared is a part of calibration and may not exceed it
            calibration: 0.2 K       | calibration: -0.2 K      | p.yaml:14:19: channels[0].uncertainty: an uncertainty is zero or more
            required: [zone          | required: [zon           | p.yaml:36:24: run-sheet.required[0]: "zon" is no run sheet entry; known: *
            id: R2-stew-73x111       | id: [R2]                 | p.yaml:3:5: id: expected text
            revision: 3              | 'revision: 3\\nrevision: 4' | p.yaml:6:1: revision: stands twice; a key may stand once
            'title: Retort'          | 'title: "Retort'         | p.yaml:*: not valid YAML: *
            """)
    void namesEachMistakeWithItsPlace(String from, String to, String message) {
        String text = PLAN.replaceFirst(java.util.regex.Pattern.quote(from), to.replace("\\n", "\n"));
        assertThat(text).isNotEqualTo(PLAN);
        String wanted = java.util.regex.Pattern.quote(message).replace("*", "\\E.*\\Q");
        AsWritten<Plan> read = plan(text);
        assertThat(read.value()).isEmpty();
        assertThat(messages(read.problems())).anyMatch(line -> line.matches(wanted));
    }

    @Test
    void reportsAllMistakesAtOnceInTheOrderOfTheFile() {
        String text = PLAN.replace("revision: 3", "revision: x")
                .replace("duration: 42 min", "duration: long")
                .replace("superheat: 2.0 K", "superheat: 2.0 degC");
        assertThat(messages(plan(text).problems()))
                .containsExactly(
                        "p.yaml:5:11: revision: \"x\" is not a whole number from 1 to 9999",
                        "p.yaml:29:13: hold.duration: \"long\" is not a duration such as 15 min; known units: s, min, h",
                        "p.yaml:32:37: saturation.superheat: \"2.0 degC\": a difference of temperatures is written in"
                                + " kelvin, here 2 K; expected a temperature difference such as 0.25 K; known units: K");
    }

    @Test
    void aGuardedDecisionNeedsEveryUncertainty() {
        String text =
                PLAN.replaceFirst("unit: degC,\\s+uncertainty: \\{calibration: 0.2 K, coverage: 2}", "unit: degC");
        assertThat(messages(plan(text).problems()))
                .containsExactly("p.yaml:12:1: channels: a guarded decision needs the uncertainty of channel \"can-1\";"
                        + " state it, or decide by the simple rule");
        assertThat(plan(text.replace("{rule: guarded, conformance: 95 %}", "{rule: simple}"))
                        .problems())
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            atmosphere: 1008 hPa     | atmosphere: 1.0 bar(g)   | r.yaml:7:13: atmosphere: "1.0 bar(g)" is a gauge pressure; the atmosphere is absolute, as 1008 hPa
            steam-on: 08:12          | steam-on: 8.12           | r.yaml:10:19: marks.steam-on: "8.12" is not a time of day such as 08:12 or 08:12:30
            'run: R2-0314\n'  | ''                       | r.yaml:2:1: run: required key is missing
            at: 2026-03-14T10:31+00:00 | at: 2026-03-14               | r.yaml:11:31: entered.at: "2026-03-14" is not a time such as 2026-03-14T10:31+00:00
            count: 1240              | count: many              | r.yaml:8:87: product.count: "many" is not a whole number from 1 to 10000000
            """)
    void namesMistakesOfTheRunSheet(String from, String to, String message) {
        assertThat(messages(sheet(SHEET.replace(from.replace("\\n", "\n"), to)).problems()))
                .containsExactly(message);
    }

    @Test
    void refusesFilesThatAreNoYamlOfOurs() {
        assertThat(messages(plan("").problems())).containsExactly("p.yaml:1:1: the file is empty");
        assertThat(messages(plan("- a\n- b\n").problems()))
                .containsExactly("p.yaml:1:1: expected keys and values such as \"id: R2\"");
        assertThat(messages(Plan.read("p.yaml", new byte[] {(byte) 0xFF, 'a'}).problems()))
                .containsExactly("p.yaml:1:1: the file is not text in UTF-8; save it as UTF-8");
        assertThat(plan("a: 1\n---\nb: 2\n").problems()).hasSize(1);
        assertThat(plan("\uFEFF" + PLAN).problems()).isEmpty();
    }

    private static List<String> messages(List<Finding> problems) {
        return problems.stream().map(f -> f.position().text() + ": " + f.text()).toList();
    }

    private static AsWritten<Plan> plan(String text) {
        return Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
    }

    private static AsWritten<RunSheet> sheet(String text) {
        return RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8));
    }

    private static String sample(String name) {
        try {
            return Files.readString(Path.of("sample-logs", name));
        } catch (IOException missing) {
            throw new java.io.UncheckedIOException(missing);
        }
    }
}
