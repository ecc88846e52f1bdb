package org.steamwitness.intake;

import java.util.regex.Pattern;

/** Reads numbers as loggers write them. */
final class NumberText {

    private static final Pattern NUMBER = Pattern.compile("[+-]?[0-9]+(\\.[0-9]*)?([eE][+-]?[0-9]{1,3})?");

    private static final int LONGEST = 60;

    /** So many digits make a whole number that a double holds exactly. */
    private static final int MOST_DIGITS = 15;

    /** All powers of ten that a double holds exactly and that a mantissa of 15 digits can need. */
    private static final double[] POWERS = {
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
    };

    private final NumberForm form;
    private final char decimal;

    NumberText(NumberForm form) {
        this.form = form;
        this.decimal = form.decimal();
    }

    /**
     * Reads a number. Short decimals become a whole mantissa divided by a power of ten; both are exact, so the result
     * is correctly rounded. All else goes through the general parser.
     *
     * @return the number, infinite if it is too large for one; NaN if the text is no number
     */
    double read(String text) {
        int length = text.length();
        if (length == 0 || length > MOST_DIGITS) {
            return general(text);
        }
        int start = text.charAt(0) == '-' ? 1 : 0;
        long mantissa = 0;
        int point = length;
        for (int i = start; i < length; i++) {
            int digit = text.charAt(i) - '0';
            if (digit >= 0 && digit <= 9) {
                mantissa = mantissa * 10 + digit;
            } else if (digit + '0' == decimal && point == length && i > start) {
                point = i;
            } else {
                return general(text);
            }
        }
        if (start == length) {
            return Double.NaN;
        }
        double value = point == length ? mantissa : mantissa / POWERS[length - point - 1];
        return start == 1 ? -value : value;
    }

    /** The unit, one that is known, that stands in the same cell behind a number; empty if none does. */
    static String unitOf(String text) {
        String stripped = text.strip();
        int end = stripped.length();
        while (end > 0 && !Character.isDigit(stripped.charAt(end - 1)) && stripped.charAt(end - 1) != '.') {
            end--;
        }
        String unit = stripped.substring(end).strip();
        return text.length() <= LONGEST && end > 0 && UnitText.of(unit).isPresent() ? unit : "";
    }

    private double general(String text) {
        if (text.length() > LONGEST) {
            return Double.NaN;
        }
        String number = canonical(text.strip());
        String unit = unitOf(number);
        if (!unit.isEmpty()) {
            number = number.substring(0, number.length() - unit.length()).strip();
        }
        return NUMBER.matcher(number).matches() ? Double.parseDouble(number) : Double.NaN;
    }

    /** With a full stop, a plain minus and no groups; as it is if the groups are not of three digits. */
    private String canonical(String text) {
        String plain = text.replace('\u2212', '-');
        if (form.thousands().isPresent()) {
            char mark = form.thousands().get();
            String group = mark == ' '
                    ? "[ \u00A0\u2009\u202F]"
                    : mark == '\'' || mark == '\u2019' ? "['\u2019]" : Pattern.quote(mark + "");
            String decimal = Pattern.quote(form.decimal() + "");
            if (plain.matches("[+-]?[0-9]{1,3}(" + group + "[0-9]{3})+(" + decimal + "[0-9]*)?.*")) {
                plain = plain.replaceAll(group, "");
            }
        }
        if (form.decimal() == '.') {
            return plain;
        }
        return plain.indexOf('.') >= 0 ? "" : plain.replace(form.decimal(), '.');
    }
}
