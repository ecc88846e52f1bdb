package org.steamwitness.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.steamwitness.quantity.Progress;
import org.steamwitness.run.Drafts;
import org.steamwitness.run.LogSurvey;
import org.steamwitness.run.ReadLog;
import org.steamwitness.run.RunFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Plans: a draft to start from, a check, the shape that editors can use, and what presets there are. */
@Command(name = "plan", description = "Draft, check and describe plans.", mixinStandardHelpOptions = true)
final class PlanCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    private final Progress progress;

    PlanCommand(Progress progress) {
        this.progress = progress;
    }

    @Override
    public Integer call() {
        spec.commandLine().usage(spec.commandLine().getErr());
        return ExitCode.WRONG_USAGE.code();
    }

    @Command(
            name = "draft",
            description = "Write a plan to start from, with a channel for each column of a log that is understood.",
            mixinStandardHelpOptions = true)
    Integer draft(
            @Parameters(arity = "0..1", paramLabel = "LOG", description = "A log that the plan is to fit.")
                    Optional<Path> log,
            @Option(
                            names = "--process",
                            paramLabel = "WORD",
                            defaultValue = "retort",
                            description = "One of those that plan presets lists; otherwise ${DEFAULT-VALUE}.")
                    String process,
            @Option(
                            names = "--out",
                            paramLabel = "FILE",
                            description =
                                    "Where to write; otherwise NAME.plan.yaml beside the log, or to the terminal.")
                    Optional<Path> out,
            @Option(names = "--replace", description = "Replace a file that is there.") boolean replace) {
        Voice voice = new Voice(spec.commandLine());
        try {
            Optional<LogSurvey> survey = Optional.empty();
            if (log.isPresent()) {
                RunFiles files = new RunFiles(log.get(), Optional.empty(), Optional.empty());
                ReadLog.Outcome outcome = new ReadLog(files.log(), Optional.empty(), progress).outcome();
                if (outcome instanceof ReadLog.Outcome.Refused refused) {
                    refused.findings().forEach(voice::tell);
                    return ExitCode.NOT_EVALUATED.code();
                }
                if (!(outcome instanceof ReadLog.Outcome.Surveyed surveyed)) {
                    return ExitCode.CANCELLED.code();
                }
                survey = Optional.of(surveyed.survey());
            }
            Optional<Path> target =
                    out.or(() -> log.map(l -> new RunFiles(l, Optional.empty(), Optional.empty()).planPath()));
            String text = Drafts.plan(process, survey)
                    .orElseThrow(() -> new ParameterException(
                            spec.commandLine(),
                            "no preset is named \"" + process + "\"; see: steamwitness plan presets"));
            return Written.of(spec.commandLine(), text, target, replace, "steamwitness plan check ")
                    .code();
        } catch (RunFiles.MissingFileException missing) {
            voice.trouble(missing.getMessage());
            return ExitCode.WRONG_USAGE.code();
        }
    }

    @Command(name = "check", description = "Say what is wrong or open in plans.", mixinStandardHelpOptions = true)
    Integer check(@Parameters(arity = "1..*", paramLabel = "PLAN", description = "Plans.") List<Path> plans) {
        return Checks.of(spec.commandLine(), plans, "the plan", Drafts::problemsOfPlan)
                .code();
    }

    @Command(
            name = "schema",
            description = "Print the JSON Schema of plans, for editors that check while people type.",
            mixinStandardHelpOptions = true)
    Integer schema(@Option(names = "--run", description = "Print that of run sheets.") boolean run) {
        spec.commandLine().getOut().print(Drafts.schema(run));
        spec.commandLine().getOut().flush();
        return ExitCode.MET.code();
    }

    @Command(name = "presets", description = "List the presets that plan draft knows.", mixinStandardHelpOptions = true)
    Integer presets() {
        Drafts.presets()
                .forEach(preset -> spec.commandLine()
                        .getOut()
                        .print(preset.name()
                                + " ".repeat(Math.max(1, 13 - preset.name().length())) + preset.title() + "\n"));
        spec.commandLine().getOut().flush();
        return ExitCode.MET.code();
    }
}
