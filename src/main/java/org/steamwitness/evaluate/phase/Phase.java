package org.steamwitness.evaluate.phase;

/**
 * A stretch of the run with one purpose. It holds the samples from its first up to, but not including, the first of
 * the next phase, and lasts until that sample's time.
 *
 * @param name its purpose
 * @param from index of its first sample
 * @param to index of the next phase's first sample, or of the last sample of the run
 * @param last whether the run ends with it, so that the sample at {@code to} belongs to it
 * @param foundBy what set its start
 */
public record Phase(PhaseName name, int from, int to, boolean last, FoundBy foundBy) {

    /**
     * Index behind its last sample.
     *
     * @return {@code to}, or one more in the last phase
     */
    public int end() {
        return last ? to + 1 : to;
    }

    /** What set the start of a phase. */
    public enum FoundBy {
        /** The samples. */
        TRACE("trace"),
        /** A mark entered by hand. */
        MARK("mark");

        private final String word;

        FoundBy(String word) {
            this.word = word;
        }

        /**
         * The word used in records.
         *
         * @return "trace" or "mark"
         */
        public String word() {
            return word;
        }
    }
}
