package org.steamwitness.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.steamwitness.quantity.Progress;
import org.steamwitness.record.CycleRecord;
import org.steamwitness.record.LethalityPart;
import org.steamwitness.record.SaturationPart;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/**
 * Whole runs, from the bytes of the log to the record, held against the truth that the independent simulation kept
 * before anything was evaluated.
 */
class SimulatedTruthTest {

    private static final Path FOLDER = Path.of("src", "test", "resources", "simulation");

    /** A hold is known to two samples: the one in which it began and the one in which it ended. */
    private static final double TWO_SAMPLES_AND_LAG = 16;

    @ParameterizedTest
    @ValueSource(strings = {"R2-0413", "R2-0414", "R2-0415", "R2-0416", "R2-0417", "R2-0418"})
    void findsTheHoldAndTheLethality(String name) throws IOException {
        CycleRecord record = record(name);
        JsonNode truth = truth(name);
        assertThat(record.hold().steps().get(0).provenSeconds())
                .isCloseTo(truth.get("longest-hold-s").asDouble(), within(TWO_SAMPLES_AND_LAG));
        for (JsonNode probe : truth.get("lethality")) {
            LethalityPart.PerChannel measured = record.lethality().get(0).perChannel().stream()
                    .filter(c -> c.channel().equals(probe.get("channel").asString()))
                    .findFirst()
                    .orElseThrow();
            LethalityPart.Interval interval = measured.interval().value().orElseThrow();
            assertThat(probe.get("whole-run-min").asDouble()).isBetween(interval.low(), interval.high());
            assertThat(measured.toSteamOff())
                    .isCloseTo(
                            probe.get("to-steam-off-min").asDouble(),
                            within(0.02 * probe.get("to-steam-off-min").asDouble()));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"R2-0413", "R2-0417", "R2-0418"})
    void findsNoEpisodeInCleanRuns(String name) throws IOException {
        assertThat(record(name).saturation().episodes()).isEmpty();
    }

    @Test
    void findsThePocketWhereAndWhenItWas() throws IOException {
        JsonNode fault = truth("R2-0414").get("faults").get(0);
        SaturationPart.EpisodePart episode =
                record("R2-0414").saturation().episodes().get(0);
        assertThat(episode.channels()).containsExactly(fault.get("place").asString());
        assertThat(episode.kind()).isEqualTo("air");
        assertThat(episode.certainty()).isEqualTo("confirmed");
        assertThat(episode.startSeconds()).isCloseTo(fault.get("from-s").asDouble(), within(10.0));
        assertThat(episode.endSeconds()).isCloseTo(fault.get("to-s").asDouble(), within(10.0));
    }

    @Test
    void findsResidualAirAtEveryProbe() throws IOException {
        assertThat(record("R2-0415").saturation().episodes())
                .extracting(SaturationPart.EpisodePart::kind)
                .containsExactly("air", "air", "air");
    }

    private static CycleRecord record(String name) throws IOException {
        Outcome outcome = new Evaluate(
                        file(name + ".csv"), file(name + ".plan.yaml"), file(name + ".run.yaml"), Progress.UNWATCHED)
                .outcome();
        assertThat(outcome).isInstanceOf(Outcome.Evaluated.class);
        return ((Outcome.Evaluated) outcome).record();
    }

    private static NamedBytes file(String name) throws IOException {
        return new NamedBytes(name, Files.readAllBytes(FOLDER.resolve(name)));
    }

    private static JsonNode truth(String name) throws IOException {
        return new JsonMapper().readTree(Files.readString(FOLDER.resolve(name + ".truth.json")));
    }
}
