package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Grows columns row by row while a log is read. Nothing of a row is kept but its numbers, its time and its line. */
final class Samples {

    private final List<ColumnRule> rules;
    private final int[] fields;
    private final double[][] values;
    private final DoubleUnaryOperator[] toSi;
    private final double[] lowest;
    private final double[] highest;
    private final List<FaultCodes> codes = new ArrayList<>();
    private final NumberText numbers;
    private final Set<String> missingCodes;
    private final TimeReader time;
    private final Refusals refusals;
    private long[] nanos;
    private int[] lines;
    private int rows;

    /**
     * Prepares columns.
     *
     * @param rules the wanted columns
     * @param fields the field of each
     * @param form how the log is written
     * @param missingCodes texts that the plan names as missing samples
     * @param expectedRows how many rows there will be, roughly
     * @param refusals keeps account of what can't be read
     */
    Samples(
            List<ColumnRule> rules,
            int[] fields,
            LogForm form,
            Set<String> missingCodes,
            int expectedRows,
            Refusals refusals) {
        this.rules = rules;
        this.fields = fields.clone();
        this.values = new double[rules.size()][expectedRows];
        this.nanos = new long[expectedRows];
        this.lines = new int[expectedRows];
        this.numbers = new NumberText(form.numbers());
        this.missingCodes = missingCodes;
        this.time = new TimeReader(form.timeForm(), form.numbers());
        this.refusals = refusals;
        this.toSi = rules.stream().map(ColumnRule::toSi).toArray(DoubleUnaryOperator[]::new);
        rules.forEach(rule -> codes.add(new FaultCodes(rule)));
        this.lowest = codes.stream().mapToDouble(FaultCodes::lowest).toArray();
        this.highest = codes.stream().mapToDouble(FaultCodes::highest).toArray();
    }

    TimeReader time() {
        return time;
    }

    /** Appends a row whose time has been read. */
    void append(List<String> row, int line, long at) {
        room();
        for (int c = 0; c < values.length; c++) {
            values[c][rows] = value(c, row.get(fields[c]), line);
        }
        kept(line, at);
    }

    /** Appends a row as it was first split. */
    void append(CSVRecord row, int line, long at) {
        room();
        for (int c = 0; c < values.length; c++) {
            values[c][rows] = value(c, row.get(fields[c]), line);
        }
        kept(line, at);
    }

    private void kept(int line, long at) {
        nanos[rows] = at;
        lines[rows] = line;
        rows++;
    }

    private void room() {
        if (rows == nanos.length) {
            int more = rows + rows / 2 + 16;
            nanos = Arrays.copyOf(nanos, more);
            lines = Arrays.copyOf(lines, more);
            for (int c = 0; c < values.length; c++) {
                values[c] = Arrays.copyOf(values[c], more);
            }
        }
    }

    private double value(int channel, String text, int line) {
        double number = numbers.read(text);
        if (!Double.isNaN(number) && missingCodes.isEmpty()) {
            double value = toSi[channel].applyAsDouble(number);
            if (value >= lowest[channel] && value <= highest[channel]) {
                return value;
            }
        }
        return odd(channel, text, number, line);
    }

    /** What is no plain measurement: empty, a code, or no number at all. */
    private double odd(int channel, String text, double number, int line) {
        String plain = text.strip();
        int last = plain.length() - 1;
        if (last > 0 && plain.charAt(0) == '"' && plain.charAt(last) == '"') {
            return value(channel, plain.substring(1, last), line);
        }
        if (plain.isEmpty()) {
            return Double.NaN;
        }
        if (missingCodes.contains(plain) || MissingText.is(plain)) {
            codes.get(channel).count(text);
            return Double.NaN;
        }
        if (Double.isNaN(number)) {
            String held =
                    plain.indexOf('\0') >= 0 ? "a text with NUL characters" : "\"" + FieldText.shortened(plain) + "\"";
            refusals.field(line, rules.get(channel).header(), held + " is not a number, the sample is missing");
            return Double.NaN;
        }
        double value = toSi[channel].applyAsDouble(number);
        if (codes.get(channel).possible(value)) {
            return value;
        }
        codes.get(channel).count(text);
        return Double.NaN;
    }

    /** Refuses a row whose time does not fit; its numbers are not used. */
    void refuse(int row, String reason) {
        refusals.row(lines[row], Refusals.Cause.ORDER, reason);
    }

    /** Whether two rows hold the same numbers. */
    boolean alike(int one, int other) {
        for (double[] column : values) {
            if (Double.compare(column[one], column[other]) != 0) {
                return false;
            }
        }
        return true;
    }

    int rows() {
        return rows;
    }

    /** Times of all rows; the array itself, for the time base to put in order. */
    long[] nanos() {
        return nanos;
    }

    boolean withOffset() {
        return time.withOffset();
    }

    int lineOf(int row) {
        return lines[row];
    }

    FaultCodes codes(int channel) {
        return codes.get(channel);
    }

    /** The kept values of one channel; the channel's rows are given up. */
    double[] take(int channel, int[] kept) {
        double[] taken = taken(values[channel], kept);
        values[channel] = new double[0];
        return taken;
    }

    int[] takeLines(int[] kept) {
        int[] taken = new int[kept.length];
        for (int i = 0; i < kept.length; i++) {
            taken[i] = lines[kept[i]];
        }
        return taken;
    }

    /** A channel without any value. */
    Optional<ColumnRule> emptyChannel() {
        for (int c = 0; c < rules.size(); c++) {
            if (Arrays.stream(values[c], 0, rows).allMatch(Double::isNaN)) {
                return Optional.of(rules.get(c));
            }
        }
        return Optional.empty();
    }

    private static double[] taken(double[] all, int[] kept) {
        if (kept.length == all.length) {
            return all;
        }
        double[] taken = new double[kept.length];
        for (int i = 0; i < kept.length; i++) {
            taken[i] = all[kept[i]];
        }
        return taken;
    }
}
