package org.steamwitness.evaluate.phase;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.phase.HoldAttempt.EndedBy;
import org.steamwitness.trace.Place;

class PhasesTest {

    private static final double NONE = Double.NaN;

    @Test
    void holdsFromTheFirstToTheLastSampleInside() {
        Phases phases = phases(5, 100, 118, 121.1, 121.5, 122, 121.3, 121.0, 100);
        assertThat(attempts(phases)).isEqualTo("2-5 LEFT_BAND, 5.0 to 30.0");
        assertThat(names(phases)).isEqualTo("undetermined 0-2, hold 2-6, cooling 6-7");
    }

    @Test
    void listsEachAttemptAndJudgesTheLongest() {
        Phases phases = phases(5, 121.2, 121.2, 121.2, 120.7, 122, 122, 122, 122, 122, 100);
        assertThat(attempts(phases)).isEqualTo("0-2 LEFT_BAND, 0.0 to 15.0; 4-8 LEFT_BAND, 15.0 to 45.0");
        assertThat(phases.hold().orElseThrow().from()).isEqualTo(4);
    }

    @Test
    void anOvershootEndsAnAttemptLikeAnythingElse() {
        assertThat(attempts(phases(5, 122, 122, 122, 124.6, 122, 122, 122, 122)))
                .isEqualTo("0-2 LEFT_BAND, 0.0 to 15.0; 4-7 LOG_END, 15.0 to 35.0");
    }

    @Test
    void doesNotCallTwoSamplesAHold() {
        assertThat(phases(5, 100, 122, 122, 100).attempts()).isEmpty();
        assertThat(phases(1, 100, 122, 122, 122, 100).attempts()).isEmpty();
    }

    @Test
    void bridgesAMissingSampleButNotALongGap() {
        assertThat(attempts(phases(5, 122, 122, NONE, 122, 122, 100))).isEqualTo("0-4 LEFT_BAND, 0.0 to 25.0");
        assertThat(attempts(phases(5, 122, 122, 122, NONE, NONE, 122, 122, 122, 100)))
                .isEqualTo("0-2 GAP, 0.0 to 15.0; 5-7 LEFT_BAND, 20.0 to 40.0");
    }

    @Test
    void heedsTheMarksOfTheRunSheet() {
        Bench bench = Bench.every(5, 12)
                .with(Bench.temperature(
                        "chamber", Place.REFERENCE, 0.1, 20, 20, 122, 122, 122, 122, 122, 122, 122, 122, 60, 40))
                .marked(10, 22, 42);
        Phases phases = Phases.of(bench.trace(), bench.plan());
        assertThat(attempts(phases)).isEqualTo("5-8 STEAM_OFF, 22.0 to 42.0");
        assertThat(names(phases)).isEqualTo("standing 0-2, air removal 2-5, hold 5-9, cooling 9-11");
        assertThat(phases.judged().orElseThrow().endedBy()).isEqualTo(EndedBy.STEAM_OFF);
    }

    @Test
    void callsARunThatNeverHeldUndetermined() {
        assertThat(names(phases(5, 20, 60, 100, 60))).isEqualTo("undetermined 0-3");
        assertThat(phases(5, 20, 60).judged()).isEmpty();
    }

    @Property
    void phasesCoverTheRunWithoutOverlap(
            @ForAll @Size(min = 1, max = 40) List<@IntRange(min = 0, max = 3) Integer> pattern,
            @ForAll @IntRange(min = -1, max = 200) int steamOn,
            @ForAll @IntRange(min = -1, max = 200) int ventClosed,
            @ForAll @IntRange(min = -1, max = 200) int steamOff) {
        double[] celsius = pattern.stream()
                .mapToDouble(i -> new double[] {20, 122, 130, NONE}[Math.floorMod(i, 4)])
                .toArray();
        Bench bench = Bench.every(5, celsius.length)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius))
                .marked(mark(steamOn), mark(ventClosed), mark(steamOff));
        Phases phases = Phases.of(bench.trace(), bench.plan());
        int next = 0;
        for (Phase phase : phases.phases()) {
            assertThat(phase.from()).isEqualTo(next);
            assertThat(phase.end()).isGreaterThan(phase.from());
            next = phase.end();
        }
        assertThat(next).isEqualTo(celsius.length);
        phases.hold().ifPresent(hold -> {
            for (int i = hold.from(); i < hold.end(); i++) {
                assertThat(celsius[i]).isIn(122.0, NONE);
            }
        });
    }

    private static double mark(int seconds) {
        return seconds < 0 ? NONE : seconds;
    }

    private static Phases phases(double step, double... celsius) {
        Bench bench =
                Bench.every(step, celsius.length).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius));
        return Phases.of(bench.trace(), bench.plan());
    }

    private static String attempts(Phases phases) {
        return phases.attempts().stream()
                .map(a -> a.from() + "-" + a.to() + " " + a.endedBy() + ", " + a.earliestStartSeconds() + " to "
                        + a.latestEndSeconds())
                .collect(Collectors.joining("; "));
    }

    private static String names(Phases phases) {
        return phases.phases().stream()
                .map(p -> p.name().word() + " " + p.from() + "-" + p.to())
                .collect(Collectors.joining(", "));
    }
}
