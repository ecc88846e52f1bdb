package org.steamwitness.trace;

import java.util.List;

/**
 * What was done to read a log.
 *
 * @param encoding the character encoding
 * @param delimiter what stands between two fields
 * @param decimalMark what stands before the fraction of a number
 * @param timeFormat how the times are written, in words
 * @param headerLines the header, as written
 * @param rows rows that became samples
 * @param unreadColumns headers of columns that no channel of the plan names
 * @param refused rows that did not become samples, folded into ranges
 */
public record Reading(
        String encoding,
        String delimiter,
        String decimalMark,
        String timeFormat,
        List<String> headerLines,
        int rows,
        List<String> unreadColumns,
        List<RefusedRows> refused) {

    /**
     * Takes copies of the lists.
     *
     * @param encoding the character encoding
     * @param delimiter what stands between two fields
     * @param decimalMark what stands before the fraction of a number
     * @param timeFormat how the times are written, in words
     * @param headerLines the header, as written
     * @param rows rows that became samples
     * @param unreadColumns headers of columns that no channel of the plan names
     * @param refused rows that did not become samples, folded into ranges
     */
    public Reading {
        headerLines = List.copyOf(headerLines);
        unreadColumns = List.copyOf(unreadColumns);
        refused = List.copyOf(refused);
    }

    /**
     * How many rows were refused.
     *
     * @return zero or more
     */
    public int refusedRows() {
        return refused.stream().mapToInt(RefusedRows::rows).sum();
    }

    /**
     * Neighbouring rows refused for the same reason.
     *
     * @param fromLine first line, as an editor counts them
     * @param toLine last line
     * @param rows how many rows that are
     * @param column header of the column at fault, or "whole row"
     * @param reason in words
     */
    public record RefusedRows(int fromLine, int toLine, int rows, String column, String reason) {

        /**
         * Which lines these are, in words.
         *
         * @return such as "Line 14", or "Lines 776 to 778 (3 rows)"
         */
        public String lines() {
            return fromLine == toLine
                    ? "Line " + fromLine
                    : "Lines " + fromLine + " to " + toLine + " (" + rows + (rows == 1 ? " row)" : " rows)");
        }
    }
}
