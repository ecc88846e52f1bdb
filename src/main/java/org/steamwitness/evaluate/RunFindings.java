package org.steamwitness.evaluate;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.evaluate.phase.HoldAttempt;
import org.steamwitness.evaluate.phase.HoldAttempt.EndedBy;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.evaluate.saturation.Episode;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.quantity.Printed;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Trace;

/** What phases, hold and saturation have to tell the reader beside their figures. */
final class RunFindings {

    private final Trace trace;
    private final List<Finding> findings = new ArrayList<>();

    private RunFindings(Trace trace) {
        this.trace = trace;
    }

    static List<Finding> of(Trace trace, Reading reading, Phases phases, HoldResult hold, SaturationCheck saturation) {
        RunFindings all = new RunFindings(trace);
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
                .forEach(range -> find(
                        FindingKind.ROWS_REFUSED_IN_HOLD,
                        range.fromLine(),
                        Map.of(
                                "from", Integer.toString(range.fromLine()),
                                "to", Integer.toString(range.toLine()))));
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
}
