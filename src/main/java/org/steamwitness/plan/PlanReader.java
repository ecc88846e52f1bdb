package org.steamwitness.plan;

import java.time.LocalDate;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.trace.Told;

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
        Entry<AtmosphereSource> atmosphere = AtmosphereReader.source(at.need("atmosphere"));
        Entry<Chamber> chamber = at.may("chamber").section(ChamberReader::chamber);
        Entry<Told> reading = at.may("reading").section(ReadingSectionReader::told);
        Entry<List<PlannedChannel>> channels = at.need("channels").list(slot -> slot.section(ChannelReader::channel));
        boolean holds = process.kept().map(CycleProcess::holds).orElse(true);
        Entry<List<HoldStep>> steps = holds ? HoldReader.steps(at.need("hold")) : Entry.absent();
        Entry<Sampling> sampling = at.may("sampling").section(PlanReader::sampling);
        Entry<Boolean> marksDecide = at.may("marks-decide").either("yes", "no");
        Entry<Double> markAgreement = at.may("mark-agreement").parsed("a duration such as 60 s", QuantityText::seconds);
        Entry<Double> longestGap = at.may("longest-gap").parsed("a duration such as 10 s", QuantityText::seconds);
        Entry<Double> scanDelay = at.may("scan-delay").parsed("a duration such as 2 s", QuantityText::seconds);
        Entry<SaturationTolerance> saturation = at.may("saturation").section(SaturationReader::saturation);
        Entry<List<LethalityAim>> lethality = at.may("lethality").list(slot -> slot.section(LethalityReader::aim));
        Entry<List<Limit>> limits = at.may("limits").anyNumber(LimitReader::limit);
        Entry<DecisionRule> decision = at.need("decision").section(DecisionReader::decision);
        Entry<Set<String>> required = at.may("run-sheet").section(PlanReader::requiredEntries);
        format.get();
        Plan plan = new Plan(
                id.get(),
                title.get(),
                revision.get(),
                status.get(),
                basis.get(),
                equipment.get(),
                process.get(),
                medium.get(),
                atmosphere.get(),
                chamber.optional(),
                reading.or(Told.NOTHING),
                channels.get(),
                steps.or(List.of()),
                sampling.optional(),
                longestGap.or(DEFAULT_LONGEST_GAP_SECONDS),
                scanDelay.or(0.0),
                saturation.optional(),
                lethality.or(List.of()),
                limits.or(List.of()),
                marksDecide.or(true),
                ChamberReader.number(markAgreement),
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

    private static Sampling sampling(Section at) {
        Entry<Double> hold = at.may("hold").parsed("a duration such as 5 s", QuantityText::seconds);
        Entry<Double> elsewhere = at.may("elsewhere").parsed("a duration such as 10 s", QuantityText::seconds);
        return new Sampling(ChamberReader.number(hold), ChamberReader.number(elsewhere));
    }
}
