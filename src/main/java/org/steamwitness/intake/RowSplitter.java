package org.steamwitness.intake;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.trace.Delimiter;

/**
 * Splits lines into fields. A quotation mark never reaches over a line's end: fields are cut at the delimiter first, and
 * only a line that holds quotation marks is cut once more with their meaning.
 */
final class RowSplitter {

    private final char mark;
    private final boolean joinSpaces;
    private final CSVFormat quoted;
    private final CSVFormat plain;

    RowSplitter(Delimiter delimiter) {
        this.mark = delimiter == Delimiter.SPACES ? '\t' : delimiter.mark();
        this.joinSpaces = delimiter == Delimiter.SPACES;
        this.plain = CSVFormat.DEFAULT
                .builder()
                .setDelimiter(mark)
                .setQuote(null)
                .setIgnoreEmptyLines(true)
                .get();
        this.quoted =
                CSVFormat.DEFAULT.builder().setDelimiter(mark).setQuote('"').get();
    }

    /** The format that cuts a whole text, one row a line. */
    CSVFormat byLine() {
        return plain;
    }

    /** The format in which a quoted field may run over several lines. */
    CSVFormat overLines() {
        return quoted;
    }

    /** Fields of one line; empty if a quotation mark is not closed. */
    Optional<List<String>> split(String line) {
        String text = joinSpaces ? line.stripLeading().replaceAll(" +", "\t") : line;
        if (text.indexOf('"') < 0) {
            return Optional.of(
                    List.of(text.split(String.valueOf(mark).equals("|") ? "\\|" : String.valueOf(mark), -1)));
        }
        try (CSVParser parser = CSVParser.parse(text, quoted)) {
            List<CSVRecord> rows = parser.getRecords();
            return rows.size() == 1 ? Optional.of(rows.get(0).toList()) : Optional.empty();
        } catch (IOException | UncheckedIOException | IllegalStateException notClosed) {
            return Optional.empty();
        }
    }

    /** A row once more, with the meaning of its quotation marks. */
    Optional<List<String>> again(CSVRecord row) {
        return split(String.join(String.valueOf(mark), row));
    }
}
