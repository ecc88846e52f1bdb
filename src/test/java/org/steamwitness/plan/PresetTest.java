package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;

class PresetTest {

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void everyProcessHasADraftWhoseOnlyMistakesAreOpenPlaces(CycleProcess process) {
        Preset preset = Preset.of(process);
        assertThat(preset.name()).isEqualTo(process.word());
        assertThat(preset.text()).contains("\nprocess: " + process.word() + "\n", "\nstatus: draft ");
        List<Finding> problems = read(preset.text()).problems();
        assertThat(problems).extracting(Finding::kind).containsOnly(FindingKind.OPEN_PLACE);
        assertThat(problems).extracting(p -> p.position().path()).contains("basis.document", "channels[0].column");
        assertThat(problems).hasSize((int) Pattern.compile("\"\\?\"")
                .matcher(preset.text().replaceAll("#.*", ""))
                .results()
                .count());
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void onceFilledInItReadsAndIsStillADraft(CycleProcess process) {
        Plan plan = Plan.read("p.yaml", Filled.plan(Preset.of(process).text()).getBytes(StandardCharsets.UTF_8))
                .value()
                .orElseThrow();
        assertThat(plan.status()).isEqualTo(PlanStatus.DRAFT);
        assertThat(plan.process()).isEqualTo(process);
        assertThat(plan.requiredEntries()).contains("atmosphere");
    }

    /** A figure stands there with its source, or with the confession that it has none. */
    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void everyLimitNamesItsSourceAndNoneAStandard(CycleProcess process) {
        String text = Preset.of(process).text();
        Plan plan = Plan.read("p.yaml", Filled.plan(text).getBytes(StandardCharsets.UTF_8))
                .value()
                .orElseThrow();
        assertThat(plan.limits()).allSatisfy(limit -> assertThat(limit.source()).isPresent());
        assertThat(text).doesNotContain("EN 285", "ISO 17665", "HTM", "EN 13060");
        text.lines()
                .filter(line ->
                        line.startsWith("sampling:") || line.startsWith("longest-gap:") || line.startsWith("decision:"))
                .forEach(line -> assertThat(line + text).contains("common practice, no source"));
    }

    @Test
    void areFoundByNameAndSayWhatTheyAreFor() {
        assertThat(Preset.all())
                .extracting(Preset::title)
                .doesNotHaveDuplicates()
                .hasSize(7);
        assertThat(Preset.named("porous-load").orElseThrow().title())
                .isEqualTo("Steam sterilizer, porous load, air removed by vacuum pulses");
        assertThat(Preset.named("oven")).isEmpty();
    }

    private static AsWritten<Plan> read(String text) {
        return Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
    }
}
