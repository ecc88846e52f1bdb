package simulation;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

class SampleLogsTest {

    @Test
    void theSampleLogIsWhatTheSimulationWrites() throws IOException {
        assertThat(Path.of("sample-logs", "R2-0314.csv")).hasContent(new SaturatedSteamRun().log());
    }
}
