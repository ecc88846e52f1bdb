package org.steamwitness.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.steamwitness.quantity.Progress;

class ShellTest {

    @TempDir
    private Path folder;

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();
    private Path log;
    private Path plan;
    private Path sheet;

    @BeforeEach
    void copyTheSample() throws IOException {
        log = copy("R2-0314.csv");
        plan = copy("R2-0314.plan.yaml");
        sheet = copy("R2-0314.run.yaml");
    }

    @Test
    void exits0WhenEveryCriterionIsMet() {
        assertThat(evaluate()).isZero();
        assertThat(out.toString()).contains("Criteria of the plan: met", "R2-0314.record.pdf", "R2-0314.record.json");
        assertThat(err.toString()).isEmpty();
        assertThat(records()).containsExactly("R2-0314.record.json", "R2-0314.record.pdf");
    }

    @Test
    void exits1WhenACriterionIsNotMet() throws IOException {
        change(plan, "duration: 42 min", "duration: 50 min");
        assertThat(evaluate()).isEqualTo(1);
        assertThat(out.toString())
                .contains(
                        "Criteria of the plan: not met", "because    holding time: 45 min 45 s of 50 min 00 s proven");
    }

    @Test
    void exits2WhenItCannotBeTold() throws IOException {
        change(plan, "duration: 42 min", "duration: 2747 s");
        assertThat(evaluate()).isEqualTo(2);
        assertThat(out.toString()).contains("Criteria of the plan: undecided");
    }

    @Test
    void exits2ForADraftPlan() throws IOException {
        change(plan, "status: in-force", "status: draft");
        assertThat(evaluate()).isEqualTo(2);
        assertThat(out.toString()).contains("Criteria of the plan: draft plan");
    }

    @Test
    void exits2WhenARequiredEntryIsMissing() throws IOException {
        change(sheet, "atmosphere: 1008 hPa\n", "");
        assertThat(evaluate()).isEqualTo(2);
        assertThat(out.toString())
                .contains("The plan requires the entry atmosphere, which the run sheet does not hold.");
    }

    @Test
    void exits2WhenAChannelNeverChanges() throws IOException {
        Files.write(
                log,
                Files.readAllLines(log).stream()
                        .map(row -> row.startsWith("time") ? row : row.replaceFirst(",[^,]*$", ",121.50"))
                        .toList());
        assertThat(evaluate()).isEqualTo(2);
        assertThat(out.toString())
                .contains("The channel can-2 shows one value, 121.50 °C, in all of its 1441 samples.");
    }

    @Test
    void printsWhatItCanOfHostileAndForeignText() throws IOException {
        change(sheet, "name: bean stew", "name: \"bean\\u0001 <b>&stew\\u0085 豆\"");
        assertThat(evaluate()).isZero();
        assertThat(Files.readString(folder.resolve("records/R2-0314.record.json")))
                .contains("The printed record cannot show these characters: U+0085 U+8C46.");
        assertThat(out.toString()).contains("bean\uFFFD <b>&stew\uFFFD 豆");
    }

    @Test
    void exits3WhenThePlanIsWrongAndSaysWhere() throws IOException {
        change(plan, "duration: 42 min", "duration: 42");
        assertThat(evaluate()).isEqualTo(3);
        assertThat(err.toString())
                .startsWith("R2-0314.plan.yaml:29:13: hold.duration: \"42\" is not a duration such as 15 min");
        assertThat(out.toString()).isEmpty();
        assertThat(folder.resolve("records")).doesNotExist();
    }

    @Test
    void exits3WhenTheLogCannotBeEvaluated() throws IOException {
        change(log, "T5", "T7");
        assertThat(evaluate()).isEqualTo(3);
        assertThat(err.toString())
                .contains("R2-0314.csv:1: The plan's channel can-1 needs a column with the header \"T5\"");
    }

