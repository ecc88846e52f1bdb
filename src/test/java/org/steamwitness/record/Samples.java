package org.steamwitness.record;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.steamwitness.quantity.Progress;
import org.steamwitness.run.Evaluate;
import org.steamwitness.run.NamedBytes;
import org.steamwitness.run.Outcome;

/** The sample runs, evaluated for tests. */
public final class Samples {

    private static final Path FOLDER = Path.of("sample-logs");

    private Samples() {}

    public static Outcome.Evaluated saturatedSteam() throws IOException {
        return (Outcome.Evaluated) new Evaluate(
                        file("R2-0314.csv"), file("R2-0314.plan.yaml"), file("R2-0314.run.yaml"), Progress.UNWATCHED)
                .outcome();
    }

    public static NamedBytes file(String name) throws IOException {
        return new NamedBytes(name, Files.readAllBytes(FOLDER.resolve(name)));
    }
}
