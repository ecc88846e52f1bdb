package org.steamwitness.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import org.steamwitness.quantity.Progress;
import org.steamwitness.run.Evaluate;
import org.steamwitness.run.Outcome;
import org.steamwitness.run.RecordFolder;
import org.steamwitness.run.RunFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Evaluates logs one after the other and writes a record of each. */
@Command(
        name = "evaluate",
        description = "Evaluate logs against their plans and write a record of each.",
        mixinStandardHelpOptions = true,
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {
            "0:every criterion is met",
            "1:a criterion is not met",
            "2:undecided, or nothing judged",
            "3:a log, plan or run sheet can't be evaluated",
            "64:wrong usage",
            "70:internal error",
            "74:the record can't be written",
            "130:cancelled"
        })
final class EvaluateCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "LOG", description = "Logger files.")
    private List<Path> logs;

    @Option(
            names = "--plan",
            paramLabel = "FILE",
            description = "The plan; otherwise NAME.plan.yaml beside each log NAME.csv.")
    private Optional<Path> plan;

    @Option(
            names = "--run",
            paramLabel = "FILE",
            description = "The run sheet, for one log only; otherwise NAME.run.yaml beside each log.")
    private Optional<Path> sheet;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            defaultValue = "records",
            description = "Where records are written; otherwise ${DEFAULT-VALUE}.")
    private Path out;

    @Option(names = "--replace", description = "Replace records that were made from other files.")
    private boolean replace;

    private final Progress progress;

    EvaluateCommand(Progress progress) {
        this.progress = progress;
    }

    @Override
    public Integer call() {
        if (sheet.isPresent() && logs.size() > 1) {
            throw new ParameterException(spec.commandLine(), "--run names one run sheet, but there are several logs");
        }
        Set<String> names = new HashSet<>();
        for (Path log : logs) {
            if (!names.add(new RunFiles(log, plan, sheet).name())) {
                throw new ParameterException(
                        spec.commandLine(),
                        "two logs would give the same record: " + log + " and another of its name; evaluate them into"
                                + " different folders with --out");
            }
        }
        ExitCode worst = ExitCode.MET;
        for (Path log : logs) {
            ExitCode code = one(new RunFiles(log, plan, sheet));
            worst = worst.orWorse(code);
            if (code == ExitCode.CANCELLED) {
                break;
            }
        }
        return worst.code();
    }

    private ExitCode one(RunFiles files) {
        Voice voice = new Voice(spec.commandLine());
        try {
            Outcome outcome = new Evaluate(files.log(), files.plan(), files.sheet(), progress).outcome();
            if (outcome instanceof Outcome.Evaluated evaluated) {
                return written(files, evaluated);
            }
            if (outcome instanceof Outcome.Refused refused) {
                refused.findings().forEach(voice::tell);
                return ExitCode.NOT_EVALUATED;
            }
            voice.trouble("cancelled; no record was written for " + files.name());
            return ExitCode.CANCELLED;
        } catch (RunFiles.MissingFileException missing) {
            voice.trouble(missing.getMessage());
            return ExitCode.WRONG_USAGE;
        } catch (RecordFolder.NotWrittenException notWritten) {
            voice.trouble(notWritten.getMessage());
            return ExitCode.NOT_WRITTEN;
        }
    }

    private ExitCode written(RunFiles files, Outcome.Evaluated evaluated) throws RecordFolder.NotWrittenException {
        RecordFolder.Written written = new RecordFolder(out, replace).write(files.name(), evaluated);
        PrintWriter page = spec.commandLine().getOut();
        TerminalPage.of(evaluated.record()).forEach(line -> page.print(Harmless.text(line) + "\n"));
        page.print("Record       " + written.pdf() + "\n             " + written.json() + "\n");
        page.flush();
        return ExitCode.ofOutcome(evaluated.record().verdict().outcome());
    }
}
