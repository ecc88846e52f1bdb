package simulation.logger;

/**
 * Something that befell a row of the log on its way to the file.
 *
 * @param row the row, counted from zero
 * @param kind what
 */
public record Oddity(int row, Kind kind) {

    /** What can befall a row. */
    public enum Kind {
        /** It is not there. */
        DROPPED,
        /** It is there twice. */
        DOUBLED,
        /** The header stands before it once more, as on a new page. */
        HEADER_AGAIN,
        /** It ends in a spare delimiter. */
        TRAILING,
        /** Its last cell holds letters. */
        GARBLED;

        String change(String line, String header, String lineEnd) {
            return switch (this) {
                case DROPPED -> "";
                case DOUBLED -> line + lineEnd + line;
                case HEADER_AGAIN -> header + lineEnd + line;
                case TRAILING -> line + (header.contains(";") ? ";" : ",");
                case GARBLED -> line.substring(0, line.length() - 1) + "O#";
            };
        }
    }
}
