package org.steamwitness.distribution;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.steamwitness.distribution.Distribution.Ended;

class DistributionIT {

    private static final String LICENCES = "META-INF/licences/";

    @TempDir
    private Path folder;

    private final Distribution program = Distribution.built();

    @Test
    void runsFromAnyFolderAndSaysWhereTheRecordLies() throws Exception {
        Ended ended = program.run(folder, List.of(), Map.of(), "evaluate", sample("R2-0314.csv"));
        assertThat(ended.err()).isEmpty();
        assertThat(ended.code()).isZero();
        assertThat(ended.out())
                .contains("Record       records/R2-0314.record.pdf\n             records/R2-0314.record.json\n");
        assertThat(folder.resolve("records/R2-0314.record.pdf")).exists();
        assertThat(folder.resolve("records/R2-0314.record.json")).exists();
    }

    @Test
    void writesUtf8WhateverTheMachineSpeaks() throws Exception {
        Ended ended = program.run(
                folder,
                List.of("-Dfile.encoding=ISO-8859-1"),
                Map.of("LC_ALL", "C"),
                "evaluate",
                sample("R2-0314.csv"));
        assertThat(ended.out()).contains("highest 122.34 °C");
    }

    @Test
    void keepsTemplatesFontsAndSchemasInsideTheJar() throws IOException {
        try (JarFile jar = new JarFile(program.jar().toFile())) {
            assertThat(jar.stream().map(e -> e.getName()))
                    .contains(
                            "org/steamwitness/record/templates/cycle-record.xhtml",
                            "org/steamwitness/record/schema/record-1.schema.json",
                            "org/steamwitness/plan/schema/plan-1.schema.json",
                            "org/steamwitness/plan/schema/run-1.schema.json",
                            "org/steamwitness/fonts/IBMPlexSans_400Regular.ttf",
                            "org/steamwitness/fonts/OFL.txt",
                            "org/steamwitness/fonts/DejaVu-LICENSE.txt",
                            "META-INF/LICENSE",
                            "META-INF/NOTICE");
        }
    }

    @Test
    void everyLibraryHasItsLicenceText() throws IOException {
        try (JarFile jar = new JarFile(program.jar().toFile())) {
            Map<String, String> texts = licenceTexts(jar);
            assertThat(program.libraries()).isNotEmpty();
            for (Path library : program.libraries()) {
                String name = library.getFileName().toString().replaceFirst("-[0-9][^-]*\\.jar$", "");
                assertThat(texts).as("licences/libraries.csv names " + name).containsKey(name);
                for (String text : texts.get(name).split(" ", -1)) {
                    String content = read(jar, LICENCES + text);
                    assertThat(content).as(text).hasSizeGreaterThan(1000).containsIgnoringCase("licen");
                }
            }
            assertThat(texts)
                    .as("no library is listed that is not there")
                    .hasSize(program.libraries().size());
        }
    }

    @Test
    void endsWith70AndInWordsWhenALibraryIsGone() throws Exception {
        Distribution broken = program.copiedTo(folder.resolve("copy"));
        for (Path library : broken.libraries()) {
            if (library.getFileName().toString().startsWith("jfreechart")) {
                Files.delete(library);
            }
        }
        Ended ended = broken.run(folder, List.of(), Map.of(), "evaluate", sample("R2-0314.csv"));
        assertThat(ended.code()).isEqualTo(70);
        assertThat(ended.err())
                .startsWith("Internal error: NoClassDefFoundError")
                .doesNotContain("\tat ");
        assertThat(ended.out()).isEmpty();
        assertThat(folder.resolve("records/R2-0314.record.json")).doesNotExist();
    }

    /** The log is a pipe that never ends: the program is surely reading when the signal comes. */
    @Test
    void endsWith130WhenInterrupted() throws Exception {
        Path pipe = folder.resolve("R2-0314.csv");
        assertThat(new ProcessBuilder("mkfifo", pipe.toString()).start().waitFor())
                .isZero();
        Files.copy(Distribution.sample("R2-0314.plan.yaml"), folder.resolve("R2-0314.plan.yaml"));
        Files.copy(Distribution.sample("R2-0314.run.yaml"), folder.resolve("R2-0314.run.yaml"));
        Process process = program.start(folder, List.of(), Map.of(), "evaluate", pipe.toString());
        try (OutputStream log = Files.newOutputStream(pipe)) {
            log.write("time\n".getBytes(StandardCharsets.UTF_8));
            log.flush();
            assertThat(new ProcessBuilder("kill", "-INT", Long.toString(process.pid()))
                            .start()
                            .waitFor())
                    .isZero();
            assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        }
        assertThat(process.exitValue()).isEqualTo(130);
        assertThat(folder.resolve("records")).doesNotExist();
    }

    @Test
    void theSameBytesComeOutOnEveryMachine() throws Exception {
        Map<String, Setting> settings = new TreeMap<>(Map.of(
                "plain", new Setting(List.of(), Map.of("LC_ALL", "C", "TZ", "UTC")),
                "turkish",
                        new Setting(
                                List.of("-Duser.language=tr", "-Duser.country=TR", "-Duser.timezone=Europe/Istanbul"),
                                Map.of()),
                "arabic",
                        new Setting(
                                List.of("-Duser.language=ar", "-Duser.country=EG", "-Duser.timezone=Africa/Cairo"),
                                Map.of()),
                "far east of the date line",
                        new Setting(List.of("-Dfile.encoding=windows-1252"), Map.of("TZ", "Pacific/Kiritimati")),
                "without intrinsics of the C library",
                        new Setting(List.of("-XX:+UnlockDiagnosticVMOptions", "-XX:-UseLibmIntrinsic"), Map.of()),
                "interpreted only", new Setting(List.of("-Xint"), Map.of())));
        Map<String, String> records = new TreeMap<>();
        for (Map.Entry<String, Setting> setting : settings.entrySet()) {
            Path own = Files.createDirectories(folder.resolve(setting.getKey()));
            Ended ended = program.run(
                    own,
                    setting.getValue().javaOptions(),
                    setting.getValue().environment(),
                    "evaluate",
                    sample("R2-0314.csv"));
            assertThat(ended.code()).as(setting.getKey() + ": " + ended.err()).isZero();
            records.put(setting.getKey(), Files.readString(own.resolve("records/R2-0314.record.json")));
        }
        assertThat(records.values()).allMatch(json -> json.equals(records.get("plain")));
    }

    private static String sample(String name) {
        return Distribution.sample(name).toString();
    }

    private static Map<String, String> licenceTexts(JarFile jar) throws IOException {
        Map<String, String> texts = new TreeMap<>();
        read(jar, LICENCES + "libraries.csv")
                .lines()
                .filter(line -> !line.startsWith("#") && !line.startsWith("library,"))
                .map(line -> line.split(",", -1))
                .forEach(row -> texts.put(row[0], row[2]));
        return texts;
    }

    private static String read(JarFile jar, String entry) throws IOException {
        assertThat(jar.getEntry(entry)).as(entry).isNotNull();
        return new String(jar.getInputStream(jar.getEntry(entry)).readAllBytes(), StandardCharsets.UTF_8);
    }

    private record Setting(List<String> javaOptions, Map<String, String> environment) {}
}
