package org.steamwitness.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import org.steamwitness.finding.Finding;
import org.steamwitness.run.NamedBytes;
import org.steamwitness.run.RunFiles;
import picocli.CommandLine;

/** Says of each file what is wrong or open in it. */
final class Checks {

    private Checks() {}

    static ExitCode of(
            CommandLine command, List<Path> paths, String role, Function<NamedBytes, List<Finding>> problems) {
        Voice voice = new Voice(command);
        ExitCode worst = ExitCode.MET;
        for (Path path : paths) {
            try {
                List<Finding> found = problems.apply(RunFiles.read(path, role, "name a file that exists"));
                found.forEach(voice::name);
                command.getOut()
                        .print(path + ": "
                                + (found.isEmpty() ? "nothing is wrong or open" : found.size() + " to mend or fill in")
                                + "\n");
                command.getOut().flush();
                worst = worst.orWorse(found.isEmpty() ? ExitCode.MET : ExitCode.NOT_EVALUATED);
            } catch (RunFiles.MissingFileException missing) {
                voice.trouble(missing.getMessage());
                worst = worst.orWorse(ExitCode.WRONG_USAGE);
            }
        }
        return worst;
    }
}
