package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.evaluate.saturation.Episode;
import org.steamwitness.evaluate.saturation.PhaseDeparture;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.quantity.Printed;

/**
 * The steam-contact probes stood at saturation in the hold phase: not met by a confirmed episode, undecided by a
 * possible one, or when a probe could not be judged for longer than the longest gap. The value shown is the departure that comes closest to its tolerance or exceeds it most.
 */
final class SaturationAgreement {

    private final SaturationCheck check;
    private final SaturationTolerance tolerance;
    private final Optional<PhaseDeparture> unjudged;

    private SaturationAgreement(
            SaturationCheck check, SaturationTolerance tolerance, Optional<PhaseDeparture> unjudged) {
        this.check = check;
        this.tolerance = tolerance;
        this.unjudged = unjudged;
    }

    static Optional<Criterion> of(SaturationCheck check, Phases phases, double longestGapSeconds) {
        Optional<PhaseDeparture> unjudged = phases.hold()
                .flatMap(check::longestUnjudged)
                .filter(p -> p.longestUnjudgedSeconds() > longestGapSeconds);
        return check.tolerance()
                .map(tolerance -> new SaturationAgreement(check, tolerance, unjudged).criterion(phases));
    }

    private Criterion criterion(Phases phases) {
        List<Side> sides = new ArrayList<>();
        for (PhaseDeparture probe : phases.hold().map(check::in).orElse(List.of())) {
            PhaseDeparture.Figures figures = probe.figures().orElseThrow();
            boolean quiet = check.episodes().stream().noneMatch(e -> e.channel().equals(probe.channel()));
            sides.add(new Side(
                    probe.channel().name(), quiet ? figures.lowestInside() : figures.lowest(), -tolerance.airKelvin()));
            sides.add(new Side(
                    probe.channel().name(),
                    quiet ? figures.highestInside() : figures.highest(),
                    tolerance.superheatKelvin()));
        }
        return sides.stream()
                .max(Comparator.comparingDouble(Side::share))
                .map(this::judged)
                .orElseGet(this::notJudged);
    }

    private Criterion judged(Side closest) {
        return new Criterion(
                "saturation-in-hold",
                Criterion.Subject.SATURATION,
                "departure from saturation",
                closest.channel(),
                "hold",
                "K",
                OptionalDouble.of(closest.departure().kelvin()),
                closest.limit(),
                closest.limit() < 0,
                OptionalDouble.of(closest.departure().uncertaintyKelvin()),
                Optional.of(closest.departure().index()),
                decision(),
                why());
    }

    private Criterion notJudged() {
        return new Criterion(
                "saturation-in-hold",
                Criterion.Subject.SATURATION,
                "departure from saturation",
                "steam-contact probes",
                "hold",
                "K",
                OptionalDouble.empty(),
                -tolerance.airKelvin(),
                true,
                OptionalDouble.empty(),
                Optional.empty(),
                Decision.UNDECIDED,
                "not judged: " + check.notJudged().orElse("no sample could be judged"));
    }

    private Decision decision() {
        if (check.episodes().stream().anyMatch(Episode::confirmed)) {
            return Decision.NOT_MET;
        }
        return check.episodes().isEmpty() && unjudged.isEmpty() ? Decision.MET : Decision.UNDECIDED;
    }

    private String why() {
        long confirmed = check.episodes().stream().filter(Episode::confirmed).count();
        long possible = check.episodes().size() - confirmed;
        return switch (decision()) {
            case MET -> "no episode in the hold phase";
            case NOT_MET -> "episodes in the hold phase: " + confirmed + " confirmed, " + possible + " possible";
            default ->
                unjudged.filter(u -> possible == 0)
                        .map(SaturationAgreement::unjudged)
                        .orElse("possible episodes in the hold phase: " + possible
                                + ", none beyond the sensors' uncertainty");
        };
    }

    private static String unjudged(PhaseDeparture probe) {
        return "not judged for " + Printed.duration(probe.longestUnjudgedSeconds()) + " of the hold phase at "
                + probe.channel().name() + ": temperature or pressure is missing or off the saturation line";
    }

    /** One side of saturation at one probe. */
    private record Side(String channel, PhaseDeparture.Extreme departure, double limit) {

        /** How much of the tolerance is used: 1 at the limit. */
        double share() {
            return departure.kelvin() / limit;
        }
    }
}
