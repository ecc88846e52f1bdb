package org.steamwitness.quantity;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * How one kind of quantity is written: a number, a space, one of its units, and for pressures the datum in brackets.
 * Every refusal says what was written, what was expected with an example, and the units that are known.
 *
 * @param expected the kind with an example, such as "a duration such as 15 min"
 * @param scales its units, in the order in which messages name them
 */
record Wording(String expected, List<Scale> scales) {

    /** The number gives nothing back once read, so that 121/min is never taken for 12 of 1/min. */
    private static final Pattern SHAPE = Pattern.compile("(?<number>[+-]?[0-9]{1,15}+(?:\\.[0-9]{1,15}+)?+) ?"
            + "(?<unit>(?:1/)?[A-Za-z%][A-Za-z0-9/]*(?:/\\([A-Za-z ]+\\))?)(?:\\((?<datum>[ag])\\))?");

    /**
     * A text taken apart.
     *
     * @param number the number in its unit
     * @param unit the unit as written, known or not
     * @param datum the datum in brackets, if there is one
     */
    record Written(double number, String unit, Optional<Datum> datum) {}

    Written apart(String text) {
        Matcher shape = SHAPE.matcher(text);
        if (!shape.matches()) {
            throw notExpected(text);
        }
        return new Written(
                Double.parseDouble(shape.group("number")),
                shape.group("unit"),
                Optional.ofNullable(shape.group("datum")).map(Datum::ofMark));
    }

    double toSi(String text, Written written) {
        return scale(written.unit())
                .orElseThrow(() -> refusal(text, ": unknown unit " + written.unit()))
                .toSi()
                .applyAsDouble(written.number());
    }

    Optional<Scale> scale(String symbol) {
        return scales.stream().filter(scale -> scale.symbol().equals(symbol)).findFirst();
    }

    /** Any number, below zero too. */
    double read(String text) {
        Written written = apart(text);
        if (written.datum().isPresent()) {
            throw notExpected(text);
        }
        return toSi(text, written);
    }

    double readPositive(String text) {
        double value = read(text);
        if (value <= 0) {
            throw refusal(text, " is not above zero");
        }
        return value;
    }

    double readZeroOrMore(String text) {
        double value = read(text);
        if (value < 0) {
            throw refusal(text, " is below zero");
        }
        return value;
    }

    QuantityException notExpected(String text) {
        return new QuantityException("\"" + text + "\" is not " + expected + "; " + knownUnits());
    }

    QuantityException refusal(String text, String why) {
        return new QuantityException("\"" + text + "\"" + why + "; expected " + expected + "; " + knownUnits());
    }

    private String knownUnits() {
        return "known units: " + scales.stream().map(Scale::symbol).collect(Collectors.joining(", "));
    }
}
