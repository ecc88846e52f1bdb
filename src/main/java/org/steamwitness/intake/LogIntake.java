package org.steamwitness.intake;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.Channel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Reading.RefusedRows;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.TimeForm;
import org.steamwitness.trace.Trace;

/** One act of reading a log whose form is known: rows to columns, columns to a trace, and what has to be told. */
final class LogIntake {

    /** Beyond this share of refused rows a log is not evaluated; common practice, no source. */
    static final double LARGEST_REFUSED_SHARE = 0.05;

    /** So many lines behind the last sample may be a summary; common practice, no source. */
    private static final int MOST_SUMMARY_LINES = 20;

    private static final long SECOND = 1_000_000_000L;

    private final String file;
    private final LogText text;
    private final LogForm form;
    private final ReadingRules rules;
    private final Optional<ZoneId> zone;
    private final boolean planned;
    private final Refusals refusals = new Refusals();
    private final List<Finding> findings = new ArrayList<>();

    /**
     * Prepares the act.
     *
     * @param file base name of the log
     * @param text its text
     * @param form how it is written
     * @param rules which columns are wanted
     * @param zone zone of its clock
     * @param planned whether a plan wants the columns, so that none may be empty
     */
    LogIntake(String file, LogText text, LogForm form, ReadingRules rules, Optional<ZoneId> zone, boolean planned) {
        this.file = file;
        this.text = text;
        this.form = form;
        this.rules = rules;
        this.zone = zone;
        this.planned = planned;
    }

    Intake read(Progress progress) {
        ColumnChoice choice = new ColumnChoice(file, form, rules.columns());
        if (!choice.missing().isEmpty()) {
            return new Intake.Unreadable(List.copyOf(choice.missing()));
        }
        Samples samples = new Samples(
                rules.columns(), choice.fields(), form, rules.told().missingCodes(), expectedRows(), refusals);
        Rows rows = new Rows(file, text, form, rules.told().quotedLineBreaks(), samples, refusals);
        if (!rows.read(progress)) {
            return new Intake.Cancelled();
        }
        if (samples.rows() == 0) {
            return noRows();
        }
        TimeBase time = new TimeBase(file, samples, form.timeForm(), zone);
        int[] kept = time.kept();
        int[] lines = samples.takeLines(kept);
        Optional<Finding> obstacle = tooMany(lines).or(() -> empty(samples));
        if (obstacle.isPresent()) {
            return new Intake.Unreadable(List.of(obstacle.get()));
        }
        findings.addAll(choice.notes());
        assumed();
        repeated(rows);
        findings.addAll(time.findings());
        List<Channel> channels = channels(samples, kept);
        Trace trace = new Trace(clock(samples, time), Column.of(time.seconds()), lines, channels);
        refused(lines[lines.length - 1]);
        unread(choice.unread());
        return new Intake.Read(
                trace,
                reading(choice.unread(), lines),
                List.copyOf(findings),
                form.guesses(),
                form.columns(),
                form.times());
    }

    /** As many as the mean length of the first rows lets expect, and a few more. */
    private int expectedRows() {
        long rows = 64 + (long) (text.length() / Math.max(1, form.meanRowBytes()) * 1.02);
        return (int) Math.min(rows, text.length() / 2 + 64);
    }

    private Intake noRows() {
        List<RefusedRows> ranges = refusals.ranges();
        return new Intake.Unreadable(List.of(
                ranges.isEmpty()
                        ? new Finding(FindingKind.LOG_EMPTY, Position.ofFile(file), Map.of())
                        : new Finding(
                                FindingKind.LOG_WITHOUT_TIME,
                                Position.ofFile(file),
                                Map.of(
                                        "why",
                                        "line " + ranges.get(0).fromLine() + ": "
                                                + ranges.get(0).reason()))));
    }

    private Optional<Finding> tooMany(int[] lines) {
        int behind = refusals.rowsUpTo(Integer.MAX_VALUE) - refusals.rowsUpTo(lines[lines.length - 1]);
        boolean summary = behind <= Math.min(MOST_SUMMARY_LINES, lines.length);
        int refused = refusals.rowsUpTo(summary ? lines[lines.length - 1] : Integer.MAX_VALUE);
        int all = refused + lines.length;
        double allowed = rules.told().largestRefusedShare().orElse(LARGEST_REFUSED_SHARE);
        if (refused <= allowed * all) {
            return Optional.empty();
        }
        RefusedRows first = refusals.ranges().stream()
                .filter(r -> r.column().equals(Refusals.WHOLE_ROW))
                .findFirst()
                .orElseThrow();
        return Optional.of(new Finding(
                FindingKind.TOO_MANY_ROWS_REFUSED,
                Position.ofFile(file),
                Map.of(
                        "refused", Integer.toString(refused),
                        "rows", Integer.toString(all),
                        "share", Long.toString(StrictMath.round(allowed * 100)),
                        "line", Integer.toString(first.fromLine()),
                        "reason", first.reason())));
    }

