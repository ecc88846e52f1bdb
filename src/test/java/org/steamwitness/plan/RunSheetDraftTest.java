package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class RunSheetDraftTest {

    static List<String> entries() {
        return List.copyOf(RunSheet.ENTRIES);
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void holdsWhatThePlanRequiresOnceFilledIn(CycleProcess process) {
        Plan plan = plan(Filled.plan(Preset.of(process).text()));
        RunSheet sheet = sheet(Filled.runSheet(RunSheetDraft.of(plan)));
        assertThat(sheet.planId()).isEqualTo(plan.id());
        assertThat(sheet.planRevision()).isEqualTo(plan.revision());
        assertThat(sheet.equipment()).isEqualTo(plan.equipment());
        assertThat(plan.requiredEntries()).isNotEmpty().allMatch(sheet::holds);
    }

    @ParameterizedTest
    @MethodSource("entries")
    void opensTheRequiredEntryAndNoOther(String entry) {
        Plan plan = plan(PlanLanguageTest.FULL + "run-sheet: {required: [" + entry + "]}\n");
        String draft = RunSheetDraft.of(plan);
        RunSheet sheet = sheet(Filled.runSheet(draft));
        assertThat(RunSheet.ENTRIES.stream().filter(sheet::holds))
                .containsExactlyElementsOf(entry.equals("lots") ? List.of("product", "lots") : List.of(entry));
        assertThat(draft).contains("# Open places, marked \"?\": ");
        assertThat(RunSheetDraft.openPlaces(draft))
                .allSatisfy(place -> assertThat(draft)
                        .contains("#   " + place.position().path() + ": "
                                + place.facts().get("expected")));
    }

    @Test
    void namesTheProbesThatMoveWithTheLoad() {
        Plan plan = plan(PlanLanguageTest.FULL + "run-sheet: {required: [probes]}\n");
        assertThat(sheet(Filled.runSheet(RunSheetDraft.of(plan))).probes())
                .extracting(PlacedProbe::channel)
                .containsExactly("can-1");
    }

    /** Whoever takes away every mark has a run sheet in which only values are missing. */
    @Test
    void theLinesLeftOutKeepTheShapeToo() {
        String draft = RunSheetDraft.of(plan(PlanLanguageTest.FULL));
        String all = draft.replaceAll("(?m)^#(?! )", "").replaceAll("(?m)^#(?=  \\S)", "");
        RunSheet sheet = sheet(Filled.runSheet(all));
        assertThat(RunSheet.ENTRIES).allMatch(sheet::holds);
        assertThat(sheet.logPart()).isPresent();
    }

    private static Plan plan(String text) {
        AsWritten<Plan> read = Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
        assertThat(PlanLanguageTest.messages(read)).isEmpty();
        return read.value().orElseThrow();
    }

    private static RunSheet sheet(String text) {
        AsWritten<RunSheet> read = RunSheet.read("r.yaml", text.getBytes(StandardCharsets.UTF_8));
        assertThat(PlanLanguageTest.messages(read)).isEmpty();
        return read.value().orElseThrow();
    }
}
