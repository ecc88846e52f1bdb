package org.steamwitness.intake;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.trace.TimeForm;

/**
 * Makes one rising time base of the times of all rows: midnight without a date, the steps of summer time where the zone
 * is known, several rows under one stamp, doubled rows, rows out of order, and clocks that jump back. Thresholds are
 * common practice, no source.
 */
final class TimeBase {

    private static final long SECOND = 1_000_000_000L;
    private static final long HOUR = 3600 * SECOND;
    private static final long DAY = 24 * HOUR;

    /** Rows out of order come back to the old time within so many rows; otherwise the clock has jumped. */
    private static final int OUT_OF_ORDER_ROWS = 20;

    /** With so many rows that repeat the stamp before, stamps are coarser than the sampling. */
    private static final double REPEATED_STAMP_SHARE = 0.3;

    private final String file;
    private final Samples samples;
    private final long[] nanos;
    private final int rows;
    private final TimeForm form;
    private final Optional<ZoneId> zone;
    private final List<Finding> findings = new ArrayList<>();
    private final int[] kept;
    private int count;
    private int doubled;
    private int firstDoubled;

    TimeBase(String file, Samples samples, TimeForm form, Optional<ZoneId> zone) {
        this.file = file;
        this.samples = samples;
        this.nanos = samples.nanos();
        this.rows = samples.rows();
        this.form = form;
        this.zone = zone;
        this.kept = new int[rows];
        walk();
        if (doubled > 0) {
            find(FindingKind.ROWS_DOUBLED, samples.lineOf(firstDoubled), Map.of("rows", Integer.toString(doubled)));
        }
    }

    /** Indices of the rows that are samples. */
    int[] kept() {
        return Arrays.copyOf(kept, count);
    }

    /** Seconds of the samples from the first. */
    double[] seconds() {
        double[] seconds = new double[count];
        for (int i = 0; i < count; i++) {
            long since = nanos[kept[i]] - nanos[kept[0]];
            long whole = since / SECOND;
            seconds[i] = whole + (since - whole * SECOND) / 1e9;
        }
        return seconds;
    }

    /** Clock and first instant: nanoseconds since 1970-01-01 as {@link TimeReader} counts them. */
    long firstNanos() {
        return nanos[kept[0]];
    }

    List<Finding> findings() {
        return findings;
    }

    private void walk() {
        spreadStamps();
        long usual = usualStep();
        long shift = 0;
        for (int i = 0; i < rows; i++) {
            if (count == 0) {
                keep(i);
                continue;
            }
            long last = nanos[kept[count - 1]];
            nanos[i] += shift;
            if (nanos[i] < last) {
                long more = stepBack(i, last, usual, shift);
                nanos[i] += more;
                shift += more;
            } else if (summerTimeBegins(last - shift, nanos[i] - shift)) {
                shift -= HOUR;
                nanos[i] -= HOUR;
                find(
                        FindingKind.CLOCK_SUMMER_TIME,
                        samples.lineOf(i),
                        Map.of("zone", zone.orElseThrow().getId()));
            }
            accept(i, last);
        }
    }

    private void accept(int i, long last) {
        if (nanos[i] > last) {
            keep(i);
        } else if (nanos[i] == last && samples.alike(i, kept[count - 1])) {
            firstDoubled = doubled == 0 ? i : firstDoubled;
            doubled++;
        } else {
            samples.refuse(
                    i,
                    nanos[i] == last
                            ? "its time is that of the row before"
                            : "its time does not come after the row before");
        }
    }

    private void keep(int i) {
        kept[count++] = i;
    }

    /** What has to be added to this and all later times; zero for a row that is merely out of order. */
    private long stepBack(int i, long last, long usual, long shift) {
        long back = last - nanos[i];
        if (form == TimeForm.TIME_OF_DAY && back > DAY / 2) {
            return DAY;
        }
        for (int j = i + 1; j < Math.min(rows, i + OUT_OF_ORDER_ROWS); j++) {
            if (nanos[j] + shift > last) {
                return 0;
            }
        }
        if (i + 1 == rows) {
            return 0;
        }
        boolean hour = Math.abs(back + usual - HOUR) < 2 * usual + SECOND;
        if (hour && summerTimeEnds(last - shift)) {
            find(
                    FindingKind.CLOCK_SUMMER_TIME,
                    samples.lineOf(i),
                    Map.of("zone", zone.orElseThrow().getId()));
            return HOUR;
        }
        find(FindingKind.CLOCK_JUMP, samples.lineOf(i), Map.of("back", Long.toString((back + SECOND / 2) / SECOND)));
        return back + usual;
    }

    private boolean summerTimeBegins(long last, long next) {
        return transition(last)
                .filter(ZoneOffsetTransition::isGap)
                .filter(t -> local(last).isBefore(t.getDateTimeBefore())
                        && !local(next).isBefore(t.getDateTimeAfter()))
                .isPresent();
    }

    private boolean summerTimeEnds(long last) {
        return transition(last - 2 * HOUR)
                .filter(ZoneOffsetTransition::isOverlap)
                .filter(t -> !local(last).isBefore(t.getDateTimeAfter()))
                .filter(t -> !local(last).isAfter(t.getDateTimeBefore()))
                .isPresent();
    }

    /** The zone's next change of its distance from UTC within a day; empty for logs that tell their own distance. */
    private Optional<ZoneOffsetTransition> transition(long from) {
        if (zone.isEmpty() || !form.dated() || samples.withOffset()) {
            return Optional.empty();
        }
        Instant instant = local(from).atZone(zone.get()).toInstant();
        return Optional.ofNullable(zone.get().getRules().nextTransition(instant.minusSeconds(1)))
                .filter(t -> t.getInstant().isBefore(instant.plusSeconds(86_400)));
    }

    private static LocalDateTime local(long nanos) {
        return LocalDateTime.ofEpochSecond(
                Math.floorDiv(nanos, SECOND), (int) Math.floorMod(nanos, SECOND), ZoneOffset.UTC);
    }

    /** Spreads rows that share a stamp evenly up to the next stamp, where that is the log's habit. */
    private void spreadStamps() {
        int repeated = 0;
        for (int i = 1; i < rows; i++) {
            repeated += nanos[i] == nanos[i - 1] && !samples.alike(i, i - 1) ? 1 : 0;
        }
        if (repeated <= REPEATED_STAMP_SHARE * rows) {
            return;
        }
        long gap = 0;
        int from = 0;
        while (from < rows) {
            int to = from;
            while (to < rows && nanos[to] == nanos[from]) {
                to++;
            }
            gap = to < rows && nanos[to] > nanos[from] ? nanos[to] - nanos[from] : gap;
            long stamp = nanos[from];
            for (int i = from; i < to; i++) {
                nanos[i] = stamp + gap / (to - from) * (i - from);
            }
            from = to;
        }
        find(FindingKind.STAMPS_SPREAD, samples.lineOf(0), Map.of("rows", Integer.toString(repeated)));
    }

    /** Median step forward. */
    private long usualStep() {
        long[] steps = new long[Math.max(0, rows - 1)];
        int found = 0;
        for (int i = 1; i < rows; i++) {
            if (nanos[i] > nanos[i - 1]) {
                steps[found++] = nanos[i] - nanos[i - 1];
            }
        }
        Arrays.sort(steps, 0, found);
        return found == 0 ? SECOND : steps[found / 2];
    }

    private void find(FindingKind kind, int line, Map<String, String> facts) {
        findings.add(new Finding(kind, Position.ofLine(file, line), facts));
    }
}
