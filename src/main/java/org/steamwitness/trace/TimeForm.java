package org.steamwitness.trace;

/** How a log writes its times. */
public enum TimeForm {
    /** Year, month, day, then the time of day: ISO 8601 and its kin. */
    YEAR_MONTH_DAY("year-month-day"),
    /** Day, month, year, then the time of day. */
    DAY_MONTH_YEAR("day-month-year"),
    /** Month, day, year, then the time of day. */
    MONTH_DAY_YEAR("month-day-year"),
    /** The time of day alone. */
    TIME_OF_DAY("time-of-day"),
    /** Hours, minutes and seconds since the start. */
    ELAPSED("elapsed"),
    /** Seconds since the start. */
    ELAPSED_SECONDS("elapsed-seconds"),
    /** Minutes since the start. */
    ELAPSED_MINUTES("elapsed-minutes"),
    /** Days since 1899-12-30, as spreadsheets count them. */
    SPREADSHEET_DAYS("spreadsheet-days"),
    /** Seconds since 1970-01-01 UTC. */
    EPOCH_SECONDS("epoch-seconds"),
    /** Milliseconds since 1970-01-01 UTC. */
    EPOCH_MILLISECONDS("epoch-milliseconds");

    private final String word;

    TimeForm(String word) {
        this.word = word;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "day-month-year"
     */
    public String word() {
        return word;
    }

    /**
     * Tells whether times hold a calendar date.
     *
     * @return false for the time of day alone and for elapsed time
     */
    public boolean dated() {
        return this != TIME_OF_DAY && !elapsed();
    }

    /**
     * Tells whether times count from the start of the log.
     *
     * @return true for elapsed time
     */
    public boolean elapsed() {
        return this == ELAPSED || this == ELAPSED_SECONDS || this == ELAPSED_MINUTES;
    }

    /**
     * Tells whether times are plain numbers.
     *
     * @return true for spreadsheet days, epochs, and elapsed seconds or minutes
     */
    public boolean numeric() {
        return this == ELAPSED_SECONDS
                || this == ELAPSED_MINUTES
                || this == SPREADSHEET_DAYS
                || this == EPOCH_SECONDS
                || this == EPOCH_MILLISECONDS;
    }
}
