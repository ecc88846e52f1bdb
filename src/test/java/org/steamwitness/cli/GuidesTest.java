package org.steamwitness.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.steamwitness.quantity.Progress;

/** What the guides promise is what the program does. */
class GuidesTest {

    private static final Path SAMPLES = Path.of("sample-logs");

    @TempDir
    private Path folder;

    @Test
    void theReadmeShowsThePageThatTheSampleGives() throws IOException {
        String readme = Files.readString(Path.of("README.md"));
        String shown = between(readme, "```text\n", "```");
        List<String> promised =
                shown.lines().takeWhile(line -> !line.equals("...")).toList();
        assertThat(promised).hasSizeGreaterThan(10);
        assertThat(evaluated("R2-0314").page().lines().limit(promised.size())).containsExactlyElementsOf(promised);
    }

    @Test
    void theReadmeListsEveryExitCode() throws IOException {
        String readme = Files.readString(Path.of("README.md"));
        for (ExitCode code : ExitCode.values()) {
            assertThat(readme).contains("| " + code.code() + " | ");
        }
    }

    @Test
    void theMistakeThatTheReadmeQuotesReadsSo() throws IOException {
        String quoted = "R2-0314.plan.yaml:29:13: hold.duration: \"42\" is not a duration such as 15 min;"
                + " known units: s, min, h";
        assertThat(Files.readString(Path.of("README.md"))).contains("`" + quoted + "`");
        Path plan = folder.resolve("R2-0314.plan.yaml");
        Files.writeString(
                plan, Files.readString(SAMPLES.resolve("R2-0314.plan.yaml")).replace("42 min", "42"));
        StringWriter err = new StringWriter();
        new Shell(new PrintWriter(new StringWriter()), new PrintWriter(err), Progress.UNWATCHED)
                .run("evaluate", SAMPLES.resolve("R2-0314.csv").toString(), "--plan", plan.toString());
        assertThat(err.toString()).startsWith(quoted + "\n");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("samples")
    void everySampleComesToTheVerdictOfItsGuide(String name, String verdict, int code) throws IOException {
        Evaluated evaluated = evaluated(name);
        assertThat(evaluated.page()).contains("Criteria of the plan: " + verdict + "\n");
        assertThat(evaluated.code()).isEqualTo(code);
    }

    @Test
    void everySampleLogIsInTheGuide() throws IOException {
        try (Stream<Path> files = Files.list(SAMPLES)) {
            assertThat(files.map(f -> f.getFileName().toString())
                            .filter(f -> f.endsWith(".csv"))
                            .map(f -> f.replace(".csv", "")))
                    .containsExactlyInAnyOrderElementsOf(
                            samples().map(row -> (String) row[0]).toList());
        }
    }

    static Stream<Object[]> samples() throws IOException {
        return Files.readAllLines(SAMPLES.resolve("README.md")).stream()
                .filter(line -> line.matches("\\| [A-Z0-9-]+ \\|.*\\| [0-9]+ \\|"))
                .map(line -> line.split(" *\\| *", -1))
                .map(cells -> new Object[] {cells[1], cells[3], Integer.parseInt(cells[4])});
    }

    private Evaluated evaluated(String name) {
        StringWriter out = new StringWriter();
        int code = new Shell(new PrintWriter(out), new PrintWriter(new StringWriter()), Progress.UNWATCHED)
                .run("evaluate", SAMPLES.resolve(name + ".csv").toString(), "--out", folder.toString());
        return new Evaluated(code, out.toString());
    }

    private static String between(String text, String start, String end) {
        int from = text.indexOf(start) + start.length();
        return text.substring(from, text.indexOf(end, from));
    }

    private record Evaluated(int code, String page) {}
}
