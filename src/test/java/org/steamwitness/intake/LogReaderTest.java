package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Reading.RefusedRows;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.ReadingRules.ColumnRule;

class LogReaderTest {

    private static final ReadingRules RULES = new ReadingRules(List.of(
            new ColumnRule(
                    "chamber",
                    "T1",
                    QuantityKind.TEMPERATURE,
                    "degC",
                    Datum.ABSOLUTE,
                    TemperatureUnit.CELSIUS::toKelvin),
            new ColumnRule("pressure", "P1", QuantityKind.PRESSURE, "bar", Datum.GAUGE, PressureUnit.BAR::toPascal)));

    @Test
    void readsColumnsInSiOnOneTimeBase() {
        Intake.Read read = read("time,P1,T1\n2026-03-14T08:05:00,1.04,121.1\n2026-03-14T08:05:05,1.05,121.2\n");
        assertThat(read.trace().seconds().at(1)).isEqualTo(5);
        assertThat(read.trace().channels().get(0).values().at(0)).isEqualTo(121.1 + 273.15);
        assertThat(read.trace().channels().get(1).values().at(1)).isEqualTo(105_000);
        assertThat(read.trace().channels().get(1).absolute(100_800).at(1)).isEqualTo(205_800);
        assertThat(read.trace().lineOf(1)).isEqualTo(3);
        assertThat(read.findings()).isEmpty();
        assertThat(read.reading().rows()).isEqualTo(2);
    }

    @ParameterizedTest
    @CsvSource({
        "2026-03-14 08:05:00, 2026-03-14 08:05:00.5, 0.5",
        "2026-03-14T23:59:58, 2026-03-15T00:00:03, 5",
        "2026-03-14T08:05:00Z, 2026-03-14T09:05:10+01:00, 10",
        "2026-03-14T08:05, 2026-03-14T08:06, 60"
    })
    void understandsIsoTimes(String first, String second, double seconds) {
        Intake.Read read = read("time,T1,P1\n" + first + ",20,0\n" + second + ",20,0\n");
        assertThat(read.trace().lastSeconds()).isEqualTo(seconds);
    }

    @Test
    void refusesBadRowsOneByOneAndKeepsTheRest() {
        StringBuilder log = new StringBuilder("time,T1,P1\n");
        for (int i = 0; i < 100; i++) {
            log.append("2026-03-14T08:")
                    .append(10 + i / 60)
                    .append(':')
                    .append(i % 60 < 10 ? "0" : "")
                    .append(i % 60);
            log.append(i == 40 ? ",20\n" : i == 41 ? ",20\n" : i == 50 ? ",\"2\n" : ",20,1.0\n");
        }
        log.append("2026-03-14T08:10:00,20,1.0\n14/03/2026 08:12:00,20,1.0\n\n2026-03-14T08:12:00,2O,1.0\n");
        Intake.Read read = read(log.toString());
        assertThat(read.trace().size()).isEqualTo(98);
        assertThat(read.reading().refused())
                .containsExactly(
                        new RefusedRows(42, 43, 2, "whole row", "it has 2 fields where a row has 3"),
                        new RefusedRows(52, 52, 1, "whole row", "a quotation mark is not closed"),
                        new RefusedRows(102, 102, 1, "whole row", "its time does not come after the row before"),
                        new RefusedRows(
                                103,
                                103,
                                1,
                                "whole row",
                                "its time \"14/03/2026 08:12:00\" is not written as in the other rows (year-month-day)"),
                        new RefusedRows(105, 105, 1, "T1", "\"2O\" is not a number, the sample is missing"));
        assertThat(read.trace().channels().get(0).values().missing(97)).isTrue();
        assertThat(read.findings()).extracting(Finding::kind).containsOnly(FindingKind.ROWS_REFUSED);
    }

    @Test
    void takesAnEmptyFieldForAMissingSample() {
        Intake.Read read = read("time,T1,P1\n2026-03-14T08:05:00,,1.0\n2026-03-14T08:05:05,20,1.0\n");
        assertThat(read.trace().channels().get(0).values().missing(0)).isTrue();
        assertThat(read.findings()).isEmpty();
    }

    @Test
    void tellsOfColumnsThatNobodyAskedFor() {
        Intake.Read read = read("time,T1,P1,T9\n2026-03-14T08:05:00,20,1.0,3\n2026-03-14T08:05:05,20,1.0,3\n");
        assertThat(read.findings().get(0).text())
                .isEqualTo("Columns of the log that no channel of the plan names: T9.");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', nullValues = "-", textBlock = """
            -                                                    | LOG_EMPTY
            time,T1,P1                                           | LOG_EMPTY
            time,T1,P1;x,1,2;y,3,4                               | LOG_WITHOUT_TIME
            time,T1;2026-03-14T08:05:00,20                       | COLUMN_ABSENT
            time,T1,P1,T1;2026-03-14T08:05:00,20,1,20            | COLUMN_TWICE
            time,T1,P1;2026-03-14T08:05:00,20,1;x,1,1;y,1,1      | TOO_MANY_ROWS_REFUSED
            time,T1,P1;2026-03-14T08:05:00,,1;2026-03-14T08:05:05,,1 | CHANNEL_EMPTY
            """)
    void saysWhyALogCannotBeEvaluated(String lines, FindingKind kind) {
        String log = lines == null ? "" : lines.replace(';', '\n') + "\n";
        Intake intake = reader().read(log.getBytes(StandardCharsets.UTF_8));
        assertThat(((Intake.Unreadable) intake).findings())
                .extracting(Finding::kind)
                .containsExactly(kind);
    }

    @Test
    void stopsWhenNobodyWantsTheResult() {
        Progress cancelled = new Progress() {
            @Override
            public void step(String what, double fraction) {}

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        assertThat(new LogReader("run.csv", RULES, Optional.empty(), cancelled)
                        .read("time,T1,P1\n".getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(Intake.Cancelled.class);
    }

    private static Intake.Read read(String log) {
        return (Intake.Read) reader().read(log.getBytes(StandardCharsets.UTF_8));
    }

    private static LogReader reader() {
        return new LogReader("run.csv", RULES, Optional.empty(), Progress.UNWATCHED);
    }
}
