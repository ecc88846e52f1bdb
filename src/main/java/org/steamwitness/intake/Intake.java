package org.steamwitness.intake;

import java.util.List;
import org.steamwitness.finding.Finding;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Trace;

/** What became of a log. */
public sealed interface Intake {

    /**
     * It could be read, perhaps without some rows.
     *
     * @param trace its samples
     * @param reading how it was read and what was refused
     * @param findings what the reader must know about that
     * @param guesses how the log's form came to be known
     * @param columns all columns of the log
     * @param times indices of the columns that tell the time
     */
    record Read(
            Trace trace,
            Reading reading,
            List<Finding> findings,
            List<Guess> guesses,
            List<FoundColumn> columns,
            List<Integer> times)
            implements Intake {}

    /**
     * It can't be evaluated.
     *
     * @param findings why
     */
    record Unreadable(List<Finding> findings) implements Intake {}

    /** Nobody wants it any more. */
    record Cancelled() implements Intake {}
}
