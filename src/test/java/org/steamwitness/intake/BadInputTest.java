package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Bad input is normal input: no crash, no hang, no silence. */
class BadInputTest {

    @ParameterizedTest(name = "{0}")
    @CsvSource(delimiter = '|', textBlock = """
            empty                | ''                                                             | LOG_EMPTY
            blank lines          | /n/n/n                                                         | LOG_EMPTY
            header only          | time,T1/n                                                      | LOG_EMPTY
            prose                | Dear all,/nplease find the log attached./nRegards/n            | LOG_WITHOUT_TIME
            no time              | a,T1/n1,20/n3,21/n2,22/n                                       | LOG_WITHOUT_TIME
            ambiguous dates      | time,T1/n03/04/2026 08:00:00,20/n03/04/2026 08:00:05,21/n      | DATE_ORDER_UNDECIDED
            both orders          | time,T1/n13/04/2026 08:00:00,20/n04/14/2026 08:00:05,21/n      | DATE_ORDER_UNDECIDED
            AM and PM apart      | d h ap T1/n04/14/2026 8:00:00 PM 20/n04/14/2026 8:00:05 PM 21/n | TIME_UNDECIDED
            minutes or hours     | elapsed,T1/n00:00,20/n00:05,21/n                               | TIME_UNDECIDED
            seconds or minutes   | time,T1/n0,20/n1,21/n2,22/n                                    | TIME_UNDECIDED
            doubled names        | time,T1,T1/n2026-03-14T08:05:00,20,21/n2026-03-14T08:05:05,20,21/n | COLUMN_TWICE
            missing column       | time,T2/n2026-03-14T08:05:00,20/n2026-03-14T08:05:05,20/n      | COLUMN_ABSENT
            no header            | 2026-03-14T08:05:00,20/n2026-03-14T08:05:05,20/n               | COLUMN_ABSENT
            nothing but codes    | time,T1/n2026-03-14T08:05:00,OPEN/n2026-03-14T08:05:05,NaN/n   | CHANNEL_EMPTY
            too large a number   | time,T1/n2026-03-14T08:05:00,1e400/n2026-03-14T08:05:05,1e400/n | CHANNEL_EMPTY
            """)
    void saysWhyALogCannotBeEvaluated(String what, String log, FindingKind kind) {
        assertThat(kinds(log.replace("/n", "\n").getBytes(StandardCharsets.UTF_8)))
                .containsExactly(kind);
    }

