package org.steamwitness.intake;

import java.time.Duration;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.time.chrono.IsoChronology;
import java.time.format.DateTimeFormatter;
import java.time.format.DateTimeFormatterBuilder;
import java.time.format.DateTimeParseException;
import java.time.format.ResolverStyle;
import java.time.temporal.TemporalAccessor;
import java.util.Locale;
import java.util.Optional;

/**
 * A date and time as a log writes it in ISO 8601: a T or a space between date and time, seconds with or without a
 * fraction, with or without distance from UTC.
 */
record TimeText(LocalDateTime local, Optional<ZoneOffset> offset) {

    private static final DateTimeFormatter WRITTEN = new DateTimeFormatterBuilder()
            .append(DateTimeFormatter.ISO_LOCAL_DATE)
            .optionalStart()
            .appendLiteral('T')
            .optionalEnd()
            .optionalStart()
            .appendLiteral(' ')
            .optionalEnd()
            .append(DateTimeFormatter.ISO_LOCAL_TIME)
            .optionalStart()
            .appendOffsetId()
            .optionalEnd()
            .toFormatter(Locale.ROOT)
            .withResolverStyle(ResolverStyle.STRICT)
            .withChronology(IsoChronology.INSTANCE);

    static Optional<TimeText> read(String text) {
        if (text.length() < 16 || text.length() > 40 || !(text.charAt(10) == 'T' || text.charAt(10) == ' ')) {
            return Optional.empty();
        }
        try {
            TemporalAccessor parsed = WRITTEN.parseBest(text, OffsetDateTime::from, LocalDateTime::from);
            return Optional.of(
                    parsed instanceof OffsetDateTime time
                            ? new TimeText(time.toLocalDateTime(), Optional.of(time.getOffset()))
                            : new TimeText((LocalDateTime) parsed, Optional.empty()));
        } catch (DateTimeParseException notATime) {
            return Optional.empty();
        }
    }

    /** Seconds since another time of the same log. */
    double secondsAfter(TimeText first) {
        Duration between = Duration.between(first.utc(), utc());
        return between.getSeconds() + between.getNano() / 1e9;
    }

    private LocalDateTime utc() {
        return local.minusSeconds(offset.map(ZoneOffset::getTotalSeconds).orElse(0));
    }

    boolean writtenLike(TimeText other) {
        return offset.isPresent() == other.offset.isPresent();
    }

    String format() {
        return offset.isPresent() ? "ISO 8601 with distance from UTC" : "ISO 8601 without zone";
    }
}
