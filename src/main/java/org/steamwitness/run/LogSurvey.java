package org.steamwitness.run;

import java.util.List;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.plan.FoundColumn;

/** How a log was understood, in the words in which people read it. */
public final class LogSurvey {

    private final Extent extent;
    private final List<Point> points;
    private final List<ColumnSurvey> columns;
    private final List<Refusal> refusals;
    private final List<Finding> findings;
    private final List<FoundColumn> forPlan;

    LogSurvey(
            Extent extent,
            List<Point> points,
            List<ColumnSurvey> columns,
            List<Refusal> refusals,
            List<Finding> findings,
            List<FoundColumn> forPlan) {
        this.extent = extent;
        this.points = List.copyOf(points);
        this.columns = List.copyOf(columns);
        this.refusals = List.copyOf(refusals);
        this.findings = List.copyOf(findings);
        this.forPlan = List.copyOf(forPlan);
    }

    /**
     * Rows and time.
     *
     * @return how far the samples reach
     */
    public Extent extent() {
        return extent;
    }

    /**
     * What had to be known to read the log.
     *
     * @return encoding, delimiter and so on
     */
    public List<Point> points() {
        return points;
    }

    /**
     * All columns.
     *
     * @return in the order of the log
     */
    public List<ColumnSurvey> columns() {
        return columns;
    }

    /**
     * What did not become samples.
     *
     * @return folded into ranges
     */
    public List<Refusal> refusals() {
        return refusals;
    }

    /**
     * What the reader must know.
     *
     * @return refused rows among them
     */
    public List<Finding> findings() {
        return findings;
    }

    /** The columns that a plan could have channels for. */
    List<FoundColumn> forPlan() {
        return forPlan;
    }

    /**
     * How far the samples reach.
     *
     * @param rows rows that became samples
     * @param firstLine line of the first
     * @param lastLine line of the last
     * @param start its time, or the time since the start
     * @param end that of the last
     * @param medianSeconds usual time between samples
     * @param longestSeconds longest time between samples
     */
    public record Extent(
            int rows,
            int firstLine,
            int lastLine,
            String start,
            String end,
            double medianSeconds,
            double longestSeconds) {}

    /**
     * One thing that had to be known.
     *
     * @param what such as "delimiter"
     * @param value as it was taken
     * @param basis found, told or assumed
     * @param evidence why
     */
    public record Point(String what, String value, String basis, String evidence) {}

    /**
     * One column; what nothing tells is "?".
     *
     * @param position 1 for the first
     * @param header as written
     * @param quantity what it measures
     * @param unit the unit of its numbers
     * @param datum what a pressure is counted from; empty for all else
     * @param datumByStart whether the datum was told by where the pressure starts
     * @param place where its sensor may sit
     * @param figures its samples; empty for columns of times and those that can't be read
     * @param why why it has no figures; empty if it has
     */
    public record ColumnSurvey(
            int position,
            String header,
            String quantity,
            String unit,
            String datum,
            boolean datumByStart,
            String place,
            List<Figures> figures,
            String why) {}

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

    /**
     * Rows or fields that did not become samples.
     *
     * @param fromLine first line
     * @param toLine last line
     * @param rows how many
     * @param column header of the column, or "whole row"
     * @param reason in words
     */
    public record Refusal(int fromLine, int toLine, int rows, String column, String reason) {}
}
