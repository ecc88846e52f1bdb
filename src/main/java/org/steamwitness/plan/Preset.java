package org.steamwitness.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * A commented plan to start from, one for every process. Each is a draft with open places: what a plant, a standard or
 * a process authority has to say is not said here.
 *
 * @param process the kind of cycle it is for
 * @param text the file, as YAML with comments
 */
public record Preset(CycleProcess process, String text) {

    /**
     * All presets.
     *
     * @return one for every process, in the order of these
     */
    public static List<Preset> all() {
        return Arrays.stream(CycleProcess.values()).map(Preset::of).toList();
    }

    /**
     * The preset of a process.
     *
     * @param process a kind of cycle
     * @return its preset
     */
    public static Preset of(CycleProcess process) {
        return new Preset(process, resource("presets/" + process.word() + ".plan.yaml"));
    }

    /**
     * The preset of a name.
     *
     * @param name word of a process, such as "porous-load"
     * @return empty if no process is named so
     */
    public static Optional<Preset> named(String name) {
        return Arrays.stream(CycleProcess.values())
                .filter(process -> process.word().equals(name))
                .findFirst()
                .map(Preset::of);
    }

    /**
     * Its name.
     *
     * @return word of its process
     */
    public String name() {
        return process.word();
    }

    /**
     * What it is for, from its own title.
     *
     * @return one line
     */
    public String title() {
        return text.lines()
                .filter(line -> line.startsWith("# "))
                .findFirst()
                .map(line -> line.substring(2))
                .orElse(process.word());
    }

    static String resource(String name) {
        try (InputStream file = Preset.class.getResourceAsStream(name)) {
            if (file == null) {
                throw new IllegalStateException("the program lacks " + name);
            }
            return new String(file.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
