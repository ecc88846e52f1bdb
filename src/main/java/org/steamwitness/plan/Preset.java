package org.steamwitness.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The drafts of plans that ship with the program, one a process. */
public final class Preset {

    private Preset() {}

    /**
     * The text of a draft.
     *
     * @param process for which process
     * @return a commented plan with open places
     */
    public static String text(CycleProcess process) {
        try (InputStream in = Preset.class.getResourceAsStream("presets/" + process.word() + ".plan.yaml")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
