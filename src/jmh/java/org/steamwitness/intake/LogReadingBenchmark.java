package org.steamwitness.intake;

import com.sun.management.GarbageCollectionNotificationInfo;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.lang.management.GarbageCollectorMXBean;
import java.lang.management.ManagementFactory;
import java.lang.management.MemoryUsage;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;
import javax.management.NotificationEmitter;
import javax.management.openmbean.CompositeData;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/**
 * Reads a log of a million rows and fourteen columns into columns, beside the CSV library alone splitting the same
 * bytes by turns in the same run; writes the table into the developers' page if that is named.
 */
public final class LogReadingBenchmark {

    private static final int ROWS = 1_000_000;
    private static final int CHANNELS = 13;
    private static final int ROUNDS = 5;
    private static final String BEGIN = "<!-- log reading: begin -->";
    private static final String END = "<!-- log reading: end -->";

    private LogReadingBenchmark() {}

    /**
     * Measures.
     *
     * @param arguments the page to write the table into, or none
     * @throws IOException if the page can't be written
     */
    public static void main(String[] arguments) throws IOException {
        byte[] log = log();
        AtomicLong highest = new AtomicLong();
        watchMemory(highest);
        double split = 0;
        double read = 0;
        long before = live();
        for (int round = 0; round < ROUNDS; round++) {
            split = Math.max(split, rate(() -> split(log)));
            read = Math.max(read, rate(() -> rows(log)));
        }
        long columns = 8L * ROWS * (CHANNELS + 1);
        highest.set(0);
        int kept = rows(log);
        double times = (highest.get() - before) / (double) columns;
        String table = "| 1,000,000 rows, 14 columns, " + log.length / 1_000_000 + " MB | |\n|---|---|\n"
                + "| Commons CSV alone, splitting | " + million(split) + " million rows/s |\n"
                + "| into columns | " + million(read) + " million rows/s |\n"
                + "| ratio, to be 0.75 or more | " + hundredths(read / split) + " |\n"
                + "| highest live memory after a collection beyond the log's bytes, in columns as doubles, to be 3 or"
                + " less | " + hundredths(times) + " |\n";
        System.out.print(table + "rows read: " + kept + "\n");
        if (arguments.length > 0) {
            write(Path.of(arguments[0]), table);
        }
    }

    private interface Work {
        int rows();
    }

    private static double rate(Work work) {
        long start = System.nanoTime();
        int rows = work.rows();
        return rows * 1e9 / (System.nanoTime() - start);
    }

    private static int split(byte[] log) {
        int rows = 0;
        int characters = 0;
        try (CSVParser parser = CSVParser.builder()
                .setReader(new InputStreamReader(new ByteArrayInputStream(log), StandardCharsets.UTF_8))
                .setFormat(CSVFormat.DEFAULT)
                .get()) {
            for (CSVRecord record : parser) {
                rows++;
                characters += record.get(CHANNELS).length();
            }
        } catch (IOException impossibleInMemory) {
            throw new IllegalStateException(impossibleInMemory);
        }
        return characters > 0 ? rows : 0;
    }

    private static int rows(byte[] log) {
        Intake intake = new LogReader("run.csv", rules(), Optional.empty(), Progress.UNWATCHED).read(log);
        return ((Intake.Read) intake).trace().size();
    }

    private static ReadingRules rules() {
        List<ColumnRule> rules = new ArrayList<>();
        for (int c = 1; c <= CHANNELS; c++) {
            rules.add(new ColumnRule(
                    "probe-" + c,
                    "T" + c,
                    QuantityKind.TEMPERATURE,
                    "degC",
                    Datum.ABSOLUTE,
                    TemperatureUnit.CELSIUS::toKelvin));
        }
        return new ReadingRules(rules);
    }

    private static byte[] log() {
        DateTimeFormatter format = DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss", Locale.ROOT);
        LocalDateTime start = LocalDateTime.of(2026, 3, 14, 8, 5);
        ByteArrayOutputStream log = new ByteArrayOutputStream();
        StringBuilder row = new StringBuilder("t");
        for (int c = 1; c <= CHANNELS; c++) {
            row.append(",T").append(c);
        }
        for (int i = 0; i < ROWS; i++) {
            log.writeBytes(row.append('\n').toString().getBytes(StandardCharsets.UTF_8));
            row.setLength(0);
            row.append(format.format(start.plusSeconds(i)));
            for (int c = 0; c < CHANNELS; c++) {
                int hundredths = 10_000 + (int) ((i * 31L + c * 977L) % 2_500);
                row.append(',')
                        .append(hundredths / 100)
                        .append('.')
                        .append(hundredths / 10 % 10)
                        .append(hundredths % 10);
            }
        }
        log.writeBytes(row.append('\n').toString().getBytes(StandardCharsets.UTF_8));
        return log.toByteArray();
    }

    private static long live() {
        System.gc();
        return Runtime.getRuntime().totalMemory() - Runtime.getRuntime().freeMemory();
    }

    /** What is still there after each collection while a log is read. */
    private static void watchMemory(AtomicLong highest) {
        for (GarbageCollectorMXBean collector : ManagementFactory.getGarbageCollectorMXBeans()) {
            ((NotificationEmitter) collector)
                    .addNotificationListener(
                            (notification, handback) -> {
                                if (notification.getUserData() instanceof CompositeData data) {
                                    Map<String, MemoryUsage> after = GarbageCollectionNotificationInfo.from(data)
                                            .getGcInfo()
                                            .getMemoryUsageAfterGc();
                                    long used = after.values().stream()
                                            .mapToLong(MemoryUsage::getUsed)
                                            .sum();
                                    highest.accumulateAndGet(used, Math::max);
                                }
                            },
                            null,
                            null);
        }
    }

    private static void write(Path page, String table) throws IOException {
        String text = Files.readString(page);
        int from = text.indexOf(BEGIN);
        int to = text.indexOf(END);
        if (from < 0 || to < from) {
            throw new IllegalStateException(page + " has no place for the table");
        }
        Files.writeString(page, text.substring(0, from) + BEGIN + "\n" + table + text.substring(to));
    }

    private static String million(double rate) {
        return hundredths(rate / 1e6);
    }

    private static String hundredths(double value) {
        return Double.toString(Math.rint(value * 100) / 100);
    }
}
