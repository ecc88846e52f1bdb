package org.steamwitness.intake;

import java.util.OptionalDouble;
import java.util.regex.Pattern;

/** Numbers as loggers write them: full stop as decimal mark, no thousands mark. */
final class NumberText {

    private static final Pattern NUMBER = Pattern.compile("[+-]?[0-9]+(\\.[0-9]*)?([eE][+-]?[0-9]{1,3})?");

    /** All powers of ten that a double holds exactly and that a mantissa of 15 digits can need. */
    private static final double[] POWERS = {
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
    };

    private NumberText() {}

    /**
     * Reads a number. Short decimals become a whole mantissa divided by a power of ten; both are exact, so the result
     * is correctly rounded. All else goes through the general parser.
     */
    static OptionalDouble read(String text) {
        int length = text.length();
        int start = length > 0 && text.charAt(0) == '-' ? 1 : 0;
        long mantissa = 0;
        int digits = 0;
        int point = -1;
        for (int i = start; i < length; i++) {
            char c = text.charAt(i);
            if (c >= '0' && c <= '9') {
                mantissa = mantissa * 10 + (c - '0');
                digits++;
            } else if (c == '.' && point < 0 && digits > 0) {
                point = i;
            } else {
                return general(text);
            }
            if (digits > 15) {
                return general(text);
            }
        }
        if (digits == 0) {
            return OptionalDouble.empty();
        }
        int decimals = point < 0 ? 0 : length - point - 1;
        double value = mantissa / POWERS[decimals];
        return OptionalDouble.of(start == 1 ? -value : value);
    }

    private static OptionalDouble general(String text) {
        if (text.length() > 40 || !NUMBER.matcher(text).matches()) {
            return OptionalDouble.empty();
        }
        double value = Double.parseDouble(text);
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
