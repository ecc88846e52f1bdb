package org.steamwitness.trace;

/** What stands between two fields of a log. */
public enum Delimiter {
    /** A comma. */
    COMMA("comma", ','),
    /** A semicolon. */
    SEMICOLON("semicolon", ';'),
    /** A tabulator. */
    TAB("tab", '\t'),
    /** An upright bar. */
    BAR("bar", '|'),
    /** One space or more. */
    SPACES("spaces", ' ');

    private final String word;
    private final char mark;

    Delimiter(String word, char mark) {
        this.word = word;
        this.mark = mark;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "semicolon"
     */
    public String word() {
        return word;
    }

    /**
     * The character itself.
     *
     * @return a space stands for one or more
     */
    public char mark() {
        return mark;
    }
}
