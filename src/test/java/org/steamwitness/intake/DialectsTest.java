package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Severity;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.Channel;

/** One run, written as many loggers would, is one trace. */
class DialectsTest {

    private static final int ROWS = 120;

    static Stream<Arguments> dialects() {
        return Stream.of(
                dialect(
                        "comma, ISO",
                        "time,T1 [degC],P1 [bar(g)]\n",
                        r -> r.iso("T") + "," + r.t(".") + "," + r.p(".")),
                dialect(
                        "semicolon, decimal comma",
                        "Zeit;T1 (°C);P1 (barg)\r\n",
                        r -> r.dmy(".") + ";" + r.t(",") + ";" + r.p(",") + "\r"),
                dialect(
                        "tab, ISO with a space",
                        "when\tT1 °C\tP1 bar(g)\n",
                        r -> r.iso(" ") + "\t" + r.t(".") + "\t" + r.p(".")),
                dialect("bar, day first", "date|T1 degC|P1 barg\n", r -> r.dmy("/") + "|" + r.t(".") + "|" + r.p(".")),
                dialect(
                        "month first, twelve hours",
                        "Date,T1 (degC),P1 (barg)\n",
                        r -> r.mdyTwelve() + "," + r.t(".") + "," + r.p(".")),
                dialect(
                        "spaces, date and time apart",
                        "Date Time T1_degC P1_barg\n",
                        r -> r.iso("    ") + "  " + r.t(".") + "   " + r.p(".")),
                dialect(
                        "preamble and a line of units",
                        "Logger report\nSerial: 4711, channels: 2\n\ntime,T1,P1\n,°C,bar(g)\n",
                        r -> r.iso("T") + "," + r.t(".") + "," + r.p(".")),
                dialect(
                        "units in every cell",
                        "time;T1;P1\n",
                        r -> r.iso("T") + ";" + r.t(".") + " °C;" + r.p(".") + " bar(g)"),
                dialect(
                        "quoted decimal commas between commas",
                        "\"time\",\"T1 [°C]\",\"P1 [bar(g)]\"\n",
                        r -> "\"" + r.iso("T") + "\",\"" + r.t(",") + "\",\"" + r.p(",") + "\""),
                dialect(
                        "separator named, two-digit years",
                        "sep=;\ntime;T1 degC;P1 barg\n",
                        r -> r.dmy("/").replace("/2026", "/26") + ";" + r.t(".") + ";" + r.p(".")),
                dialect(
                        "trailing delimiter",
                        "time,T1 degC,P1 barg\n",
                        r -> r.iso("T") + "," + r.t(".") + "," + r.p(".") + ","),
                dialect(
                        "month in letters",
                        "time;T1 degC;P1 barg\n",
                        r -> "14-Mar-2026 " + r.clock() + ";" + r.t(".") + ";" + r.p(".")),
                dialect(
                        "fractions of seconds by comma",
                        "time;T1 degC;P1 barg\n",
                        r -> r.iso("T") + ",000;" + r.t(",") + ";" + r.p(",")));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("dialects")
    void readsTheSameTrace(String name, String log) {
        for (Charset charset :
                List.of(StandardCharsets.UTF_8, Charset.forName("windows-1252"), StandardCharsets.UTF_16LE)) {
            assertSame(survey(log.getBytes(charset)), name + " in " + charset);
        }
        assertSame(survey(("\uFEFF" + log).getBytes(StandardCharsets.UTF_16BE)), name + " in UTF-16BE");
        assertSame(survey(("\uFEFF" + log).getBytes(StandardCharsets.UTF_8)), name + " with a byte order mark");
        assertSame(
                survey(log.replace("\r", "").replace('\n', '\r').getBytes(StandardCharsets.UTF_8)), name + " with CR");
    }

    /** Elapsed time and days of a spreadsheet hold the same seconds, if less of the clock. */
    @Test
    void readsElapsedTimesAndNumbers() {
        List<Function<Row, String>> times = List.of(
                r -> r.elapsed(),
                r -> Integer.toString(r.index * 5),
                r -> Double.toString(46095 + (8 * 3600 + r.index * 5) / 86400.0),
                r -> Long.toString(1773475200L + r.index * 5L),
                r -> Long.toString((1773475200L + r.index * 5L) * 1000),
                Row::clock);
        List<String> headers = List.of("elapsed", "time s", "date", "time", "time", "time");
        for (int k = 0; k < times.size(); k++) {
            int which = k;
            String log = log(
                    headers.get(k) + ";T1 degC;P1 barg\n",
                    r -> times.get(which).apply(r) + ";" + r.t(".") + ";" + r.p("."));
            assertSame(survey(log.getBytes(StandardCharsets.UTF_8)), headers.get(k) + " " + k);
        }
    }

    @Test
    void readsFahrenheitAndAbsolutePounds() {
        String log = log("time,T1 [°F],P1 [psia]\n", r -> r.iso("T") + "," + (r.celsius() * 1.8 + 32) + "," + 14.7);
        Intake.Read read = survey(log.getBytes(StandardCharsets.UTF_8));
        Channel temperature = read.trace().channels().get(0);
        assertThat(temperature.values().at(7))
                .isCloseTo(new Row(7).celsius() + 273.15, org.assertj.core.api.Assertions.within(1e-9));
        assertThat(read.trace().channels().get(1).absolute(Double.NaN).at(0))
                .isCloseTo(14.7 * 6894.757293168, org.assertj.core.api.Assertions.within(1e-3));
    }

    private static void assertSame(Intake.Read read, String name) {
        assertThat(read.trace().size()).as(name).isEqualTo(ROWS);
        assertThat(read.trace().channels()).as(name).hasSize(2);
        for (int i = 0; i < ROWS; i++) {
            Row row = new Row(i);
            assertThat(read.trace().seconds().at(i)).as(name).isEqualTo(i * 5.0);
            assertThat(read.trace().channels().get(0).values().at(i)).as(name).isEqualTo(row.celsius() + 273.15);
            assertThat(read.trace().channels().get(1).values().at(i)).as(name).isEqualTo(row.bar() * 1e5);
        }
        assertThat(read.findings()).as(name).noneMatch(f -> f.severity() == Severity.BLOCKS);
        assertThat(read.findings())
                .as(name)
                .extracting(f -> f.kind())
                .isSubsetOf(FindingKind.FORM_ASSUMED, FindingKind.COLUMNS_UNREAD);
        assertThat(read.reading().refusedRows()).as(name).isZero();
    }

    private static Intake.Read survey(byte[] bytes) {
        Intake intake = new LogReader(
                        "run.csv",
                        new org.steamwitness.trace.ReadingRules(List.of()),
                        Optional.empty(),
                        Progress.UNWATCHED)
                .survey(bytes);
        assertThat(intake).isInstanceOf(Intake.Read.class);
        return (Intake.Read) intake;
    }

    private static Arguments dialect(String name, String header, Function<Row, String> row) {
        return Arguments.of(name, log(header, row));
    }

    private static String log(String header, Function<Row, String> row) {
        StringBuilder log = new StringBuilder(header);
        for (int i = 0; i < ROWS; i++) {
            log.append(row.apply(new Row(i))).append('\n');
        }
        return log.toString();
    }

    /** One row of the run: 14 March 2026, every five seconds from eight o'clock. */
    private record Row(int index) {

        double celsius() {
            return (11_800 + index * 7 % 431) / 100.0;
        }

        double bar() {
            return (1000 + index * 3 % 47) / 1000.0;
        }

        String t(String mark) {
            return decimal(11_800 + index * 7 % 431, 100, mark);
        }

        String p(String mark) {
            return decimal(1000 + index * 3 % 47, 1000, mark);
        }

        private static String decimal(int digits, int scale, String mark) {
            String fraction = Integer.toString(scale + digits % scale).substring(1);
            return digits / scale + mark + fraction;
        }

        String clock() {
            return "08:" + two(index * 5 / 60) + ":" + two(index * 5 % 60);
        }

        String elapsed() {
            return "0:" + two(index * 5 / 60) + ":" + two(index * 5 % 60);
        }

        String iso(String between) {
            return "2026-03-14" + between + clock();
        }

        String dmy(String mark) {
            return String.join(mark, new ArrayList<>(List.of("14", "03", "2026"))) + " " + clock();
        }

        String mdyTwelve() {
            return "3/14/2026 " + clock().substring(1) + " AM";
        }

        private static String two(int number) {
            return number < 10 ? "0" + number : Integer.toString(number);
        }
    }
}
