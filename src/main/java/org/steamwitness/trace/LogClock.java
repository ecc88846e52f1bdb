package org.steamwitness.trace;

import java.time.Duration;
import java.time.LocalDate;
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
 * @param shows what of it the log really told; the rest of {@code first} is a stand-in that is never shown
 */
public record LogClock(LocalDateTime first, Optional<ZoneOffset> offset, Shows shows) {

    private static final Duration HALF_A_DAY = Duration.ofHours(12);
    private static final double NANOSECONDS = 1e9;
    private static final DateTimeFormatter WRITTEN = DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss", Locale.ROOT);

    /** A date that stands in where a log tells none. */
    private static final LocalDate NO_DATE = LocalDate.EPOCH;

    /**
     * A clock that told date and time.
     *
     * @param first date and time of the first sample
     * @param offset how far that is ahead of UTC, where it is known
     */
    public LogClock(LocalDateTime first, Optional<ZoneOffset> offset) {
        this(first, offset, Shows.DATE_AND_TIME);
    }

    /**
     * A clock that told the time of day alone.
     *
     * @param first time of the first sample
     * @return a clock without date
     */
    public static LogClock timeOfDay(LocalTime first) {
        return new LogClock(NO_DATE.atTime(first), Optional.empty(), Shows.TIME_OF_DAY);
    }

    /**
     * A clock that told nothing but the time since the start.
     *
     * @return a clock without date and time of day
     */
    public static LogClock elapsed() {
        return new LogClock(NO_DATE.atStartOfDay(), Optional.empty(), Shows.ELAPSED);
    }

    /** What a log tells of the time. */
    public enum Shows {
        /** Date and time of day. */
        DATE_AND_TIME,
        /** The time of day. */
        TIME_OF_DAY,
        /** The time since the start. */
        ELAPSED
    }

    /**
     * The date of the first sample.
     *
     * @return empty if the log tells none
     */
    public Optional<LocalDate> date() {
        return shows == Shows.DATE_AND_TIME ? Optional.of(first.toLocalDate()) : Optional.empty();
    }

    /**
     * The log's date and time at an instant of the run, rounded to whole seconds.
     *
     * @param seconds from the first sample
     * @return ISO 8601, with the offset if it is known; the time of day alone where the log tells no date; empty where it
     *     tells the time since the start alone
     */
    public Optional<String> localAt(double seconds) {
        String local = WRITTEN.format(instant(seconds));
        return switch (shows) {
            case DATE_AND_TIME ->
                Optional.of(offset.map(o -> local + (o.equals(ZoneOffset.UTC) ? "+00:00" : o.getId()))
                        .orElse(local));
            case TIME_OF_DAY -> Optional.of(local.substring(11));
            case ELAPSED -> Optional.empty();
        };
    }

    /**
     * The log's time of day at an instant of the run, rounded to whole seconds.
     *
     * @param seconds from the first sample
     * @return such as "08:27:35", or "+00:05:00" for the time since the start where the log tells nothing else
     */
    public String timeOfDayAt(double seconds) {
        String time = WRITTEN.format(instant(seconds)).substring(11);
        return shows == Shows.ELAPSED ? "+" + time : time;
    }

    /**
     * When a time of day first comes round in the run.
     *
     * @param time as a clock shows it
     * @param lastSeconds the last sample, in seconds from the first
     * @return seconds from the first sample; empty if the run does not reach that time, or the log tells no time of day
     */
    public OptionalDouble secondsAt(LocalTime time, double lastSeconds) {
        if (shows == Shows.ELAPSED) {
            return OptionalDouble.empty();
        }
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
        return offset.isPresent() || shows != Shows.DATE_AND_TIME ? this : new LogClock(first, Optional.of(known));
    }

    /**
     * The same clock for a part of the log.
     *
     * @param seconds from this clock's first sample to the part's first
     * @return a clock whose first sample is the part's
     */
    public LogClock startingAt(double seconds) {
        return new LogClock(first.plusNanos(StrictMath.round(seconds * NANOSECONDS)), offset, shows);
    }

    /**
     * The same instants shown by a clock on the wall, for a log that tells less than that.
     *
     * @param wall time on the wall at an instant
     * @param log what the log's own clock showed at that instant
     * @return a clock that shows the time of day; a log with a date keeps its date
     */
    public LogClock readBeside(LocalTime wall, LocalTime log) {
        Duration ahead = Duration.between(log, wall);
        if (shows != Shows.ELAPSED && ahead.abs().compareTo(HALF_A_DAY) > 0) {
            ahead = ahead.isNegative() ? ahead.plusDays(1) : ahead.minusDays(1);
        }
        Shows shown = shows == Shows.ELAPSED ? Shows.TIME_OF_DAY : shows;
        return new LogClock(first.plus(ahead), offset, shown);
    }

    private LocalDateTime instant(double seconds) {
        return first.plusNanos(StrictMath.round(seconds * NANOSECONDS))
                .plusNanos(500_000_000)
                .truncatedTo(ChronoUnit.SECONDS);
    }
}
