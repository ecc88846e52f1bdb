package org.steamwitness.quantity;

/** What a pressure is counted from. */
public enum Datum {
    /** From vacuum. */
    ABSOLUTE("absolute", "a"),
    /** From the atmosphere at the time and place of the reading. */
    GAUGE("gauge", "g");

    private final String word;
    private final String mark;

    Datum(String word, String mark) {
        this.word = word;
        this.mark = mark;
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
     * The letter in brackets behind the unit of a pressure.
     *
     * @return "a" or "g"
     */
    public String mark() {
        return mark;
    }

    static Datum ofMark(String mark) {
        return mark.equals(GAUGE.mark) ? GAUGE : ABSOLUTE;
    }

    /**
     * The one place in which gauge readings become absolute.
     *
     * @param atmospherePascal absolute pressure of the atmosphere at the time of the reading; without a default, and
     *     not looked at for absolute readings
     * @return what to add to a pressure of this datum to make it absolute, in pascal
     * @throws IllegalArgumentException if the reading is a gauge reading and the atmosphere is not a positive number
     */
    public double toAbsolute(double atmospherePascal) {
        if (this == ABSOLUTE) {
            return 0;
        }
        if (!(atmospherePascal > 0 && atmospherePascal < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("a gauge pressure becomes absolute only by a stated atmosphere, not by "
                    + atmospherePascal + " Pa");
        }
        return atmospherePascal;
    }
}
