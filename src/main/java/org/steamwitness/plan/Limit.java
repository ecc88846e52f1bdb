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
 * @param terms what only a few kinds of limits have
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
        Terms terms,
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
     * @param terms what only a few kinds of limits have
     * @param atLeast what has to be reached
     * @param atMost what may not be exceeded
     * @param anyOf ways of which one suffices
     * @param alert where a warning starts
     * @param decision how it is decided
     * @param source where it comes from
     * @param edition edition of that source
     * @throws IllegalArgumentException if there is none, a vent has no any-of, at-least lies above at-most, or the alert outside the limit
     */
    public Limit {
        if (what == LimitKind.VENT && anyOf.isEmpty()) {
            throw new IllegalArgumentException("a vent needs any-of: ways of a time and a temperature together");
        }
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
        alert.ifPresent(figure -> checkAlert(figure, atLeast, atMost));
        anyOf = List.copyOf(anyOf);
    }

    private static void checkAlert(Figure alert, Optional<Figure> atLeast, Optional<Figure> atMost) {
        if (atLeast.isPresent() == atMost.isPresent()) {
            throw new IllegalArgumentException("an alert needs either at-least or at-most beside it");
        }
        Figure limit = atLeast.or(() -> atMost).orElseThrow();
        if (alert.datum() != limit.datum()) {
            throw new IllegalArgumentException("alert and limit must be counted from the same datum");
        }
        if (atLeast.isPresent() ? alert.si() < limit.si() : alert.si() > limit.si()) {
            throw new IllegalArgumentException("the alert must lie inside the limit");
        }
    }

    /**
     * How criteria on this limit are named, with an ending for the side that they judge.
     *
     * @param index of the limit in its plan, from 0
     * @return such as "limit-1-spread"
     */
    public String idAt(int index) {
        return "limit-" + (index + 1) + "-" + what.word();
    }

    /**
     * The limit in words, as the plan writes it.
     *
     * @return such as "spread, hold, reference, at most 1.5 K"
     */
    public String words() {
        StringBuilder words = new StringBuilder(what.word());
        terms.name().ifPresent(name -> words.append(", ").append(name));
        scope.phase().ifPresent(phase -> words.append(", ").append(phase.word()));
        if (!scope.where().isEmpty()) {
            words.append(", ").append(scope.where());
        }
        if (scope.which() != Which.EACH) {
            words.append(", ").append(scope.which().word());
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

    /**
     * What only a few kinds of limits have.
     *
     * @param name which of the plan's lethalities is meant
     * @param fromSeconds from when after the start of the phase a probe is held against the reference
     * @param untilSeconds until when
     * @param settleSeconds how long the pressure settles before the rise of a leak test is measured
     * @param startPressure from which pressure, at most, a leak test may start
     */
    public record Terms(
            Optional<String> name,
            OptionalDouble fromSeconds,
            OptionalDouble untilSeconds,
            OptionalDouble settleSeconds,
            Optional<Figure> startPressure) {

        /**
         * Checks the window.
         *
         * @param name which of the plan's lethalities is meant
         * @param fromSeconds from when after the start of the phase
         * @param untilSeconds until when
         * @param settleSeconds how long the pressure settles
         * @param startPressure from which pressure, at most
         * @throws IllegalArgumentException if from is not before until
         */
        public Terms {
            if (!(fromSeconds.orElse(0) < untilSeconds.orElse(Double.POSITIVE_INFINITY))) {
                throw new IllegalArgumentException("from must come before until");
            }
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
