package org.steamwitness.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import org.steamwitness.quantity.Progress;

/** Where the program starts. */
public final class Main {

    private Main() {}

    /**
     * Runs one command and ends the process with its exit code.
     *
     * @param arguments the command line
     */
    public static void main(String[] arguments) {
        System.setProperty("java.awt.headless", "true");
        System.setProperty("org.apache.commons.logging.Log", "org.apache.commons.logging.impl.NoOpLog");
        PrintWriter out = utf8(FileDescriptor.out);
        PrintWriter err = utf8(FileDescriptor.err);
        int code = new Shell(out, err, Progress.UNWATCHED).run(arguments);
        if (out.checkError()) {
            err.println("What was to be told could not be written to the standard output.");
            code = ExitCode.NOT_WRITTEN.code();
        }
        System.exit(code);
    }

    private static PrintWriter utf8(FileDescriptor stream) {
        return new PrintWriter(new OutputStreamWriter(new FileOutputStream(stream), StandardCharsets.UTF_8), true);
    }
}
