package org.steamwitness.evaluate.criteria;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.quantity.Printed;

/** The band was held long enough. Guarded decisions use what the samples leave possible, simple ones what they prove. */
final class HoldingTime {

    private HoldingTime() {}

    static Criterion of(BoundPlan plan, HoldResult hold) {
        double limit = plan.hold().durationSeconds();
        double possible = plan.decision().guarded() ? hold.possibleSeconds() : hold.provenSeconds();
        Decision held = GuardBand.atLeast(hold.provenSeconds(), possible, limit);
        Decision decision = held == Decision.NOT_MET && hold.cutByLog() ? Decision.UNDECIDED : held;
        return new Criterion(
                "holding-time",
                Criterion.Subject.TIME_OR_TEMPERATURE,
                "holding time",
                plan.startChannels().stream().map(BoundChannel::name).collect(Collectors.joining(", ")),
                "hold",
                "s",
                OptionalDouble.of(hold.provenSeconds()),
                limit,
                true,
                OptionalDouble.empty(),
                Optional.empty(),
                decision,
                why(decision, hold, limit));
    }

    private static String why(Decision decision, HoldResult hold, double limit) {
        String required = " of " + Printed.duration(limit);
        if (hold.possibleSeconds() == 0) {
            return "0 s" + required + ", the band was never held";
        }
        String proven = Printed.duration(hold.provenSeconds()) + required + " proven";
        if (decision == Decision.UNDECIDED && hold.cutByLog()) {
            return proven + "; a gap or an end of the log leaves open whether it was held longer";
        }
        return decision == Decision.UNDECIDED
                ? proven + ", " + Printed.duration(hold.possibleSeconds())
                        + " possible: the sampling interval leaves it open"
                : proven;
    }
}
