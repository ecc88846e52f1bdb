package org.steamwitness.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.steamwitness.finding.Finding;
import org.steamwitness.quantity.Progress;
import org.steamwitness.run.NamedBytes;
import org.steamwitness.run.ReadLog;
import org.steamwitness.run.RunFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Shows how logs are understood. */
@Command(
        name = "read",
        description = "Show how a log is understood: its form, its columns, and what was refused.",
        mixinStandardHelpOptions = true,
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {"0:the log was understood", "3:it can't be understood", "64:wrong usage", "130:cancelled"})
final class ReadCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "LOG", description = "Logger files.")
    private List<Path> logs;

    @Option(names = "--plan", paramLabel = "FILE", description = "Read as this plan's part reading says.")
    private Optional<Path> plan;

    private final Progress progress;

    ReadCommand(Progress progress) {
        this.progress = progress;
    }

    @Override
    public Integer call() {
        ExitCode worst = ExitCode.MET;
        for (Path log : logs) {
            worst = worst.orWorse(one(new RunFiles(log, plan, Optional.empty())));
        }
        return worst.code();
    }

    private ExitCode one(RunFiles files) {
        Voice voice = new Voice(spec.commandLine());
        try {
            Optional<NamedBytes> told = plan.isPresent() ? Optional.of(files.plan()) : Optional.empty();
            return shown(new ReadLog(files.log(), told, progress).outcome(), files, voice);
        } catch (RunFiles.MissingFileException missing) {
            voice.trouble(missing.getMessage());
            return ExitCode.WRONG_USAGE;
        }
    }

    private ExitCode shown(ReadLog.Outcome outcome, RunFiles files, Voice voice) {
        if (outcome instanceof ReadLog.Outcome.Surveyed surveyed) {
            PrintWriter out = spec.commandLine().getOut();
            SurveyPage.of(files.name(), surveyed.survey()).forEach(line -> out.print(Harmless.text(line) + "\n"));
            out.flush();
            return ExitCode.MET;
        }
        if (outcome instanceof ReadLog.Outcome.Refused refused) {
            for (Finding finding : refused.findings()) {
                voice.tell(finding);
            }
            return ExitCode.NOT_EVALUATED;
        }
        voice.trouble("cancelled");
        return ExitCode.CANCELLED;
    }
}
