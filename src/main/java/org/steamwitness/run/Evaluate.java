package org.steamwitness.run;

import java.time.DateTimeException;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.chart.ChartFonts;
import org.steamwitness.chart.RunChart;
import org.steamwitness.evaluate.Evaluation;
import org.steamwitness.evaluate.phase.Cycles;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.intake.Intake;
import org.steamwitness.intake.LogReader;
import org.steamwitness.plan.AsWritten;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.RunSheet;
import org.steamwitness.quantity.Progress;
import org.steamwitness.record.Attachment;
import org.steamwitness.record.CycleRecord;
import org.steamwitness.record.Evidence;
import org.steamwitness.record.FileIdentity;
import org.steamwitness.record.Provenance;
import org.steamwitness.record.RecordAssembly;
import org.steamwitness.record.RecordPdf;
import org.steamwitness.record.Template;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/** Evaluates one run: log, plan and run sheet in, record out. */
public final class Evaluate {

    private final NamedBytes log;
    private final NamedBytes planFile;
    private final NamedBytes sheetFile;
    private final Progress progress;

    /**
     * Prepares the evaluation of one run.
     *
     * @param log the logger file
     * @param planFile the plan
     * @param sheetFile the run sheet
     * @param progress is told of the advance and asked whether to stop
     */
    public Evaluate(NamedBytes log, NamedBytes planFile, NamedBytes sheetFile, Progress progress) {
        this.log = log;
        this.planFile = planFile;
        this.sheetFile = sheetFile;
        this.progress = progress;
    }

    /**
     * Evaluates the run.
     *
     * @return the record, or why there is none
     */
    public Outcome outcome() {
        AsWritten<Plan> plan = Plan.read(planFile.name(), planFile.bytes());
        AsWritten<RunSheet> sheet = RunSheet.read(sheetFile.name(), sheetFile.bytes());
        if (plan.value().isEmpty() || sheet.value().isEmpty()) {
            List<Finding> problems = new ArrayList<>(plan.problems());
            problems.addAll(sheet.problems());
            return new Outcome.Refused(problems);
        }
        return evaluate(plan.value().get(), sheet.value().get());
    }

    private Outcome evaluate(Plan plan, RunSheet sheet) {
        Optional<ZoneId> zone;
        try {
            zone = sheet.zone().map(ZoneId::of);
        } catch (DateTimeException unknown) {
            return new Outcome.Refused(List.of(new Finding(
                    FindingKind.ENTRY_WRONG,
                    new Position(sheetFile.name(), 0, 0, "zone"),
                    Map.of("what", "no time zone is named so; expected one such as Europe/Lisbon"))));
        }
        if (plan.hold().isEmpty()) {
            return new Outcome.Refused(List.of(new Finding(
                    FindingKind.PROCESS_NOT_EVALUATED,
                    new Position(planFile.name(), 0, 0, "process"),
                    Map.of("process", plan.process().word()))));
        }
        Intake intake = new LogReader(log.name(), plan.readingRules(), zone, progress).read(log.bytes());
        if (intake instanceof Intake.Unreadable unreadable) {
            return new Outcome.Refused(unreadable.findings());
        }
        if (intake instanceof Intake.Read read) {
            return placed(plan, sheet, inZone(read.trace(), zone), read, zone);
        }
        return new Outcome.Cancelled();
    }

    /** Takes the part of the log that is this run, and sets its clock by the wall's. */
    private Outcome placed(Plan plan, RunSheet sheet, Trace whole, Intake.Read read, Optional<ZoneId> zone) {
        List<Finding> known = new ArrayList<>(read.findings());
        zone.flatMap(z -> RunPlace.zoneDiffers(read.trace(), z)).ifPresent(known::add);
        Trace trace = whole;
        if (sheet.logPart().isPresent()) {
            Optional<Trace> part = RunPlace.part(whole, sheet.logPart().get());
            if (part.isEmpty()) {
                return new Outcome.Refused(
                        List.of(RunPlace.outside(whole, sheet.logPart().get())));
            }
            trace = part.get();
        }
        if (sheet.clocks().isPresent()) {
            trace = RunPlace.set(trace, sheet.clocks().get());
            known.add(RunPlace.clockSet(sheet.clocks().get()));
        }
        BoundPlan.Bound bound = BoundPlan.of(plan, sheet, trace);
        List<Stretch> cycles = Cycles.of(trace, bound.plan());
        if (cycles.size() > 1 && sheet.logPart().isEmpty()) {
            return new Outcome.Refused(List.of(RunPlace.several(trace, cycles)));
        }
        return evaluated(plan, sheet, trace, read, bound, known);
    }

    private Outcome evaluated(
            Plan plan, RunSheet sheet, Trace trace, Intake.Read read, BoundPlan.Bound bound, List<Finding> known) {
        progress.step("evaluating " + log.name(), 0.5);
        known.addAll(bound.findings());
        Evaluation evaluation = Evaluation.of(trace, read.reading(), bound.plan(), known);
        Template template = Template.standard();
        Provenance provenance = new Provenance(
                Program.NAME,
                Program.VERSION,
                Evaluation.NUMBER,
                identity(log),
                identity(planFile),
                identity(sheetFile),
                template.identity());
        CycleRecord record = RecordAssembly.of(
                new Evidence(provenance, plan, sheet, trace, read.reading(), bound.plan(), evaluation));
        return new Outcome.Evaluated(record, printedAt -> {
            ChartFonts fonts = ChartFonts.load();
            return new RecordPdf(template)
                    .write(record, RunChart.of(trace, bound.plan(), evaluation, fonts), attachments(), printedAt);
        });
    }

    private List<Attachment> attachments() {
        return List.of(
                new Attachment(log.name(), "text/csv", Attachment.Relation.LOG, log.bytes()),
                new Attachment(planFile.name(), "application/yaml", Attachment.Relation.PLAN, planFile.bytes()),
                new Attachment(sheetFile.name(), "application/yaml", Attachment.Relation.RUN_SHEET, sheetFile.bytes()));
    }

    private static Trace inZone(Trace trace, Optional<ZoneId> zone) {
        LogClock clock = trace.clock();
        return zone.map(z -> trace.withClock(clock.withOffset(z.getRules().getOffset(clock.first()))))
                .orElse(trace);
    }

    private static FileIdentity identity(NamedBytes file) {
        return FileIdentity.of(file.name(), file.bytes());
    }
}
