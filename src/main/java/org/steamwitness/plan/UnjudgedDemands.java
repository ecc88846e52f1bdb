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
        plan.reading().ifPresent(reading -> demands.add("reading"));
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
        sheet.logPart().ifPresent(part -> demands.add("log-part " + part.from() + " to " + part.to()));
        sheet.corrections().forEach(correction -> demands.add("correction: " + correction.what()));
        return List.copyOf(demands);
    }

    private static void steps(Plan plan, List<String> demands) {
        if (plan.steps().size() > 1) {
            demands.add("hold steps after the first: " + (plan.steps().size() - 1));
        }
        for (HoldStep step : plan.steps()) {
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
}
