package org.steamwitness.trace;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.steamwitness.quantity.Datum;

/**
 * How a log is to be read, as asked for by the plan.
 *
 * @param columns the columns that are wanted, in the order of the plan; others are left unread
 * @param told what need not be found from the bytes
 */
public record ReadingRules(List<ColumnRule> columns, Told told) {

    /**
     * Takes a copy of the columns.
     *
     * @param columns the columns that are wanted
     * @param told what need not be found from the bytes
     */
    public ReadingRules {
        columns = List.copyOf(columns);
    }

    /**
     * All of the log's form is to be found.
     *
     * @param columns the columns that are wanted
     */
    public ReadingRules(List<ColumnRule> columns) {
        this(columns, Told.NOTHING);
    }

    /**
     * How one column is to be read.
     *
     * @param channel the channel's name in plan and record
     * @param header the column's header in the log, or "#3" for the third column
     * @param kind what it measures
     * @param unit the unit of its numbers, as written
     * @param datum what a pressure is counted from; absolute for all else
     * @param toSi turns a number of the log into kelvin or pascal
     */
    public record ColumnRule(
            String channel, String header, QuantityKind kind, String unit, Datum datum, DoubleUnaryOperator toSi) {}
}