    @Test
    void knowsFilesThatAreNoLogs() throws IOException {
        ByteArrayOutputStream zip = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(zip)) {
            out.putNextEntry(new ZipEntry("log.csv"));
            out.write(clean(100).getBytes(StandardCharsets.UTF_8));
        }
        assertThat(reader().read(zip.toByteArray()))
                .isInstanceOfSatisfying(
                        Intake.Unreadable.class,
                        u -> assertThat(u.findings().get(0).text())
                                .isEqualTo("The file is no text that could be a log: it begins like a ZIP archive or a"
                                        + " spreadsheet; save it as text with delimiters."));
        assertThat(kinds("%PDF-1.7\n1 0 obj".getBytes(StandardCharsets.ISO_8859_1)))
                .containsExactly(FindingKind.LOG_NOT_TEXT);
        byte[] noise = new byte[100_000];
        new Random(1).nextBytes(noise);
        assertThat(kinds(noise)).containsExactly(FindingKind.LOG_NOT_TEXT);
    }

    @Test
    void refusesMixedEncodings() {
        byte[] utf8 = "time,T1 °C\n".getBytes(StandardCharsets.UTF_8);
        byte[] latin = "2026-03-14T08:05:00,20 °C\n".getBytes(StandardCharsets.ISO_8859_1);
        assertThat(kinds(joined(utf8, latin, latin))).containsExactly(FindingKind.ENCODING_UNDECIDED);
    }

    @Test
    void readsUtf16UpToItsTornEnd() {
        byte[] whole = ("\uFEFF" + clean(50)).getBytes(StandardCharsets.UTF_16LE);
        Intake.Read read = (Intake.Read) reader().read(Arrays.copyOf(whole, whole.length - 33));
        assertThat(read.trace().size()).isEqualTo(49);
        assertThat(read.findings()).extracting(Finding::kind).containsExactly(FindingKind.LINES_BEHIND);
    }

    @Test
    void aPowerCutLeavesNulsInOneRow() {
        String log = clean(60).replace("08:05:20,120.40", "08:05:20,12\0\0\0");
        Intake.Read read = (Intake.Read) reader().read(log.getBytes(StandardCharsets.UTF_8));
        assertThat(read.trace().channels().get(0).values().missing(4)).isTrue();
        assertThat(read.reading().refused().get(0).reason())
                .isEqualTo("a text with NUL characters is not a number, the sample is missing");
    }

    @Test
    void aLineWithoutEndIsOneRefusedRow() {
        String half = clean(60);
        String log = half + "x".repeat(50_000_000) + "\n2026-03-14T08:10:00,120\n";
        Intake.Read read = (Intake.Read) reader().read(log.getBytes(StandardCharsets.UTF_8));
        assertThat(read.trace().size()).isEqualTo(61);
        assertThat(read.reading().refused()).hasSize(1);
        assertThat(read.reading().refused().get(0).reason()).isEqualTo("it is longer than 1000000 characters");
        assertThat(read.trace().lineOf(60)).isEqualTo(63);
    }

    @Test
    void tenThousandColumnsAreColumns() {
        StringBuilder log = new StringBuilder("time");
        for (int c = 1; c < 10_000; c++) {
            log.append(",T").append(c);
        }
        for (int row = 0; row < 5; row++) {
            log.append("\n2026-03-14T08:05:0").append(row).append(",20".repeat(9999));
        }
        Intake.Read read = (Intake.Read) reader().read(log.toString().getBytes(StandardCharsets.UTF_8));
        assertThat(read.trace().size()).isEqualTo(5);
        assertThat(read.columns()).hasSize(10_000);
    }

    @Test
    void halfAMillionBadRowsAreNoFlood() {
        StringBuilder log = new StringBuilder(clean(10));
        for (int i = 0; i < 500_000; i++) {
            log.append(i % 2 == 0 ? "bad row " + i + "\n" : "2026-03-14T07:00:00,3\n");
        }
        Intake.Unreadable unreadable =
                (Intake.Unreadable) reader().read(log.toString().getBytes(StandardCharsets.UTF_8));
        assertThat(unreadable.findings()).hasSize(1);
        assertThat(unreadable.findings().get(0).kind()).isEqualTo(FindingKind.TOO_MANY_ROWS_REFUSED);
    }

    @Test
    void badFieldsFoldWhateverTheySay() {
        StringBuilder log = new StringBuilder("time,T1\n");
        for (int i = 0; i < 3000; i++) {
            log.append("2026-03-14T")
                    .append(clock(i))
                    .append(i % 2 == 0 ? ",20\n" : i < 2000 ? ",bad" + i + "\n" : ",21\n");
        }
        Intake.Read read = (Intake.Read) reader().read(log.toString().getBytes(StandardCharsets.UTF_8));
        assertThat(read.reading().refused()).hasSize(Refusals.MOST_RANGES + 1);
        assertThat(read.reading().refusedRows()).isEqualTo(1000);
        assertThat(read.findings()).hasSize(Refusals.MOST_RANGES + 1);
    }

    @Test
    void quotesNeverSwallowLines() {
        String log = clean(60).replace("08:05:20,120.40", "08:05:20,\"120.40");
        Intake.Read read = (Intake.Read) reader().read(log.getBytes(StandardCharsets.UTF_8));
        assertThat(read.trace().size()).isEqualTo(60);
        assertThat(read.reading().refused()).hasSize(1);
        assertThat(read.reading().refused().get(0).fromLine()).isEqualTo(6);
    }

    /** Any byte of a log may be broken: there is always an answer. */
    @Test
    void breakingAnyByteNeverCrashes() {
        byte[] sound = clean(40).getBytes(StandardCharsets.UTF_8);
        Random dice = new Random(42);
        for (int trial = 0; trial < 3000; trial++) {
            byte[] broken = sound.clone();
            for (int k = 0; k < 1 + trial % 5; k++) {
                broken[dice.nextInt(broken.length)] = (byte) dice.nextInt(256);
            }
            byte[] cut = Arrays.copyOf(broken, dice.nextInt(broken.length));
            assertThat(reader().read(broken)).isNotNull();
            assertThat(reader().read(cut)).isNotNull();
            assertThat(reader().survey(broken)).isNotNull();
        }
    }

    static String clean(int rows) {
        StringBuilder log = new StringBuilder("time,T1\n");
        for (int i = 0; i < rows; i++) {
            log.append("2026-03-14T")
                    .append(clock(i))
                    .append(",120.")
                    .append(i % 10)
                    .append("0\n");
        }
        return log.toString();
    }

    private static String clock(int i) {
        int seconds = 8 * 3600 + 300 + i * 5;
        return two(seconds / 3600) + ":" + two(seconds / 60 % 60) + ":" + two(seconds % 60);
    }

    private static String two(int number) {
        return number < 10 ? "0" + number : Integer.toString(number);
    }

    private static byte[] joined(byte[]... parts) {
        ByteArrayOutputStream all = new ByteArrayOutputStream();
        for (byte[] part : parts) {
            all.writeBytes(part);
        }
        return all.toByteArray();
    }

    private static List<FindingKind> kinds(byte[] bytes) {
        Intake intake = reader().read(bytes);
        assertThat(intake).isInstanceOf(Intake.Unreadable.class);
        return ((Intake.Unreadable) intake)
                .findings().stream().map(Finding::kind).toList();
    }

    private static LogReader reader() {
        return new LogReader(
                "run.csv",
                new ReadingRules(List.of(new ColumnRule(
                        "chamber",
                        "T1",
                        QuantityKind.TEMPERATURE,
                        "degC",
                        Datum.ABSOLUTE,
                        TemperatureUnit.CELSIUS::toKelvin))),
                Optional.empty(),
                Progress.UNWATCHED);
    }
}
