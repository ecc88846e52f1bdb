package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Matcher;
import org.steamwitness.trace.TimeForm;
import org.steamwitness.trace.Told;

/** Finds the columns that tell the time and how they write it. */
final class TimeFinder {

    private static final double FEWEST_SPREADSHEET_DAYS = 20_000;
    private static final double MOST_SPREADSHEET_DAYS = 80_000;

    private final Block block;
    private final List<FoundColumn> columns;
    private final Told told;
    private final Function<Integer, List<String>> allDates;

    /**
     * Prepares the search.
     *
     * @param block rows of samples among the first lines
     * @param columns all columns
     * @param told what the plan says
     * @param allDates gives the different dates of a column over the whole log, in order
     */
    TimeFinder(Block block, List<FoundColumn> columns, Told told, Function<Integer, List<String>> allDates) {
        this.block = block;
        this.columns = columns;
        this.told = told;
        this.allDates = allDates;
    }

    /** What was found. */
    sealed interface Found {

        /** Columns and form. */
        record Known(List<Integer> columns, TimeForm form, Guess guess) implements Found {}

        /** No column tells the time. */
        record Nowhere() implements Found {}

        /** The order of day and month can't be told. */
        record OrderOpen(String why, String example) implements Found {}

        /** The meaning of the times can't be told. */
        record Open(String why) implements Found {}
    }

    Found find() {
        Optional<List<Integer>> indices = told.timeColumns().isEmpty() ? columns() : named();
        if (indices.isEmpty()) {
            return new Found.Nowhere();
        }
        if (told.timeForm().isPresent()) {
            return known(indices.get(), told.timeForm().get(), Guess.Basis.TOLD, "the plan says so");
        }
        int first = indices.get().get(0);
        if (block.mostly(first, FieldKind.DATE_AND_TIME) || block.mostly(first, FieldKind.DATE)) {
            return dated(indices.get());
        }
        return block.mostly(first, FieldKind.TIME) ? clock(indices.get()) : numeric(indices.get());
    }

    private Optional<List<Integer>> named() {
        List<Integer> indices = new ArrayList<>();
        for (String name : told.timeColumns()) {
            columns.stream().filter(c -> c.isNamed(name)).findFirst().ifPresent(c -> indices.add(c.position() - 1));
        }
        return indices.size() == told.timeColumns().size() ? Optional.of(List.copyOf(indices)) : Optional.empty();
    }

    private Optional<List<Integer>> columns() {
        int date = -1;
        int time = -1;
        for (int c = 0; c < block.width(); c++) {
            if (block.mostly(c, FieldKind.DATE_AND_TIME)) {
                return Optional.of(List.of(c));
            }
            date = date < 0 && block.mostly(c, FieldKind.DATE) ? c : date;
            time = time < 0 && block.mostly(c, FieldKind.TIME) ? c : time;
        }
        if (time >= 0) {
            return Optional.of(date >= 0 ? List.of(date, time) : List.of(time));
        }
        for (int c = 0; c < block.width(); c++) {
            if ((c == 0 || namesTime(c)) && rises(c)) {
                return Optional.of(List.of(c));
            }
        }
        return Optional.empty();
    }

    private boolean namesTime(int column) {
        String header = header(column);
        return header.contains("time") || header.contains("elapsed") || header.contains("date") || header.equals("t");
    }

    private String header(int column) {
        return columns.get(column).header().toLowerCase(Locale.ROOT);
    }

    private boolean rises(int column) {
        double last = Double.NEGATIVE_INFINITY;
        for (double value : numbers(column)) {
            if (!(value >= last)) {
                return false;
            }
            last = value;
        }
        return block.rows().size() > 1 && last > numbers(column)[0];
    }

    private double[] numbers(int column) {
        boolean comma = block.column(column).stream().anyMatch(f -> f.indexOf(',') >= 0);
        NumberText text = new NumberText(comma ? NumberForm.COMMA : NumberForm.PLAIN);
        return block.column(column).stream().mapToDouble(text::read).toArray();
    }

