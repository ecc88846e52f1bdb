package org.steamwitness.cli;

import java.io.PrintWriter;
import org.steamwitness.finding.Finding;
import picocli.CommandLine;

/** What a command has to say beside its data: on the error stream, one trouble a line, with what to do about it. */
final class Voice {

    private final PrintWriter err;

    Voice(CommandLine command) {
        this.err = command.getErr();
    }

    void tell(Finding finding) {
        String place = finding.position().text();
        trouble((place.isEmpty() ? "" : place + ": ") + finding.text() + "\n    " + finding.remedy());
    }

    /** Without its remedy: for lists in which all remedies are alike. */
    void name(Finding finding) {
        trouble(finding.position().text() + ": " + finding.text());
    }

    void trouble(String message) {
        err.print(Harmless.text(message) + "\n");
        err.flush();
    }
}
