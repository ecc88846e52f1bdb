package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.steamwitness.trace.Reading.RefusedRows;

/**
 * Keeps account of rows and fields that had to be refused. Neighbouring lines refused for the same cause are one range,
 * told by its first text; beyond a number of ranges the rest is counted together, so that half a million bad rows make
 * neither a flood nor a slow run.
 */
final class Refusals {

    /** So many ranges are told one by one. */
    static final int MOST_RANGES = 200;

    static final String WHOLE_ROW = "whole row";

    private final List<RefusedRows> ranges = new ArrayList<>();
    private final Map<String, Integer> lastOfCause = new HashMap<>();
    private final List<Integer> rowLines = new ArrayList<>();
    private RefusedRows further;

    /**
     * A row that becomes no sample.
     *
     * @param line as an editor counts
     * @param cause the same for all rows refused alike
     * @param reason in words
     */
    void row(int line, Cause cause, String reason) {
        rowLines.add(line);
        add(line, WHOLE_ROW, cause, reason);
    }

    /**
     * A field that becomes a missing sample.
     *
     * @param line as an editor counts
     * @param column header of its column
     * @param reason in words
     */
    void field(int line, String column, String reason) {
        add(line, column, Cause.NUMBER, reason);
    }

    /** How many whole rows were refused up to a line. */
    int rowsUpTo(int line) {
        int count = 0;
        for (int refused : rowLines) {
            count += refused <= line ? 1 : 0;
        }
        return count;
    }

    /** All ranges, those that are counted together last. */
    List<RefusedRows> ranges() {
        List<RefusedRows> all = new ArrayList<>(ranges);
        all.sort(Comparator.comparingInt(RefusedRows::fromLine));
        if (further != null) {
            all.add(further);
        }
        return all;
    }

    private void add(int line, String column, Cause cause, String reason) {
        String key = cause + column;
        Integer last = lastOfCause.get(key);
        if (last != null && ranges.get(last).toLine() == line - 1) {
            RefusedRows range = ranges.get(last);
            ranges.set(last, new RefusedRows(range.fromLine(), line, range.rows() + 1, range.column(), range.reason()));
        } else if (ranges.size() < MOST_RANGES) {
            lastOfCause.put(key, ranges.size());
            ranges.add(new RefusedRows(line, line, 1, column, reason));
        } else {
            further = further == null
                    ? new RefusedRows(line, line, 1, "several", "further refusals, counted together")
                    : new RefusedRows(further.fromLine(), line, further.rows() + 1, further.column(), further.reason());
        }
    }

    /** Why something was refused. */
    enum Cause {
        /** Too few or too many fields. */
        FIELDS,
        /** A time that can't be read. */
        TIME,
        /** A time that does not come after the one before. */
        ORDER,
        /** A quotation mark without its partner. */
        QUOTE,
        /** A line beyond the longest. */
        LENGTH,
        /** A field that is no number. */
        NUMBER
    }
}
