package org.steamwitness.record;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.steamwitness.evaluate.criteria.Criterion;
import org.steamwitness.evaluate.criteria.Verdict;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.RunSheet;
import org.steamwitness.trace.Reading;

/** Puts a record together from its evidence: one part a question, in the order of the record. */
public final class RecordAssembly {

    private final Evidence evidence;
    private final List<Finding> more;

    private RecordAssembly(Evidence evidence, List<Finding> more) {
        this.evidence = evidence;
        this.more = more;
    }

    /**
     * Puts the record together.
     *
     * @param evidence all that it is made from
     * @return the record
     */
    public static CycleRecord of(Evidence evidence) {
        CycleRecord record = new RecordAssembly(evidence, List.of()).record();
        String missing = PrintableCharacters.missingFrom(record);
        if (missing.isEmpty()) {
            return record;
        }
        Finding unprintable = new Finding(FindingKind.GLYPH_MISSING, Position.RUN, Map.of("characters", missing));
        return new RecordAssembly(evidence, List.of(unprintable)).record();
    }

    private CycleRecord record() {
        return new CycleRecord(
                CycleRecord.SCHEMA,
                evidence.provenance(),
                reading(),
                run(),
                plan(),
                new ChannelParts(evidence).all(),
                new PhaseParts(evidence).all(),
                Given.withheld("pressure pulses are not looked for in a retort cycle"),
                new SaturationParts(evidence).part(),
                new HoldParts(evidence).part(),
                new LethalityParts(evidence).all(),
                Given.withheld("this version of the program does not evaluate energy"),
                Given.withheld("the plan asks for no air leakage test"),
                criteria(),
                verdict(),
                findings(),
                NotJudgedList.of(evidence),
                Cautions.all());
    }

    private ReadingPart reading() {
        Reading reading = evidence.reading();
        List<ReadingPart.Range> ranges = reading.refused().stream()
                .map(r -> new ReadingPart.Range(r.fromLine(), r.toLine(), r.column(), r.reason()))
                .toList();
        return new ReadingPart(
                reading.encoding(),
                reading.delimiter(),
                reading.decimalMark(),
                reading.timeFormat(),
                Given.entered(evidence.sheet().zone(), "zone"),
                reading.headerLines(),
                reading.rows(),
                new ReadingPart.Refused(reading.refusedRows(), ranges));
    }

    private RunPart run() {
        RunSheet sheet = evidence.sheet();
        return new RunPart(
                true,
                sheet.run(),
                new RunPart.PlanUsed(sheet.planId(), sheet.planRevision()),
                sheet.equipment(),
                Given.entered(sheet.zone(), "zone"),
                Given.entered(sheet.atmospherePascal().map(Canonical::kilopascal), "atmosphere"),
                Given.entered(sheet.product().map(RecordAssembly::product), "product"),
                Given.entered(sheet.initialTemperature().map(RecordAssembly::initial), "initial-temperature"),
                new RunPart.Marks(
                        Given.entered(sheet.steamOn().map(LocalTime::toString), "marks.steam-on"),
                        Given.entered(sheet.ventClosed().map(LocalTime::toString), "marks.vent-closed"),
                        Given.entered(sheet.steamOff().map(LocalTime::toString), "marks.steam-off")),
                new RunPart.Entered(sheet.entered().by(), sheet.entered().at()));
    }

    private static RunPart.Product product(RunSheet.Product product) {
        return new RunPart.Product(
                product.name(),
                Given.entered(product.code(), "product.code"),
                Given.entered(Optional.of(product.lots()).filter(lots -> !lots.isEmpty()), "product.lots"),
                Given.entered(product.container(), "product.container"),
                Given.entered(product.count(), "product.count"));
    }

    private static RunPart.InitialTemperature initial(RunSheet.InitialTemperature initial) {
        return new RunPart.InitialTemperature(
                Canonical.celsius(initial.kelvin()),
                Given.entered(initial.at().map(LocalTime::toString), "initial-temperature.at"),
                Given.entered(initial.instrument(), "initial-temperature.instrument"));
    }

