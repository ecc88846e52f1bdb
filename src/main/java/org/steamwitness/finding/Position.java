package org.steamwitness.finding;

/**
 * Where something stands: in a file, at a line and column as an editor counts them, under a key path or column header.
 *
 * @param file base name of the file, or empty
 * @param line 1 or more, or 0 if no line can be named
 * @param column 1 or more, or 0 if no column can be named
 * @param path key path or column header, or empty
 */
public record Position(String file, int line, int column, String path) {

    /** Concerns the run as a whole. */
    public static final Position RUN = new Position("", 0, 0, "");

    /**
     * A file as a whole.
     *
     * @param file its base name
     * @return its position
     */
    public static Position ofFile(String file) {
        return new Position(file, 0, 0, "");
    }

    /**
     * A line of a file.
     *
     * @param file its base name
     * @param line 1 or more
     * @return its position
     */
    public static Position ofLine(String file, int line) {
        return new Position(file, line, 0, "");
    }

    /**
     * Tells whether this is a place in a file.
     *
     * @return false for {@link #RUN}
     */
    public boolean inFile() {
        return !file.isEmpty();
    }

    /**
     * The position as messages begin.
     *
     * @return {@code file:line:column: path}, with the parts that are known; empty for the whole run
     */
    public String text() {
        StringBuilder text = new StringBuilder(file);
        if (line > 0) {
            text.append(':').append(line);
        }
        if (column > 0) {
            text.append(':').append(column);
        }
        if (!path.isEmpty()) {
            text.append(text.isEmpty() ? "" : ": ").append(path);
        }
        return text.toString();
    }
}
