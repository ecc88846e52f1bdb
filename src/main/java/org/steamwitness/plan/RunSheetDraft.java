package org.steamwitness.plan;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.steamwitness.finding.Finding;
import org.steamwitness.trace.Place;

/** Writes the blank run sheet of a plan: what the plan requires is open, all else stands there as a comment. */
public final class RunSheetDraft {

    private static final String OPEN = OpenPlace.WRITTEN;
    private static final List<String> MARKS = List.of("steam-on", "vent-closed", "timing-started", "steam-off");

    private static final Set<Place> MOVING = EnumSet.of(Place.PRODUCT, Place.LOAD, Place.FREE_SPACE);

    private final Plan plan;
    private final Set<String> required;
    private final List<String> lines = new ArrayList<>();

    private RunSheetDraft(Plan plan) {
        this.plan = plan;
        this.required = plan.requiredEntries();
    }

    /**
     * Writes the blank run sheet.
     *
     * @param plan the plan that the run is to follow
     * @return a run sheet file with comments, as YAML with {@code \n} line ends
     */
    public static String of(Plan plan) {
        String body = new RunSheetDraft(plan).body();
        List<Finding> open = openPlaces(body);
        return "# Run sheet for plan " + QuotedText.comment(plan.id()) + " revision " + plan.revision() + ": "
                + QuotedText.comment(plan.title()) + "\n" + OpenPlace.listed(open)
                + "# Lines behind # may be left out; take the mark away to fill them in. Times are by the log's clock.\n\n"
                + body;
    }

    /**
     * What is still open in a run sheet file.
     *
     * @param text the file
     * @return one finding a question mark, in the order of the file; other mistakes are not among them
     */
    public static List<Finding> openPlaces(String text) {
        return OpenPlace.in(RunSheet.read("", text.getBytes(StandardCharsets.UTF_8)));
    }

    private String body() {
        lines.add("run-format: 1");
        lines.add("run: " + OPEN + "                           # number of the run");
        lines.add("plan-used: {id: " + QuotedText.of(plan.id()) + ", revision: " + plan.revision() + "}");
        lines.add("equipment: " + QuotedText.of(plan.equipment()));
        entry("log-part", "{from: " + OPEN + ", to: " + OPEN + "}", "only this part of the log belongs to the run");
        entry("zone", OPEN, "time zone of the log's clock, such as Europe/Lisbon");
        entry("clocks", "{log: " + OPEN + ", wall: " + OPEN + "}", "both read at the same moment");
        entry("atmosphere", OPEN, "read beside the chamber, not reduced to sea level, such as 1008 hPa");
        product();
        entry(
                "initial-temperature",
                "{value: " + OPEN + ", at: " + OPEN + ", instrument: " + OPEN + "}",
                "of the coldest container");
        entry("water", "{before: " + OPEN + ", after: " + OPEN + "}", "of a closed vessel, weighed, such as 1.20 kg");
        marks();
        entry(
                "readings",
                "[{at: " + OPEN + ", indicating: " + OPEN + ", pressure: " + OPEN + "}]",
                "of the indicating instruments, such as 121.6 degC and 1.07 bar(g)");
        probes();
        entry(
                "indicators",
                "[{kind: " + OPEN + ", lot: " + OPEN + ", result: " + OPEN + ", read-by: " + OPEN + "}]",
                "such as chemical, CI-9, passed, J.");
        lines.add(
                "corrections: []                    # a moved boundary {phase: hold, starts: 08:28, reason: , by: , at: }");
        lines.add("                                   # or a probe left out {channel: can-1, reason: , by: , at: }");
        lines.add("events: []                         # such as {at: 08:50, what: door alarm}");
        lines.add("entered: {by: " + OPEN + ", at: " + OPEN + "}         # at: such as 2026-03-14T10:31+00:00");
        return lines.stream().map(line -> line + "\n").collect(Collectors.joining());
    }

    private void entry(String key, String value, String comment) {
        lines.add((required.contains(key) ? "" : "#") + key + ": " + value + "   # " + comment);
    }

    private void product() {
        boolean lots = required.contains("lots");
        String mark = lots || required.contains("product") ? "" : "#";
        lines.add(mark + "product:                           # what was processed");
        lines.add(mark + "  name: " + OPEN);
        lines.add((lots ? "" : "#") + "  lots: [" + OPEN + "]");
        lines.add("#  code: " + OPEN + "                       # the plant's code");
        lines.add("#  container: " + OPEN + "                  # kind and size, such as 73 x 111 mm");
        lines.add("#  count: " + OPEN + "                      # how many containers");
    }

    private void marks() {
        boolean any = MARKS.stream().anyMatch(mark -> required.contains("marks." + mark));
        lines.add(
                (any ? "" : "#") + "marks:                             # such as 08:12, or with what the thermometer");
        lines.add("                                   # showed: {at: 08:19, indicating: 107.8 degC}");
        for (String mark : MARKS) {
            lines.add((required.contains("marks." + mark) ? "" : "#") + "  " + mark + ": " + OPEN);
        }
    }

    /** One line a channel that moves with the load. */
    private void probes() {
        boolean wanted = required.contains("probes");
        List<String> moving = plan.channels().stream()
                .filter(channel -> MOVING.contains(channel.place()))
                .map(PlannedChannel::name)
                .toList();
        lines.add((wanted ? "" : "#") + "probes:                            # where each probe was put");
        for (String channel : moving.isEmpty() ? List.of(OPEN) : moving) {
            lines.add((wanted ? "" : "#") + "  - {channel: "
                    + (moving.isEmpty() ? OPEN : QuotedText.of(channel)) + ", serial: " + OPEN + ", position: " + OPEN
                    + "}");
        }
    }
}
