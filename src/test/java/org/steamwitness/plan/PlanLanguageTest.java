package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureReading;

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
        assertThat(chamber.metal())
                .contains(new Chamber.Metal(640, Chamber.Material.STAINLESS_STEEL, List.of("chamber")));
        assertThat(chamber.load())
                .contains(new Chamber.Load(410, 3550, List.of("can-1"), Chamber.LoadProbes.COLD_SPOT));
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

    static List<String> messages(AsWritten<?> read) {
        return read.problems().stream()
                .map(f -> f.position().text() + ": " + f.text())
                .toList();
    }

    static AsWritten<Plan> read(String text) {
        return Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
    }
}