    private Optional<Finding> empty(Samples samples) {
        if (!planned) {
            return Optional.empty();
        }
        return samples.emptyChannel()
                .map(rule -> new Finding(
                        FindingKind.CHANNEL_EMPTY,
                        Position.ofFile(file),
                        Map.of("channel", rule.channel(), "column", rule.header())));
    }

    private List<Channel> channels(Samples samples, int[] kept) {
        List<Channel> channels = new ArrayList<>();
        for (int c = 0; c < rules.columns().size(); c++) {
            ReadingRules.ColumnRule rule = rules.columns().get(c);
            FaultCodes codes = samples.codes(c);
            if (codes.samples() > 0) {
                findings.add(new Finding(
                        FindingKind.FAULT_CODES,
                        Position.ofFile(file),
                        Map.of(
                                "channel", rule.channel(),
                                "samples", Integer.toString(codes.samples()),
                                "codes", codes.words())));
            }
            double[] values = samples.take(c, kept);
            int every = HeldValues.everyRows(values, kept.length);
            if (every > 1) {
                HeldValues.drop(values, kept.length, every);
                findings.add(new Finding(
                        FindingKind.VALUES_HELD,
                        Position.ofFile(file),
                        Map.of("channel", rule.channel(), "every", Integer.toString(every))));
            }
            channels.add(new Channel(rule, Column.of(values)));
        }
        return channels;
    }

    private LogClock clock(Samples samples, TimeBase time) {
        long first = time.firstNanos();
        if (form.timeForm().elapsed()) {
            return LogClock.elapsed();
        }
        boolean utc = form.timeForm() == TimeForm.EPOCH_SECONDS || form.timeForm() == TimeForm.EPOCH_MILLISECONDS;
        int offset = samples.time().offsetSeconds();
        LocalDateTime local = LocalDateTime.ofEpochSecond(
                Math.floorDiv(first, SECOND) + offset, (int) Math.floorMod(first, SECOND), ZoneOffset.UTC);
        if (form.timeForm() == TimeForm.TIME_OF_DAY) {
            return LogClock.timeOfDay(local.toLocalTime());
        }
        return new LogClock(
                local, utc || samples.withOffset() ? Optional.of(ZoneOffset.ofTotalSeconds(offset)) : Optional.empty());
    }

    private void assumed() {
        form.guesses().stream()
                .filter(g -> g.basis() == Guess.Basis.ASSUMED)
                .filter(g -> !g.evidence().equals("no number has a fraction"))
                .forEach(g -> findings.add(new Finding(
                        FindingKind.FORM_ASSUMED,
                        Position.ofFile(file),
                        Map.of("what", g.what(), "value", g.value(), "evidence", g.evidence()))));
    }

    private void repeated(Rows rows) {
        if (rows.headersRepeated() > 0) {
            findings.add(new Finding(
                    FindingKind.HEADER_REPEATED,
                    Position.ofLine(file, rows.firstRepeated()),
                    Map.of("times", Integer.toString(rows.headersRepeated()))));
        }
    }

    private void unread(List<String> headers) {
        List<String> named = headers.stream().filter(h -> !h.startsWith("#")).toList();
        if (!named.isEmpty()) {
            findings.add(new Finding(
                    FindingKind.COLUMNS_UNREAD,
                    Position.ofLine(file, Math.max(1, form.firstRowLine() - 1)),
                    Map.of("columns", String.join(", ", named))));
        }
    }

    private void refused(int lastLine) {
        for (RefusedRows range : refusals.ranges()) {
            boolean behind = range.fromLine() > lastLine
                    && range.column().equals(Refusals.WHOLE_ROW)
                    && range.rows() <= MOST_SUMMARY_LINES;
            findings.add(
                    behind
                            ? new Finding(
                                    FindingKind.LINES_BEHIND,
                                    Position.ofLine(file, Math.min(range.fromLine(), lastLine + 1)),
                                    Map.of("lines", Integer.toString(range.rows()), "reason", range.reason()))
                            : new Finding(
                                    FindingKind.ROWS_REFUSED,
                                    Position.ofLine(file, range.fromLine()),
                                    Map.of(
                                            "lines", range.lines(),
                                            "column", range.column(),
                                            "reason", range.reason())));
        }
    }

    private Reading reading(List<String> unread, int[] lines) {
        return new Reading(
                form.encoding().name(),
                form.delimiter().word(),
                form.numbers().words(),
                form.timeForm().word(),
                form.headerLines(),
                lines.length,
                unread.stream().filter(h -> !h.startsWith("#")).toList(),
                refusals.ranges());
    }
}
