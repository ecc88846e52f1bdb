package org.steamwitness.quantity;

/** What a pressure is counted from. */
public enum Datum {
    /** From vacuum. */
    ABSOLUTE("absolute"),
    /** From the atmosphere at the time and place of the reading. */
    GAUGE("gauge");

    private final String word;

    Datum(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return "absolute" or "gauge"
     */
    public String word() {
        return word;
    }

    /**
     * The one place in which gauge readings become absolute.
     *
     * @param atmospherePascal absolute pressure of the atmosphere at the time of the reading; without a default
     * @return what to add to a pressure of this datum to make it absolute, in pascal
     */
    public double toAbsolute(double atmospherePascal) {
        return this == GAUGE ? atmospherePascal : 0;
    }
}
