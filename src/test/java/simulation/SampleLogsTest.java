package simulation;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The files that are kept are, byte for byte, what the simulation writes. */
class SampleLogsTest {

    private static final Path KEPT = Path.of("src", "test", "resources", "simulation");

    static List<Sample> samples() {
        return Sample.all();
    }

    @Test
    void theSampleLogIsWhatTheSimulationWrites() throws IOException {
        assertThat(Path.of("sample-logs", "R2-0314.csv")).hasContent(new SaturatedSteamRun().log());
    }

    @ParameterizedTest
    @MethodSource("samples")
    void everyRunIsWhatTheSimulationWrites(Sample sample) throws IOException {
        for (Map.Entry<String, byte[]> file : WriteSamples.files(sample.run()).entrySet()) {
            assertThat(KEPT.resolve(file.getKey())).hasBinaryContent(file.getValue());
        }
    }

    @Test
    void nothingElseIsKept() throws IOException {
        try (Stream<Path> files = Files.list(KEPT)) {
            assertThat(files.map(file -> file.getFileName().toString())
                            .filter(name -> !name.equals("README.md"))
                            .map(name -> name.substring(0, name.indexOf('.')))
                            .distinct())
                    .containsExactlyInAnyOrderElementsOf(
                            samples().stream().map(Sample::name).toList());
        }
    }

    @ParameterizedTest
    @MethodSource("samples")
    void theTableTellsTheVerdictThatTheTruthAsksFor(Sample sample) throws IOException {
        Expected expected = sample.run().truth().expected();
        assertThat(Files.readAllLines(KEPT.resolve("README.md")))
                .filteredOn(line -> line.startsWith("| " + sample.name() + " |"))
                .singleElement()
                .asString()
                .endsWith("| " + expected.words() + " | " + expected.exitCode() + " |");
    }

    @ParameterizedTest
    @MethodSource("samples")
    void logsAreSmall(Sample sample) {
        assertThat(sample.run().log()).hasSizeLessThan(150_000);
    }
}
