package org.steamwitness.plan;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import org.steamwitness.quantity.AmountText;
import org.steamwitness.trace.Delimiter;
import org.steamwitness.trace.TimeForm;
import org.steamwitness.trace.Told;

/** Understands {@code reading}: what a plan says of how its logs are written, so that it need not be found. */
final class ReadingSectionReader {

    private static final int LAST_HEADER_LINE = 1000;
    private static final List<String> ENCODINGS =
            List.of("UTF-8", "UTF-16LE", "UTF-16BE", "windows-1252", "ISO-8859-1");
    private static final Map<String, Character> DECIMAL_MARKS = Map.of("full stop", '.', "comma", ',');
    private static final Map<String, Character> THOUSANDS_MARKS =
            Map.of("full stop", '.', "comma", ',', "space", ' ', "apostrophe", '\'');

    private ReadingSectionReader() {}

    static Told told(Section at) {
        Entry<String> encoding = at.may("encoding").oneOf(ENCODINGS);
        Entry<Delimiter> delimiter = at.may("delimiter").word(Delimiter.class, Delimiter::word);
        Entry<String> decimal = at.may("decimal-mark").oneOf(List.of("full stop", "comma"));
        Entry<String> thousands = at.may("thousands-mark").oneOf(List.of("full stop", "comma", "space", "apostrophe"));
        Entry<Integer> header = at.may("header-line").whole(0, LAST_HEADER_LINE);
        Entry<List<String>> timeColumns = at.may("time-columns").list(Slot::text);
        Entry<TimeForm> timeForm = at.may("time-format").word(TimeForm.class, TimeForm::word);
        Entry<Boolean> lineBreaks = at.may("quoted-line-breaks").either("yes", "no");
        Entry<List<String>> missing = at.may("missing-codes").list(Slot::text);
        Entry<Double> refused = at.may("largest-refused-share").parsed("a share such as 1 %", AmountText::fraction);
        Optional<Character> decimalMark = decimal.optional().map(DECIMAL_MARKS::get);
        Optional<Character> thousandsMark = thousands.optional().map(THOUSANDS_MARKS::get);
        if (decimalMark.isPresent() && decimalMark.equals(thousandsMark)) {
            throw new IllegalArgumentException("decimal-mark and thousands-mark must differ");
        }
        if (timeColumns.or(List.of()).size() > 2) {
            throw new IllegalArgumentException("expected one column of times, or two: date and time of day");
        }
        return new Told(
                encoding.optional(),
                delimiter.optional(),
                decimalMark,
                thousandsMark,
                header.optional().map(OptionalInt::of).orElseGet(OptionalInt::empty),
                timeColumns.or(List.of()),
                timeForm.optional(),
                lineBreaks.or(false),
                Set.copyOf(missing.or(List.of())),
                refused.optional().map(OptionalDouble::of).orElseGet(OptionalDouble::empty));
    }
}
