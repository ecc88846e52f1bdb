package org.steamwitness.intake;

import java.util.Optional;

/**
 * How a log writes numbers.
 *
 * @param decimal what stands before the fraction
 * @param thousands what groups the digits before it, if anything does
 */
record NumberForm(char decimal, Optional<Character> thousands) {

    /** A full stop before the fraction and no groups. */
    static final NumberForm PLAIN = new NumberForm('.', Optional.empty());

    /** A comma before the fraction and no groups. */
    static final NumberForm COMMA = new NumberForm(',', Optional.empty());

    String words() {
        return named(decimal)
                + thousands.map(t -> ", " + named(t) + " between thousands").orElse("");
    }

    private static String named(char mark) {
        return switch (mark) {
            case '.' -> "full stop";
            case ',' -> "comma";
            case '\'', '\u2019' -> "apostrophe";
            default -> "space";
        };
    }
}
