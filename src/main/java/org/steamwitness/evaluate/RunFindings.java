package org.steamwitness.evaluate;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.lethality.ProbeLethality;
import org.steamwitness.evaluate.phase.HoldAttempt;
import org.steamwitness.evaluate.phase.HoldAttempt.EndedBy;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.evaluate.saturation.Episode;
import org.steamwitness.evaluate.saturation.PhaseDeparture;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.quantity.Printed;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/** What phases, hold and saturation have to tell the reader beside their figures. */
final class RunFindings {

    private final Trace trace;
    private final List<Finding> findings = new ArrayList<>();

    private RunFindings(Trace trace) {
        this.trace = trace;
    }

    static List<Finding> of(Trace trace, Reading reading, BoundPlan plan, Evaluated done) {
        RunFindings all = new RunFindings(trace);
        Phases phases = done.phases();
        HoldResult hold = done.hold();
        SaturationCheck saturation = done.saturation();
        phases.attempts().stream().filter(a -> a.endedBy() == EndedBy.GAP).forEach(all::gap);
        phases.judged().filter(a -> a.endedBy() == EndedBy.LOG_END).ifPresent(all::logEnd);
        phases.hold().ifPresent(phase -> all.refusedIn(phase, reading));
        hold.missingSamples()
                .forEach(missing -> all.find(
                        FindingKind.SAMPLES_MISSING_IN_HOLD,
                        trace.lineOf(phases.hold().orElseThrow().from()),
                        Map.of(
                                "samples", Integer.toString(missing.samples()),
                                "channel", missing.channel().name())));
        phases.judged().ifPresent(judged -> all.attempts(phases, judged));
        all.findings.addAll(MarkAgreement.of(trace, plan));
        phases.hold().ifPresent(phase -> saturation.in(phase).forEach(p -> all.shortDeparture(p, saturation)));
        all.lost(done.lethality());
        saturation.episodes().forEach(e -> all.episode(e, saturation.tolerance().orElseThrow()));
        return List.copyOf(all.findings);
    }

    private void gap(HoldAttempt attempt) {
        double from = trace.seconds().at(attempt.to());
        find(
                FindingKind.GAP_IN_HOLD,
                trace.lineOf(attempt.to()),
                Map.of(
                        "duration", Printed.duration(attempt.latestEndSeconds() - from),
                        "at", trace.clock().timeOfDayAt(from)));
    }

    private void logEnd(HoldAttempt attempt) {
        find(FindingKind.LOG_ENDS_IN_HOLD, trace.lineOf(attempt.to()), Map.of());
    }

    private void refusedIn(Phase hold, Reading reading) {
        int first = trace.lineOf(hold.from());
        int last = trace.lineOf(hold.end() - 1);
        reading.refused().stream()
                .filter(range -> range.toLine() > first && range.fromLine() < last)
                .forEach(range ->
                        find(FindingKind.ROWS_REFUSED_IN_HOLD, range.fromLine(), Map.of("lines", range.lines())));
    }

    private void attempts(Phases phases, HoldAttempt judged) {
        if (phases.attempts().size() > 1) {
            find(
                    FindingKind.HOLD_IN_ATTEMPTS,
                    trace.lineOf(judged.from()),
                    Map.of(
                            "count", Integer.toString(phases.attempts().size()),
                            "from", at(judged.from()),
                            "to", at(judged.to())));
        }
    }

    private void lost(List<Lethality> lethality) {
        Map<String, Double> lost = new TreeMap<>();
        for (Lethality each : lethality) {
            for (ProbeLethality probe : each.probes()) {
                if (probe.coverage().lostSeconds() > 0) {
                    lost.put(probe.channel().name(), probe.coverage().lostSeconds());
                }
            }
        }
        lost.forEach((channel, seconds) -> findings.add(new Finding(
                FindingKind.PROBE_WITHOUT_SAMPLES,
                Position.RUN,
                Map.of("channel", channel, "duration", Printed.duration(seconds)))));
    }

    /** What stands outside the tolerance in the hold phase and belongs to no episode. */
    private void shortDeparture(PhaseDeparture probe, SaturationCheck saturation) {
        List<Stretch> outside = saturation.outsideAt(probe.channel()).orElse(List.of());
        int samples = 0;
        int worst = -1;
        for (Stretch stretch : outside) {
            for (int i = Math.max(stretch.from(), probe.phase().from());
                    i <= Math.min(stretch.to(), probe.phase().end() - 1);
                    i++) {
                int index = i;
                boolean told = saturation.episodes().stream()
                        .anyMatch(e -> e.channel().equals(probe.channel()) && e.from() <= index && index <= e.to());
                if (!told) {
                    samples++;
                    worst = worst < 0
                                    || Math.abs(saturation.kelvinAt(probe.channel(), i))
                                            > Math.abs(saturation.kelvinAt(probe.channel(), worst))
                            ? i
                            : worst;
                }
            }
        }
        if (samples > 0) {
            find(
                    FindingKind.DEPARTURE_SHORT,
                    trace.lineOf(worst),
                    Map.of(
                            "channel", probe.channel().name(),
                            "samples", Integer.toString(samples),
                            "worst", Printed.signed(saturation.kelvinAt(probe.channel(), worst), 2),
                            "at", at(worst)));
        }
    }

    private String at(int index) {
        return trace.clock().timeOfDayAt(trace.seconds().at(index));
    }

    private void episode(Episode episode, SaturationTolerance tolerance) {
        boolean air = episode.kind() == Episode.Kind.AIR;
        find(
                episode.confirmed() ? FindingKind.EPISODE_CONFIRMED : FindingKind.EPISODE_POSSIBLE,
                trace.lineOf(episode.from()),
                Map.of(
                        "channel", episode.channel().name(),
                        "from", trace.clock().timeOfDayAt(trace.seconds().at(episode.from())),
                        "to", trace.clock().timeOfDayAt(trace.seconds().at(episode.to())),
                        "kind", episode.kind().word(),
                        "worst", Printed.signed(episode.worstKelvin(), 2),
                        "tolerance", Printed.fixed(air ? tolerance.airKelvin() : tolerance.superheatKelvin(), 2)));
    }

    private void find(FindingKind kind, int line, Map<String, String> facts) {
        findings.add(new Finding(kind, Position.ofLine("log", line), facts));
    }

    /** What was concluded before the findings are told. */
    record Evaluated(Phases phases, HoldResult hold, SaturationCheck saturation, List<Lethality> lethality) {}
}
