package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/**
 * Which field of a row each wanted channel is: the column whose header is exactly the plan's, or else the only one that
 * people would call the same.
 */
final class ColumnChoice {

    private final String file;
    private final LogForm form;
    private final List<Integer> fields = new ArrayList<>();
    private final List<Finding> missing = new ArrayList<>();
    private final List<Finding> notes = new ArrayList<>();

    ColumnChoice(String file, LogForm form, List<ColumnRule> rules) {
        this.file = file;
        this.form = form;
        rules.forEach(this::choose);
    }

    int[] fields() {
        return fields.stream().mapToInt(Integer::intValue).toArray();
    }

    /** Why the log can't be evaluated; empty if every channel has its column. */
    List<Finding> missing() {
        return missing;
    }

    List<Finding> notes() {
        return notes;
    }

    /** Headers of columns that nobody wants, the time's left out. */
    List<String> unread() {
        return form.columns().stream()
                .filter(c -> !form.times().contains(c.position() - 1) && !fields.contains(c.position() - 1))
                .map(FoundColumn::header)
                .toList();
    }

    private void choose(ColumnRule rule) {
        List<FoundColumn> exact =
                form.columns().stream().filter(c -> c.isNamed(rule.header())).toList();
        List<FoundColumn> alike =
                form.columns().stream().filter(c -> c.isAlike(rule.header())).toList();
        if (exact.size() == 1) {
            fields.add(exact.get(0).position() - 1);
        } else if (exact.size() > 1) {
            missing.add(finding(
                    FindingKind.COLUMN_TWICE,
                    Map.of(
                            "channel", rule.channel(),
                            "column", rule.header(),
                            "times", Integer.toString(exact.size()))));
        } else if (alike.size() == 1) {
            fields.add(alike.get(0).position() - 1);
            notes.add(finding(
                    FindingKind.COLUMN_ALIKE,
                    Map.of(
                            "channel", rule.channel(),
                            "column", rule.header(),
                            "header", alike.get(0).header())));
        } else {
            missing.add(finding(
                    FindingKind.COLUMN_ABSENT,
                    Map.of(
                            "channel", rule.channel(),
                            "column", rule.header(),
                            "headers", headers())));
        }
    }

    private String headers() {
        return form.columns().stream()
                .map(c -> FieldText.shortened(c.header()))
                .limit(40)
                .collect(Collectors.joining(", ", "", form.columns().size() > 40 ? ", …" : ""));
    }

    private Finding finding(FindingKind kind, Map<String, String> facts) {
        return new Finding(kind, Position.ofLine(file, Math.max(1, form.firstRowLine() - 1)), facts);
    }
}
