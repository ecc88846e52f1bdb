package org.steamwitness.plan;

import java.time.LocalDate;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Channel;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Trace;

/** One act of binding: resolves names, datums and marks, and collects what does not fit. */
final class Binding {

    private final Plan plan;
    private final RunSheet sheet;
    private final Trace trace;
    private final List<Finding> findings = new ArrayList<>();

    Binding(Plan plan, RunSheet sheet, Trace trace) {
        this.plan = plan;
        this.sheet = sheet;
        this.trace = trace;
    }

    BoundPlan.Bound bound() {
        checkPapers();
        List<BoundChannel> channels = channels();
        Hold hold = plan.hold().orElseThrow();
        List<BoundChannel> start = hold.startChannels().stream()
                .map(name -> channels.stream()
                        .filter(c -> c.name().equals(name))
                        .findFirst()
                        .orElseThrow())
                .toList();
        BoundPlan boundPlan = new BoundPlan(
                channels,
                hold,
                start,
                plan.medium().saturated() ? plan.saturation() : Optional.empty(),
                plan.lethality(),
                plan.limits(),
                UnjudgedDemands.shaking(plan, sheet),
                plan.decision(),
                plan.longestGapSeconds(),
                plan.scanDelaySeconds(),
                marks(),
                plan.status() == PlanStatus.DRAFT,
                plan.basis());
        return new BoundPlan.Bound(boundPlan, List.copyOf(findings));
    }

    private void checkPapers() {
        String thisPlan = plan.id() + " revision " + plan.revision();
        String sheetPlan = sheet.planId() + " revision " + sheet.planRevision();
        if (!thisPlan.equals(sheetPlan)) {
            find(FindingKind.PLAN_DIFFERS, Map.of("sheet", sheetPlan, "plan", thisPlan));
        }
        if (!sheet.equipment().equals(plan.equipment())) {
            find(FindingKind.EQUIPMENT_DIFFERS, Map.of("sheet", sheet.equipment(), "plan", plan.equipment()));
        }
        if (plan.status() == PlanStatus.DRAFT) {
            find(FindingKind.PLAN_IS_DRAFT, Map.of());
        }
        for (String entry : plan.requiredEntries()) {
            if (!sheet.holds(entry)) {
                find(FindingKind.ENTRY_MISSING, Map.of("entry", entry));
            }
        }
        for (String demand : UnjudgedDemands.of(plan, sheet)) {
            find(FindingKind.DEMAND_NOT_JUDGED, Map.of("demand", demand));
        }
        List<String> unused = UnjudgedDemands.onlyKept(sheet);
        if (!unused.isEmpty()) {
            find(FindingKind.ENTRIES_KEPT, Map.of("entries", String.join(", ", unused)));
        }
        for (PlannedChannel channel : plan.channels()) {
            Optional<LocalDate> day = trace.clock().date();
            if (channel.due().isPresent() && day.isEmpty()) {
                find(FindingKind.DATE_UNKNOWN, Map.of("channel", channel.name()));
            } else if (channel.due().filter(day.orElse(LocalDate.MIN)::isAfter).isPresent()) {
                find(
                        FindingKind.CALIBRATION_OVERDUE,
                        Map.of(
                                "channel", channel.name(),
                                "certificate", channel.certificate().orElse("not named"),
                                "due", channel.due().orElseThrow().toString(),
                                "date", day.orElseThrow().toString()));
            }
        }
    }

    private List<BoundChannel> channels() {
        List<BoundChannel> bound = new ArrayList<>();
        for (int i = 0; i < plan.channels().size(); i++) {
            PlannedChannel planned = plan.channels().get(i);
            Channel read = trace.channels().get(i);
            if (!planned.mayStateUncertainty()) {
                find(
                        FindingKind.CHANNEL_NOT_EVALUATED,
                        Map.of(
                                "channel", planned.name(),
                                "quantity", planned.rule().kind().word()));
                continue;
            }
            boolean atmosphereKnown = plan.atmosphere() instanceof AtmosphereSource.Entered
                    && sheet.atmospherePascal().isPresent();
            if (planned.rule().datum() == Datum.GAUGE && !atmosphereKnown) {
                continue;
            }
            bound.add(new BoundChannel(
                    planned.name(),
                    planned.rule().kind(),
                    planned.place(),
                    planned.contact(),
                    read.absolute(sheet.atmospherePascal().orElse(Double.NaN)),
                    planned.lag().orElse(PlannedChannel.Lag.NONE),
                    planned.uncertainty()
                            .map(PlannedChannel.StatedUncertainty::standard)
                            .map(OptionalDouble::of)
                            .orElse(OptionalDouble.empty()),
                    planned.uncertainty()
                            .map(PlannedChannel.StatedUncertainty::sharedStandard)
                            .orElse(0.0)));
        }
        return List.copyOf(bound);
    }

    private Marks marks() {
        boolean entered = sheet.steamOn().isPresent()
                || sheet.ventClosed().isPresent()
                || sheet.steamOff().isPresent();
        if (entered && trace.clock().shows() == LogClock.Shows.ELAPSED) {
            find(FindingKind.MARKS_WITHOUT_CLOCK, Map.of());
            return new Marks(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
        }
        OptionalDouble steamOn = mark("steam-on", sheet.steamOn());
        OptionalDouble ventClosed = mark("vent-closed", sheet.ventClosed());
        OptionalDouble steamOff = mark("steam-off", sheet.steamOff());
        checkOrder("steam-on", steamOn, "vent-closed", ventClosed);
        checkOrder("vent-closed", ventClosed, "steam-off", steamOff);
        checkOrder("steam-on", steamOn, "steam-off", steamOff);
        return new Marks(steamOn, ventClosed, steamOff);
    }

    private OptionalDouble mark(String name, Optional<LocalTime> entered) {
        if (entered.isEmpty()) {
            return OptionalDouble.empty();
        }
        OptionalDouble seconds = trace.clock().secondsAt(entered.get(), trace.lastSeconds());
        if (seconds.isEmpty()) {
            if (plan.requiredEntries().contains("marks." + name)) {
                find(FindingKind.ENTRY_MISSING, Map.of("entry", "marks." + name + " within the log"));
            }
            find(
                    FindingKind.MARK_OUTSIDE_LOG,
                    Map.of(
                            "mark", name,
                            "time", entered.get().toString(),
                            "first", trace.clock().timeOfDayAt(0),
                            "last", trace.clock().timeOfDayAt(trace.lastSeconds())));
        }
        return seconds;
    }

    private void checkOrder(String earlierName, OptionalDouble earlier, String laterName, OptionalDouble later) {
        if (earlier.isPresent() && later.isPresent() && later.getAsDouble() < earlier.getAsDouble()) {
            find(FindingKind.MARKS_OUT_OF_ORDER, Map.of("earlier", earlierName, "later", laterName));
        }
    }

    private void find(FindingKind kind, Map<String, String> facts) {
        findings.add(new Finding(kind, Position.RUN, facts));
    }
}
