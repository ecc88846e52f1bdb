package org.steamwitness.run;

import java.util.List;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.plan.AsWritten;
import org.steamwitness.plan.FoundColumn;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.PlanDraft;
import org.steamwitness.plan.Preset;
import org.steamwitness.plan.RunSheet;
import org.steamwitness.plan.RunSheetDraft;
import org.steamwitness.trace.QuantityKind;

/** Plans and run sheets to start from, and what is still wrong or open in those that people have written. */
public final class Drafts {

    private Drafts() {}

    /**
     * A plan to start from.
     *
     * @param preset the kind of cycle
     * @param survey how the log is understood whose columns it is for; empty leaves the preset's channels open
     * @return commented YAML
     */
    public static String plan(Preset preset, Optional<LogSurvey> survey) {
        return PlanDraft.of(preset, survey.map(Drafts::columns).orElse(List.of()));
    }

    /**
     * A blank run sheet.
     *
     * @param plan the plan that the run follows
     * @return commented YAML
     */
    public static String runSheet(Plan plan) {
        return RunSheetDraft.of(plan);
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
     * Reads a plan.
     *
     * @param file the plan
     * @return it, or all that is wrong with it
     */
    public static AsWritten<Plan> readPlan(NamedBytes file) {
        return Plan.read(file.name(), file.bytes());
    }

    private static List<FoundColumn> columns(LogSurvey survey) {
        return survey.columns().stream()
                .filter(c -> c.figures().isPresent())
                .filter(c ->
                        c.found().quantity().isPresent() || c.found().unit().isPresent())
                .map(c -> new FoundColumn(
                        c.found().header(),
                        c.found().quantity(),
                        c.found().unit(),
                        c.found()
                                .quantity()
                                .filter(q -> q == QuantityKind.PRESSURE)
                                .flatMap(q -> c.datum()),
                        c.found().place()))
                .toList();
    }
}
