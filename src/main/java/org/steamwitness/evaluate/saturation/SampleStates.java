package org.steamwitness.evaluate.saturation;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.trace.Stretch;

/** Names the state of each sample of one probe: the tolerance first, then the uncertainty. */
final class SampleStates {

    private final Departure departure;
    private final SaturationTolerance tolerance;
    private final double z;

    /**
     * Prepares the rule.
     *
     * @param departure of one probe
     * @param tolerance how far it may stand from saturation
     * @param z how many standard uncertainties make a departure sure; one-sided
     */
    SampleStates(Departure departure, SaturationTolerance tolerance, double z) {
        this.departure = departure;
        this.tolerance = tolerance;
        this.z = z;
    }

    /** Every stretch of samples that stand outside the tolerance, possible or confirmed. */
    List<Stretch> outside(int samples) {
        List<Stretch> stretches = new ArrayList<>();
        int first = -1;
        for (int i = 0; i <= samples; i++) {
            boolean outside = i < samples && at(i).outside();
            if (outside && first < 0) {
                first = i;
            } else if (!outside && first >= 0) {
                stretches.add(new Stretch(first, i - 1));
                first = -1;
            }
        }
        return List.copyOf(stretches);
    }

    SampleState at(int index) {
        double kelvin = departure.kelvinAt(index);
        if (Double.isNaN(kelvin)) {
            return SampleState.NOT_JUDGED;
        }
        if (kelvin < -tolerance.airKelvin()) {
            boolean sure = kelvin < -(tolerance.airKelvin() + z * departure.uncertaintyAt(index));
            return sure ? SampleState.CONFIRMED_AIR : SampleState.POSSIBLE_AIR;
        }
        if (kelvin > tolerance.superheatKelvin()) {
            boolean sure = kelvin > tolerance.superheatKelvin() + z * departure.uncertaintyAt(index);
            return sure ? SampleState.CONFIRMED_SUPERHEAT : SampleState.POSSIBLE_SUPERHEAT;
        }
        return SampleState.SATURATED;
    }
}
