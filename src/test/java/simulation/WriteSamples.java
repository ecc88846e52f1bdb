package simulation;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Writes the simulated runs into folders: run it with both folders as its arguments after a change of the simulation.
 */
public final class WriteSamples {

    private WriteSamples() {}

    /**
     * Writes all sample logs.
     *
     * @param arguments the folder of the sample log that users see, and the folder of the runs with their truth
     * @throws IOException if they can't be written to
     */
    public static void main(String[] arguments) throws IOException {
        Files.write(
                Path.of(arguments[0], "R2-0314.csv"),
                new SaturatedSteamRun().log().getBytes(StandardCharsets.UTF_8));
        for (Sample sample : Sample.all()) {
            for (Map.Entry<String, byte[]> file : files(sample.run()).entrySet()) {
                Files.write(Path.of(arguments[1], file.getKey()), file.getValue());
            }
        }
    }

    /** The files of a run by their names. */
    static Map<String, byte[]> files(SimulatedRun run) {
        Map<String, byte[]> files = new LinkedHashMap<>();
        files.put(run.name() + run.extension(), run.log());
        files.put(run.name() + ".plan.yaml", run.plan().getBytes(StandardCharsets.UTF_8));
        files.put(run.name() + ".run.yaml", run.sheet().getBytes(StandardCharsets.UTF_8));
        files.put(run.name() + ".truth.json", run.truth().json().getBytes(StandardCharsets.UTF_8));
        return files;
    }
}
