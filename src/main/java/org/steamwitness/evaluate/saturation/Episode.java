package org.steamwitness.evaluate.saturation;

import org.steamwitness.plan.BoundChannel;

/**
 * A stretch in which a probe left saturation.
 *
 * @param channel the probe
 * @param kind air or superheat
 * @param confirmed true if beyond the uncertainty, false if it can't be told
 * @param from index of its first sample
 * @param to index of its last sample
 * @param worstIndex index of the sample furthest from saturation
 * @param worstKelvin its departure
 * @param meanKelvin mean departure
 * @param uncertaintyKelvin standard uncertainty of the worst departure
 * @param airFractionHighest highest equivalent air fraction; below zero for superheat
 */
public record Episode(
        BoundChannel channel,
        Kind kind,
        boolean confirmed,
        int from,
        int to,
        int worstIndex,
        double worstKelvin,
        double meanKelvin,
        double uncertaintyKelvin,
        double airFractionHighest) {

    /** On which side of saturation the probe stood. */
    public enum Kind {
        /** Colder than saturation. */
        AIR("air"),
        /** Hotter than saturation. */
        SUPERHEAT("superheat");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /**
         * The word used in records.
         *
         * @return "air" or "superheat"
         */
        public String word() {
            return word;
        }
    }
}