    private PlanPart plan() {
        Plan plan = evidence.plan();
        Plan.Basis basis = plan.basis();
        return new PlanPart(
                plan.id(),
                plan.title(),
                plan.revision(),
                plan.status().word(),
                new PlanPart.Basis(basis.document(), basis.edition(), basis.by(), basis.date()),
                plan.equipment(),
                plan.process().word(),
                plan.medium().word(),
                new PlanPart.Decision(
                        plan.decision().word(),
                        plan.decision().guarded()
                                ? Given.ofNumber(plan.decision().conformance())
                                : Given.withheld("the simple rule knows none")));
    }

    private List<CriterionPart> criteria() {
        return evidence.evaluation().criteria().stream().map(this::criterion).toList();
    }

    /** The plan's limit that a criterion judges, where it has one of its own. */
    private Optional<Limit> limitOf(Criterion criterion) {
        List<Limit> limits = evidence.plan().limits();
        return IntStream.range(0, limits.size())
                .filter(i -> criterion.id().startsWith(limits.get(i).idAt(i) + "-"))
                .mapToObj(limits::get)
                .findFirst();
    }

    private CriterionPart criterion(Criterion criterion) {
        Optional<Limit> limit = limitOf(criterion);
        Optional<String> own = limit.flatMap(Limit::source);
        return new CriterionPart(
                criterion.id(),
                criterion.what(),
                criterion.where(),
                criterion.phase(),
                criterion.unit(),
                Given.numberOr(criterion.value(), criterion.why()),
                Canonical.number(criterion.limit()),
                criterion.atLeast() ? Given.ofNumber(criterion.limit()) : Given.withheld("the limit is an upper one"),
                criterion.atLeast() ? Given.withheld("the limit is a lower one") : Given.ofNumber(criterion.limit()),
                Given.numberOr(criterion.margin(), criterion.why()),
                atSeconds(criterion),
                Given.numberOr(criterion.uncertainty(), "the value carries none, or none is stated"),
                criterion.decision().word(),
                criterion.why(),
                limit.flatMap(Limit::decision)
                        .orElse(evidence.plan().decision())
                        .word(),
                own.orElse(evidence.plan().basis().document()),
                own.isPresent()
                        ? limit.flatMap(Limit::edition).orElse("not stated")
                        : evidence.plan().basis().edition());
    }

    private Given<Double> atSeconds(Criterion criterion) {
        return criterion
                .index()
                .map(i -> Given.ofNumber(evidence.trace().seconds().at(i)))
                .orElseGet(() -> Given.withheld("it belongs to no single sample"));
    }

    private VerdictPart verdict() {
        Verdict verdict = evidence.evaluation().verdict();
        Given<VerdictPart.Closest> closest = verdict.closest()
                .map(c -> Given.of(new VerdictPart.Closest(
                        c.id(), Canonical.number(c.margin().orElseThrow()), c.unit(), c.where(), atSeconds(c))))
                .orElseGet(() -> Given.withheld("no criterion has a value"));
        return new VerdictPart(verdict.outcome().word(), verdict.because(), closest);
    }

    private List<FindingPart> findings() {
        List<FindingPart> parts = new ArrayList<>();
        List<Finding> all = new ArrayList<>(evidence.evaluation().findings());
        all.addAll(more);
        for (Finding finding : all) {
            List<FindingPart.Fact> facts = finding.facts().entrySet().stream()
                    .map(fact -> new FindingPart.Fact(fact.getKey(), fact.getValue()))
                    .toList();
            parts.add(new FindingPart(
                    "finding-" + (parts.size() + 1),
                    finding.kind().word(),
                    finding.severity().word(),
                    finding.position().inFile()
                            ? Given.of(place(finding.position()))
                            : Given.withheld("it concerns the run as a whole"),
                    facts,
                    finding.text(),
                    finding.remedy()));
        }
        return List.copyOf(parts);
    }

    /** The evaluation knows the log's lines, not its name. */
    private String place(Position position) {
        String name =
                position.file().equals("log") ? evidence.provenance().log().name() : position.file();
        return new Position(name, position.line(), position.column(), position.path()).text();
    }
}
