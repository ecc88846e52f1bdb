package org.steamwitness.run;

import java.io.IOException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import org.steamwitness.record.RecordJson;

/**
 * Where records are written. A record is rewritten without asking only if it was made from the same files; both files
 * are written whole under temporary names before either takes its own.
 */
public final class RecordFolder {

    private final Path folder;
    private final boolean replace;

    /**
     * Names the folder.
     *
     * @param folder is made if it does not exist
     * @param replace whether records made from other files may be replaced
     */
    public RecordFolder(Path folder, boolean replace) {
        this.folder = folder;
        this.replace = replace;
    }

    /**
     * Writes JSON and PDF of a record.
     *
     * @param name the record's name, without an ending
     * @param evaluated the record
     * @return where both lie
     * @throws NotWrittenException if they can't be written or may not be replaced
     */
    public Written write(String name, Outcome.Evaluated evaluated) throws NotWrittenException {
        Path json = folder.resolve(name + ".record.json");
        Path pdf = folder.resolve(name + ".record.pdf");
        try {
            Files.createDirectories(folder);
            if (Files.exists(json) && !replace && !sameFiles(json, evaluated)) {
                throw new NotWrittenException(
                        json + " is the record of other files; write to another folder with --out,"
                                + " or replace it with --replace");
            }
            Path newJson = temporary(RecordJson.write(evaluated.record()));
            Path newPdf = temporary(evaluated.pdf().print(OffsetDateTime.now(ZoneId.systemDefault())));
            Files.move(newPdf, pdf, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
            Files.move(newJson, json, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException wrong) {
            throw new NotWrittenException("the record cannot be written to the folder " + folder + reason(wrong)
                    + "; name a folder that can be written to with --out");
        }
        return new Written(pdf, json);
    }

    private static String reason(IOException wrong) {
        return wrong instanceof FileSystemException file && file.getReason() != null
                ? " (" + file.getReason() + ")"
                : "";
    }

    private boolean sameFiles(Path json, Outcome.Evaluated evaluated) throws IOException {
        return RecordJson.provenanceIn(Files.readAllBytes(json))
                .filter(p -> p.sameFilesAs(evaluated.record().provenance()))
                .isPresent();
    }

    private Path temporary(byte[] bytes) throws IOException {
        Path file = Parts.in(folder);
        return Files.write(file, bytes);
    }

    /**
     * Where a record lies.
     *
     * @param pdf the printed record
     * @param json its data
     */
    public record Written(Path pdf, Path json) {}

    /** A record can't be written; the message says why and what to do. */
    public static final class NotWrittenException extends Exception {

        private static final long serialVersionUID = 1L;

        NotWrittenException(String message) {
            super(message);
        }
    }
}
