package org.steamwitness.record;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.PhaseName;
import org.steamwitness.evaluate.saturation.Episode;
import org.steamwitness.evaluate.saturation.PhaseDeparture;
import org.steamwitness.evaluate.saturation.SampleState;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.trace.Column;

/** The record's part on saturation. */
final class SaturationParts {

    private static final String NO_SAMPLE = "no sample could be judged";

    private final Evidence evidence;
    private final SaturationCheck check;

    SaturationParts(Evidence evidence) {
        this.evidence = evidence;
        this.check = evidence.evaluation().saturation();
    }

    SaturationPart part() {
        return new SaturationPart(
                check.tolerance()
                        .map(t -> Given.of(new SaturationPart.Tolerance(
                                Canonical.number(t.airKelvin()), Canonical.number(t.superheatKelvin()))))
                        .orElseGet(() -> Given.withheld("saturation is not judged: "
                                + check.notJudged().orElse("the plan states no tolerance"))),
                check.notJudged().isPresent() ? List.of() : List.of(PhaseName.HOLD.word()),
                evidence.evaluation()
                        .phases()
                        .hold()
                        .map(hold -> Given.numberOr(check.smallestAirFraction(hold), NO_SAMPLE))
                        .orElseGet(() -> Given.withheld("no hold phase was reached")),
                perPhase(),
                episodes());
    }

    private List<SaturationPart.PerPhase> perPhase() {
        List<Phase> phases = evidence.evaluation().phases().phases();
        return check.perPhase().stream()
                .map(p -> new SaturationPart.PerPhase(
                        p.phase().name().word(),
                        phases.indexOf(p.phase()) + 1,
                        p.channel().name(),
                        states(p),
                        p.figures()
                                .map(f -> Given.of(new SaturationPart.DepartureKelvin(
                                        Canonical.number(f.lowest().kelvin()),
                                        Canonical.number(f.meanKelvin()),
                                        Canonical.number(f.highest().kelvin()),
                                        Canonical.number(f.rmsKelvin()),
                                        Canonical.number(f.lowest().uncertaintyKelvin()))))
                                .orElseGet(() -> Given.withheld(NO_SAMPLE)),
                        p.figures()
                                .map(f -> Given.of(new SaturationPart.AirFraction(
                                        Canonical.number(f.airFractionMean()),
                                        Canonical.number(f.airFractionHighest()))))
                                .orElseGet(() -> Given.withheld(NO_SAMPLE))))
                .toList();
    }

    private static SaturationPart.StateCounts states(PhaseDeparture departure) {
        return new SaturationPart.StateCounts(
                departure.states().getOrDefault(SampleState.SATURATED, 0),
                departure.states().getOrDefault(SampleState.POSSIBLE_AIR, 0),
                departure.states().getOrDefault(SampleState.CONFIRMED_AIR, 0),
                departure.states().getOrDefault(SampleState.POSSIBLE_SUPERHEAT, 0),
                departure.states().getOrDefault(SampleState.CONFIRMED_SUPERHEAT, 0),
                departure.states().getOrDefault(SampleState.NOT_JUDGED, 0));
    }

    private List<SaturationPart.EpisodePart> episodes() {
        Column seconds = evidence.trace().seconds();
        List<SaturationPart.EpisodePart> parts = new ArrayList<>();
        for (Episode e : check.episodes()) {
            parts.add(new SaturationPart.EpisodePart(
                    "episode-" + (parts.size() + 1),
                    e.kind().word(),
                    e.confirmed() ? "confirmed" : "possible",
                    PhaseName.HOLD.word(),
                    true,
                    List.of(e.channel().name()),
                    Canonical.number(seconds.at(e.from())),
                    Canonical.number(seconds.at(e.to())),
                    Canonical.number(seconds.at(e.to()) - seconds.at(e.from())),
                    Canonical.number(e.worstKelvin()),
                    Canonical.number(e.meanKelvin()),
                    Canonical.number(e.airFractionHighest()),
                    Canonical.number(e.uncertaintyKelvin()),
                    Given.withheld("this version of the program does not look for causes")));
        }
        return List.copyOf(parts);
    }
}
