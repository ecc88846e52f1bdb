package org.steamwitness.plan;

import java.util.List;
import org.steamwitness.quantity.QuantityText;

/** Understands {@code saturation}. */
final class SaturationReader {

    private static final double DEFAULT_SHORTEST_SECONDS = 10;

    private SaturationReader() {}

    static SaturationTolerance saturation(Section at) {
        Entry<Double> air =
                at.need("air").parsed("a temperature difference such as 1.0 K", QuantityText::kelvinDifference);
        Entry<Double> superheat =
                at.need("superheat").parsed("a temperature difference such as 2.0 K", QuantityText::kelvinDifference);
        Entry<Double> shortest = at.may("shortest").parsed("a duration such as 10 s", QuantityText::seconds);
        Entry<List<PlannedPhase>> judged =
                at.may("judged").list(slot -> slot.word(PlannedPhase.class, PlannedPhase::word));
        return new SaturationTolerance(
                air.get(),
                superheat.get(),
                shortest.or(DEFAULT_SHORTEST_SECONDS),
                judged.or(List.of(PlannedPhase.HOLD)));
    }
}
