package org.steamwitness.intake;

import java.util.regex.Pattern;

/** What a field looks like, before anything is known of the log's form. */
enum FieldKind {
    EMPTY,
    DATE_AND_TIME,
    DATE,
    TIME,
    NUMBER,
    MISSING,
    TEXT;

    private static final Pattern NUMBER_LIKE = Pattern.compile(
            "[+\\-\u2212]?[0-9]{1,3}([.,'\u2019 \u00A0\u2009\u202F][0-9]{3})*([.,][0-9]+)?|[+\\-\u2212]?[0-9]+([.,][0-9]+)?([eE][+-]?[0-9]{1,3})?");

    static FieldKind of(String field) {
        String text = field.strip();
        if (text.isEmpty()) {
            return EMPTY;
        }
        if (text.length() > 60) {
            return TEXT;
        }
        if (NUMBER_LIKE.matcher(text).matches()) {
            return NUMBER;
        }
        if (TimeReader.OF_DAY.matcher(text).matches()) {
            return TIME;
        }
        var dated = TimeReader.DATED.matcher(text);
        if (dated.matches() && dated.group(1).length() + dated.group(4).length() <= 6) {
            String rest = dated.group(5).strip();
            if (rest.isEmpty()) {
                return DATE;
            }
            return TimeReader.OF_DAY.matcher(rest).matches() ? DATE_AND_TIME : TEXT;
        }
        if (!NumberText.unitOf(text).isEmpty()) {
            String number = text.substring(
                            0, text.length() - NumberText.unitOf(text).length())
                    .strip();
            return NUMBER_LIKE.matcher(number).matches() ? NUMBER : TEXT;
        }
        return MissingText.is(text) ? MISSING : TEXT;
    }

    boolean time() {
        return this == DATE_AND_TIME || this == DATE || this == TIME;
    }
}
