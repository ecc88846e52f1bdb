package org.steamwitness.intake;

import java.util.Locale;
import java.util.Set;

/** Words that loggers write where a sample is missing: open circuits, overranges, errors. Common practice, no source. */
final class MissingText {

    private static final Set<String> WORDS = Set.of(
            "open",
            "ol",
            "o.l.",
            "o.l",
            "over",
            "overrange",
            "over range",
            "under",
            "underrange",
            "err",
            "error",
            "fault",
            "bad",
            "fail",
            "n/a",
            "na",
            "#n/a",
            "#value!",
            "#div/0!",
            "nan",
            "-nan",
            "inf",
            "+inf",
            "-inf",
            "infinity",
            "-infinity",
            "null",
            "none",
            "no data",
            "short",
            "burnout");

    private MissingText() {}

    /** Tells whether a text stands for a missing sample. */
    static boolean is(String text) {
        String plain = text.strip().toLowerCase(Locale.ROOT);
        return WORDS.contains(plain)
                || (!plain.isEmpty() && plain.chars().allMatch(c -> "-*?.\u2013\u2014_".indexOf(c) >= 0));
    }
}
