package simulation;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes the sample logs into a folder: run it with the folder as its argument after a change of the simulation. */
public final class WriteSamples {

    private WriteSamples() {}

    /**
     * Writes all sample logs.
     *
     * @param arguments the folder
     * @throws IOException if it can't be written to
     */
    public static void main(String[] arguments) throws IOException {
        Files.write(
                Path.of(arguments[0], "R2-0314.csv"),
                new SaturatedSteamRun().log().getBytes(StandardCharsets.UTF_8));
    }
}
