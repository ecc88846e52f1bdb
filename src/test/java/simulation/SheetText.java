package simulation;

import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The text of a run sheet, put together line by line. */
final class SheetText {

    private static final DateTimeFormatter CLOCK = DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
    private static final DateTimeFormatter DAY = DateTimeFormatter.ofPattern("uuuu-MM-dd", Locale.ROOT);

    private final LocalDateTime start;
    private final List<String> lines = new ArrayList<>();
    private int behind;

    /** Begins a sheet for a log whose first row was written at a time of the logger's clock. */
    SheetText(String run, String plan, String equipment, LocalDateTime start, LogStyle style) {
        this.start = start;
        lines.add("# Invented run sheet of an invented run.");
        lines.add("run-format: 1");
        lines.add("run: " + run);
        lines.add("plan-used: {id: " + plan + ", revision: 1}");
        lines.add("equipment: " + equipment);
        lines.add("zone: Europe/Lisbon");
        if (style.isElapsed()) {
            lines.add("clocks: {log: \"00:00:00\", wall: " + DAY.format(start) + "T" + CLOCK.format(start) + "}");
        }
    }

    /** The logger's clock is behind the clock on the wall, by which people write. */
    SheetText loggerSlow(int seconds) {
        lines.add("clocks: {log: " + CLOCK.format(start) + ", wall: " + CLOCK.format(start.plusSeconds(seconds)) + "}");
        behind = seconds;
        return this;
    }

    SheetText add(String line) {
        lines.add(line);
        return this;
    }

    /** Time of the wall clock so many seconds after the first row. */
    String at(double seconds) {
        return CLOCK.format(start.plusSeconds(Math.round(seconds) + behind));
    }

    SheetText entered(double seconds) {
        LocalDateTime when = start.plusSeconds(Math.round(seconds) + 900);
        lines.add("entered: {by: operator 4, at: " + DAY.format(when) + "T"
                + CLOCK.format(when).substring(0, 5) + "+00:00}");
        return this;
    }

    @Override
    public String toString() {
        return String.join("\n", lines) + "\n";
    }
}