    @Test
    void exits3ForAnUnknownTimeZone() throws IOException {
        change(sheet, "Europe/Lisbon", "Europe/Atlantis");
        assertThat(evaluate()).isEqualTo(3);
        assertThat(err.toString()).contains("R2-0314.run.yaml: zone: no time zone is named so");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "evaluate", "evaluate --colour x.csv", "assess x.csv", "evaluate missing.csv", "evaluate ."})
    void exits64ForWrongUsageAndShowsTheWay(String line) {
        assertThat(run(line.isEmpty() ? new String[0] : line.split(" ", -1))).isEqualTo(64);
        assertThat(out.toString()).isEmpty();
        assertThat(err.toString()).isNotBlank().doesNotContain("Exception", "\tat ");
    }

    @Test
    void exits64WhenPlanOrRunSheetIsNotThere() throws IOException {
        Files.delete(sheet);
        assertThat(evaluate()).isEqualTo(64);
        assertThat(err.toString()).contains("the run sheet", "does not exist; put it there or name another with --run");
    }

    @Test
    void exits70ForAnInternalErrorWithoutAStackTrace() {
        Progress broken = new Progress() {
            @Override
            public void step(String what, double fraction) {
                throw new IllegalStateException("a fault put here by the test");
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        };
        assertThat(run(broken, "evaluate", log.toString())).isEqualTo(70);
        assertThat(err.toString())
                .startsWith("Internal error: IllegalStateException: a fault put here by the test\n")
                .doesNotContain("\tat ");
        assertThat(out.toString()).isEmpty();
    }

    @Test
    void exits74WhenTheRecordCannotBeWritten() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "in the way");
        assertThat(run(
                        "evaluate",
                        log.toString(),
                        "--out",
                        file.resolve("records").toString()))
                .isEqualTo(74);
        assertThat(err.toString()).contains("cannot be written to the folder", "--out");
        assertThat(out.toString()).isEmpty();
    }

    @Test
    void exits74RatherThanReplaceTheRecordOfOtherFiles() throws IOException {
        assertThat(evaluate()).isZero();
        assertThat(evaluate()).as("the same files may be evaluated again").isZero();
        byte[] first = Files.readAllBytes(folder.resolve("records/R2-0314.record.json"));
        change(sheet, "operator 4", "operator 5");
        assertThat(evaluate()).isEqualTo(74);
        assertThat(err.toString()).contains("is the record of other files", "--replace");
        assertThat(folder.resolve("records/R2-0314.record.json")).hasBinaryContent(first);
        assertThat(evaluate("--replace")).isZero();
        assertThat(records()).containsExactly("R2-0314.record.json", "R2-0314.record.pdf");
    }

    @Test
    void exits130WhenCancelledAndWritesNothing() {
        Progress cancelled = new Progress() {
            @Override
            public void step(String what, double fraction) {}

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        assertThat(run(
                        cancelled,
                        "evaluate",
                        log.toString(),
                        "--out",
                        folder.resolve("records").toString()))
                .isEqualTo(130);
        assertThat(folder.resolve("records")).doesNotExist();
    }

    @Test
    void ofManyLogsTheWorstCounts() throws IOException {
        Path other = folder.resolve("other.csv");
        Files.writeString(other, "time\n");
        int code = run(
                "evaluate",
                log.toString(),
                other.toString(),
                "--plan",
                plan.toString(),
                "--out",
                folder.resolve("records").toString());
        assertThat(code).as("the other log has no run sheet").isEqualTo(64);
        assertThat(out.toString()).contains("Criteria of the plan: met");
    }

    @Test
    void ordersWhatManyLogsCameTo() {
        assertThat(ExitCode.NOT_EVALUATED.orWorse(ExitCode.NOT_MET)).isEqualTo(ExitCode.NOT_EVALUATED);
        assertThat(ExitCode.UNDECIDED.orWorse(ExitCode.NOT_MET)).isEqualTo(ExitCode.NOT_MET);
        assertThat(ExitCode.MET.orWorse(ExitCode.UNDECIDED)).isEqualTo(ExitCode.UNDECIDED);
    }

    @Test
    void theTerminalPageFitsAScreen() {
        evaluate();
        assertThat(out.toString().lines().count()).isLessThanOrEqualTo(36);
        assertThat(out.toString().lines().mapToInt(String::length).max().orElseThrow())
                .isLessThanOrEqualTo(160);
    }

    /** From a log never seen before to a plan and a run sheet whose open places are named. */
    @Test
    void leadsFromANewLogToItsPapers() throws IOException {
        Path fresh = folder.resolve("week 7.csv");
        Files.write(
                fresh,
                Files.readAllLines(log).stream()
                        .map(row -> row.startsWith("time")
                                ? "Time;T1 steam [°C];T2 drain [°C];T3 top [°C];P1 bar(g);T5 can in degC;T6 can in degC"
                                : row.replace('T', ' ').replace(',', ';').replace('.', ','))
                        .toList());
        assertThat(run("read", fresh.toString())).isZero();
        assertThat(out.toString())
                .contains(
                        "delimiter    semicolon (found",
                        "decimal mark comma (found",
                        "time         year-month-day (found")
                .contains("#2  T1 steam [°C]", "bar gauge", "Refused      nothing")
                .containsPattern("#6  T5 can in degC +temperature +degC +product");
        assertThat(run("plan", "draft", fresh.toString())).isZero();
        Path drafted = folder.resolve("week 7.plan.yaml");
        assertThat(drafted).content().contains("column: \"T1 steam [°C]\"", "Open places, marked \"?\":");
        assertThat(run("plan", "check", drafted.toString())).isEqualTo(3);
        assertThat(err.toString()).contains("hold.at-least: open place: fill in a temperature such as 121.1 degC");
        assertThat(run("plan", "draft", fresh.toString())).isEqualTo(74);
        assertThat(err.toString()).contains("week 7.plan.yaml exists; name another file with --out");
        assertThat(run("run", "draft", fresh.toString())).isEqualTo(3);
        assertThat(run("run", "draft", fresh.toString(), "--plan", plan.toString()))
                .isZero();
        Path blank = folder.resolve("week 7.run.yaml");
        assertThat(blank).content().contains("plan-used: {id: \"R2-stew-73x111\", revision: 3}", "steam-on: \"?\"");
        assertThat(run("run", "check", blank.toString())).isEqualTo(3);
        assertThat(run("run", "check", sheet.toString())).isZero();
        assertThat(run("plan", "check", plan.toString())).isZero();
    }

    @Test
    void describesPresetsAndShapes() {
        assertThat(run("plan", "presets")).isZero();
        assertThat(out.toString()).contains("porous-load  Steam sterilizer, porous load");
        assertThat(run("plan", "schema")).isZero();
        assertThat(run("plan", "schema", "--run")).isZero();
        assertThat(out.toString()).contains("urn:steamwitness:plan:1", "urn:steamwitness:run:1");
        assertThat(run("plan", "draft", "--process", "oven")).isEqualTo(64);
        assertThat(run("plan", "draft", "--process", "leak-test")).isZero();
        assertThat(out.toString()).contains("# Draft from the preset leak-test, approved by nobody.");
        assertThat(run("plan")).isEqualTo(64);
        assertThat(run("run")).isEqualTo(64);
    }

    @Test
    void readsNoLogThatItCannotUnderstand() throws IOException {
        Files.writeString(log, "time,T1\n03/04/2026 08:00:00,20\n03/04/2026 08:00:05,21\n");
        assertThat(run("read", log.toString())).isEqualTo(3);
        assertThat(err.toString()).contains("Day and month of the log's dates can't be told apart");
        assertThat(run("read", folder.resolve("none.csv").toString())).isEqualTo(64);
        assertThat(run("plan", "draft", log.toString(), "--replace")).isEqualTo(3);
    }

    /** The plan says what the log does not show. */
    @Test
    void aPlanTellsHowALogIsWritten() throws IOException {
        String text = Files.readString(log).replace("2026-03-14T", "03/04/2026 ");
        Files.writeString(log, text);
        assertThat(evaluate()).isEqualTo(3);
        change(plan, "longest-gap: 10 s", "longest-gap: 10 s\nreading: {time-format: day-month-year}");
        assertThat(evaluate()).isZero();
        assertThat(out.toString()).contains("2026-04-03 08:05:00");
    }

    /** Two runs in one file: without a part they are named, with one the run is judged. */
    @Test
    void asksWhichOfSeveralCyclesIsMeant() throws IOException {
        List<String> rows = Files.readAllLines(log);
        List<String> two = new java.util.ArrayList<>(rows);
        rows.stream().skip(1).map(r -> r.replace("2026-03-14T", "2026-03-15T")).forEach(two::add);
        Files.write(log, two);
        assertThat(evaluate()).isEqualTo(3);
        assertThat(err.toString()).contains("The log holds 2 cycles: at temperature from 08:24:15 (line 233) to");
        change(sheet, "equipment: R2", "equipment: R2\nlog-part: {from: 08:05, to: 10:05}");
        assertThat(evaluate()).isZero();
    }

    @Test
    void tellsAZoneThatTheLogContradicts() throws IOException {
        Files.write(
                log,
                Files.readAllLines(log).stream()
                        .map(row -> row.replaceFirst("^(2026-[^,]*),", "$1+02:00,"))
                        .toList());
        assertThat(evaluate()).isZero();
        assertThat(out.toString().replaceAll("\\s+", " "))
                .contains("The log tells a distance of +02:00 from UTC, the zone Europe/Lisbon has Z on that day.");
    }

    @Test
    void saysOfMediaThatHoldAirThatSaturationIsNotJudged() throws IOException {
        change(plan, "medium: saturated-steam", "medium: steam-air");
        evaluate();
        assertThat(out.toString()).contains("Saturation   ").doesNotContain("smallest air");
    }

    @Test
    void refusesTwoLogsOfOneName() throws IOException {
        Path other = Files.createDirectory(folder.resolve("other")).resolve("R2-0314.csv");
        Files.copy(log, other);
        assertThat(run("evaluate", log.toString(), other.toString())).isEqualTo(64);
        assertThat(err.toString()).contains("two logs would give the same record");
    }

    private int evaluate(String... more) {
        out.getBuffer().setLength(0);
        err.getBuffer().setLength(0);
        return run(Stream.concat(
                        Stream.of(
                                "evaluate",
                                log.toString(),
                                "--out",
                                folder.resolve("records").toString()),
                        Stream.of(more))
                .toArray(String[]::new));
    }

    private int run(String... arguments) {
        return run(Progress.UNWATCHED, arguments);
    }

    private int run(Progress progress, String... arguments) {
        return new Shell(new PrintWriter(out), new PrintWriter(err), progress).run(arguments);
    }

    private Stream<String> records() {
        try (Stream<Path> files = Files.list(folder.resolve("records"))) {
            return files.map(f -> f.getFileName().toString()).sorted().toList().stream();
        } catch (IOException unreadable) {
            throw new java.io.UncheckedIOException(unreadable);
        }
    }

    private Path copy(String name) throws IOException {
        return Files.copy(Path.of("sample-logs", name), folder.resolve(name));
    }

    private static void change(Path file, String from, String to) throws IOException {
        String text = Files.readString(file);
        assertThat(text).contains(from);
        Files.writeString(file, text.replace(from, to));
    }
}
