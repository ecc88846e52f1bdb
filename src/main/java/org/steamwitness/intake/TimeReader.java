package org.steamwitness.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.steamwitness.trace.TimeForm;

/**
 * Reads the times of one log, all written in one form. The date is parsed when its text changes, the time of day digit
 * by digit. Remembers whether times tell their distance from UTC: all of a log do or none.
 */
final class TimeReader {

    /** Stands for a text that is no time. */
    static final long REFUSED = Long.MIN_VALUE;

    static final Pattern DATED = Pattern.compile(
            "([0-9]{1,4})([-/. ])([0-9]{1,2}|\\p{Alpha}{3})\\2([0-9]{1,4})(?:[T_]|,? +)?(.*)", Pattern.DOTALL);
    static final Pattern OF_DAY = Pattern.compile("([0-9]{1,4}):([0-9]{2})(?::([0-9]{2})(?:[.,]([0-9]{1,9}))?)?"
            + " ?([AaPp]\\.?[Mm]\\.?)? ?(Z|[+-][0-9]{2}:?(?:[0-9]{2})?)?");
    private static final List<String> MONTHS =
            List.of("jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec");

    private static final long SECOND = 1_000_000_000L;
    private static final long DAY = 86_400 * SECOND;
    private static final double DAYS_TO_MILLISECONDS = 86_400e3;
    private static final long SPREADSHEET_EPOCH_DAY = -25_569;

    private final TimeForm form;
    private final NumberText numbers;
    private String dateText = "";
    private long dateNanos;
    private boolean anyRead;
    private boolean withOffset;
    private int offsetSeconds;
    private int lastOffsetSeconds;

    TimeReader(TimeForm form, NumberForm numbers) {
        this.form = form;
        this.numbers = new NumberText(numbers);
    }

    /** Nanoseconds since 1970-01-01 by the log's clock, or by UTC where the log tells the distance from it. */
    long nanos(String text) {
        if (form.numeric()) {
            return numeric(numbers.read(text));
        }
        if (form == TimeForm.TIME_OF_DAY || form == TimeForm.ELAPSED) {
            return accepted(ofDay(text.strip(), form == TimeForm.ELAPSED));
        }
        int cached = dateText.length();
        if (cached > 0 && text.length() > cached && text.startsWith(dateText)) {
            return accepted(plus(ofDay(text.substring(cached), false)));
        }
        Matcher dated = DATED.matcher(text.strip());
        if (!dated.matches() || !date(dated)) {
            return REFUSED;
        }
        int start = dated.start(5);
        dateText = text.strip().length() == text.length() ? text.substring(0, start) : "";
        return accepted(plus(ofDay(dated.group(5), false)));
    }

    /** The same for date and time in columns of their own. */
    long nanos(String date, String time) {
        if (!date.equals(dateText)) {
            Matcher dated = DATED.matcher(date.strip());
            if (!dated.matches() || !date(dated) || !midnightOrNothing(dated.group(5))) {
                return REFUSED;
            }
            dateText = date;
        }
        return accepted(plus(ofDay(time.strip(), false)));
    }

    /** Whether the times tell their distance from UTC. */
    boolean withOffset() {
        return withOffset;
    }

    /** Distance of the log's clock from UTC at the first time, in seconds. */
    int offsetSeconds() {
        return offsetSeconds;
    }

    private static boolean midnightOrNothing(String rest) {
        return rest.isBlank() || rest.matches("0{1,2}:00(:00)?");
    }

    private long plus(long ofDay) {
        return ofDay == REFUSED ? REFUSED : dateNanos + ofDay;
    }

    private long accepted(long nanos) {
        if (nanos == REFUSED) {
            return REFUSED;
        }
        boolean hasOffset = lastOffsetSeconds != Integer.MIN_VALUE;
        if (!anyRead) {
            anyRead = true;
            withOffset = hasOffset;
            offsetSeconds = hasOffset ? lastOffsetSeconds : 0;
        } else if (hasOffset != withOffset) {
            return REFUSED;
        }
        return hasOffset ? nanos - lastOffsetSeconds * SECOND : nanos;
    }

