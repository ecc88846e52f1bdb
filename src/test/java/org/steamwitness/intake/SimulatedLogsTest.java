package org.steamwitness.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.ReadingRules;

/** Logs that the independent simulation wrote in its own dialects, with the sampling that its truth tells. */
class SimulatedLogsTest {

    private static final Path FOLDER = Path.of("src", "test", "resources", "simulation");

    @ParameterizedTest
    @CsvSource({
        "K1-0427, 4, 0",
        "K1-0428, 4, 0",
        "K1-0429, 4, 0",
        "R2-0413, 6, 0",
        "R2-0414, 6, 0",
        "R2-0415, 6, 0",
        "R2-0416, 6, 1",
        "R2-0417, 6, 0",
        "R2-0418, 6, 5",
        "R3-0424, 4, 0",
        "S1-0420, 5, 0",
        "S1-0421, 2, 0",
        "S1-0422, 2, 0",
        "S2-0423, 4, 0"
    })
    void areReadWholeWhateverTheirDialect(String name, int channels, int refused) throws IOException {
        Intake intake = new LogReader(name + ".csv", new ReadingRules(List.of()), Optional.empty(), Progress.UNWATCHED)
                .survey(Files.readAllBytes(FOLDER.resolve(name + ".csv")));
        assertThat(intake).isInstanceOf(Intake.Read.class);
        Intake.Read read = (Intake.Read) intake;
        assertThat(read.trace().channels()).hasSize(channels);
        assertThat(read.reading().refusedRows()).isEqualTo(refused);
        assertThat(read.trace().interval().medianSeconds()).isEqualTo(interval(name));
        assertThat(read.trace().size()).isGreaterThan(500);
    }

    private static double interval(String name) throws IOException {
        Matcher interval = Pattern.compile("\"interval-s\"\\s*:\\s*([0-9.]+)")
                .matcher(Files.readString(FOLDER.resolve(name + ".truth.json")));
        assertThat(interval.find()).isTrue();
        return Double.parseDouble(interval.group(1));
    }
}
