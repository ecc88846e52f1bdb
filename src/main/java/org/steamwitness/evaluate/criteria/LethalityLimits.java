package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.lethality.MarkedLethality;
import org.steamwitness.evaluate.lethality.ProbeLethality;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.ProbeChoice;
import org.steamwitness.quantity.Printed;
import org.steamwitness.quantity.TemperatureUnit;

/**
 * The limits of one lethality: the probe that reached least has to reach the minimum, the one that reached most may not
 * exceed the maximum. What a probe gathered outside saturation does not help to reach a minimum.
 */
final class LethalityLimits {

    /** The interval of a lethality spans two standard uncertainties to each side. */
    private static final double INTERVAL_IN_STANDARD_UNCERTAINTIES = 4;

    private final Lethality lethality;
    private final LethalityAim aim;
    private final boolean cutByLog;

    private LethalityLimits(Lethality lethality, boolean cutByLog) {
        this.lethality = lethality;
        this.cutByLog = cutByLog;
        this.aim = lethality.aim();
    }

    static List<Criterion> of(Lethality lethality, boolean cutByLog) {
        LethalityLimits limits = new LethalityLimits(lethality, cutByLog);
        List<Criterion> criteria = new ArrayList<>();
        limits.aim.limits().leastSeconds().ifPresent(least -> criteria.add(limits.least(least)));
        limits.aim.limits().mostSeconds().ifPresent(most -> criteria.add(limits.most(most)));
        return criteria;
    }

    private Criterion least(double limitSeconds) {
        Optional<ProbeLethality> probe = lethality.least();
        Optional<Decision> decision = probe.map(p -> unlessLost(
                p,
                GuardBand.atLeast(
                        p.surelySeconds()
                                - p.marked()
                                        .map(MarkedLethality::lethalitySeconds)
                                        .orElse(0.0),
                        p.surelyNotSeconds(),
                        limitSeconds)));
        return criterion("lethality-" + aim.name(), "least", probe, limitSeconds, true, decision);
    }

    /** Time without samples counts as nothing, so that a lethality that falls short for it, or cut, is not known to. */
    private Decision unlessLost(ProbeLethality probe, Decision decision) {
        return decision == Decision.NOT_MET && (cutByLog || probe.coverage().lostSeconds() > 0)
                ? Decision.UNDECIDED
                : decision;
    }

    private Criterion most(double limitSeconds) {
        Optional<ProbeLethality> probe = lethality.greatest();
        Optional<Decision> decision =
                probe.map(p -> GuardBand.atMost(p.surelySeconds(), p.surelyNotSeconds(), limitSeconds));
        return criterion("lethality-" + aim.name() + "-most", "greatest", probe, limitSeconds, false, decision);
    }

    private Criterion criterion(
            String id,
            String which,
            Optional<ProbeLethality> probe,
            double limitSeconds,
            boolean atLeast,
            Optional<Decision> decision) {
        return new Criterion(
                id,
                Criterion.Subject.LETHALITY,
                aim.name() + " at the " + which + probes(),
                probe.map(p -> p.channel().name()).orElse(aim.probes().words()),
                aim.coolingCounted() ? "whole run" : "to steam-off",
                unit(),
                probe.map(p -> OptionalDouble.of(aim.unit().of(p.countedSeconds(aim))))
                        .orElseGet(OptionalDouble::empty),
                aim.unit().of(limitSeconds),
                atLeast,
                probe.map(this::uncertainty).orElseGet(OptionalDouble::empty),
                Optional.empty(),
                decision.orElse(Decision.NOT_APPLICABLE),
                probe.map(p -> why(p, which, limitSeconds))
                        .orElseGet(() ->
                                "not measured: no " + aim.probes().words() + " probe; judged by time and temperature"));
    }

    private String probes() {
        return aim.probes().names().isEmpty()
                ? " " + aim.probes().words() + " probe"
                : " of " + aim.probes().words();
    }

    /** Seconds are named with their temperature, lest they be read as time of the clock. */
    private String unit() {
        return aim.unit() == LethalityUnit.MINUTE
                ? aim.unit().symbol()
                : aim.unit().symbol() + " at "
                        + Printed.fixed(TemperatureUnit.CELSIUS.ofKelvin(aim.referenceKelvin()), 1) + " °C";
    }

    private OptionalDouble uncertainty(ProbeLethality probe) {
        if (probe.channel().commonUncertainty().isEmpty()) {
            return OptionalDouble.empty();
        }
        double width = probe.highSeconds() - probe.lowSeconds();
        return OptionalDouble.of(aim.unit().of(width) / INTERVAL_IN_STANDARD_UNCERTAINTIES);
    }

    private String why(ProbeLethality probe, String which, double limitSeconds) {
        String symbol = " " + aim.unit().symbol();
        String reached = printed(probe.countedSeconds(aim)) + symbol + " of " + printed(limitSeconds) + symbol + ", "
                + which + " of " + lethality.probes().size() + " probes";
        String where =
                aim.probes().equals(ProbeChoice.PRODUCT) || !probe.channel().inSteam()
                        ? ""
                        : "; in the chamber's steam, not in a product";
        double lost = probe.coverage().lostSeconds();
        return reached
                + where
                + (lost > 0 ? "; without samples for " + Printed.duration(lost) + ", which count as nothing" : "")
                + probe.marked()
                        .filter(m -> m.lethalitySeconds() > 0)
                        .map(m -> "; of it " + printed(m.lethalitySeconds()) + symbol
                                + " outside saturation, which does not count as reached")
                        .orElse("");
    }

    private String printed(double equivalentSeconds) {
        return Printed.fixed(aim.unit().of(equivalentSeconds), aim.unit() == LethalityUnit.MINUTE ? 2 : 0);
    }
}
