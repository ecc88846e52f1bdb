package org.steamwitness.evaluate.criteria;

import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.lethality.ProbeLethality;
import org.steamwitness.quantity.Printed;

/** The product probe that reached the least lethality reached the plan's minimum. */
final class LeastLethality {

    private static final double SECONDS_PER_MINUTE = 60;

    /** The interval of a lethality spans two standard uncertainties to each side. */
    private static final double INTERVAL_IN_STANDARD_UNCERTAINTIES = 4;

    private LeastLethality() {}

    static Criterion of(Lethality lethality) {
        double limit = lethality.aim().minimumSeconds() / SECONDS_PER_MINUTE;
        Optional<ProbeLethality> governing = lethality.governing();
        OptionalDouble value = governing
                .map(p -> OptionalDouble.of(p.countedSeconds(lethality.aim()) / SECONDS_PER_MINUTE))
                .orElse(OptionalDouble.empty());
        return new Criterion(
                "lethality-" + lethality.aim().name(),
                Criterion.Subject.LETHALITY,
                lethality.aim().name() + " at the least product probe",
                governing.map(p -> p.channel().name()).orElse("product"),
                lethality.aim().coolingCounted() ? "whole run" : "to steam-off",
                "min",
                value,
                limit,
                true,
                uncertainty(governing),
                Optional.empty(),
                governing
                        .map(p -> GuardBand.atLeast(
                                p.surelySeconds(),
                                p.surelyNotSeconds(),
                                lethality.aim().minimumSeconds()))
                        .orElse(Decision.NOT_APPLICABLE),
                governing
                        .map(p -> Printed.fixed(value.orElseThrow(), 2) + " min of " + Printed.fixed(limit, 2)
                                + " min, least of " + lethality.probes().size() + " product probes")
                        .orElse("not measured: no product probe; judged by time and temperature"));
    }

    private static OptionalDouble uncertainty(Optional<ProbeLethality> governing) {
        if (governing.isEmpty() || governing.get().channel().commonUncertainty().isEmpty()) {
            return OptionalDouble.empty();
        }
        double width = governing.get().highSeconds() - governing.get().lowSeconds();
        return OptionalDouble.of(width / INTERVAL_IN_STANDARD_UNCERTAINTIES / SECONDS_PER_MINUTE);
    }
}
