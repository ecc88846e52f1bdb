package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureReading;

class RunSheetReadingTest {

    static final String FULL = """
            run-format: 1
            run: R2-0314
            plan-used: {id: R2-stew, revision: 3}
            equipment: R2
            log-part: {from: 08:05, to: 10:10}
            zone: Europe/Lisbon
            clocks: {log: 08:12:30, wall: 08:13:05}
            atmosphere: 1008 hPa
            product: {name: bean stew, lots: [L2291], count: 1240}
            initial-temperature: {value: 68.0 degC, at: 08:10, instrument: TP-03}
            water: {before: 1.20 kg, after: 930 g}
            marks: {steam-on: 08:12, vent-closed: {at: 08:19, indicating: 107.8 degC}, timing-started: 08:27, steam-off: 09:10}
            readings: [{at: 08:45, indicating: 121.6 degC, pressure: 1.07 bar(g)}]
            probes: [{channel: can-1, serial: P-17, position: "basket 3, centre"}]
            indicators: [{kind: chemical, lot: CI-9, result: passed, read-by: J.}]
            corrections:
              - {phase: hold, starts: 08:28, reason: timer late, by: J., at: 2026-03-14T10:31+00:00}
              - {channel: can-1, reason: slipped, by: J., at: 2026-03-14T10:32+00:00}
            events: [{at: 08:50, what: door alarm}]
            entered: {by: operator 4, at: 2026-03-14T10:31+00:00}
            """;

    @Test
    void readsEveryEntry() {
        RunSheet sheet = read(FULL).value().orElseThrow();
        assertThat(RunSheet.ENTRIES).allMatch(sheet::holds);
        assertThat(sheet.logPart()).contains(new LogPart(LocalTime.of(8, 5), LocalTime.of(10, 10)));
        assertThat(sheet.clocks().orElseThrow().aheadSeconds()).isEqualTo(-35);
        assertThat(sheet.water()).contains(new WeighedWater(Optional.of(1.2), Optional.of(0.93)));
        assertThat(sheet.marks().ventClosed())
                .contains(new EnteredMark(LocalTime.of(8, 19), Optional.of(107.8 + 273.15)));
        assertThat(sheet.marks().timingStarted()).contains(new EnteredMark(LocalTime.of(8, 27), Optional.empty()));
        assertThat(sheet.ventClosed()).contains(LocalTime.of(8, 19));
        assertThat(sheet.readings())
                .containsExactly(new HandReading(
                        LocalTime.of(8, 45),
                        Optional.of(121.6 + 273.15),
                        Optional.of(new PressureReading(1.07 * 1e5, Datum.GAUGE))));
        assertThat(sheet.probes())
                .containsExactly(new PlacedProbe("can-1", Optional.of("P-17"), Optional.of("basket 3, centre")));
        assertThat(sheet.indicators()).containsExactly(new Indicator("chemical", "CI-9", "passed", "J."));
        assertThat(sheet.corrections())
                .extracting(Correction::what)
                .containsExactly("start of hold moved to 08:28", "channel can-1 left out");
        assertThat(sheet.corrections())
                .extracting(c -> c.by() + ": " + c.reason() + ", " + c.at())
                .contains("J.: slipped, 2026-03-14T10:32+00:00");
        assertThat(sheet.events()).containsExactly(new RunEvent(LocalTime.of(8, 50), "door alarm"));
    }

    @Test
    void listsMayBeEmpty() {
        RunSheet sheet = read("""
                run-format: 1
                run: R1
                plan-used: {id: R2-stew, revision: 3}
                equipment: R2
                corrections: []
                events: []
                entered: {by: operator 4, at: 2026-03-14T10:31+00:00}
                """).value().orElseThrow();
        assertThat(sheet.corrections()).isEmpty();
        assertThat(sheet.steamOn()).isEmpty();
        assertThat(RunSheet.ENTRIES).noneMatch(sheet::holds);
    }

    @Test
    void clocksMayLieOnBothSidesOfMidnight() {
        EnteredClocks clocks = new EnteredClocks(LocalTime.of(0, 0, 20), LocalTime.of(23, 59, 50));
        assertThat(clocks.aheadSeconds()).isEqualTo(30);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            to: 10:10}          | to: 08:05}         | r.yaml:5:11: log-part: from and to must differ
            wall: 08:13:05      | wall: noon         | r.yaml:7:31: clocks.wall: "noon" is not a time of day such as 08:12 or 08:12:30
            after: 930 g        | after: 0 g         | r.yaml:11:33: water.after: "0 g" is not above zero; expected a mass such as 640 kg; known units: kg, g, lb
            indicating: 107.8 degC | indicating: 107.8 | r.yaml:12:63: marks.vent-closed.indicating: "107.8" is not a temperature such as 121.1 degC; known units: degC, degF, K
            1.07 bar(g)         | 1.07 bar           | r.yaml:13:58: readings[0].pressure: "1.07 bar" does not say what it is counted from; write 1.07 bar(a) for absolute or 1.07 bar(g) for gauge
            'indicating: 121.6 degC, pressure: 1.07 bar(g)' | '' | r.yaml:13:12: readings[0]: a reading needs indicating or pressure
            channel: can-1, ser | ser                | r.yaml:14:10: probes[0].channel: required key is missing
            'result: passed, '  | ''                 | r.yaml:15:14: indicators[0].result: required key is missing
            starts: 08:28       | 'starts: 08:28, ends: 08:29' | r.yaml:17:5: corrections[0]: a moved boundary needs either starts or ends
            phase: hold         | phase: simmer      | r.yaml:17:13: corrections[0].phase: "simmer" is not one of: standing, air-removal, heating, equilibration, hold, exhaust, drying, cooling, evacuation, settling, test
            'reason: slipped, ' | ''                 | r.yaml:18:5: corrections[1].reason: required key is missing
            at: 08:50           | at: 8:50           | r.yaml:19:15: events[0].at: "8:50" is not a time of day such as 08:12 or 08:12:30
            """)
    void namesEachMistakeWithItsPlace(String from, String to, String message) {
        assertThat(FULL).contains(from);
        assertThat(read(FULL.replace(from, to)).problems().stream()
                        .map(f -> f.position().text() + ": " + f.text())
                        .toList())
                .isEqualTo(List.of(message));
    }

    private static AsWritten<RunSheet> read(String text) {
        return RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8));
    }
}
