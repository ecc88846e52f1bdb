package org.steamwitness.intake;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.ReadingRules;

/**
 * Reads delimited text: UTF-8, comma, full stop as decimal mark, one header line, ISO 8601 time in the first column.
 * Fields are taken as they stand; a quotation mark has no meaning, so that it can't swallow lines.
 */
public final class LogReader {

    /** Beyond this share of refused rows a log is not evaluated; common practice, no source. */
    static final double LARGEST_REFUSED_SHARE = 0.05;

    private static final int ROWS_BETWEEN_POLLS = 65_536;

    private static final CSVFormat FORMAT = CSVFormat.DEFAULT
            .builder()
            .setQuote(null)
            .setTrim(true)
            .setIgnoreEmptyLines(true)
            .get();

    private final String file;
    private final ReadingRules rules;
    private final Progress progress;

    /**
     * Prepares to read one log.
     *
     * @param file base name of the log, for messages
     * @param rules which columns are wanted
     * @param progress is told of the advance
     */
    public LogReader(String file, ReadingRules rules, Progress progress) {
        this.file = file;
        this.rules = rules;
        this.progress = progress;
    }

    /**
     * Reads the log.
     *
     * @param bytes the log as it is
     * @return its trace and how it was read, or why it can't be evaluated
     */
    public Intake read(byte[] bytes) {
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException notUtf8) {
            return unreadable(FindingKind.LOG_NOT_TEXT, Map.of("why", "it holds bytes that UTF-8 does not know"));
        }
        if (text.indexOf('\0') >= 0) {
            return unreadable(FindingKind.LOG_NOT_TEXT, Map.of("why", "it holds NUL characters"));
        }
        boolean marked = text.startsWith("\uFEFF");
        try (CSVParser parser = CSVParser.parse(new StringReader(marked ? text.substring(1) : text), FORMAT)) {
            return rows(parser, marked ? "UTF-8 with byte order mark" : "UTF-8");
        } catch (IOException impossibleInMemory) {
            throw new UncheckedIOException(impossibleInMemory);
        }
    }

    private Intake rows(CSVParser parser, String encoding) {
        var records = parser.iterator();
        if (!records.hasNext()) {
            return unreadable(FindingKind.LOG_EMPTY, Map.of());
        }
        List<String> headers = records.next().toList();
        List<Finding> missing = columnsMissing(headers);
        if (!missing.isEmpty()) {
            return new Intake.Unreadable(missing);
        }
        Samples samples = new Samples(rules, headers);
        while (records.hasNext()) {
            CSVRecord row = records.next();
            samples.add(row, Math.toIntExact(parser.getCurrentLineNumber()));
            if (row.getRecordNumber() % ROWS_BETWEEN_POLLS == 0) {
                progress.step("reading " + file, 0);
                if (progress.cancelled()) {
                    return new Intake.Cancelled();
                }
            }
        }
        return progress.cancelled() ? new Intake.Cancelled() : judged(samples, encoding, headers);
    }

    private Intake judged(Samples samples, String encoding, List<String> headers) {
        if (samples.rows() == 0) {
            return samples.firstRefusal()
                    .<Intake>map(first -> unreadable(
                            FindingKind.LOG_WITHOUT_TIME,
                            Map.of("why", "line " + first.fromLine() + ": " + first.reason())))
                    .orElseGet(() -> unreadable(FindingKind.LOG_EMPTY, Map.of()));
        }
        int refused = samples.refusedRows();
        if (refused > LARGEST_REFUSED_SHARE * (refused + samples.rows())) {
            return unreadable(
                    FindingKind.TOO_MANY_ROWS_REFUSED,
                    Map.of(
                            "refused", Integer.toString(refused),
                            "rows", Integer.toString(refused + samples.rows()),
                            "share", "5",
                            "line",
                                    Integer.toString(
                                            samples.firstRefusal().orElseThrow().fromLine()),
                            "reason", samples.firstRefusal().orElseThrow().reason()));
        }
        return samples.emptyChannel()
                .<Intake>map(rule -> unreadable(
                        FindingKind.CHANNEL_EMPTY, Map.of("channel", rule.channel(), "column", rule.header())))
                .orElseGet(() -> read(samples, encoding, headers));
    }

    private Intake read(Samples samples, String encoding, List<String> headers) {
        List<String> unread = new ArrayList<>(headers.subList(1, headers.size()));
        rules.columns().forEach(rule -> unread.remove(rule.header()));
        List<Finding> findings = new ArrayList<>();
        if (!unread.isEmpty()) {
            findings.add(new Finding(
                    FindingKind.COLUMNS_UNREAD,
                    Position.ofLine(file, 1),
                    Map.of("columns", String.join(", ", unread))));
        }
        samples.refusals()
                .forEach(range -> findings.add(new Finding(
                        FindingKind.ROWS_REFUSED,
                        Position.ofLine(file, range.fromLine()),
                        Map.of(
                                "rows", Integer.toString(range.rows()),
                                "from", Integer.toString(range.fromLine()),
                                "to", Integer.toString(range.toLine()),
                                "column", range.column(),
                                "reason", range.reason()))));
        return new Intake.Read(samples.trace(), samples.reading(encoding, headers, unread), findings);
    }

    private List<Finding> columnsMissing(List<String> headers) {
        List<Finding> missing = new ArrayList<>();
        for (ReadingRules.ColumnRule rule : rules.columns()) {
            int times = Collections.frequency(headers.subList(1, headers.size()), rule.header());
            if (times == 0) {
                missing.add(new Finding(
                        FindingKind.COLUMN_ABSENT,
                        Position.ofLine(file, 1),
                        Map.of(
                                "channel", rule.channel(),
                                "column", rule.header(),
                                "headers", String.join(", ", headers))));
            } else if (times > 1) {
                missing.add(new Finding(
                        FindingKind.COLUMN_TWICE,
                        Position.ofLine(file, 1),
                        Map.of(
                                "channel", rule.channel(),
                                "column", rule.header(),
                                "times", Integer.toString(times))));
            }
        }
        return missing;
    }

    private Intake.Unreadable unreadable(FindingKind kind, Map<String, String> facts) {
        return new Intake.Unreadable(List.of(new Finding(kind, Position.ofFile(file), facts)));
    }
}
