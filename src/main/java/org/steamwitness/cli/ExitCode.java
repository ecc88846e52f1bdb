package org.steamwitness.cli;

import java.util.List;

/** What the program tells the shell. */
enum ExitCode {
    MET(0),
    NOT_MET(1),
    UNDECIDED(2),
    NOT_EVALUATED(3),
    WRONG_USAGE(64),
    INTERNAL_ERROR(70),
    NOT_WRITTEN(74),
    CANCELLED(130);

    /** From the worst to the best. A run that ended for a reason of its own outweighs what other runs came to. */
    private static final List<ExitCode> WORST_FIRST =
            List.of(CANCELLED, INTERNAL_ERROR, NOT_WRITTEN, WRONG_USAGE, NOT_EVALUATED, NOT_MET, UNDECIDED, MET);

    private final int code;

    ExitCode(int code) {
        this.code = code;
    }

    int code() {
        return code;
    }

    ExitCode orWorse(ExitCode other) {
        return WORST_FIRST.indexOf(this) <= WORST_FIRST.indexOf(other) ? this : other;
    }

    static ExitCode ofOutcome(String outcome) {
        return switch (outcome) {
            case "met" -> MET;
            case "not met" -> NOT_MET;
            default -> UNDECIDED;
        };
    }
}
