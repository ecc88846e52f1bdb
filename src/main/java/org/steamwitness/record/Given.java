package org.steamwitness.record;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.steamwitness.quantity.Printed;

/**
 * A value of the record, or the reason why it is withheld.
 *
 * @param <T> type of the value
 * @param value the value, if it can be given
 * @param withheld why it can't, in words; empty if it can
 * @param missing what would be needed to give it, as "plan: key" or "run sheet: key"
 */
public record Given<T>(Optional<T> value, String withheld, List<String> missing) {

    /**
     * Takes a copy of the list.
     *
     * @param value the value, if it can be given
     * @param withheld why it can't, in words; empty if it can
     * @param missing what would be needed to give it
     */
    public Given {
        missing = List.copyOf(missing);
    }

    /**
     * A value that can be given.
     *
     * @param <T> its type
     * @param value the value
     * @return it, given
     */
    public static <T> Given<T> of(T value) {
        return new Given<>(Optional.of(value), "", List.of());
    }

    /**
     * A number that can be given, with twelve significant digits.
     *
     * @param value finite
     * @return it, given
     */
    public static Given<Double> ofNumber(double value) {
        return of(Printed.twelveDigits(value));
    }

    /**
     * A value that can't be given.
     *
     * @param <T> its type
     * @param reason why, in words
     * @param missing what would be needed
     * @return the reason in its place
     */
    public static <T> Given<T> withheld(String reason, String... missing) {
        return new Given<>(Optional.empty(), reason, List.of(missing));
    }

    /**
     * A value that may have been entered by hand.
     *
     * @param <T> its type
     * @param entered what was entered
     * @param key its key in the run sheet
     * @return it, or "not entered"
     */
    static <T> Given<T> entered(Optional<T> entered, String key) {
        return entered.map(Given::of).orElseGet(() -> withheld("not entered", "run sheet: " + key));
    }

    /**
     * A number that may be missing.
     *
     * @param number the number
     * @param reason why it may be missing
     * @return it, or the reason
     */
    static Given<Double> numberOr(OptionalDouble number, String reason) {
        return number.isPresent() ? ofNumber(number.getAsDouble()) : withheld(reason);
    }

    /**
     * What to print for it.
     *
     * @param printer prints the value
     * @return the printed value, or the reason for withholding it
     */
    public String printed(Function<T, String> printer) {
        return value.map(printer).orElse(withheld);
    }
}
