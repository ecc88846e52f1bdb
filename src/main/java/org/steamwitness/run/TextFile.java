package org.steamwitness.run;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** A file of text that people go on with: written whole, and never over one that is there unless that was asked for. */
public final class TextFile {

    private final Path path;
    private final boolean replace;

    /**
     * Names the file.
     *
     * @param path where it is to lie
     * @param replace whether a file that is there may be replaced
     */
    public TextFile(Path path, boolean replace) {
        this.path = path;
        this.replace = replace;
    }

    /**
     * Writes the text in UTF-8.
     *
     * @param text the whole content
     * @throws RecordFolder.NotWrittenException if it can't be written, or there is a file that may not be replaced
     */
    public void write(String text) throws RecordFolder.NotWrittenException {
        if (Files.exists(path) && !replace) {
            throw new RecordFolder.NotWrittenException(
                    path + " exists; name another file with --out, or replace it with --replace");
        }
        try {
            Path folder = path.toAbsolutePath().getParent();
            Path part = Parts.in(folder);
            Files.write(part, text.getBytes(StandardCharsets.UTF_8));
            Files.move(part, path, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException wrong) {
            throw new RecordFolder.NotWrittenException(
                    path + " cannot be written; name a file in a folder that can be written to with --out");
        }
    }
}
