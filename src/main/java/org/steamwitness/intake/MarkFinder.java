package org.steamwitness.intake;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.steamwitness.trace.Told;

/** Finds how a log writes its numbers: which mark stands before the fraction and which groups the digits. */
final class MarkFinder {

    private static final Pattern DOT = Pattern.compile(".*[0-9]\\.[0-9]+\\D*");
    private static final Pattern COMMA = Pattern.compile(".*[0-9],[0-9]+\\D*");
    private static final Pattern COMMA_NOT_GROUP =
            Pattern.compile("\\D*[0-9]+,([0-9]{1,2}|[0-9]{4,})\\D*|\\D*(0|[0-9]{4,}),[0-9]+\\D*");
    private static final Pattern DOT_NOT_GROUP =
            Pattern.compile("\\D*[0-9]+\\.([0-9]{1,2}|[0-9]{4,})\\D*|\\D*(0|[0-9]{4,})\\.[0-9]+\\D*");
    private static final Pattern DOT_GROUPS =
            Pattern.compile("\\D*[0-9]{1,3}(\\.[0-9]{3})+,[0-9]+\\D*|\\D*[0-9]{1,3}(\\.[0-9]{3}){2,}\\D*");
    private static final Pattern COMMA_GROUPS =
            Pattern.compile("\\D*[0-9]{1,3}(,[0-9]{3})+\\.[0-9]+\\D*|\\D*[0-9]{1,3}(,[0-9]{3}){2,}\\D*");
    private static final Pattern APOSTROPHES = Pattern.compile("\\D*[0-9]{1,3}(['\u2019][0-9]{3})+.*");
    private static final Pattern SPACES = Pattern.compile("\\D*[0-9]{1,3}([ \u00A0\u2009\u202F][0-9]{3})+.*");

    private MarkFinder() {}

    /** The form and how it came to be known. */
    record Found(NumberForm form, Guess guess) {}

    static Found of(Block block, List<Integer> times, Told told) {
        Counts counts = new Counts();
        for (int c = 0; c < block.width(); c++) {
            if (!times.contains(c)) {
                block.column(c).stream()
                        .filter(f -> FieldKind.of(f) == FieldKind.NUMBER)
                        .forEach(counts::add);
            }
        }
        Optional<Character> thousands = told.thousandsMark().or(counts::thousands);
        if (told.decimalMark().isPresent()) {
            NumberForm form = new NumberForm(told.decimalMark().get(), thousands);
            return new Found(form, new Guess("decimal mark", form.words(), Guess.Basis.TOLD, "the plan says so"));
        }
        return counts.found(thousands);
    }

    /** What the numbers of a log show. */
    private static final class Counts {
        private int dot;
        private int comma;
        private int dotNotGroup;
        private int commaNotGroup;
        private int dotGroups;
        private int commaGroups;
        private int apostrophes;
        private int spaces;

        void add(String text) {
            dot += DOT.matcher(text).matches() ? 1 : 0;
            comma += COMMA.matcher(text).matches() ? 1 : 0;
            dotNotGroup += DOT_NOT_GROUP.matcher(text).matches() ? 1 : 0;
            commaNotGroup += COMMA_NOT_GROUP.matcher(text).matches() ? 1 : 0;
            dotGroups += DOT_GROUPS.matcher(text).matches() ? 1 : 0;
            commaGroups += COMMA_GROUPS.matcher(text).matches() ? 1 : 0;
            apostrophes += APOSTROPHES.matcher(text).matches() ? 1 : 0;
            spaces += SPACES.matcher(text).matches() ? 1 : 0;
        }

        Optional<Character> thousands() {
            if (dotGroups > 0) {
                return Optional.of('.');
            }
            if (commaGroups > 0) {
                return Optional.of(',');
            }
            if (apostrophes > 0) {
                return Optional.of('\'');
            }
            return spaces > 0 ? Optional.of(' ') : Optional.empty();
        }

        Found found(Optional<Character> thousands) {
            boolean byComma = dotGroups > 0 || (comma > 0 && commaGroups == 0 && dot == 0);
            NumberForm form = new NumberForm(byComma ? ',' : '.', thousands);
            if (comma == 0 && dot == 0) {
                return new Found(
                        form, new Guess("decimal mark", form.words(), Guess.Basis.ASSUMED, "no number has a fraction"));
            }
            boolean sure = byComma ? commaNotGroup > 0 || dotGroups > 0 : dotNotGroup > 0 || commaGroups > 0;
            return new Found(
                    form,
                    sure
                            ? new Guess("decimal mark", form.words(), Guess.Basis.FOUND, "the numbers are written so")
                            : new Guess(
                                    "decimal mark",
                                    form.words(),
                                    Guess.Basis.ASSUMED,
                                    "every number has three digits behind its mark, which could group thousands"));
        }
    }
}
