package org.steamwitness.record;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
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

    /** The sample with its texts changed. */
    public static Outcome.Evaluated changed(
            UnaryOperator<String> log, UnaryOperator<String> plan, UnaryOperator<String> sheet) throws IOException {
        return (Outcome.Evaluated) new Evaluate(
                        changed("R2-0314.csv", log),
                        changed("R2-0314.plan.yaml", plan),
                        changed("R2-0314.run.yaml", sheet),
                        Progress.UNWATCHED)
                .outcome();
    }

    /** A log whose drain stands three kelvin below in the hold, and that has a row that can't be read. */
    public static String pocketAtTheDrain(String log) {
        List<String> rows = new ArrayList<>(log.lines().toList());
        for (int i = 400; i < 430; i++) {
            rows.set(i, rows.get(i).replaceFirst("^((?:[^,]*,){3})[^,]*", "$1119.00"));
        }
        rows.set(900, rows.get(900).replaceFirst("^[^,]*", "later"));
        return String.join("\n", rows) + "\n";
    }

    private static NamedBytes changed(String name, UnaryOperator<String> change) throws IOException {
        String text = Files.readString(FOLDER.resolve(name));
        return new NamedBytes(name, change.apply(text).getBytes(StandardCharsets.UTF_8));
    }

    public static NamedBytes file(String name) throws IOException {
        return new NamedBytes(name, Files.readAllBytes(FOLDER.resolve(name)));
    }
}
