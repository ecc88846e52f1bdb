package org.steamwitness.evaluate.uncertainty;

/**
 * Standard uncertainty of a sample in two parts that behave differently when samples are put together: what is common
 * to all samples of a channel does not average out, what is random does. JCGM 100:2008, 4.2.3 and 5.2.4; the split is
 * common practice.
 *
 * @param common the part that all samples of the channel share, zero or more
 * @param random the part that each sample has to itself, zero or more
 */
public record SampleUncertainty(double common, double random) {

    /**
     * Checks both parts.
     *
     * @param common the part that all samples share
     * @param random the part that each sample has to itself
     * @throws IllegalArgumentException if a part is below zero or not finite
     */
    public SampleUncertainty {
        if (!(common >= 0 && random >= 0) || Double.isInfinite(common) || Double.isInfinite(random)) {
            throw new IllegalArgumentException(
                    "a standard uncertainty is zero or more, was common " + common + ", random " + random);
        }
    }

    /**
     * Of one sample.
     *
     * @return both parts together
     */
    public double ofSample() {
        return rootOfSquares(common, random);
    }

    /**
     * Of the mean of several samples.
     *
     * @param samples how many samples that are independent of each other, one or more
     * @return the common part, and the random part divided by the root of their number
     * @throws IllegalArgumentException if {@code samples} is below one
     */
    public double ofMean(double samples) {
        if (!(samples >= 1)) {
            throw new IllegalArgumentException("a mean needs one sample or more, was " + samples);
        }
        return rootOfSquares(common, random / Math.sqrt(samples));
    }

    /**
     * Of the lowest or highest of several samples: the common part and the random part once. That an extreme of many
     * samples lies further out by noise alone is not corrected: the minimum of 1,800 samples lies about 3.4 random
     * parts below their mean.
     *
     * @return both parts together
     */
    public double ofExtreme() {
        return ofSample();
    }

    /**
     * Of the difference between samples of two channels at one instant.
     *
     * @param other the other channel's
     * @param shared the part of both common parts that is the same error in both, such as that of one reference
     *     thermometer; it cancels
     * @return standard uncertainty of the difference
     * @throws IllegalArgumentException if {@code shared} is below zero or exceeds either common part
     */
    public double ofDifference(SampleUncertainty other, double shared) {
        if (!(shared >= 0 && shared <= common && shared <= other.common)) {
            throw new IllegalArgumentException("the shared part lies between zero and the common parts " + common
                    + " and " + other.common + ", was " + shared);
        }
        double own = common * common - shared * shared;
        double others = other.common * other.common - shared * shared;
        return Math.sqrt(own + others + random * random + other.random * other.random);
    }

    /**
     * The same with a further random part of its own cause.
     *
     * @param more standard uncertainty, zero or more
     * @return both random parts joined
     */
    public SampleUncertainty withRandom(double more) {
        return new SampleUncertainty(common, rootOfSquares(random, more));
    }

    /**
     * The same with a further common part of its own cause.
     *
     * @param more standard uncertainty, zero or more
     * @return both common parts joined
     */
    public SampleUncertainty withCommon(double more) {
        return new SampleUncertainty(rootOfSquares(common, more), random);
    }

    /**
     * The uncertainty of a multiple, such as a pressure seen as a saturation temperature.
     *
     * @param slope what the value is multiplied by
     * @return both parts multiplied by the size of the slope
     */
    public SampleUncertainty times(double slope) {
        return new SampleUncertainty(common * Math.abs(slope), random * Math.abs(slope));
    }

    /**
     * The uncertainty of a sum or difference with an independent value.
     *
     * @param other the other value's
     * @return the parts joined one by one
     */
    public SampleUncertainty and(SampleUncertainty other) {
        return new SampleUncertainty(rootOfSquares(common, other.common), rootOfSquares(random, other.random));
    }

    private static double rootOfSquares(double a, double b) {
        return Math.sqrt(a * a + b * b);
    }
}
