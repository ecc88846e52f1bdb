package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.trace.Place;

/** Understands one entry of {@code limits}. What a limit is set on says what its figures are stated in. */
final class LimitReader {

    private LimitReader() {}

    static Limit limit(Section at) {
        Entry<LimitKind> what = at.need("what").word(LimitKind.class, LimitKind::word);
        Entry<Limit.Scope> scope = scope(at, what);
        Optional<Measure> measure = measure(at, what);
        Entry<Limit.Figure> atLeast = figure(at.may("at-least"), measure);
        Entry<Limit.Figure> atMost = figure(at.may("at-most"), measure);
        Entry<List<Limit.Way>> anyOf = ways(at, what);
        Entry<Limit.Figure> alert = figure(at.may("alert"), measure);
        Entry<Limit.Terms> terms = terms(at, what);
        Entry<DecisionRule> decision = at.may("decision").section(DecisionReader::decision);
        Entry<String> source = at.may("source").text();
        Entry<String> edition = at.may("edition").text();
        LimitKind kind = what.get();
        return new Limit(
                kind,
                measure.orElseGet(kind::usual),
                scope.get(),
                terms.get(),
                atLeast.optional(),
                atMost.optional(),
                anyOf.or(List.of()),
                alert.optional(),
                decision.optional(),
                source.optional(),
                edition.optional());
    }

    private static Entry<Limit.Scope> scope(Section at, Entry<LimitKind> what) {
        Entry<PlannedPhase> phase = at.may("phase").word(PlannedPhase.class, PlannedPhase::word);
        Entry<List<Place>> places = at.may("places").list(slot -> slot.word(Place.class, Place::word));
        Entry<List<String>> channels = at.may("channels").list(Slot::text);
        Entry<Limit.Which> which = at.may("which").word(Limit.Which.class, Limit.Which::word);
        Entry<Double> over = at.may("over").parsed("a duration such as 30 s", QuantityText::seconds);
        if (at.has("places") && at.has("channels")) {
            return at.may("channels").refused("places are named too; expected one of both");
        }
        boolean windowed = what.kept().map(LimitKind::overTime).orElse(true);
        if (at.has("over") && !windowed) {
            return at.may("over").refused("this limit has no window of time");
        }
        Set<Measure> rates = Set.of(Measure.TEMPERATURE_RATE, Measure.PRESSURE_RATE);
        if (!at.has("over")
                && what.kept().filter(k -> rates.containsAll(k.measures())).isPresent()) {
            at.refuse("over", "required key is missing: a rate needs its window, such as 30 s");
            return Entry.broken();
        }
        if (Stream.of(phase, places, channels, which, over).anyMatch(Entry::isBroken)) {
            return Entry.broken();
        }
        return Entry.of(new Limit.Scope(
                phase.optional(),
                places.or(List.of()),
                channels.or(List.of()),
                which.or(Limit.Which.EACH),
                ChamberReader.number(over)));
    }

    /** What only a few kinds have; a kind that has it not knows no such key. */
    private static Entry<Limit.Terms> terms(Section at, Entry<LimitKind> what) {
        Optional<LimitKind> kind = what.kept();
        Entry<String> name = kind.filter(k -> !k.named()).isPresent()
                ? Entry.absent()
                : at.may("name").text();
        boolean windowed =
                kind.filter(k -> k != LimitKind.PROBE_AGAINST_REFERENCE).isEmpty();
        Entry<Double> from = windowed ? duration(at.may("from")) : Entry.absent();
        Entry<Double> until = windowed ? duration(at.may("until")) : Entry.absent();
        boolean leak = kind.filter(k -> k != LimitKind.AIR_LEAKAGE).isEmpty();
        Entry<Double> settle = leak ? duration(at.may("settle")) : Entry.absent();
        Entry<Limit.Figure> start = leak
                ? at.may("start-pressure").parsed(Measure.PRESSURE.expected(), Measure.PRESSURE::figure)
                : Entry.absent();
        if (Stream.of(name, from, until, settle, start).anyMatch(Entry::isBroken)) {
            return Entry.broken();
        }
        return Entry.of(new Limit.Terms(
                name.optional(),
                ChamberReader.number(from),
                ChamberReader.number(until),
                ChamberReader.number(settle),
                start.optional()));
    }

    private static Entry<Double> duration(Slot slot) {
        return slot.parsed("a duration such as 60 s", QuantityText::seconds);
    }

    /** Where two measures are possible, the one that the first figure can be read in. */
    private static Optional<Measure> measure(Section at, Entry<LimitKind> what) {
        if (what.kept().isEmpty()) {
            return Optional.empty();
        }
        Set<Measure> possible = what.kept().get().measures();
        Slot first = at.has("at-least") ? at.may("at-least") : at.may("at-most");
        return possible.stream()
                .filter(first::reads)
                .findFirst()
                .or(() -> what.kept().map(LimitKind::usual));
    }

    private static Entry<Limit.Figure> figure(Slot slot, Optional<Measure> measure) {
        return measure.isEmpty() ? Entry.absent() : slot.parsed(measure.get().expected(), measure.get()::figure);
    }

    private static Entry<List<Limit.Way>> ways(Section at, Entry<LimitKind> what) {
        Slot slot = at.may("any-of");
        if (!slot.isEmpty() && what.kept().filter(k -> k != LimitKind.VENT).isPresent()) {
            return slot.refused("only the vent has ways of which any suffices");
        }
        return slot.list(each -> each.section(LimitReader::way));
    }

    private static Limit.Way way(Section at) {
        Entry<Limit.Figure> time = at.need("time").parsed(Measure.DURATION.expected(), Measure.DURATION::figure);
        Entry<Limit.Figure> temperature =
                at.need("temperature").parsed(Measure.TEMPERATURE.expected(), Measure.TEMPERATURE::figure);
        return new Limit.Way(time.get(), temperature.get());
    }
}
