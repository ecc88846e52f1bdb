package org.steamwitness.intake;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.intake.Refusals.Cause;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.Delimiter;

/** The walk over all rows of a log: each becomes a sample, is refused, or repeats the header. */
final class Rows {

    private static final int ROWS_BETWEEN_POLLS = 65_536;

    private final String file;
    private final LogText text;
    private final LogForm form;
    private final boolean quotedLineBreaks;
    private final Samples samples;
    private final Refusals refusals;
    private final RowSplitter splitter;
    private final int first;
    private final int second;
    private int headersRepeated;
    private int firstRepeated;

    Rows(String file, LogText text, LogForm form, boolean quotedLineBreaks, Samples samples, Refusals refusals) {
        this.file = file;
        this.text = text;
        this.form = form;
        this.quotedLineBreaks = quotedLineBreaks;
        this.samples = samples;
        this.refusals = refusals;
        this.splitter = new RowSplitter(form.delimiter());
        this.first = form.times().get(0);
        this.second = form.times().size() > 1 ? form.times().get(1) : -1;
    }

    /**
     * Walks over the log. Lines are cut into fields here, while another thread makes numbers of the rows cut before, in
     * their order; the result is that of one thread.
     *
     * @return false if nobody wants it any more
     */
    boolean read(Progress progress) {
        CappedLines lines = text.capped(form.delimiter() == Delimiter.SPACES);
        boolean wanted = true;
        try (RowBelt belt = new RowBelt((row, line) -> add(row, line, lines));
                CSVParser parser =
                        CSVParser.parse(lines, quotedLineBreaks ? splitter.overLines() : splitter.byLine())) {
            wanted = feed(parser, belt, progress);
        } catch (UncheckedIOException | IllegalStateException notClosed) {
            refusals.row(Integer.MAX_VALUE, Cause.QUOTE, "a quotation mark is not closed before the end of the log");
        } catch (IOException impossibleInMemory) {
            throw new UncheckedIOException(impossibleInMemory);
        }
        return wanted && !progress.cancelled();
    }

    private boolean feed(CSVParser parser, RowBelt belt, Progress progress) {
        Iterator<CSVRecord> records = parser.iterator();
        int seen = 0;
        while (records.hasNext()) {
            CSVRecord row = records.next();
            int line = Math.toIntExact(parser.getCurrentLineNumber());
            if (line >= form.firstRowLine()) {
                belt.put(row, line);
            }
            if (++seen % ROWS_BETWEEN_POLLS == 0) {
                progress.step("reading " + file, 0);
                if (progress.cancelled()) {
                    return false;
                }
            }
        }
        return true;
    }

    int headersRepeated() {
        return headersRepeated;
    }

    int firstRepeated() {
        return firstRepeated;
    }

    private void add(CSVRecord row, int line, CappedLines lines) {
        if (row.size() == form.width()) {
            long at = second < 0
                    ? samples.time().nanos(row.get(first))
                    : samples.time().nanos(row.get(first), row.get(second));
            if (at != TimeReader.REFUSED && !cut(lines, line)) {
                samples.append(row, line, at);
                return;
            }
        }
        addOdd(row, line, lines);
    }

    /** A row that does not fit at first sight: too long, with quotation marks, a header, or wrong. */
    private void addOdd(CSVRecord row, int line, CappedLines lines) {
        if (cut(lines, line)) {
            refusals.row(line, Cause.LENGTH, "it is longer than " + CappedLines.LONGEST + " characters");
            return;
        }
        Optional<List<String>> fields = quoted(row) ? splitter.again(row) : Optional.of(row.toList());
        if (fields.isEmpty()) {
            refusals.row(line, Cause.QUOTE, "a quotation mark is not closed");
            return;
        }
        List<String> again = fields.get();
        if (again.size() == form.width() - 1 && form.width() > 2) {
            again = withEmptyEnd(again);
        }
        if (again.size() != form.width()) {
            refusals.row(
                    line,
                    Cause.FIELDS,
                    "it has " + again.size() + (again.size() == 1 ? " field" : " fields") + " where a row has "
                            + form.width());
            return;
        }
        addAgain(again, line);
    }

    private void addAgain(List<String> fields, int line) {
        long at = second < 0
                ? samples.time().nanos(fields.get(first))
                : samples.time().nanos(fields.get(first), fields.get(second));
        if (at != TimeReader.REFUSED) {
            samples.append(fields, line, at);
        } else if (repeatsHeader(fields)) {
            firstRepeated = headersRepeated == 0 ? line : firstRepeated;
            headersRepeated++;
        } else {
            refusals.row(
                    line,
                    Cause.TIME,
                    "its time \""
                            + FieldText.shortened(
                                    fields.get(second < 0 ? first : second).strip())
                            + "\" is not written as in the other rows ("
                            + form.timeForm().word() + ")");
        }
    }

    private boolean repeatsHeader(List<String> fields) {
        return form.columns().stream()
                .allMatch(c -> fields.get(c.position() - 1).strip().equals(c.header())
                        || UnitText.of(fields.get(c.position() - 1)).isPresent());
    }

    /** Rows may end without the delimiter that others end with. */
    private List<String> withEmptyEnd(List<String> fields) {
        boolean lastUnused = form.columns().get(form.width() - 1).header().startsWith("#");
        if (!lastUnused) {
            return fields;
        }
        List<String> more = new java.util.ArrayList<>(fields);
        more.add("");
        return more;
    }

    private static boolean quoted(CSVRecord row) {
        for (String field : row) {
            if (field.indexOf('"') >= 0) {
                return true;
            }
        }
        return false;
    }

    private static boolean cut(CappedLines lines, int line) {
        return !lines.cut().isEmpty() && lines.cut().contains(line);
    }
}
