package org.steamwitness.evaluate.criteria;

/** What a criterion came to. */
public enum Decision {
    /** On the right side of the limit. */
    MET("met"),
    /** On the wrong side of the limit. */
    NOT_MET("not met"),
    /** It can't be told. */
    UNDECIDED("undecided"),
    /** The plan does not ask. */
    NOT_APPLICABLE("not applicable");

    private final String word;

    Decision(String word) {
        this.word = word;
    }

    /**
     * The word used in records.
     *
     * @return such as "not met"
     */
    public String word() {
        return word;
    }
}
