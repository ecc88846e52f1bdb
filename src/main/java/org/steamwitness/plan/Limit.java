package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;

/**
 * A limit that a plan sets beside hold, saturation and lethality.
 *
 * @param what what it is set on
 * @param measure what its figures are stated in
 * @param scope where and when it holds
 * @param atLeast what has to be reached
 * @param atMost what may not be exceeded
 * @param anyOf ways of which one suffices, each a time at a temperature
 * @param alert where a warning starts, inside the limit
 * @param decision how it is decided, where not as the plan's other limits
 * @param source where it comes from, where not from the plan's basis
 * @param edition edition of that source
 */
public record Limit(
        LimitKind what,
        Measure measure,
        Scope scope,
        Optional<Figure> atLeast,
        Optional<Figure> atMost,
        List<Way> anyOf,
        Optional<Figure> alert,
        Optional<DecisionRule> decision,
        Optional<String> source,
        Optional<String> edition) {

    /**
     * Checks that there is a limit.
     *
     * @param what what it is set on
     * @param measure what its figures are stated in
     * @param scope where and when it holds
     * @param atLeast what has to be reached
     * @param atMost what may not be exceeded
     * @param anyOf ways of which one suffices
     * @param alert where a warning starts
     * @param decision how it is decided
     * @param source where it comes from
     * @param edition edition of that source
     * @throws IllegalArgumentException if there is none, or at-least lies above at-most
     */
    public Limit {
        if (atLeast.isEmpty() && atMost.isEmpty() && anyOf.isEmpty()) {
            throw new IllegalArgumentException("a limit needs at-least, at-most or any-of");
        }
        if (!anyOf.isEmpty() && (atLeast.isPresent() || atMost.isPresent())) {
            throw new IllegalArgumentException("any-of stands alone, without at-least and at-most");
        }
        if (atLeast.isPresent() && atMost.isPresent()) {
            if (atLeast.get().datum() != atMost.get().datum()) {
                throw new IllegalArgumentException("at-least and at-most must be counted from the same datum");
            }
            if (atLeast.get().si() > atMost.get().si()) {
                throw new IllegalArgumentException("at-least may not lie above at-most");
            }
        }
        anyOf = List.copyOf(anyOf);
    }

    /**
     * The limit in words, as the plan writes it.
     *
     * @return such as "spread, hold, reference, at most 1.5 K"
     */
    public String words() {
        StringBuilder words = new StringBuilder(what.word());
        scope.phase().ifPresent(phase -> words.append(", ").append(phase.word()));
        if (!scope.where().isEmpty()) {
            words.append(", ").append(scope.where());
        }
        atLeast.ifPresent(figure -> words.append(", at least ").append(figure.written()));
        atMost.ifPresent(figure -> words.append(", at most ").append(figure.written()));
        if (!anyOf.isEmpty()) {
            words.append(", ")
                    .append(String.join(" or ", anyOf.stream().map(Way::words).toList()));
        }
        return words.toString();
    }

    /**
     * A figure of a limit.
     *
     * @param si in the unit of its measure
     * @param datum what a pressure is counted from; absolute for all else
     * @param written as the plan writes it
     */
    public record Figure(double si, Datum datum, String written) {}

    /**
     * A way to meet a limit: a time at a temperature.
     *
     * @param time how long
     * @param temperature how hot at least
     */
    public record Way(Figure time, Figure temperature) {

        String words() {
            return time.written() + " at " + temperature.written();
        }
    }

    /**
     * Where and when a limit holds.
     *
     * @param phase in which phase; empty for the whole run
     * @param places at which places; empty if channels are named or all are meant
     * @param channels at which channels; empty if places are named or all are meant
     * @param which of the values
     * @param overSeconds over which window of time
     */
    public record Scope(
            Optional<PlannedPhase> phase,
            List<Place> places,
            List<String> channels,
            Which which,
            OptionalDouble overSeconds) {

        /**
         * Where, in words.
         *
         * @return places or channels; empty text if all are meant
         */
        public String where() {
            return places.isEmpty()
                    ? String.join(", ", channels)
                    : String.join(", ", places.stream().map(Place::word).toList());
        }
    }

    /** Which values have to keep a limit. */
    public enum Which {
        /** Each of them. */
        EACH("each"),
        /** At least one of them. */
        ANY("any"),
        /** Their mean over time. */
        MEAN("mean"),
        /** The last one. */
        END("end");

        private final String word;

        Which(String word) {
            this.word = word;
        }

        /**
         * The word used in plans and records.
         *
         * @return such as "each"
         */
        public String word() {
            return word;
        }
    }
}
