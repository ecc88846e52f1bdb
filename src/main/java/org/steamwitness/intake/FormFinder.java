package org.steamwitness.intake;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.trace.Delimiter;
import org.steamwitness.trace.Told;

/** Finds the form of a log from its first lines, and the order of its dates from all of them. */
final class FormFinder {

    /** The order of dates is sought among so many different ones at most. */
    private static final int MOST_DATES = 1000;

    private final String file;
    private final LogText text;
    private final Told told;

    FormFinder(String file, LogText text, Told told) {
        this.file = file;
        this.text = text;
        this.told = told;
    }

    /** What became of the search. */
    sealed interface Found {

        /** The form. */
        record Known(LogForm form) implements Found {}

        /** Why it can't be told. */
        record Unclear(Finding why) implements Found {}
    }

    Found find() {
        List<String> lines = LineSample.of(text).lines();
        int from = 1;
        Optional<Delimiter> named = told.delimiter();
        if (!lines.isEmpty() && lines.get(0).matches("\"?sep=.\"?")) {
            from = 2;
            named = named.or(() -> separator(lines.get(0)));
        }
        List<Block> blocks = blocks(lines, from, named);
        if (blocks.isEmpty() || blocks.get(0).rows().isEmpty()) {
            return empty(lines);
        }
        Block best = blocks.get(0);
        if (blocks.size() > 1 && blocks.get(1).rows().size() == best.rows().size()) {
            return unclear(
                    FindingKind.DELIMITER_UNDECIDED,
                    Map.of(
                            "one", best.delimiter().word(),
                            "other", blocks.get(1).delimiter().word()));
        }
        Guess delimiter = new Guess(
                "delimiter",
                best.delimiter().word(),
                named.isPresent() ? Guess.Basis.TOLD : Guess.Basis.FOUND,
                told.delimiter().isPresent()
                        ? "the plan says so"
                        : named.isPresent()
                                ? "the log's first line says so"
                                : best.rows().size() + " of the first " + lines.size() + " lines become rows of "
                                        + best.width() + " fields");
        return formed(lines, best, delimiter);
    }

    private Found formed(List<String> lines, Block block, Guess delimiter) {
        Header header = Header.of(lines, block, told);
        TimeFinder.Found time = new TimeFinder(block, header.columns(), told, c -> allDates(block, c)).find();
        if (time instanceof TimeFinder.Found.OrderOpen open) {
            return unclear(FindingKind.DATE_ORDER_UNDECIDED, Map.of("why", open.why(), "example", open.example()));
        }
        if (time instanceof TimeFinder.Found.Open open) {
            return unclear(FindingKind.TIME_UNDECIDED, Map.of("why", open.why()));
        }
        if (!(time instanceof TimeFinder.Found.Known known)) {
            return unclear(
                    FindingKind.LOG_WITHOUT_TIME,
                    Map.of("why", "line " + block.lines().get(0) + " holds neither date nor time that is known"));
        }
        MarkFinder.Found numbers = MarkFinder.of(block, known.columns(), told);
        Guess encoding = new Guess(
                "encoding",
                text.encoding().name(),
                told.encoding().isPresent() ? Guess.Basis.TOLD : Guess.Basis.FOUND,
                text.encoding().evidence());
        return new Found.Known(new LogForm(
                text.encoding(),
                block.delimiter(),
                numbers.form(),
                block.width(),
                meanRowBytes(lines, block),
                block.lines().get(0),
                header.lines(),
                header.columns(),
                known.columns(),
                known.form(),
                List.of(encoding, delimiter, numbers.guess(), header.guess(), known.guess())));
    }

    private double meanRowBytes(List<String> lines, Block block) {
        boolean two = text.encoding().charset().name().startsWith("UTF-16");
        double characters = block.lines().stream()
                .mapToInt(line -> lines.get(line - 1).length() + 1)
                .average()
                .orElse(1);
        return two ? 2 * characters : characters;
    }

    private List<Block> blocks(List<String> lines, int from, Optional<Delimiter> named) {
        List<Delimiter> candidates = named.map(List::of).orElseGet(() -> List.of(Delimiter.values()));
        int start = Math.max(from, told.headerLine().orElse(0) + 1);
        List<Block> blocks = new ArrayList<>();
        candidates.forEach(d -> blocks.add(Block.of(d, lines, start)));
        blocks.sort(Comparator.<Block>comparingInt(b -> b.rows().size()).reversed());
        return blocks;
    }

    private static Optional<Delimiter> separator(String line) {
        char mark = line.replace("\"", "").charAt(4);
        for (Delimiter delimiter : Delimiter.values()) {
            if (delimiter.mark() == mark) {
                return Optional.of(delimiter);
            }
        }
        return Optional.empty();
    }

    /** The different dates of a column, in order, over the whole log. */
    private List<String> allDates(Block block, int column) {
        RowSplitter splitter = new RowSplitter(block.delimiter());
        List<String> dates = new ArrayList<>();
        try (CSVParser rows = CSVParser.parse(text.capped(block.delimiter() == Delimiter.SPACES), splitter.byLine())) {
            for (CSVRecord row : rows) {
                if (row.getRecordNumber() < 1 || row.size() != block.width()) {
                    continue;
                }
                String field = row.get(column).replace("\"", "").strip();
                var dated = TimeReader.DATED.matcher(field);
                if (dated.matches()) {
                    String date = field.substring(0, dated.start(5)).strip();
                    if (dates.isEmpty() || !dates.get(dates.size() - 1).equals(date)) {
                        dates.add(date);
                    }
                }
                if (dates.size() >= MOST_DATES) {
                    break;
                }
            }
        } catch (IOException impossibleInMemory) {
            throw new UncheckedIOException(impossibleInMemory);
        }
        return dates;
    }

    private Found empty(List<String> lines) {
        if (lines.stream().allMatch(String::isBlank)) {
            return unclear(FindingKind.LOG_EMPTY, Map.of());
        }
        return lines.stream().filter(l -> !l.isBlank()).count() < 2
                ? unclear(FindingKind.LOG_EMPTY, Map.of())
                : unclear(
                        FindingKind.LOG_WITHOUT_TIME,
                        Map.of("why", "none of its first " + lines.size() + " lines is a row of samples"));
    }

    private Found unclear(FindingKind kind, Map<String, String> facts) {
        return new Found.Unclear(new Finding(kind, Position.ofFile(file), facts));
    }
}
