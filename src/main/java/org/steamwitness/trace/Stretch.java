package org.steamwitness.trace;

/**
 * A run of neighbouring samples.
 *
 * @param from index of its first sample
 * @param to index of its last sample, not before the first
 */
public record Stretch(int from, int to) {

    /**
     * Checks the order.
     *
     * @param from index of its first sample
     * @param to index of its last sample
     * @throws IllegalArgumentException if it ends before it starts, or starts before the first sample
     */
    public Stretch {
        if (from < 0 || to < from) {
            throw new IllegalArgumentException("a stretch runs forward from sample 0 on, was " + from + " to " + to);
        }
    }
}
