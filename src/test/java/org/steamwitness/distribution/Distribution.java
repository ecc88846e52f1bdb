package org.steamwitness.distribution;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/** The program as it is handed out: a jar with its libraries beside it, run in a Java of its own. */
final class Distribution {

    private static final long LONGEST_SECONDS = 120;

    private final Path jar;

    private Distribution(Path jar) {
        this.jar = jar;
    }

    static Distribution built() {
        return new Distribution(Path.of(System.getProperty("steamwitness.jar")));
    }

    static Path sample(String name) {
        return Path.of(System.getProperty("steamwitness.samples")).resolve(name);
    }

    /** A copy elsewhere, of which parts can be taken away. */
    Distribution copiedTo(Path folder) throws IOException {
        Files.createDirectories(folder.resolve("lib"));
        for (Path library : libraries()) {
            Files.copy(library, folder.resolve("lib").resolve(library.getFileName()));
        }
        return new Distribution(Files.copy(jar, folder.resolve(jar.getFileName())));
    }

    Path jar() {
        return jar;
    }

    List<Path> libraries() throws IOException {
        try (var files = Files.list(jar.resolveSibling("lib"))) {
            return files.sorted().toList();
        }
    }

    Process start(Path folder, List<String> javaOptions, Map<String, String> environment, String... arguments)
            throws IOException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(javaOptions);
        command.add("-jar");
        command.add(jar.toString());
        command.addAll(List.of(arguments));
        ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile());
        builder.environment().putAll(environment);
        return builder.redirectOutput(folder.resolve("stdout").toFile())
                .redirectError(folder.resolve("stderr").toFile())
                .start();
    }

    Ended run(Path folder, List<String> javaOptions, Map<String, String> environment, String... arguments)
            throws IOException, InterruptedException {
        return ended(start(folder, javaOptions, environment, arguments), folder);
    }

    static Ended ended(Process process, Path folder) throws IOException, InterruptedException {
        if (!process.waitFor(LONGEST_SECONDS, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new IllegalStateException("the program did not end within " + LONGEST_SECONDS + " s");
        }
        return new Ended(
                process.exitValue(),
                Files.readString(folder.resolve("stdout"), StandardCharsets.UTF_8),
                Files.readString(folder.resolve("stderr"), StandardCharsets.UTF_8));
    }

    /** How a run of the program ended. */
    record Ended(int code, String out, String err) {}
}
