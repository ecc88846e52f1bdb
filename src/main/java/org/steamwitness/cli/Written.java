package org.steamwitness.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.steamwitness.run.RecordFolder;
import org.steamwitness.run.TextFile;
import picocli.CommandLine;

/** Hands a drafted file to its reader: to a file beside the log, or to the terminal. */
final class Written {

    private Written() {}

    static ExitCode of(CommandLine command, String text, Optional<Path> target, boolean replace, String next) {
        if (target.isEmpty()) {
            command.getOut().print(text);
            command.getOut().flush();
            return ExitCode.MET;
        }
        try {
            new TextFile(target.get(), replace).write(text);
        } catch (RecordFolder.NotWrittenException notWritten) {
            new Voice(command).trouble(notWritten.getMessage());
            return ExitCode.NOT_WRITTEN;
        }
        command.getOut().print("Draft        " + target.get() + "\n");
        command.getOut()
                .print("Next         fill in its open places, marked \"?\", then: " + next + target.get() + "\n");
        command.getOut().flush();
        return ExitCode.MET;
    }
}
