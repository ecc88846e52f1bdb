package org.steamwitness.evaluate.phase;

/**
 * A stretch in which all starting channels stayed in the hold's band.
 *
 * @param from index of the first sample inside
 * @param to index of the last sample inside
 * @param earliestStartSeconds the sample or mark before it, between which and the first sample inside the truth lies
 * @param latestEndSeconds the sample or mark behind it
 * @param endedBy what ended it
 */
public record HoldAttempt(int from, int to, double earliestStartSeconds, double latestEndSeconds, EndedBy endedBy) {

    /** What can end an attempt. */
    public enum EndedBy {
        /** A starting channel left the band. */
        LEFT_BAND("a channel left the band"),
        /** Too long without a sample. */
        GAP("a gap longer than the plan allows"),
        /** Steam was shut off, as entered. */
        STEAM_OFF("steam shut off (entered)"),
        /** The log stops. */
        LOG_END("the log ends");

        private final String words;

        EndedBy(String words) {
            this.words = words;
        }

        /**
         * The reason as records print it.
         *
         * @return in words
         */
        public String words() {
            return words;
        }
    }
}
