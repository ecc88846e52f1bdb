package org.steamwitness.trace;

import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Turns seconds from the first sample into the log's own date and time, and back.
 *
 * @param first date and time of the first sample, as the log tells it
 * @param offset how far that is ahead of UTC, where it is known
 */
public record LogClock(LocalDateTime first, Optional<ZoneOffset> offset) {

    private static final double NANOSECONDS = 1e9;
    private static final DateTimeFormatter WRITTEN = DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss", Locale.ROOT);

    /**
     * The log's date and time at an instant of the run, rounded to whole seconds.
     *
     * @param seconds from the first sample
     * @return ISO 8601, with the offset if it is known
     */
    public String localAt(double seconds) {
        String local = WRITTEN.format(instant(seconds));
        return offset.map(o -> local + (o.equals(ZoneOffset.UTC) ? "+00:00" : o.getId()))
                .orElse(local);
    }

    /**
     * The log's time of day at an instant of the run, rounded to whole seconds.
     *
     * @param seconds from the first sample
     * @return such as "08:27:35"
     */
    public String timeOfDayAt(double seconds) {
        return WRITTEN.format(instant(seconds)).substring(11);
    }

    /**
     * When a time of day first comes round in the run.
     *
     * @param time as a clock shows it
     * @param lastSeconds the last sample, in seconds from the first
     * @return seconds from the first sample; empty if the run does not reach that time
     */
    public OptionalDouble secondsAt(LocalTime time, double lastSeconds) {
        LocalDateTime candidate = first.toLocalDate().atTime(time);
        if (candidate.isBefore(first)) {
            candidate = candidate.plusDays(1);
        }
        double seconds = ChronoUnit.NANOS.between(first, candidate) / NANOSECONDS;
        return seconds <= lastSeconds ? OptionalDouble.of(seconds) : OptionalDouble.empty();
    }

    /**
     * The same clock with its distance from UTC, where the log itself did not tell it.
     *
     * @param known how far the clock is ahead of UTC
     * @return a clock with an offset; the log's own offset stays
     */
    public LogClock withOffset(ZoneOffset known) {
        return offset.isPresent() ? this : new LogClock(first, Optional.of(known));
    }

    private LocalDateTime instant(double seconds) {
        return first.plusNanos(StrictMath.round(seconds * NANOSECONDS))
                .plusNanos(500_000_000)
                .truncatedTo(ChronoUnit.SECONDS);
    }
}
