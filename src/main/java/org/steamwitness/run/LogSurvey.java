package org.steamwitness.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.intake.FoundColumn;
import org.steamwitness.intake.Guess;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Trace;

/**
 * How a log was understood, without a plan or with one.
 *
 * @param trace its samples
 * @param reading how they were read
 * @param guesses how that came to be known
 * @param columns all columns, in the order of the log
 * @param findings what the reader must know
 */
public record LogSurvey(
        Trace trace, Reading reading, List<Guess> guesses, List<ColumnSurvey> columns, List<Finding> findings) {

    /**
     * One column.
     *
     * @param found what its header suggests
     * @param datum what a pressure is counted from, by its header or by where it starts
     * @param datumBasis how the datum came to be known, in words; empty if it is not known
     * @param figures its samples; empty for columns of times and those that can't be read
     * @param why why it has no figures, in words; empty if it has
     */
    public record ColumnSurvey(
            FoundColumn found, Optional<Datum> datum, String datumBasis, Optional<Figures> figures, String why) {}

    /**
     * What a column shows, in its own unit.
     *
     * @param samples samples with a value
     * @param missing samples without one
     * @param lowest lowest value
     * @param highest highest value
     * @param resolution smallest step seen often
     * @param noise standard deviation of what neighbouring samples do not share
     */
    public record Figures(
            int samples, int missing, double lowest, double highest, OptionalDouble resolution, OptionalDouble noise) {}
}