    private boolean date(Matcher dated) {
        try {
            int first = Integer.parseInt(dated.group(1));
            int last = Integer.parseInt(dated.group(4));
            String middle = dated.group(3);
            boolean named = Character.isLetter(middle.charAt(0));
            int second = named ? MONTHS.indexOf(middle.toLowerCase(Locale.ROOT)) + 1 : Integer.parseInt(middle);
            LocalDate date = switch (form) {
                case YEAR_MONTH_DAY -> dated.group(1).length() == 4 ? LocalDate.of(first, second, last) : null;
                case MONTH_DAY_YEAR -> named ? null : LocalDate.of(year(dated.group(4), last), first, second);
                default -> LocalDate.of(year(dated.group(4), last), second, first);
            };
            if (date == null) {
                return false;
            }
            dateNanos = date.toEpochDay() * DAY;
            return date.getYear() > 1900 && date.getYear() < 2200;
        } catch (DateTimeException noSuchDay) {
            return false;
        }
    }

    private static int year(String text, int value) {
        return text.length() == 4 ? value : text.length() == 2 ? 2000 + value : 0;
    }

    private long ofDay(String text, boolean elapsed) {
        lastOffsetSeconds = Integer.MIN_VALUE;
        if (!elapsed && text.length() == 8 && text.charAt(2) == ':' && text.charAt(5) == ':') {
            int hour = two(text, 0);
            int minute = two(text, 3);
            int second = two(text, 6);
            if (hour >= 0 && hour < 24 && minute >= 0 && minute < 60 && second >= 0 && second < 60) {
                return (hour * 3600L + minute * 60L + second) * SECOND;
            }
        }
        Matcher clock = OF_DAY.matcher(text);
        return clock.matches() ? ofDay(clock, elapsed) : REFUSED;
    }

    private static int two(String text, int at) {
        int tens = text.charAt(at) - '0';
        int ones = text.charAt(at + 1) - '0';
        return tens < 0 || tens > 9 || ones < 0 || ones > 9 ? -1 : tens * 10 + ones;
    }

    private long ofDay(Matcher clock, boolean elapsed) {
        long hour = Integer.parseInt(clock.group(1));
        long minute = Integer.parseInt(clock.group(2));
        long second = clock.group(3) == null ? 0 : Integer.parseInt(clock.group(3));
        if (elapsed && clock.group(3) == null) {
            second = minute;
            minute = hour;
            hour = 0;
        }
        if (clock.group(5) != null) {
            boolean afternoon = Character.toLowerCase(clock.group(5).charAt(0)) == 'p';
            if (hour < 1 || hour > 12) {
                return REFUSED;
            }
            hour = hour % 12 + (afternoon ? 12 : 0);
        }
        boolean inDay = elapsed || hour < 24;
        if (!inDay || (minute > 59 && !(elapsed && hour == 0)) || second > 59) {
            return REFUSED;
        }
        long nanos = clock.group(4) == null ? 0 : Long.parseLong((clock.group(4) + "00000000").substring(0, 9));
        offset(clock.group(6));
        return (hour * 3600 + minute * 60 + second) * SECOND + nanos;
    }

    private void offset(String text) {
        if (text == null) {
            return;
        }
        if (text.equals("Z")) {
            lastOffsetSeconds = 0;
            return;
        }
        String digits = text.substring(1).replace(":", "");
        int seconds = two(digits, 0) * 3600 + (digits.length() > 2 ? two(digits, 2) * 60 : 0);
        lastOffsetSeconds = text.charAt(0) == '-' ? -seconds : seconds;
    }

    private long numeric(double value) {
        lastOffsetSeconds = Integer.MIN_VALUE;
        if (!(Math.abs(value) < 1e14)) {
            return REFUSED;
        }
        return switch (form) {
            case ELAPSED_SECONDS -> bounded(value, SECOND);
            case ELAPSED_MINUTES -> bounded(value, 60 * SECOND);
            case EPOCH_SECONDS -> bounded(value, SECOND);
            case EPOCH_MILLISECONDS -> bounded(value, SECOND / 1000);
            default -> spreadsheet(value);
        };
    }

    private static long bounded(double value, long unit) {
        double nanos = value * unit;
        return Math.abs(nanos) < 9e18 ? StrictMath.round(nanos) : REFUSED;
    }

    /** To the millisecond: the fraction of a day has no more digits than that. */
    private static long spreadsheet(double days) {
        if (!(days > 0 && days < 100_000)) {
            return REFUSED;
        }
        return SPREADSHEET_EPOCH_DAY * DAY + StrictMath.round(days * DAYS_TO_MILLISECONDS) * 1_000_000;
    }
}
