package org.steamwitness.plan;

import java.util.ArrayList;
import java.util.List;

/**
 * What plan and run sheet ask for and this version can't judge. Limits are not among them: each becomes a criterion of
 * its own, undecided.
 */
final class UnjudgedDemands {

    private UnjudgedDemands() {}

    /** In words, in the order of the plan's keys. */
    static List<String> of(Plan plan, RunSheet sheet) {
        List<String> demands = new ArrayList<>();
        if (plan.process() != CycleProcess.RETORT) {
            demands.add("process: " + plan.process().word());
        }
        plan.chamber().flatMap(Chamber::maximumPressure).ifPresent(most -> demands.add("chamber.maximum-pressure"));
        if (!(plan.atmosphere() instanceof AtmosphereSource.Entered)) {
            demands.add("atmosphere: " + plan.atmosphere().words());
        }
        plan.channels().stream()
                .filter(channel -> !channel.corrections().isEmpty())
                .forEach(channel -> demands.add("corrections of channel " + channel.name()));
        steps(plan, demands);
        plan.sampling().ifPresent(sampling -> demands.add("sampling"));
        plan.saturation()
                .filter(tolerance -> !tolerance.judged().equals(List.of(PlannedPhase.HOLD)))
                .ifPresent(tolerance -> demands.add("saturation.judged: "
                        + String.join(
                                ", ",
                                tolerance.judged().stream()
                                        .map(PlannedPhase::word)
                                        .toList())));
        if (!plan.marksDecide()) {
            demands.add("marks-decide: no");
        }
        plan.markAgreementSeconds().ifPresent(seconds -> demands.add("mark-agreement"));
        sheet.corrections().forEach(correction -> demands.add("correction: " + correction.what()));
        return List.copyOf(demands);
    }

    private static void steps(Plan plan, List<String> demands) {
        if (plan.steps().size() > 1) {
            demands.add("hold steps after the first: " + (plan.steps().size() - 1));
        }
        for (HoldStep step : plan.steps()) {
            if (step.startsWithAny()) {
                demands.add("hold.starts.when: any");
            }
            if (step.interruptionFails()) {
                demands.add("hold.interruption: fails");
            }
            if (step.equilibrationSeconds() > 0) {
                demands.add("hold.equilibration");
            }
            if (step.excursion().isPresent()) {
                demands.add("hold.allowed-excursion");
            }
        }
    }

    /**
     * Those among them without which neither the samples nor the hold are what plan and run sheet mean: nothing that is
     * decided without them may stand.
     */
    static List<String> shaking(Plan plan, RunSheet sheet) {
        List<String> shaking = new ArrayList<>();
        if (plan.process() != CycleProcess.RETORT) {
            shaking.add("process: " + plan.process().word());
        }
        if (plan.channels().stream().anyMatch(channel -> !channel.corrections().isEmpty())) {
            shaking.add("corrections of channels");
        }
        if (plan.steps().stream().anyMatch(HoldStep::startsWithAny)) {
            shaking.add("hold.starts.when: any");
        }
        if (plan.steps().stream().anyMatch(step -> step.excursion().isPresent())) {
            shaking.add("hold.allowed-excursion");
        }
        if (!plan.marksDecide()) {
            shaking.add("marks-decide: no");
        }
        if (!sheet.corrections().isEmpty()) {
            shaking.add("corrections of the run sheet");
        }
        return List.copyOf(shaking);
    }

    /** Entries of a run sheet that are kept with the record and enter no result. */
    static List<String> onlyKept(RunSheet sheet) {
        List<String> kept = new ArrayList<>();
        sheet.water().ifPresent(water -> kept.add("water"));
        sheet.marks().timingStarted().ifPresent(mark -> kept.add("marks.timing-started"));
        addIf(!sheet.readings().isEmpty(), "readings", kept);
        addIf(!sheet.probes().isEmpty(), "probes", kept);
        addIf(!sheet.indicators().isEmpty(), "indicators", kept);
        addIf(!sheet.events().isEmpty(), "events", kept);
        return List.copyOf(kept);
    }

    private static void addIf(boolean there, String entry, List<String> kept) {
        if (there) {
            kept.add(entry);
        }
    }
}
