package org.steamwitness.trace;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;

/**
 * What people told of a log's form, so that it need not be found. Whatever is empty is found from the bytes.
 *
 * @param encoding the character encoding, such as "UTF-8"
 * @param delimiter what stands between two fields
 * @param decimalMark what stands before the fraction of a number, '.' or ','
 * @param thousandsMark what groups the digits before it
 * @param headerLine line of the column names, as an editor counts lines; 0 if there is none
 * @param timeColumns headers of the columns that tell date and time, one or two
 * @param timeForm how date and time are written
 * @param quotedLineBreaks whether a quoted field may run over several lines
 * @param missingCodes texts that stand for a missing sample
 * @param largestRefusedShare share of refused rows beyond which the log is not evaluated, 0 to 1
 */
public record Told(
        Optional<String> encoding,
        Optional<Delimiter> delimiter,
        Optional<Character> decimalMark,
        Optional<Character> thousandsMark,
        OptionalInt headerLine,
        List<String> timeColumns,
        Optional<TimeForm> timeForm,
        boolean quotedLineBreaks,
        Set<String> missingCodes,
        OptionalDouble largestRefusedShare) {

    /** Nothing was told: all is found. */
    public static final Told NOTHING = new Told(
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            OptionalInt.empty(),
            List.of(),
            Optional.empty(),
            false,
            Set.of(),
            OptionalDouble.empty());

    /**
     * Takes copies of the collections.
     *
     * @param encoding the character encoding
     * @param delimiter what stands between two fields
     * @param decimalMark what stands before the fraction of a number
     * @param thousandsMark what groups the digits before it
     * @param headerLine line of the column names
     * @param timeColumns headers of the columns that tell date and time
     * @param timeForm how date and time are written
     * @param quotedLineBreaks whether a quoted field may run over several lines
     * @param missingCodes texts that stand for a missing sample
     * @param largestRefusedShare share of refused rows beyond which the log is not evaluated
     */
    public Told {
        timeColumns = List.copyOf(timeColumns);
        missingCodes = Set.copyOf(missingCodes);
    }
}
