package org.steamwitness.evaluate.hold;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.instruments.ChannelMeasure;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.plan.BoundChannel;

/**
 * Difference between the hottest and the coldest steam-contact probe at one instant.
 *
 * @param hottest the hottest probe then
 * @param coldest the coldest probe then
 * @param index of the sample
 * @param uncertaintyKelvin standard uncertainty of the difference, without the error that both sensors share; empty if
 *     the plan does not state that of both
 */
public record Spread(BoundChannel hottest, BoundChannel coldest, int index, OptionalDouble uncertaintyKelvin) {

    /**
     * The greatest spread of a phase, the first if there are several.
     *
     * @param probes measures of the steam-contact probes
     * @param hold the hold phase
     * @return empty if no two probes have a sample at one instant
     */
    static Optional<Spread> greatest(List<ChannelMeasure> probes, Phase hold) {
        Spread greatest = null;
        for (int i = hold.from(); i < hold.end(); i++) {
            ChannelMeasure hottest = null;
            ChannelMeasure coldest = null;
            int present = 0;
            for (ChannelMeasure probe : probes) {
                double kelvin = at(probe, i);
                if (!Double.isNaN(kelvin)) {
                    present++;
                    hottest = hottest == null || kelvin > at(hottest, i) ? probe : hottest;
                    coldest = coldest == null || kelvin <= at(coldest, i) ? probe : coldest;
                }
            }
            if (present > 1 && (greatest == null || at(hottest, i) - at(coldest, i) > greatest.kelvin())) {
                greatest = new Spread(hottest.channel(), coldest.channel(), i, uncertainty(hottest, coldest));
            }
        }
        return Optional.ofNullable(greatest);
    }

    /**
     * The difference.
     *
     * @return kelvin, zero or more
     */
    public double kelvin() {
        return hottest.values().at(index) - coldest.values().at(index);
    }

    private static double at(ChannelMeasure probe, int index) {
        return probe.channel().values().at(index);
    }

    private static OptionalDouble uncertainty(ChannelMeasure one, ChannelMeasure other) {
        if (one.channel().commonUncertainty().isEmpty()
                || other.channel().commonUncertainty().isEmpty()) {
            return OptionalDouble.empty();
        }
        double shared =
                Math.min(one.channel().sharedUncertainty(), other.channel().sharedUncertainty());
        return OptionalDouble.of(one.uncertainty().ofDifference(other.uncertainty(), shared));
    }
}
