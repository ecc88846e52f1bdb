package org.steamwitness.trace;

/**
 * The one walk over the usable stretches of a column: pairs of neighbouring samples that a straight line may join.
 * Missing samples are bridged as long as the samples on both sides lie no further apart than the longest gap; a longer
 * gap is skipped, and what lies in it counts as nothing. Lethality and energy walk the same segments.
 */
public final class SegmentWalk {

    private final Column seconds;
    private final Column values;
    private final double longestGapSeconds;

    /**
     * Prepares the walk.
     *
     * @param seconds times, strictly rising
     * @param values samples at these times, NaN where missing
     * @param longestGapSeconds the longest time between two samples that a line may bridge, inclusive
     */
    public SegmentWalk(Column seconds, Column values, double longestGapSeconds) {
        this.seconds = seconds;
        this.values = values;
        this.longestGapSeconds = longestGapSeconds;
    }

    /**
     * Visits all segments between two samples of the time base, cut at both ends, so that walks over neighbouring
     * stretches add up to the walk over both.
     *
     * @param from index of the first instant
     * @param to index of the last instant, at least {@code from}
     * @param visitor is shown each segment in order of time
     * @return how the time between both instants was covered
     */
    public Coverage over(int from, int to, Visitor visitor) {
        double start = seconds.at(from);
        double end = seconds.at(to);
        double covered = 0;
        double bridged = 0;
        int left = lastValueUpTo(from);
        if (left < 0) {
            left = nextValue(from);
        }
        int right = nextValue(left + 1);
        while (right < seconds.size() && seconds.at(left) < end) {
            double a = seconds.at(left);
            double b = seconds.at(right);
            if (b - a <= longestGapSeconds) {
                double cutStart = Math.max(a, start);
                double cutEnd = Math.min(b, end);
                if (cutEnd > cutStart) {
                    visitor.segment(cutStart, on(left, right, cutStart), cutEnd, on(left, right, cutEnd));
                    covered += cutEnd - cutStart;
                    bridged += right > left + 1 ? cutEnd - cutStart : 0;
                }
            }
            left = right;
            right = nextValue(left + 1);
        }
        return new Coverage(covered, bridged, Math.max(0, end - start - covered));
    }

    private int lastValueUpTo(int index) {
        int last = index;
        while (last >= 0 && values.missing(last)) {
            last--;
        }
        return last;
    }

    private int nextValue(int index) {
        int next = index;
        while (next < seconds.size() && values.missing(next)) {
            next++;
        }
        return next;
    }

    private double on(int left, int right, double instant) {
        double a = seconds.at(left);
        double b = seconds.at(right);
        if (instant == a) {
            return values.at(left);
        }
        if (instant == b) {
            return values.at(right);
        }
        return values.at(left) + (values.at(right) - values.at(left)) * ((instant - a) / (b - a));
    }

    /** Is shown the segments of a walk. */
    @FunctionalInterface
    public interface Visitor {

        /**
         * One straight piece.
         *
         * @param startSeconds its start
         * @param startValue value at its start
         * @param endSeconds its end, after its start
         * @param endValue value at its end
         */
        void segment(double startSeconds, double startValue, double endSeconds, double endValue);
    }

    /**
     * How the time of a walk was covered.
     *
     * @param coveredSeconds time in usable segments
     * @param bridgedSeconds of it, time over missing samples
     * @param lostSeconds time that counted as nothing
     */
    public record Coverage(double coveredSeconds, double bridgedSeconds, double lostSeconds) {

        /**
         * The coverage of two walks together.
         *
         * @param other another walk
         * @return the sums
         */
        public Coverage plus(Coverage other) {
            return new Coverage(
                    coveredSeconds + other.coveredSeconds,
                    bridgedSeconds + other.bridgedSeconds,
                    lostSeconds + other.lostSeconds);
        }
    }
}
