package org.steamwitness.plan;

/** Text as a double-quoted scalar of YAML, and as part of a comment. */
final class QuotedText {

    private static final int HEXADECIMAL = 16;

    private QuotedText() {}

    static String of(String text) {
        StringBuilder quoted = new StringBuilder("\"");
        text.chars().forEach(c -> {
            if (c == '"' || c == '\\') {
                quoted.append('\\').append((char) c);
            } else if (isHarmless((char) c)) {
                quoted.append((char) c);
            } else {
                String digits = Integer.toString(c, HEXADECIMAL);
                quoted.append("\\u").append("0".repeat(4 - digits.length())).append(digits);
            }
        });
        return quoted.append('"').toString();
    }

    /** One line, whatever the text holds. */
    static String comment(String text) {
        StringBuilder line = new StringBuilder();
        text.chars().forEach(c -> line.append(isHarmless((char) c) ? (char) c : ' '));
        return line.toString().strip();
    }

    /** Printable on one line to every reader of YAML; halves of a pair stay together as they stand. */
    private static boolean isHarmless(char c) {
        return (c >= ' ' && c < 0x7F)
                || (c > 0xA0 && c != '\u2028' && c != '\u2029' && c != '\uFEFF' && c < 0xE000)
                || (c >= 0xF900 && c < 0xFFFE && c != '\uFEFF');
    }
}
