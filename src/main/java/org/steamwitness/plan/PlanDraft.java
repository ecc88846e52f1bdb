package org.steamwitness.plan;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;
import org.steamwitness.finding.Finding;

/** Writes a plan to start from: a preset whose channels are filled in from the columns of a log. */
public final class PlanDraft {

    private static final String CHANNELS = "channels:";

    private PlanDraft() {}

    /**
     * Writes the draft. The preset's channels are matched to columns by quantity and place; columns that match none
     * become channels of their own. Every place that is still open is a question mark and is named at the top.
     *
     * @param preset where to start from
     * @param columns columns found in a log, in its order, those of times aside; none leaves the preset's channels
     * @return a plan file with comments, as YAML with {@code \n} line ends
     */
    public static String of(Preset preset, List<FoundColumn> columns) {
        List<String> lines = preset.text().lines().toList();
        int first = lines.indexOf(CHANNELS) + 1;
        int end = first;
        while (end < lines.size() && lines.get(end).startsWith(" ")) {
            end++;
        }
        List<String> channels =
                columns.isEmpty() ? lines.subList(first, end) : new DraftChannels(preset, columns).lines();
        String body = joined(lines.subList(0, first)) + joined(channels) + joined(lines.subList(end, lines.size()));
        return head(preset, openPlaces(body)) + body;
    }

    /**
     * What is still open in a plan file.
     *
     * @param text the file
     * @return one finding a question mark, in the order of the file; other mistakes are not among them
     */
    public static List<Finding> openPlaces(String text) {
        return OpenPlace.in(Plan.read("", text.getBytes(StandardCharsets.UTF_8)));
    }

    private static String head(Preset preset, List<Finding> open) {
        return "# Draft from the preset " + preset.name() + ", approved by nobody.\n" + OpenPlace.listed(open) + "\n";
    }

    private static String joined(List<String> lines) {
        return lines.stream().map(line -> line + "\n").collect(Collectors.joining());
    }
}
