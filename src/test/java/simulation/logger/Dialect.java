package simulation.logger;

import java.io.ByteArrayOutputStream;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import java.util.List;

/** How a plant's logger writes its file. */
public final class Dialect {

    private final LocalDateTime start;
    private final TimeStyle time;
    private Charset charset = StandardCharsets.UTF_8;
    private boolean mark;
    private String delimiter = ",";
    private char decimal = '.';
    private String lineEnd = "\n";
    private String timeHeader = "time";
    private List<String> preamble = List.of();
    private String unitsRow = "";
    private String missing = "";
    private List<String> tail = List.of();
    private List<Oddity> oddities = List.of();

    /** A log with a first row at a wall clock time, in the clock of the logger. */
    public Dialect(LocalDateTime start, TimeStyle time) {
        this.start = start;
        this.time = time;
    }

    /** When the first row was written, by the logger's clock. */
    public LocalDateTime start() {
        return start;
    }

    /** Encoding, with a byte order mark or without. */
    public Dialect encoded(Charset as, boolean withMark) {
        charset = as;
        mark = withMark;
        return this;
    }

    /** Between cells, and before decimals. */
    public Dialect marks(String between, char decimalMark) {
        delimiter = between;
        decimal = decimalMark;
        return this;
    }

    /** Carriage return and line feed. */
    public Dialect windowsLines() {
        lineEnd = "\r\n";
        return this;
    }

    /** Header of the time, two with the delimiter between if date and time stand apart. */
    public Dialect timeHeader(String header) {
        timeHeader = header;
        return this;
    }

    /** Lines before the header. */
    public Dialect preamble(String... lines) {
        preamble = List.of(lines);
        return this;
    }

    /** A line of units below the header. */
    public Dialect units(String row) {
        unitsRow = row;
        return this;
    }

    /** What stands for an open circuit. */
    public Dialect missing(String code) {
        missing = code;
        return this;
    }

    /** Lines after the last row. */
    public Dialect tail(String... lines) {
        tail = List.of(lines);
        return this;
    }

    /** What goes wrong with rows. */
    public Dialect oddities(Oddity... which) {
        oddities = List.of(which);
        return this;
    }

    /** The file. */
    public byte[] write(Logger logger) {
        StringBuilder text = new StringBuilder();
        for (String line : preamble) {
            text.append(line).append(lineEnd);
        }
        text.append(header(logger)).append(lineEnd);
        if (!unitsRow.isEmpty()) {
            text.append(unitsRow).append(lineEnd);
        }
        List<double[]> rows = logger.rows();
        for (int i = 0; i < rows.size(); i++) {
            String line = line(logger.columns(), rows.get(i));
            for (Oddity oddity : oddities) {
                if (oddity.row() == i) {
                    line = oddity.kind().change(line, header(logger), lineEnd);
                }
            }
            if (!line.isEmpty()) {
                text.append(line).append(lineEnd);
            }
        }
        for (String line : tail) {
            text.append(line).append(lineEnd);
        }
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        if (mark) {
            bytes.writeBytes("\uFEFF".getBytes(charset));
        }
        bytes.writeBytes(text.toString().getBytes(charset));
        return bytes.toByteArray();
    }

    private String header(Logger logger) {
        StringBuilder header = new StringBuilder(timeHeader);
        for (Column column : logger.columns()) {
            header.append(delimiter).append(column.header());
        }
        return header.toString();
    }

    private String line(List<Column> columns, double[] row) {
        StringBuilder line = new StringBuilder(time.write(start, row[0], delimiter));
        for (int i = 0; i < columns.size(); i++) {
            line.append(delimiter);
            double value = row[i + 1];
            line.append(
                    Double.isNaN(value) ? missing : number(value, columns.get(i).decimals()));
        }
        return line.toString();
    }

    private String number(double value, int decimals) {
        return new BigDecimal(value)
                .setScale(decimals, RoundingMode.HALF_UP)
                .toPlainString()
                .replace('.', decimal);
    }
}
