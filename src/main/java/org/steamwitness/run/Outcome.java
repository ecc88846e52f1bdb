package org.steamwitness.run;

import java.time.OffsetDateTime;
import java.util.List;
import org.steamwitness.finding.Finding;
import org.steamwitness.record.CycleRecord;

/** What became of an evaluation. */
public sealed interface Outcome {

    /**
     * There is a record.
     *
     * @param record its data
     * @param pdf prints it
     */
    record Evaluated(CycleRecord record, Printer pdf) implements Outcome {}

    /**
     * The run can't be evaluated.
     *
     * @param findings why
     */
    record Refused(List<Finding> findings) implements Outcome {}

    /** Nobody wants it any more. */
    record Cancelled() implements Outcome {}

    /** Prints a record when somebody wants the paper. */
    @FunctionalInterface
    interface Printer {

        /**
         * Prints the record.
         *
         * @param printedAt the time of printing
         * @return the PDF
         */
        byte[] print(OffsetDateTime printedAt);
    }
}
