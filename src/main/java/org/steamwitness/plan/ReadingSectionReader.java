package org.steamwitness.plan;

import java.util.List;
import org.steamwitness.quantity.AmountText;

/** Understands {@code reading}. */
final class ReadingSectionReader {

    private static final int LAST_HEADER_LINE = 1000;

    private ReadingSectionReader() {}

    static ReadingSection reading(Section at) {
        Entry<String> encoding = at.may("encoding").oneOf(ReadingSection.ENCODINGS);
        Entry<String> delimiter = at.may("delimiter").oneOf(ReadingSection.DELIMITERS);
        Entry<String> decimal = at.may("decimal-mark").oneOf(ReadingSection.DECIMAL_MARKS);
        Entry<String> thousands = at.may("thousands-mark").oneOf(ReadingSection.THOUSANDS_MARKS);
        Entry<Integer> header = at.may("header-line").whole(1, LAST_HEADER_LINE);
        Entry<List<String>> timeColumns = at.may("time-columns").list(Slot::text);
        Entry<String> timeFormat =
                at.may("time-format").parsed("a pattern such as dd.MM.yyyy HH:mm:ss", ReadingSectionReader::pattern);
        Entry<String> dateOrder = at.may("date-order").oneOf(ReadingSection.DATE_ORDERS);
        Entry<Boolean> lineBreaks = at.may("quoted-line-breaks").either("yes", "no");
        Entry<List<String>> missing = at.may("missing-codes").list(Slot::text);
        Entry<Double> refused = at.may("largest-refused-share").parsed("a share such as 1 %", AmountText::fraction);
        return new ReadingSection(
                encoding.optional(),
                delimiter.optional(),
                decimal.optional(),
                thousands.optional(),
                header.optional(),
                timeColumns.or(List.of()),
                timeFormat.optional(),
                dateOrder.optional(),
                lineBreaks.optional(),
                missing.or(List.of()),
                ChamberReader.number(refused));
    }

    private static String pattern(String text) {
        if (!text.matches("[yuMdHhmsSa'T .:/,-]{2,40}")) {
            throw new IllegalArgumentException(
                    "\"" + text + "\" is not a pattern such as dd.MM.yyyy HH:mm:ss; letters: y u M d H h m s S a");
        }
        return text;
    }
}
