package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.trace.Delimiter;

/**
 * The rows of samples that a delimiter would find among a log's first lines.
 *
 * @param delimiter the candidate
 * @param width fields of most of them
 * @param rows their fields
 * @param lines the line number of each, as an editor counts
 */
record Block(Delimiter delimiter, int width, List<List<String>> rows, List<Integer> lines) {

    /** Of the fields of a row of samples at most this share is text; common practice, no source. */
    private static final double LARGEST_TEXT_SHARE = 0.34;

    /** A column of one kind shows it in this share of its rows at least; common practice, no source. */
    private static final double LEAST_ALIKE_SHARE = 0.3;

    static Block of(Delimiter delimiter, List<String> text, int fromLine) {
        RowSplitter splitter = new RowSplitter(delimiter);
        Map<Integer, Integer> widths = new HashMap<>();
        List<List<String>> rows = new ArrayList<>();
        List<Integer> lines = new ArrayList<>();
        for (int i = fromLine - 1; i < text.size(); i++) {
            boolean tabbed = delimiter == Delimiter.SPACES && text.get(i).indexOf('\t') >= 0;
            Optional<List<String>> fields = tabbed ? Optional.empty() : splitter.split(text.get(i));
            if (fields.isPresent() && samples(fields.get())) {
                rows.add(fields.get());
                lines.add(i + 1);
                widths.merge(fields.get().size(), 1, Integer::sum);
            }
        }
        int width = widths.entrySet().stream()
                .max(Map.Entry.<Integer, Integer>comparingByValue().thenComparing(Map.Entry.comparingByKey()))
                .map(Map.Entry::getKey)
                .orElse(0);
        for (int i = rows.size() - 1; i >= 0; i--) {
            if (rows.get(i).size() != width) {
                rows.remove(i);
                lines.remove(i);
            }
        }
        return new Block(delimiter, width, List.copyOf(rows), List.copyOf(lines));
    }

    private static boolean samples(List<String> fields) {
        if (fields.size() < 2) {
            return false;
        }
        int numbers = 0;
        int times = 0;
        int text = 0;
        int filled = 0;
        for (String field : fields) {
            FieldKind kind = FieldKind.of(field);
            filled += kind == FieldKind.EMPTY ? 0 : 1;
            numbers += kind == FieldKind.NUMBER || kind == FieldKind.MISSING ? 1 : 0;
            times += kind.time() ? 1 : 0;
            text += kind == FieldKind.TEXT ? 1 : 0;
        }
        return numbers > 0 && numbers + times > 1 && text <= LARGEST_TEXT_SHARE * filled;
    }

    /** The fields of one column, in the order of the rows. */
    List<String> column(int index) {
        return rows.stream().map(row -> row.get(index).strip()).toList();
    }

    /** Whether a column's fields look so, but for some that are empty, codes or plainly wrong. */
    boolean mostly(int index, FieldKind kind) {
        int alike = 0;
        int otherwise = 0;
        for (List<String> row : rows) {
            FieldKind of = FieldKind.of(row.get(index));
            alike += of == kind ? 1 : 0;
            otherwise += of != kind && of != FieldKind.EMPTY && of != FieldKind.MISSING && of != FieldKind.TEXT ? 1 : 0;
        }
        return alike > 4 * otherwise && alike > LEAST_ALIKE_SHARE * rows.size();
    }
}
