package org.steamwitness.run;

import java.util.List;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.plan.AsWritten;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.PlanDraft;
import org.steamwitness.plan.Preset;
import org.steamwitness.plan.PublishedSchema;
import org.steamwitness.plan.RunSheet;
import org.steamwitness.plan.RunSheetDraft;

/** Plans and run sheets to start from, and what is still wrong or open in those that people have written. */
public final class Drafts {

    private Drafts() {}

    /**
     * The presets that a plan can start from.
     *
     * @return one for every process
     */
    public static List<PresetName> presets() {
        return Preset.all().stream()
                .map(p -> new PresetName(p.name(), p.title()))
                .toList();
    }

    /**
     * A plan to start from.
     *
     * @param preset name of a preset
     * @param survey how the log is understood whose columns it is for; empty leaves the preset's channels open
     * @return commented YAML; empty if no preset is named so
     */
    public static Optional<String> plan(String preset, Optional<LogSurvey> survey) {
        return Preset.named(preset)
                .map(p -> PlanDraft.of(p, survey.map(LogSurvey::forPlan).orElse(List.of())));
    }

    /**
     * A blank run sheet.
     *
     * @param plan the plan that the run follows
     * @return commented YAML, or all that is wrong with the plan
     */
    public static Sheet runSheet(NamedBytes plan) {
        AsWritten<Plan> read = Plan.read(plan.name(), plan.bytes());
        return new Sheet(read.value().map(RunSheetDraft::of), read.problems());
    }

    /**
     * What is wrong or open in a plan.
     *
     * @param file the plan
     * @return empty if it can be used
     */
    public static List<Finding> problemsOfPlan(NamedBytes file) {
        return Plan.read(file.name(), file.bytes()).problems();
    }

    /**
     * What is wrong or open in a run sheet.
     *
     * @param file the run sheet
     * @return empty if it can be used
     */
    public static List<Finding> problemsOfRunSheet(NamedBytes file) {
        return RunSheet.read(file.name(), file.bytes()).problems();
    }

    /**
     * The published shape of plans or run sheets.
     *
     * @param runSheet whether that of run sheets is wanted
     * @return a JSON Schema
     */
    public static String schema(boolean runSheet) {
        return runSheet ? PublishedSchema.ofRunSheet() : PublishedSchema.ofPlan();
    }

    /**
     * A preset.
     *
     * @param name the word of its process
     * @param title what it is for
     */
    public record PresetName(String name, String title) {}

    /**
     * A drafted run sheet.
     *
     * @param text commented YAML; empty if the plan can't be used
     * @param problems what is wrong with the plan
     */
    public record Sheet(Optional<String> text, List<Finding> problems) {}
}
