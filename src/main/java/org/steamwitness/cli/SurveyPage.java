package org.steamwitness.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.steamwitness.quantity.Printed;
import org.steamwitness.run.LogSurvey;
import org.steamwitness.run.LogSurvey.ColumnSurvey;
import org.steamwitness.run.LogSurvey.Figures;

/** How a log was understood, as lines of text. */
final class SurveyPage {

    private static final int MOST_LISTED = 12;
    private static final int NAME_WIDTH = 24;

    private final LogSurvey survey;
    private final List<String> lines = new ArrayList<>();

    private SurveyPage(LogSurvey survey) {
        this.survey = survey;
    }

    static List<String> of(String name, LogSurvey survey) {
        return new SurveyPage(survey).page(name);
    }

    private List<String> page(String name) {
        LogSurvey.Extent extent = survey.extent();
        lines.add("Log          " + name);
        lines.add("Rows         " + extent.rows() + ", from line " + extent.firstLine() + " to line "
                + extent.lastLine());
        lines.add("Time         " + extent.start() + " to " + extent.end() + ", every "
                + Printed.fixed(extent.medianSeconds(), 2) + " s, longest "
                + Printed.fixed(extent.longestSeconds(), 2) + " s");
        lines.add("");
        for (LogSurvey.Point point : survey.points()) {
            lines.add(padded(point.what(), 13) + point.value() + " (" + point.basis() + ": " + point.evidence() + ")");
        }
        lines.add("");
        columns();
        refused();
        findings();
        return lines;
    }

    private void columns() {
        lines.add(padded("column", NAME_WIDTH + 4)
                + padded("quantity", 13)
                + padded("unit", 14)
                + padded("place?", 11)
                + right("lowest", 10)
                + right("highest", 10)
                + right("missing", 9)
                + right("step", 9)
                + right("noise", 9));
        for (ColumnSurvey column : survey.columns()) {
            String start = padded("#" + column.position(), 4) + padded(cut(column.header()), NAME_WIDTH);
            lines.add(
                    column.figures().isEmpty()
                            ? start + column.why()
                            : start
                                    + padded(column.quantity(), 13)
                                    + padded(unit(column), 14)
                                    + padded(column.place(), 11)
                                    + figures(column.figures().get(0)));
        }
        if (survey.columns().stream().anyMatch(ColumnSurvey::datumByStart)) {
            lines.add("    * counted from so, by where the pressure starts: check it");
        }
        lines.add("    ? is for you to say in a plan; quantities, units and places here are by the headers' words");
    }

    private static String unit(ColumnSurvey column) {
        return column.unit()
                + (column.datum().isEmpty() ? "" : " " + column.datum() + (column.datumByStart() ? "*" : ""));
    }

    private static String figures(Figures figures) {
        return right(Printed.fixed(figures.lowest(), 2), 10)
                + right(Printed.fixed(figures.highest(), 2), 10)
                + right(Integer.toString(figures.missing()), 9)
                + right(small(figures.resolution()), 9)
                + right(small(figures.noise()), 9);
    }

    private static String small(OptionalDouble value) {
        return value.isPresent() ? Printed.fixed(value.getAsDouble(), 4) : "–";
    }

    private void refused() {
        List<LogSurvey.Refusal> ranges = survey.refusals();
        int rows = ranges.stream().mapToInt(LogSurvey.Refusal::rows).sum();
        lines.add("");
        lines.add("Refused      " + (ranges.isEmpty() ? "nothing" : rows + " rows or fields"));
        for (LogSurvey.Refusal range : ranges.subList(0, Math.min(MOST_LISTED, ranges.size()))) {
            String where = range.fromLine() == range.toLine()
                    ? "line " + range.fromLine()
                    : "lines " + range.fromLine() + " to " + range.toLine();
            lines.add("  " + where + ": " + range.column() + ": " + range.reason());
        }
        if (ranges.size() > MOST_LISTED) {
            lines.add("  and " + (ranges.size() - MOST_LISTED) + " ranges more");
        }
    }

    private void findings() {
        survey.findings().stream()
                .filter(f -> !f.kind().word().equals("rows-refused"))
                .limit(MOST_LISTED)
                .forEach(f -> lines.add("Note         " + f.text() + " " + f.remedy()));
    }

    private static String cut(String header) {
        return header.length() < NAME_WIDTH ? header : header.substring(0, NAME_WIDTH - 2) + "…";
    }

    private static String padded(String text, int width) {
        return text + " ".repeat(Math.max(1, width - text.length()));
    }

    private static String right(String text, int width) {
        return " ".repeat(Math.max(1, width - text.length())) + text;
    }
}