    private Found dated(List<Integer> indices) {
        String example = block.column(indices.get(0)).get(0);
        Matcher matcher = TimeReader.DATED.matcher(example);
        if (!matcher.matches()) {
            return new Found.Nowhere();
        }
        int next = indices.get(indices.size() - 1) + 1;
        if (next < block.width() && block.column(next).stream().allMatch(f -> f.matches("(?i)[ap]\\.?m\\.?"))) {
            return new Found.Open("AM and PM stand in a field of their own");
        }
        if (matcher.group(1).length() == 4) {
            return known(indices, TimeForm.YEAR_MONTH_DAY, Guess.Basis.FOUND, "the year comes first");
        }
        if (Character.isLetter(matcher.group(3).charAt(0))) {
            return known(indices, TimeForm.DAY_MONTH_YEAR, Guess.Basis.FOUND, "the month is written in letters");
        }
        DateOrder order = DateOrder.of(allDates.apply(indices.get(0)));
        if (order.form().isPresent()) {
            return known(indices, order.form().get(), Guess.Basis.FOUND, order.evidence());
        }
        if (matcher.group(2).equals(".")) {
            return known(
                    indices,
                    TimeForm.DAY_MONTH_YEAR,
                    Guess.Basis.ASSUMED,
                    "full stops stand between the numbers; " + order.evidence());
        }
        return new Found.OrderOpen(order.evidence(), example);
    }

    private Found clock(List<Integer> indices) {
        int column = indices.get(0);
        String first = block.column(column).get(0);
        Matcher matcher = TimeReader.OF_DAY.matcher(first);
        String header = header(column);
        boolean says = header.contains("elapsed") || header.contains("duration") || header.contains("since");
        boolean beyondDay = block.column(column).stream().anyMatch(f -> f.matches("(2[4-9]|[3-9][0-9]|[0-9]{3,}):.*"));
        boolean fromZero = matcher.matches() && first.matches("0{1,4}:0{2}(:[0-5][0-9].*)?");
        if (!(says || beyondDay || fromZero)) {
            return known(indices, TimeForm.TIME_OF_DAY, Guess.Basis.FOUND, "times of day without a date");
        }
        boolean twoParts = matcher.matches() && matcher.group(3) == null;
        if (twoParts && !header.contains("mm:ss") && !header.contains("min")) {
            return new Found.Open("\"" + first + "\" may be hours and minutes or minutes and seconds");
        }
        return known(
                indices,
                TimeForm.ELAPSED,
                Guess.Basis.FOUND,
                says ? "the header says so" : beyondDay ? "more than 24 hours" : "the times start at zero");
    }

    private Found numeric(List<Integer> indices) {
        int column = indices.get(0);
        double[] numbers = numbers(column);
        double first = numbers[0];
        double last = numbers[numbers.length - 1];
        String header = header(column);
        if (first > 5e11 && last < 5e12) {
            return known(indices, TimeForm.EPOCH_MILLISECONDS, Guess.Basis.FOUND, "milliseconds since 1970 by size");
        }
        if (first > 5e8 && last < 5e9) {
            return known(indices, TimeForm.EPOCH_SECONDS, Guess.Basis.FOUND, "seconds since 1970 by size");
        }
        if (first > FEWEST_SPREADSHEET_DAYS && last < MOST_SPREADSHEET_DAYS && last - first < 30 && fractions(column)) {
            return known(indices, TimeForm.SPREADSHEET_DAYS, Guess.Basis.FOUND, "days of a spreadsheet by size");
        }
        if (header.matches(".*\\b(s|sec|secs|seconds)\\b.*")) {
            return known(indices, TimeForm.ELAPSED_SECONDS, Guess.Basis.FOUND, "the header says so");
        }
        if (header.matches(".*\\b(min|mins|minutes)\\b.*")) {
            return known(indices, TimeForm.ELAPSED_MINUTES, Guess.Basis.FOUND, "the header says so");
        }
        return namesTime(column)
                ? new Found.Open("the numbers of \"" + columns.get(column).header() + "\" may be seconds or minutes")
                : new Found.Nowhere();
    }

    private boolean fractions(int column) {
        return block.column(column).stream().anyMatch(f -> f.indexOf('.') >= 0 || f.indexOf(',') >= 0);
    }

    private static Found known(List<Integer> indices, TimeForm form, Guess.Basis basis, String evidence) {
        return new Found.Known(List.copyOf(indices), form, new Guess("time", form.word(), basis, evidence));
    }
}
