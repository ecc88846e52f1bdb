package org.steamwitness.intake;

/** A field of a log as messages show it. */
final class FieldText {

    private static final int LONGEST = 24;

    private FieldText() {}

    static String shortened(String text) {
        return text.length() <= LONGEST ? text : text.substring(0, LONGEST) + "…";
    }
}
