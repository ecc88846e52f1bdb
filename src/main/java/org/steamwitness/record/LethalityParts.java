package org.steamwitness.record;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.lethality.MarkedLethality;
import org.steamwitness.evaluate.lethality.ProbeLethality;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.plan.DecimalReduction;
import org.steamwitness.plan.LethalityAim;

/** The record's part on lethality. */
final class LethalityParts {

    private final Evidence evidence;

    LethalityParts(Evidence evidence) {
        this.evidence = evidence;
    }

    List<LethalityPart> all() {
        return evidence.evaluation().lethality().stream().map(this::part).toList();
    }

    private LethalityPart part(Lethality lethality) {
        LethalityAim aim = lethality.aim();
        return new LethalityPart(
                aim.name(),
                Canonical.celsius(aim.referenceKelvin()),
                Canonical.number(aim.zKelvin()),
                aim.floorKelvin().isPresent()
                        ? Given.of(Canonical.celsius(aim.floorKelvin().getAsDouble()))
                        : Given.withheld("none: all counts"),
                aim.unit().symbol(),
                limit(aim, aim.limits().leastSeconds(), "minimum"),
                limit(aim, aim.limits().mostSeconds(), "maximum"),
                aim.coolingCounted() ? "whole run" : "to steam-off",
                aim.probes().words(),
                lethality.probes().stream().map(p -> perChannel(aim, p)).toList(),
                lethality
                        .governing()
                        .map(p -> Given.of(
                                new LethalityPart.Governing(p.channel().name(), value(aim, p.countedSeconds(aim)))))
                        .orElseGet(() -> notMeasured(aim)),
                reduction(lethality));
    }

    private static Given<Double> limit(LethalityAim aim, OptionalDouble seconds, String key) {
        return seconds.isPresent()
                ? Given.of(value(aim, seconds.getAsDouble()))
                : Given.withheld("the plan sets none", "plan: lethality." + key);
    }

    private static Given<LethalityPart.Reduction> reduction(Lethality lethality) {
        LethalityAim aim = lethality.aim();
        if (aim.reduction().isEmpty()) {
            return Given.withheld("the plan names none", "plan: lethality.decimal-reduction");
        }
        DecimalReduction reduction = aim.reduction().get();
        return lethality
                .governing()
                .map(p -> Given.of(new LethalityPart.Reduction(
                        reduction.of(),
                        Canonical.minutes(reduction.seconds()),
                        reduction.source(),
                        Canonical.number(reduction.powersOfTen(p.countedSeconds(aim))))))
                .orElseGet(() -> notMeasured(aim));
    }

    private static <T> Given<T> notMeasured(LethalityAim aim) {
        return Given.withheld("not measured: no " + aim.probes().words() + " probe");
    }

    private LethalityPart.PerChannel perChannel(LethalityAim aim, ProbeLethality probe) {
        List<Phase> phases = evidence.evaluation().phases().phases();
        return new LethalityPart.PerChannel(
                probe.channel().name(),
                probe.channel().contact().word(),
                value(aim, probe.toSteamOffSeconds()),
                value(aim, probe.withCoolingSeconds()),
                probe.perPhase().stream()
                        .map(v -> new LethalityPart.PhaseValue(
                                v.phase().name().word(), phases.indexOf(v.phase()) + 1, value(aim, v.seconds())))
                        .toList(),
                probe.channel().commonUncertainty().isPresent()
                        ? Given.of(new LethalityPart.Interval(
                                value(aim, probe.lowSeconds()), value(aim, probe.highSeconds())))
                        : Given.withheld("no uncertainty is stated", "plan: channels.uncertainty"),
                Canonical.number(probe.coverage().bridgedSeconds()),
                Canonical.number(probe.coverage().lostSeconds()),
                marked(probe, m -> Canonical.number(m.seconds())),
                marked(probe, m -> value(aim, m.lethalitySeconds())));
    }

    private static Given<Double> marked(ProbeLethality probe, Function<MarkedLethality, Double> figure) {
        return probe.marked()
                .map(m -> Given.of(figure.apply(m)))
                .orElseGet(() -> Given.withheld("the probe was not held against saturation"));
    }

    private static double value(LethalityAim aim, double equivalentSeconds) {
        return Canonical.number(aim.unit().of(equivalentSeconds));
    }
}
