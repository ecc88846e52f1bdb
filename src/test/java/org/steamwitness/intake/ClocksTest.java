package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.ReadingRules;

/** Clocks that run on, stop, go back and change to summer time. */
class ClocksTest {

    private static final ZoneId LISBON = ZoneId.of("Europe/Lisbon");

    /** Summer time began in Lisbon on 2026-03-29 at 01:00, when clocks went to 02:00: IANA time zone database. */
    @Test
    void theBeginningOfSummerTimeIsNoGap() {
        Intake.Read read = read(
                log(i -> i < 10 ? "2026-03-29T00:59:" + two(10 + 5 * i) : "2026-03-29T02:00:" + two(5 * i - 50)),
                Optional.of(LISBON));
        assertThat(read.trace().lastSeconds()).isEqualTo(19 * 5);
        assertThat(kinds(read)).containsExactly(FindingKind.CLOCK_SUMMER_TIME);
        assertThat(read(
                                log(i -> i < 10
                                        ? "2026-03-29T00:59:" + two(10 + 5 * i)
                                        : "2026-03-29T02:00:" + two(5 * i - 50)),
                                Optional.empty())
                        .trace()
                        .lastSeconds())
                .isEqualTo(3600 + 19 * 5);
    }

    /** It ended on 2026-10-25 at 02:00, when clocks went back to 01:00. */
    @Test
    void theEndOfSummerTimeRunsOn() {
        IntFunction<String> clock =
                i -> i < 10 ? "2026-10-25T01:59:" + two(10 + 5 * i) : "2026-10-25T01:00:" + two(5 * i - 50);
        Intake.Read known = read(log(clock), Optional.of(LISBON));
        assertThat(known.trace().lastSeconds()).isEqualTo(19 * 5);
        assertThat(kinds(known)).containsExactly(FindingKind.CLOCK_SUMMER_TIME);
        Intake.Read unknown = read(log(clock), Optional.empty());
        assertThat(kinds(unknown)).containsExactly(FindingKind.CLOCK_JUMP);
        assertThat(unknown.trace().lastSeconds()).isEqualTo(19 * 5);
    }

    @Test
    void midnightWithoutADateIsNoStepBack() {
        Intake.Read read =
                read(log(i -> i < 10 ? "23:59:" + two(10 + 5 * i) : "00:00:" + two(5 * i - 50)), Optional.empty());
        assertThat(read.trace().lastSeconds()).isEqualTo(19 * 5);
        assertThat(read.trace().clock().localAt(0)).hasValue("23:59:10");
        assertThat(read.trace().clock().date()).isEmpty();
        assertThat(kinds(read)).isEmpty();
    }

    @Test
    void aFlatBatteryBlocks() {
        Intake.Read read = read(
                log(i -> i < 10 ? "2026-03-14T08:00:" + two(5 * i) : "2000-01-01T00:00:" + two(5 * i - 50)),
                Optional.empty());
        assertThat(kinds(read)).containsExactly(FindingKind.CLOCK_JUMP);
        assertThat(read.trace().size()).isEqualTo(20);
    }

    @Test
    void rowsOutOfOrderAreRefused() {
        Intake.Read read = read(log(i -> "2026-03-14T08:00:" + two(i == 7 ? 10 : i * 3)), Optional.empty());
        assertThat(read.trace().size()).isEqualTo(19);
        assertThat(read.reading().refused().get(0).reason()).isEqualTo("its time does not come after the row before");
        assertThat(read.reading().refused().get(0).fromLine()).isEqualTo(9);
    }

    @Test
    void doubledRowsArePassedOver() {
        String log = """
                time,T1 degC
                2026-03-14T08:00:00,20
                2026-03-14T08:00:00,20
                2026-03-14T08:00:05,21
                2026-03-14T08:00:10,21
                2026-03-14T08:00:15,22
                """;
        Intake.Read read = read(log, Optional.empty());
        assertThat(read.trace().size()).isEqualTo(4);
        assertThat(kinds(read)).containsExactly(FindingKind.ROWS_DOUBLED);
    }

    @Test
    void severalRowsUnderOneMinuteAreSpread() {
        Intake.Read read = read(log(i -> "2026-03-14T08:0" + i / 4), Optional.empty());
        assertThat(read.trace().seconds().at(1)).isEqualTo(15);
        assertThat(read.trace().lastSeconds()).isEqualTo(4 * 60 + 45);
        assertThat(kinds(read)).containsExactly(FindingKind.STAMPS_SPREAD);
    }

    @Test
    void aSlowChannelIsJudgedAtItsOwnInstants() {
        StringBuilder log = new StringBuilder("time,T1 degC,T2 degC\n");
        for (int i = 0; i < 300; i++) {
            log.append("2026-03-14T08:")
                    .append(two(i * 5 / 60))
                    .append(':')
                    .append(two(i * 5 % 60))
                    .append(",")
                    .append(100 + i * 0.01)
                    .append(',')
                    .append(90 + Math.floorDiv(i, 6) * 0.5)
                    .append('\n');
        }
        Intake.Read read = read(log.toString(), Optional.empty());
        assertThat(kinds(read)).containsExactly(FindingKind.VALUES_HELD);
        assertThat(read.trace().channels().get(0).values().missing(7)).isFalse();
        assertThat(read.trace().channels().get(1).values().missing(6)).isFalse();
        assertThat(read.trace().channels().get(1).values().missing(7)).isTrue();
        assertThat(read.trace().channels().get(1).values().missing(12)).isFalse();
    }

    @Test
    void faultCodesAreCountedByTheirText() {
        StringBuilder log = new StringBuilder("time,T1 degC\n");
        String[] odd = {"850", "OPEN", "-200", "OPEN", "1e400"};
        for (int i = 0; i < 60; i++) {
            log.append("2026-03-14T08:00:")
                    .append(two(i))
                    .append(',')
                    .append(i < 5 ? odd[i] : "20." + i)
                    .append('\n');
        }
        Intake.Read read = read(log.toString(), Optional.empty());
        assertThat(read.findings().get(0).text())
                .isEqualTo(
                        "5 samples of T1 are codes or impossible values and count as missing: -200 (once), 1e400 (once),"
                                + " 850 (once), OPEN (2 times).");
        assertThat(read.trace().channels().get(0).values().missing(4)).isTrue();
    }

    private static String log(IntFunction<String> time) {
        StringBuilder log = new StringBuilder("time,T1 degC\n");
        for (int i = 0; i < 20; i++) {
            log.append(time.apply(i)).append(",20.").append(i).append('\n');
        }
        return log.toString();
    }

    private static List<FindingKind> kinds(Intake.Read read) {
        return read.findings().stream().map(Finding::kind).toList();
    }

    private static Intake.Read read(String log, Optional<ZoneId> zone) {
        return (Intake.Read) new LogReader("run.csv", new ReadingRules(List.of()), zone, Progress.UNWATCHED)
                .survey(log.getBytes(StandardCharsets.UTF_8));
    }

    private static String two(int number) {
        return number < 10 ? "0" + number : Integer.toString(number);
    }
}
