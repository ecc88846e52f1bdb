package org.steamwitness.cli;

/** Text from files, made harmless for a terminal: control characters cannot move its cursor or change its colours. */
final class Harmless {

    private static final int REPLACEMENT = 0xFFFD;

    private Harmless() {}

    /** The text with every control character but the line feed replaced. */
    static String text(String text) {
        return text.codePoints()
                .map(c -> c != '\n' && Character.isISOControl(c) ? REPLACEMENT : c)
                .collect(StringBuilder::new, StringBuilder::appendCodePoint, StringBuilder::append)
                .toString();
    }
}
