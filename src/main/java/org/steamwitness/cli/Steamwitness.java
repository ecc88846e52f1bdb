package org.steamwitness.cli;

import java.util.concurrent.Callable;
import org.steamwitness.run.Program;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The program without a command: shows its help. */
@Command(
        name = "steamwitness",
        description = {
            "Evaluates the cycles of sealed steam chambers from a logger file, a plan and a run sheet.",
            "It documents a run for review by qualified people; it decides nothing about product safety."
        },
        mixinStandardHelpOptions = true,
        versionProvider = Steamwitness.Version.class)
final class Steamwitness implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        spec.commandLine().usage(spec.commandLine().getErr());
        return ExitCode.WRONG_USAGE.code();
    }

    /** Tells the program's name and version. */
    static final class Version implements IVersionProvider {
        @Override
        public String[] getVersion() {
            return new String[] {Program.NAME + " " + Program.VERSION};
        }
    }
}
