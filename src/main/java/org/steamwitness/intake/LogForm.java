package org.steamwitness.intake;

import java.util.List;
import org.steamwitness.trace.Delimiter;
import org.steamwitness.trace.TimeForm;

/**
 * How a log is written.
 *
 * @param encoding of its bytes
 * @param delimiter between fields
 * @param numbers how numbers are written
 * @param width fields of a row
 * @param meanRowBytes mean length of the first rows
 * @param firstRowLine line of the first row of samples, as an editor counts
 * @param headerLines the lines of names and units, as written
 * @param columns all columns, those of the time among them
 * @param times indices of the columns that tell the time, one or two
 * @param timeForm how times are written
 * @param guesses how all this came to be known
 */
record LogForm(
        Encoding encoding,
        Delimiter delimiter,
        NumberForm numbers,
        int width,
        double meanRowBytes,
        int firstRowLine,
        List<String> headerLines,
        List<FoundColumn> columns,
        List<Integer> times,
        TimeForm timeForm,
        List<Guess> guesses) {}
