package org.steamwitness.record;

import java.util.List;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.lethality.ProbeLethality;
import org.steamwitness.evaluate.phase.Phase;
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
                "min",
                Canonical.minutes(aim.minimumSeconds()),
                aim.coolingCounted() ? "whole run" : "to steam-off",
                lethality.probes().stream().map(this::perChannel).toList(),
                lethality
                        .governing()
                        .map(p -> Given.of(new LethalityPart.Governing(
                                p.channel().name(), Canonical.minutes(p.countedSeconds(aim)))))
                        .orElseGet(() -> Given.withheld("not measured: no product probe")));
    }

    private LethalityPart.PerChannel perChannel(ProbeLethality probe) {
        List<Phase> phases = evidence.evaluation().phases().phases();
        return new LethalityPart.PerChannel(
                probe.channel().name(),
                probe.channel().contact().word(),
                Canonical.minutes(probe.toSteamOffSeconds()),
                Canonical.minutes(probe.withCoolingSeconds()),
                probe.perPhase().stream()
                        .map(v -> new LethalityPart.PhaseValue(
                                v.phase().name().word(), phases.indexOf(v.phase()) + 1, Canonical.minutes(v.seconds())))
                        .toList(),
                probe.channel().commonUncertainty().isPresent()
                        ? Given.of(new LethalityPart.Interval(
                                Canonical.minutes(probe.lowSeconds()), Canonical.minutes(probe.highSeconds())))
                        : Given.withheld("no uncertainty is stated", "plan: channels.uncertainty"),
                Canonical.number(probe.coverage().bridgedSeconds()),
                Canonical.number(probe.coverage().lostSeconds()),
                Given.withheld("a product probe is not held against saturation"));
    }
}
