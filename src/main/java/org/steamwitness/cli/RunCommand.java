package org.steamwitness.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.steamwitness.run.Drafts;
import org.steamwitness.run.RunFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Run sheets: a blank one for a log, and a check. */
@Command(name = "run", description = "Draft and check run sheets.", mixinStandardHelpOptions = true)
final class RunCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        spec.commandLine().usage(spec.commandLine().getErr());
        return ExitCode.WRONG_USAGE.code();
    }

    @Command(
            name = "draft",
            description = "Write the blank run sheet of a log, with what its plan requires.",
            mixinStandardHelpOptions = true)
    Integer draft(
            @Parameters(arity = "1", paramLabel = "LOG", description = "The log of the run.") Path log,
            @Option(
                            names = "--plan",
                            paramLabel = "FILE",
                            description = "The plan; otherwise NAME.plan.yaml beside the log.")
                    Optional<Path> plan,
            @Option(
                            names = "--out",
                            paramLabel = "FILE",
                            description = "Where to write; otherwise NAME.run.yaml beside the log.")
                    Optional<Path> out,
            @Option(names = "--replace", description = "Replace a file that is there.") boolean replace) {
        Voice voice = new Voice(spec.commandLine());
        RunFiles files = new RunFiles(log, plan, out);
        try {
            Drafts.Sheet sheet = Drafts.runSheet(files.plan());
            if (sheet.text().isEmpty()) {
                sheet.problems().forEach(voice::name);
                return ExitCode.NOT_EVALUATED.code();
            }
            return Written.of(
                            spec.commandLine(),
                            sheet.text().get(),
                            Optional.of(files.sheetPath()),
                            replace,
                            "steamwitness run check ")
                    .code();
        } catch (RunFiles.MissingFileException missing) {
            voice.trouble(missing.getMessage());
            return ExitCode.WRONG_USAGE.code();
        }
    }

    @Command(name = "check", description = "Say what is wrong or open in run sheets.", mixinStandardHelpOptions = true)
    Integer check(@Parameters(arity = "1..*", paramLabel = "SHEET", description = "Run sheets.") List<Path> sheets) {
        return Checks.of(spec.commandLine(), sheets, "the run sheet", Drafts::problemsOfRunSheet)
                .code();
    }
}
