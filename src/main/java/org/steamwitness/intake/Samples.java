package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.trace.Channel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Reading.RefusedRows;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.ReadingRules.ColumnRule;
import org.steamwitness.trace.Trace;

/** Grows columns row by row while a log is read, and keeps account of what had to be refused. */
final class Samples {

    private static final String WHOLE_ROW = "whole row";

    private final List<ColumnRule> rules;
    private final List<String> headers;
    private final int[] fields;
    private final double[][] values;
    private final List<RefusedRows> refusals = new ArrayList<>();
    private double[] seconds = new double[4096];
    private int[] lines = new int[4096];
    private int rows;
    private int refusedRows;
    private TimeText first;

    Samples(ReadingRules wanted, List<String> headers) {
        this.rules = wanted.columns();
        this.headers = headers;
        this.fields = rules.stream()
                .mapToInt(rule -> headers.lastIndexOf(rule.header()))
                .toArray();
        this.values = new double[rules.size()][4096];
    }

    void add(CSVRecord row, int line) {
        if (row.size() != headers.size()) {
            refuseRow(line, "it has " + row.size() + " fields where the header has " + headers.size());
            return;
        }
        Optional<TimeText> time = TimeText.read(row.get(0));
        if (time.isEmpty()) {
            refuseRow(line, "its time \"" + shortened(row.get(0)) + "\" is not ISO 8601, as 2026-03-14T08:05:00");
            return;
        }
        if (first != null && !time.get().writtenLike(first)) {
            refuseRow(line, "its time is written otherwise than the first, with or without distance from UTC");
            return;
        }
        double instant = first == null ? 0 : time.get().secondsAfter(first);
        if (rows > 0 && !(instant > seconds[rows - 1])) {
            refuseRow(line, "its time does not come after the row before");
            return;
        }
        if (first == null) {
            first = time.get();
        }
        append(row, line, instant);
    }

    int rows() {
        return rows;
    }

    int refusedRows() {
        return refusedRows;
    }

    List<RefusedRows> refusals() {
        return refusals;
    }

    Optional<RefusedRows> firstRefusal() {
        return refusals.stream().findFirst();
    }

    Optional<ColumnRule> emptyChannel() {
        for (int c = 0; c < rules.size(); c++) {
            if (Arrays.stream(values[c], 0, rows).allMatch(Double::isNaN)) {
                return Optional.of(rules.get(c));
            }
        }
        return Optional.empty();
    }

    Trace trace() {
        List<Channel> channels = new ArrayList<>();
        for (int c = 0; c < rules.size(); c++) {
            channels.add(new Channel(rules.get(c), Column.of(Arrays.copyOf(values[c], rows))));
        }
        return new Trace(
                new LogClock(first.local(), first.offset()),
                Column.of(Arrays.copyOf(seconds, rows)),
                Arrays.copyOf(lines, rows),
                channels);
    }

    Reading reading(String encoding, List<String> headerFields, List<String> unread) {
        return new Reading(
                encoding,
                "comma",
                "full stop",
                first.format(),
                List.of(String.join(",", headerFields)),
                rows,
                unread,
                refusals);
    }

    private void append(CSVRecord row, int line, double instant) {
        if (rows == seconds.length) {
            seconds = Arrays.copyOf(seconds, 2 * rows);
            lines = Arrays.copyOf(lines, 2 * rows);
            for (int c = 0; c < values.length; c++) {
                values[c] = Arrays.copyOf(values[c], 2 * rows);
            }
        }
        seconds[rows] = instant;
        lines[rows] = line;
        for (int c = 0; c < values.length; c++) {
            values[c][rows] = value(rules.get(c), row.get(fields[c]), line);
        }
        rows++;
    }

    private double value(ColumnRule rule, String text, int line) {
        if (text.isEmpty()) {
            return Double.NaN;
        }
        OptionalDouble number = NumberText.read(text);
        if (number.isEmpty()) {
            fold(new RefusedRows(
                    line,
                    line,
                    1,
                    rule.header(),
                    "\"" + shortened(text) + "\" is not a number, the sample is missing"));
            return Double.NaN;
        }
        return rule.toSi().applyAsDouble(number.getAsDouble());
    }

    private void refuseRow(int line, String reason) {
        refusedRows++;
        fold(new RefusedRows(line, line, 1, WHOLE_ROW, reason));
    }

    private void fold(RefusedRows next) {
        int last = refusals.size() - 1;
        if (last >= 0 && refusals.get(last).continuedBy(next)) {
            refusals.set(last, refusals.get(last).joinedWith(next));
        } else {
            refusals.add(next);
        }
    }

    private static String shortened(String text) {
        return text.length() <= 24 ? text : text.substring(0, 24) + "…";
    }
}
