package org.steamwitness.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneOffset;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class LogClockTest {

    private final LogClock clock = new LogClock(LocalDateTime.of(2026, 3, 14, 23, 50), Optional.empty());

    @Test
    void tellsTheLogsOwnTime() {
        assertThat(clock.localAt(0)).hasValue("2026-03-14T23:50:00");
        assertThat(clock.localAt(899.6)).hasValue("2026-03-15T00:05:00");
        assertThat(clock.timeOfDayAt(605)).isEqualTo("00:00:05");
    }

    @Test
    void addsTheDistanceFromUtcWhereItIsKnown() {
        assertThat(clock.withOffset(ZoneOffset.UTC).localAt(0)).hasValue("2026-03-14T23:50:00+00:00");
        assertThat(clock.withOffset(ZoneOffset.ofHours(2)).localAt(0)).hasValue("2026-03-14T23:50:00+02:00");
        LogClock own = new LogClock(clock.first(), Optional.of(ZoneOffset.ofHours(1)));
        assertThat(own.withOffset(ZoneOffset.ofHours(2))).isEqualTo(own);
    }

    @Test
    void findsATimeOfDayAcrossMidnight() {
        assertThat(clock.secondsAt(LocalTime.of(0, 10), 3600)).hasValue(1200);
        assertThat(clock.secondsAt(LocalTime.of(23, 50), 3600)).hasValue(0);
        assertThat(clock.secondsAt(LocalTime.of(23, 49), 3600)).isEmpty();
        assertThat(clock.secondsAt(LocalTime.of(1, 0), 3600)).isEmpty();
    }

    @Test
    void showsNoMoreThanTheLogTells() {
        LogClock day = LogClock.timeOfDay(LocalTime.of(23, 59, 50));
        assertThat(day.localAt(15)).hasValue("00:00:05");
        assertThat(day.date()).isEmpty();
        assertThat(day.secondsAt(LocalTime.of(0, 0, 5), 60)).hasValue(15);
        LogClock elapsed = LogClock.elapsed();
        assertThat(elapsed.localAt(15)).isEmpty();
        assertThat(elapsed.timeOfDayAt(3605)).isEqualTo("+01:00:05");
        assertThat(elapsed.secondsAt(LocalTime.of(0, 0, 5), 60)).isEmpty();
    }

    @Test
    void isSetByAClockOnTheWall() {
        LogClock set = LogClock.elapsed().readBeside(LocalTime.of(8, 13, 5), LocalTime.of(0, 1, 5));
        assertThat(set.localAt(65)).hasValue("08:13:05");
        assertThat(set.secondsAt(LocalTime.of(8, 12), 600)).hasValue(0);
        assertThat(clock.readBeside(LocalTime.of(23, 50, 35), LocalTime.of(23, 50))
                        .localAt(0))
                .hasValue("2026-03-14T23:50:35");
    }
}
