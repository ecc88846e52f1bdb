package org.steamwitness.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import org.steamwitness.trace.TimeForm;

/**
 * Tells day/month/year from month/day/year by all dates of a log: a number above twelve is a day; dates that follow each
 * other in one order and leap about in the other tell too. One ambiguous day alone tells nothing.
 *
 * @param form what was found; empty if the dates leave it open
 * @param evidence why, in words
 */
record DateOrder(Optional<TimeForm> form, String evidence) {

    /** A log is a few days long, read in the right order; common practice, no source. */
    private static final long LONGEST_LOG_DAYS = 4;

    static DateOrder of(List<String> dates) {
        List<Integer> first = new ArrayList<>();
        List<Integer> second = new ArrayList<>();
        List<Integer> years = new ArrayList<>();
        for (String date : dates) {
            Matcher matcher = TimeReader.DATED.matcher(date.strip());
            if (matcher.matches() && Character.isDigit(matcher.group(3).charAt(0))) {
                first.add(Integer.valueOf(matcher.group(1)));
                second.add(Integer.valueOf(matcher.group(3)));
                years.add(Integer.valueOf(matcher.group(4)));
            }
        }
        boolean firstIsDay = first.stream().anyMatch(n -> n > 12);
        boolean secondIsDay = second.stream().anyMatch(n -> n > 12);
        if (firstIsDay != secondIsDay) {
            return firstIsDay
                    ? new DateOrder(Optional.of(TimeForm.DAY_MONTH_YEAR), "a first number above 12")
                    : new DateOrder(Optional.of(TimeForm.MONTH_DAY_YEAR), "a second number above 12");
        }
        if (firstIsDay) {
            return new DateOrder(Optional.empty(), "numbers above 12 stand in both places");
        }
        return bySpan(first, second, years);
    }

    private static DateOrder bySpan(List<Integer> first, List<Integer> second, List<Integer> years) {
        boolean same = true;
        for (int i = 0; i < first.size(); i++) {
            same &= first.get(i).equals(second.get(i));
        }
        if (same) {
            return new DateOrder(Optional.of(TimeForm.DAY_MONTH_YEAR), "day and month are the same number");
        }
        boolean dayFirst = plausible(years, second, first);
        boolean monthFirst = plausible(years, first, second);
        if (dayFirst == monthFirst || first.size() < 2) {
            return new DateOrder(Optional.empty(), "every date reads both ways");
        }
        return dayFirst
                ? new DateOrder(Optional.of(TimeForm.DAY_MONTH_YEAR), "the dates follow each other only so")
                : new DateOrder(Optional.of(TimeForm.MONTH_DAY_YEAR), "the dates follow each other only so");
    }

    private static boolean plausible(List<Integer> years, List<Integer> months, List<Integer> days) {
        try {
            LocalDate start = null;
            LocalDate last = null;
            for (int i = 0; i < years.size(); i++) {
                LocalDate date = LocalDate.of(years.get(i) % 100 + 2000, months.get(i), days.get(i));
                if (last != null && date.isBefore(last)) {
                    return false;
                }
                start = start == null ? date : start;
                last = date;
            }
            return start != null && last.toEpochDay() - start.toEpochDay() <= LONGEST_LOG_DAYS;
        } catch (DateTimeException noSuchDay) {
            return false;
        }
    }
}
