package org.steamwitness.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.steamwitness.finding.Finding;

/** Fills in every open place of a file as a person would who does no more than the message says. */
final class Filled {

    private static final Pattern EXAMPLE = Pattern.compile("(?:such as |whole number from )(.+?)(?:,? (?:or|to) .*)?$");
    private static final Pattern WORD = Pattern.compile("one of: ([^,]+).*");

    /** Where the example of the message would contradict another, or a choice that stands in the file already. */
    private static final Map<String, String> BETTER = Map.of(
            "hold.at-most", "124.1 degC",
            "chamber.free-volume", "1.0 m3",
            "log-part.to", "10:10",
            "readings[0].pressure", "1.07 bar(g)");

    private Filled() {}

    static String plan(String text) {
        String filled = text;
        List<Finding> open = PlanDraft.openPlaces(filled);
        while (!open.isEmpty()) {
            filled = fill(filled, open.get(open.size() - 1));
            open = PlanDraft.openPlaces(filled);
        }
        return filled;
    }

    static String runSheet(String text) {
        String filled = text;
        List<Finding> open = RunSheetDraft.openPlaces(filled);
        while (!open.isEmpty()) {
            filled = fill(filled, open.get(open.size() - 1));
            open = RunSheetDraft.openPlaces(filled);
        }
        return filled;
    }

    private static String fill(String text, Finding open) {
        List<String> lines = new ArrayList<>(text.lines().toList());
        int line = open.position().line() - 1;
        int column = open.position().column() - 1;
        String old = lines.get(line);
        String mark = old.startsWith("\"?\"", column) ? "\"?\"" : "?";
        if (!old.startsWith(mark, column)) {
            throw new AssertionError("no question mark at " + open.position().text() + " of: " + old);
        }
        String value =
                BETTER.getOrDefault(open.position().path(), value(open.facts().get("expected")));
        lines.set(line, old.substring(0, column) + value + old.substring(column + mark.length()));
        return String.join("\n", lines) + "\n";
    }

    private static String value(String expected) {
        Matcher word = WORD.matcher(expected);
        if (word.matches()) {
            return word.group(1);
        }
        Matcher example = EXAMPLE.matcher(expected);
        return example.find() ? example.group(1) : "\"filled in\"";
    }
}
