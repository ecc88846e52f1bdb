package org.steamwitness.intake;

/**
 * One thing that had to be known to read a log.
 *
 * @param what such as "delimiter"
 * @param value as it was taken
 * @param basis how it came to be known
 * @param evidence why, in words
 */
public record Guess(String what, String value, Basis basis, String evidence) {

    /** How something came to be known. */
    public enum Basis {
        /** The bytes tell it. */
        FOUND("found"),
        /** The plan tells it. */
        TOLD("told"),
        /** Nothing tells it; the usual was taken. */
        ASSUMED("assumed");

        private final String word;

        Basis(String word) {
            this.word = word;
        }

        /**
         * The word for people.
         *
         * @return such as "found"
         */
        public String word() {
            return word;
        }
    }
}
