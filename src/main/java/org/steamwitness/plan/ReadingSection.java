package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a plan says of how its logs are written, for what a log does not show by itself.
 *
 * @param encoding of the text
 * @param delimiter between fields
 * @param decimalMark of numbers
 * @param thousandsMark of numbers
 * @param headerLine line that holds the headers, from 1
 * @param timeColumns headers of the columns that hold date and time
 * @param timeFormat how date and time are written, as a pattern of letters
 * @param dateOrder in which order day, month and year stand, where a date does not show it
 * @param quotedLineBreaks whether a field in quotation marks may hold a line break
 * @param missingCodes what stands in the place of a missing value
 * @param largestRefusedShare share of rows that may be refused, 0 to 1
 */
public record ReadingSection(
        Optional<String> encoding,
        Optional<String> delimiter,
        Optional<String> decimalMark,
        Optional<String> thousandsMark,
        Optional<Integer> headerLine,
        List<String> timeColumns,
        Optional<String> timeFormat,
        Optional<String> dateOrder,
        Optional<Boolean> quotedLineBreaks,
        List<String> missingCodes,
        OptionalDouble largestRefusedShare) {

    static final List<String> ENCODINGS = List.of("UTF-8", "UTF-16LE", "UTF-16BE", "windows-1252", "ISO-8859-1");
    static final List<String> DELIMITERS = List.of("comma", "semicolon", "tab", "pipe", "space");
    static final List<String> DECIMAL_MARKS = List.of("full stop", "comma");
    static final List<String> THOUSANDS_MARKS = List.of("none", "full stop", "comma", "space", "apostrophe");
    static final List<String> DATE_ORDERS = List.of("day-first", "month-first", "year-first");

    /**
     * Checks the marks.
     *
     * @param encoding of the text
     * @param delimiter between fields
     * @param decimalMark of numbers
     * @param thousandsMark of numbers
     * @param headerLine line that holds the headers
     * @param timeColumns headers of the columns that hold date and time
     * @param timeFormat how date and time are written
     * @param dateOrder in which order day, month and year stand
     * @param quotedLineBreaks whether a field may hold a line break
     * @param missingCodes what stands in the place of a missing value
     * @param largestRefusedShare share of rows that may be refused
     * @throws IllegalArgumentException if one mark would mean two things, or more than two columns hold times
     */
    public ReadingSection {
        if (decimalMark.isPresent() && decimalMark.equals(thousandsMark)) {
            throw new IllegalArgumentException("decimal-mark and thousands-mark must differ");
        }
        if (delimiter.isPresent() && delimiter.equals(decimalMark)) {
            throw new IllegalArgumentException("delimiter and decimal-mark must differ");
        }
        if (timeColumns.size() > 2) {
            throw new IllegalArgumentException("expected one column of times, or two: date and time of day");
        }
        timeColumns = List.copyOf(timeColumns);
        missingCodes = List.copyOf(missingCodes);
    }
}
