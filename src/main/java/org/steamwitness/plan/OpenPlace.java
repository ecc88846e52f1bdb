package org.steamwitness.plan;

import java.util.List;
import java.util.regex.Pattern;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;

/**
 * A question mark that stands where a value has to be filled in. With quotes it is plain YAML; without them YAML would
 * take it for the start of a key, so that it is exchanged for a character that no one writes before the file is read.
 */
final class OpenPlace {

    /** Written for an open place in a file that the program writes: YAML to every editor. */
    static final String WRITTEN = "\"?\"";

    private static final String MARK = "?";

    /** A character of private use: as long as the question mark, so that columns stay right. */
    private static final char STAND_IN = '\uE000';

    private static final Pattern BARE =
            Pattern.compile("(?<=\\[|[:,-] {1,8})\\?(?=[ \t]*(?:$|[,}\\]\\r]|[ \t]#))", Pattern.MULTILINE);

    private OpenPlace() {}

    static String readable(String text) {
        return BARE.matcher(text).replaceAll(String.valueOf(STAND_IN));
    }

    static boolean is(String value) {
        return value.equals(MARK) || (value.length() == 1 && value.charAt(0) == STAND_IN);
    }

    /** The value as it was written. */
    static String asWritten(String value) {
        return value.indexOf(STAND_IN) < 0 ? value : value.replace(STAND_IN, '?');
    }

    static List<Finding> in(AsWritten<?> read) {
        return read.problems().stream()
                .filter(problem -> problem.kind() == FindingKind.OPEN_PLACE)
                .toList();
    }

    /** Open places as comments of a file: each key path with what has to stand there. */
    static String listed(List<Finding> open) {
        if (open.isEmpty()) {
            return "# No place is open.\n";
        }
        StringBuilder list = new StringBuilder(
                "# Open places, marked \"?\": " + open.size() + ". Each needs a value before the file can be used.\n");
        for (Finding place : open) {
            list.append("#   ")
                    .append(QuotedText.comment(place.position().path()))
                    .append(": ")
                    .append(place.facts().get("expected"))
                    .append('\n');
        }
        return list.toString();
    }
}
