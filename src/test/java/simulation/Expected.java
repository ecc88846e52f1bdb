package simulation;

/** What the run should come to, by its truth and its plan. */
public enum Expected {
    MET("met", 0),
    NOT_MET("not met", 1),
    UNDECIDED("undecided", 2),
    NOT_EVALUATED("can't be evaluated", 3);

    private final String words;
    private final int exitCode;

    Expected(String words, int exitCode) {
        this.words = words;
        this.exitCode = exitCode;
    }

    /** As records word it. */
    public String words() {
        return words;
    }

    /** As the shell gives it. */
    public int exitCode() {
        return exitCode;
    }
}
