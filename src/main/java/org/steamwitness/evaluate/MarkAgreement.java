package org.steamwitness.evaluate;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.quantity.Printed;
import org.steamwitness.trace.Trace;

/**
 * Holds entered marks against what the starting channels show: steam that stays in the band long after it was shut off,
 * or left it long before, and vents that were closed long after the band was reached.
 */
final class MarkAgreement {

    /** Marks and log may differ by this; common practice, no source. */
    private static final double AGREEMENT_SECONDS = 60;

    private final Trace trace;
    private final BoundPlan plan;
    private final List<Finding> findings = new ArrayList<>();

    private MarkAgreement(Trace trace, BoundPlan plan) {
        this.trace = trace;
        this.plan = plan;
    }

    static List<Finding> of(Trace trace, BoundPlan plan) {
        MarkAgreement agreement = new MarkAgreement(trace, plan);
        if (!plan.startChannels().isEmpty()) {
            plan.marks().steamOffSeconds().ifPresent(agreement::steamOff);
            plan.marks().ventClosedSeconds().ifPresent(agreement::ventClosed);
        }
        return agreement.findings;
    }

    private void steamOff(double mark) {
        OptionalDouble last = lastInBand();
        if (last.isEmpty()) {
            return;
        }
        double after = last.getAsDouble() - mark;
        if (after > AGREEMENT_SECONDS) {
            find("steam-off", mark, "the band was held for " + Printed.duration(after) + " longer");
        } else if (-after > AGREEMENT_SECONDS) {
            find("steam-off", mark, "the band was left " + Printed.duration(-after) + " before");
        }
    }

    private void ventClosed(double mark) {
        for (int i = 0; i < trace.size(); i++) {
            if (inBand(i)) {
                double before = mark - trace.seconds().at(i);
                if (before > AGREEMENT_SECONDS) {
                    find("vent-closed", mark, "the band was reached " + Printed.duration(before) + " before");
                }
                return;
            }
        }
    }

    private OptionalDouble lastInBand() {
        for (int i = trace.size() - 1; i >= 0; i--) {
            if (inBand(i)) {
                return OptionalDouble.of(trace.seconds().at(i));
            }
        }
        return OptionalDouble.empty();
    }

    private boolean inBand(int index) {
        return plan.startChannels().stream()
                .map(c -> c.values().at(index))
                .allMatch(k -> !Double.isNaN(k) && plan.hold().contains(k));
    }

    private void find(String mark, double seconds, String what) {
        findings.add(new Finding(
                FindingKind.MARK_DIFFERS,
                Position.RUN,
                Map.of("mark", mark, "time", trace.clock().timeOfDayAt(seconds), "what", what)));
    }
}
