package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.finding.Finding;

class PlanPresetTest {

    private static final Pattern OPEN = Pattern.compile(
            "open place: fill in (?:.* such as (?<example>.*)|one of: (?<word>[^,]+),.*|(?<text>text))");

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void aDraftHasNothingWrongButItsOpenPlaces(CycleProcess process) {
        String draft = Preset.text(process);
        String filled = filled(draft);
        AsWritten<Plan> read = read(filled);
        assertThat(PlanLanguageTest.messages(read)).isEmpty();
        Plan plan = read.value().orElseThrow();
        assertThat(plan.process()).isEqualTo(process);
        assertThat(plan.status()).isEqualTo(PlanStatus.DRAFT);
        assertThat(PlanSchemaTest.PLAN.validate(PlanSchemaTest.tree(filled))).isEmpty();
        assertThat(filled.lines().filter(line -> !line.startsWith("#"))).noneMatch(line -> line.contains("\"?\""));
    }

    /** A limit with a figure of its own names its source, if only to say that it has none. */
    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void aFigureOfALimitNamesItsSource(CycleProcess process) {
        assertThat(Preset.text(process).lines().filter(line -> line.startsWith("  - {what")))
                .allMatch(line -> line.contains("\"?\"") || line.contains("common practice, no source"));
    }

    /** Fills every open place with the example that its message gives. */
    private static String filled(String draft) {
        List<String> lines = new ArrayList<>(Arrays.asList(draft.split("\n")));
        List<Finding> open = new ArrayList<>(read(draft).problems());
        assertThat(open).isNotEmpty();
        open.sort(Comparator.comparingInt((Finding f) -> f.position().line())
                .thenComparingInt(f -> f.position().column())
                .reversed());
        for (Finding place : open) {
            Matcher asked = OPEN.matcher(place.text());
            assertThat(asked.matches())
                    .as(place.position().text() + ": " + place.text())
                    .isTrue();
            String value = asked.group("example") != null
                    ? asked.group("example")
                    : asked.group("word") != null ? asked.group("word") : "something";
            int line = place.position().line() - 1;
            int column = place.position().column() - 1;
            String text = lines.get(line);
            assertThat(text.substring(column)).startsWith("\"?\"");
            lines.set(line, text.substring(0, column) + value + text.substring(column + 3));
        }
        return String.join("\n", lines) + "\n";
    }

    private static AsWritten<Plan> read(String text) {
        return Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
    }
}
