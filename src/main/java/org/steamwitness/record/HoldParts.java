package org.steamwitness.record;

import java.util.List;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.evaluate.hold.ProbeInHold;
import org.steamwitness.plan.Hold;
import org.steamwitness.trace.Column;

/** The record's part on the hold. */
final class HoldParts {

    private static final String NOT_STATED = "no uncertainty is stated";

    private final Evidence evidence;

    HoldParts(Evidence evidence) {
        this.evidence = evidence;
    }

    HoldPart part() {
        Hold asked = evidence.bound().hold();
        HoldResult hold = evidence.evaluation().hold();
        Column seconds = evidence.trace().seconds();
        List<HoldPart.Attempt> attempts = evidence.evaluation().phases().attempts().stream()
                .map(a -> new HoldPart.Attempt(
                        Canonical.number(seconds.at(a.from())),
                        Canonical.number(seconds.at(a.to())),
                        a.endedBy().words()))
                .toList();
        List<HoldPart.PerChannel> perChannel = hold.probes().stream()
                .map(p -> new HoldPart.PerChannel(
                        p.channel().name(),
                        Canonical.celsius(p.lowestKelvin()),
                        Canonical.celsius(p.meanKelvin()),
                        Canonical.celsius(p.highestKelvin()),
                        Canonical.number(seconds.at(p.lowestIndex())),
                        uncertainty(p)))
                .toList();
        return new HoldPart(List.of(new HoldPart.Step(
                Canonical.celsius(asked.atLeastKelvin()),
                Canonical.celsius(asked.atMostKelvin()),
                Canonical.number(asked.durationSeconds()),
                attempts,
                Canonical.number(hold.provenSeconds()),
                Canonical.number(hold.possibleSeconds()),
                Given.withheld("a retort cycle has no equilibration"),
                perChannel,
                hold.spread()
                        .map(s -> Given.of(new HoldPart.Spread(
                                Canonical.number(s.kelvin()),
                                Canonical.number(seconds.at(s.index())),
                                s.hottest().name(),
                                s.coldest().name(),
                                Given.numberOr(s.uncertaintyKelvin(), NOT_STATED))))
                        .orElseGet(() -> Given.withheld("fewer than two steam-contact probes in a hold phase")),
                Given.withheld("this version of the program does not evaluate drift"))));
    }

    private static Given<HoldPart.Uncertainty> uncertainty(ProbeInHold probe) {
        return probe.uncertainty()
                .map(u -> Given.of(new HoldPart.Uncertainty(
                        Canonical.number(u.ofExtreme()),
                        Canonical.number(u.ofMean(probe.samples())),
                        Canonical.number(u.ofExtreme()))))
                .orElseGet(() -> Given.withheld(NOT_STATED, "plan: channels.uncertainty"));
    }
}
