package org.steamwitness.record;

import java.util.List;

/**
 * How the log was read.
 *
 * @param encoding character encoding
 * @param delimiter what stands between two fields
 * @param decimalMark what stands before the fraction of a number
 * @param timeFormat how times are written
 * @param zone time zone of the log's clock
 * @param headerLines the header as written
 * @param rows rows that became samples
 * @param refused what did not
 */
public record ReadingPart(
        String encoding,
        String delimiter,
        String decimalMark,
        String timeFormat,
        Given<String> zone,
        List<String> headerLines,
        int rows,
        Refused refused) {

    /**
     * Rows and fields that did not become samples.
     *
     * @param count how many, folded ranges counted whole
     * @param ranges neighbours refused for one reason
     */
    public record Refused(int count, List<Range> ranges) {}

    /**
     * Neighbouring rows refused for one reason.
     *
     * @param fromLine first line, as an editor counts
     * @param toLine last line
     * @param column header of the column, or "whole row"
     * @param reason in words
     */
    public record Range(int fromLine, int toLine, String column, String reason) {}
}
