package org.steamwitness.plan;

import java.time.LocalDate;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.steamwitness.quantity.QuantityText;

/** Understands the keys of a plan. */
final class PlanReader {

    private static final double DEFAULT_LONGEST_GAP_SECONDS = 10;

    private PlanReader() {}

    static Plan plan(Section at) {
        Entry<Integer> format = at.need("plan-format").whole(1, 1);
        Entry<String> id = at.need("id").text();
        Entry<String> title = at.need("title").text();
        Entry<Integer> revision = at.need("revision").whole(1, 9999);
        Entry<PlanStatus> status = at.need("status").word(PlanStatus.class, PlanStatus::word);
        Entry<Plan.Basis> basis = at.need("basis").section(PlanReader::basis);
        Entry<String> equipment = at.need("equipment").text();
        Entry<CycleProcess> process = at.need("process").word(CycleProcess.class, CycleProcess::word);
        Entry<Medium> medium = at.need("medium").word(Medium.class, Medium::word);
        Entry<AtmosphereSource> atmosphere = at.need("atmosphere").word(AtmosphereSource.class, AtmosphereSource::word);
        Entry<List<PlannedChannel>> channels = at.need("channels").list(slot -> slot.section(ChannelReader::channel));
        Entry<Hold> hold = at.need("hold").section(HoldReader::hold);
        Entry<Double> longestGap = at.may("longest-gap").parsed("a duration such as 10 s", QuantityText::seconds);
        Entry<Double> scanDelay = at.may("scan-delay").parsed("a duration such as 2 s", QuantityText::seconds);
        Entry<SaturationTolerance> saturation = at.may("saturation").section(SaturationReader::saturation);
        Entry<List<LethalityAim>> lethality = at.may("lethality").list(slot -> slot.section(LethalityReader::aim));
        Entry<DecisionRule> decision = at.need("decision").section(DecisionReader::decision);
        Entry<Set<String>> required = at.may("run-sheet").section(PlanReader::requiredEntries);
        format.get();
        atmosphere.get();
        Plan plan = new Plan(
                id.get(),
                title.get(),
                revision.get(),
                status.get(),
                basis.get(),
                equipment.get(),
                process.get(),
                medium.get(),
                channels.get(),
                hold.get(),
                longestGap.or(DEFAULT_LONGEST_GAP_SECONDS),
                scanDelay.or(0.0),
                saturation.optional(),
                lethality.or(List.of()),
                decision.get(),
                required.or(Set.of()));
        PlanCheck.check(at, plan);
        return plan;
    }

    private static Plan.Basis basis(Section at) {
        Entry<String> document = at.need("document").text();
        Entry<String> edition = at.need("edition").text();
        Entry<String> by = at.need("by").text();
        Entry<LocalDate> date = at.need("date").parsed("a date such as 2026-02-20", LocalDate::parse);
        return new Plan.Basis(
                document.get(), edition.get(), by.get(), date.get().toString());
    }

    private static Set<String> requiredEntries(Section at) {
        Entry<List<String>> keys = at.need("required")
                .list(slot -> slot.parsed("a run sheet key", key -> {
                    if (!RunSheet.ENTRIES.contains(key)) {
                        throw new IllegalArgumentException(
                                "\"" + key + "\" is no run sheet entry; known: " + String.join(", ", RunSheet.ENTRIES));
                    }
                    return key;
                }));
        return new LinkedHashSet<>(keys.get());
    }

    /** Where the pressure of the atmosphere comes from. */
    private enum AtmosphereSource {
        ENTERED("entered");

        private final String word;

        AtmosphereSource(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }
}
