package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.steamwitness.trace.Told;

/**
 * The lines above the samples that name the columns.
 *
 * @param lines as written: names, and units where they have a line of their own
 * @param columns one entry a column
 * @param named whether a line of names was found
 * @param guess how it came to be known
 */
record Header(List<String> lines, List<FoundColumn> columns, boolean named, Guess guess) {

    /** A line of units holds at least this share of units among its filled fields; common practice, no source. */
    private static final double UNIT_SHARE = 0.5;

    static Header of(List<String> text, Block block, Told told) {
        RowSplitter splitter = new RowSplitter(block.delimiter());
        if (told.headerLine().isPresent()) {
            int line = told.headerLine().getAsInt();
            Optional<List<String>> names =
                    line < 1 || line > text.size() ? Optional.empty() : splitter.split(text.get(line - 1));
            return header(names, Optional.empty(), text, line, 0, block, Guess.Basis.TOLD);
        }
        int last = above(text, block.lines().get(0) - 1);
        Optional<List<String>> nearest = fields(splitter, text, last, block.width());
        if (nearest.isPresent() && units(nearest.get())) {
            int names = above(text, last - 1);
            Optional<List<String>> over = fields(splitter, text, names, block.width());
            return header(over, nearest, text, over.isPresent() ? names : 0, last, block, Guess.Basis.FOUND);
        }
        boolean text1 = nearest.isPresent() && nearest.get().stream().anyMatch(f -> FieldKind.of(f) == FieldKind.TEXT);
        return text1
                ? header(nearest, Optional.empty(), text, last, 0, block, Guess.Basis.FOUND)
                : header(Optional.empty(), Optional.empty(), text, 0, 0, block, Guess.Basis.FOUND);
    }

    private static int above(List<String> text, int line) {
        int found = line;
        while (found > 0 && text.get(found - 1).isBlank()) {
            found--;
        }
        return found;
    }

    /** Fields of a line if there are as many as in a row; rows may have one more, behind a trailing delimiter. */
    private static Optional<List<String>> fields(RowSplitter splitter, List<String> text, int line, int width) {
        if (line < 1) {
            return Optional.empty();
        }
        return splitter.split(text.get(line - 1))
                .filter(f -> f.size() == width || (f.size() == width - 1 && f.size() > 1));
    }

    private static boolean units(List<String> fields) {
        int filled = 0;
        int units = 0;
        for (String field : fields) {
            String bare = UnitText.bare(field);
            filled += bare.isEmpty() ? 0 : 1;
            units += UnitText.of(bare).isPresent() || bare.matches("s|min|h|sec|-|hh:mm:ss|%") ? 1 : 0;
        }
        return units > 0 && units >= UNIT_SHARE * filled;
    }

    private static Header header(
            Optional<List<String>> names,
            Optional<List<String>> units,
            List<String> text,
            int namesLine,
            int unitsLine,
            Block block,
            Guess.Basis basis) {
        List<FoundColumn> columns = new ArrayList<>();
        for (int c = 0; c < block.width(); c++) {
            String name = c < names.map(List::size).orElse(0) ? names.get().get(c) : "";
            String unit = c < units.map(List::size).orElse(0) ? units.get().get(c) : inCell(block, c);
            columns.add(FoundColumn.of(c, name, block.mostly(c, FieldKind.NUMBER), unit));
        }
        List<String> lines = new ArrayList<>();
        if (namesLine > 0) {
            lines.add(text.get(namesLine - 1));
        }
        if (unitsLine > 0) {
            lines.add(text.get(unitsLine - 1));
        }
        String value = namesLine > 0
                ? "line " + namesLine + (unitsLine > 0 ? ", units in line " + unitsLine : "")
                : "none; columns are called #1, #2 and so on";
        String evidence = basis == Guess.Basis.TOLD
                ? "the plan says so"
                : namesLine > 0 ? "the line above the samples" : "no line of names stands above the samples";
        return new Header(lines, List.copyOf(columns), namesLine > 0, new Guess("header", value, basis, evidence));
    }

    private static String inCell(Block block, int column) {
        List<String> fields = block.column(column);
        return fields.isEmpty() ? "" : NumberText.unitOf(fields.get(0));
    }
}
