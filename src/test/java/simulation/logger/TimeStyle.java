package simulation.logger;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** How a log writes its time. */
public enum TimeStyle {
    ISO("uuuu-MM-dd'T'HH:mm:ss"),
    ISO_SPACE("uuuu-MM-dd HH:mm:ss"),
    ISO_FRACTION("uuuu-MM-dd'T'HH:mm:ss.S"),
    DAY_FIRST("dd/MM/uuuu HH:mm:ss"),
    DAY_FIRST_DOTS("dd.MM.uuuu HH:mm:ss"),
    MONTH_FIRST_12_HOURS("MM/dd/uuuu hh:mm:ss a"),
    /** Date and time in two columns. */
    APART("dd.MM.uuuu|HH:mm:ss"),
    /** Seconds since the first row. */
    ELAPSED_SECONDS(""),
    /** Hours, minutes and seconds since the first row. */
    ELAPSED_CLOCK("");

    private final String pattern;

    TimeStyle(String pattern) {
        this.pattern = pattern;
    }

    String write(LocalDateTime start, double seconds, String delimiter) {
        if (this == ELAPSED_SECONDS) {
            return new BigDecimal(seconds).setScale(1, RoundingMode.HALF_UP).toPlainString();
        }
        if (this == ELAPSED_CLOCK) {
            long whole = (long) seconds;
            return two(whole / 3600) + ":" + two(whole / 60 % 60) + ":" + two(whole % 60);
        }
        LocalDateTime time = start.plusNanos((long) StrictMath.rint(seconds * 1e9));
        return DateTimeFormatter.ofPattern(pattern, Locale.ROOT).format(time).replace("|", delimiter);
    }

    private static String two(long number) {
        return number < 10 ? "0" + number : Long.toString(number);
    }
}
