package org.steamwitness.cli;

import java.io.PrintWriter;
import org.steamwitness.quantity.Progress;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;

/** The command line as a whole: finds the command, runs it, and turns whatever happens into words and an exit code. */
final class Shell {

    private final PrintWriter out;
    private final PrintWriter err;
    private final Progress progress;

    Shell(PrintWriter out, PrintWriter err, Progress progress) {
        this.out = out;
        this.err = err;
        this.progress = progress;
    }

    int run(String... arguments) {
        try {
            return commandLine().execute(arguments);
        } catch (Throwable broken) {
            return internalError(broken);
        }
    }

    private CommandLine commandLine() {
        return new CommandLine(new Steamwitness())
                .addSubcommand(new EvaluateCommand(progress))
                .addSubcommand(new ReadCommand(progress))
                .addSubcommand(new PlanCommand(progress))
                .addSubcommand(new RunCommand())
                .setOut(out)
                .setErr(err)
                .setUsageHelpWidth(100)
                .setParameterExceptionHandler(this::wrongUsage)
                .setExecutionExceptionHandler((broken, command, parsed) -> internalError(broken));
    }

    private int wrongUsage(ParameterException wrong, String[] arguments) {
        say(wrong.getMessage());
        say("Try: " + wrong.getCommandLine().getCommandSpec().qualifiedName() + " --help");
        return ExitCode.WRONG_USAGE.code();
    }

    private int internalError(Throwable broken) {
        say("Internal error: " + broken.getClass().getSimpleName()
                + (broken.getMessage() == null ? "" : ": " + broken.getMessage()));
        say("No record was written for this log. Please report this with the log, the plan and the run sheet.");
        return ExitCode.INTERNAL_ERROR.code();
    }

    private void say(String line) {
        err.print(line + "\n");
        err.flush();
    }
}
