package org.steamwitness.run;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/**
 * The three files of a run. Plan and run sheet lie beside the log under its name, {@code NAME.plan.yaml} and
 * {@code NAME.run.yaml}, unless others are named.
 */
public final class RunFiles {

    private final Path log;
    private final Path plan;
    private final Path sheet;

    /**
     * Names the files of a run.
     *
     * @param log the logger file
     * @param plan the plan, if it does not lie beside the log
     * @param sheet the run sheet, if it does not lie beside the log
     */
    public RunFiles(Path log, Optional<Path> plan, Optional<Path> sheet) {
        this.log = log;
        this.plan = plan.orElseGet(() -> beside(log, ".plan.yaml"));
        this.sheet = sheet.orElseGet(() -> beside(log, ".run.yaml"));
    }

    /**
     * The log's name without its ending, by which its record is named.
     *
     * @return such as "R2-0314"
     */
    public String name() {
        return nameOf(log);
    }

    /**
     * Where the plan lies or would lie.
     *
     * @return its path
     */
    public Path planPath() {
        return plan;
    }

    /**
     * Where the run sheet lies or would lie.
     *
     * @return its path
     */
    public Path sheetPath() {
        return sheet;
    }

    /**
     * Reads the log.
     *
     * @return its bytes
     * @throws MissingFileException if it can't be read
     */
    public NamedBytes log() throws MissingFileException {
        return read(log, "the log", "name a file that exists");
    }

    /**
     * Reads the plan.
     *
     * @return its bytes
     * @throws MissingFileException if it can't be read
     */
    public NamedBytes plan() throws MissingFileException {
        return read(plan, "the plan", "put it there or name another with --plan");
    }

    /**
     * Reads the run sheet.
     *
     * @return its bytes
     * @throws MissingFileException if it can't be read
     */
    public NamedBytes sheet() throws MissingFileException {
        return read(sheet, "the run sheet", "put it there or name another with --run");
    }

    private static Path beside(Path log, String ending) {
        return log.resolveSibling(nameOf(log) + ending);
    }

    private static String nameOf(Path log) {
        String file = String.valueOf(log.getFileName());
        int dot = file.lastIndexOf('.');
        return dot > 0 ? file.substring(0, dot) : file;
    }

    /**
     * Reads any file.
     *
     * @param path where it lies
     * @param role what it is, for messages
     * @param remedy what to do if it is not there, for messages
     * @return its bytes
     * @throws MissingFileException if it can't be read
     */
    public static NamedBytes read(Path path, String role, String remedy) throws MissingFileException {
        if (!Files.exists(path)) {
            throw new MissingFileException(role + " " + path + " does not exist; " + remedy);
        }
        if (Files.isDirectory(path)) {
            throw new MissingFileException(role + " " + path + " is a folder; " + remedy);
        }
        try {
            return new NamedBytes(String.valueOf(path.getFileName()), Files.readAllBytes(path));
        } catch (IOException unreadable) {
            throw new MissingFileException(role + " " + path + " cannot be read; check the rights to it, or " + remedy);
        }
    }

    /** A file of the run is not there or can't be read; the message says which and what to do. */
    public static final class MissingFileException extends Exception {

        private static final long serialVersionUID = 1L;

        MissingFileException(String message) {
            super(message);
        }
    }
}
