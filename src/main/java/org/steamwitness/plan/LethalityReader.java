package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.trace.Place;

/** Understands the keys of a lethality that a plan asks for. */
final class LethalityReader {

    private LethalityReader() {}

    static LethalityAim aim(Section at) {
        Entry<String> name = at.need("name").text();
        Entry<Double> reference =
                at.need("reference").parsed("a temperature such as 121.11 degC", QuantityText::kelvin);
        Entry<Double> z = at.need("z").parsed("a temperature difference such as 10 K", QuantityText::kelvinDifference);
        Entry<OptionalDouble> floor = at.need("floor")
                .parsed(
                        "a temperature such as 100 degC, or none",
                        text -> text.equals("none")
                                ? OptionalDouble.empty()
                                : OptionalDouble.of(QuantityText.kelvin(text)));
        Entry<LethalityUnit> unit = at.may("unit").word(LethalityUnit.class, LethalityUnit::symbol);
        Entry<Double> minimum = at.may("minimum").parsed("a duration such as 6.0 min", QuantityText::seconds);
        Entry<Double> maximum = at.may("maximum").parsed("a duration such as 90 min", QuantityText::seconds);
        Entry<ProbeChoice> channels = probes(at.need("channels"));
        Entry<Boolean> cooling = at.need("cooling").parsed("counted or not-counted", LethalityReader::counted);
        Entry<DecimalReduction> reduction = at.may("decimal-reduction").section(LethalityReader::decimalReduction);
        return new LethalityAim(
                name.get(),
                reference.get(),
                z.get(),
                floor.get(),
                unit.or(LethalityUnit.MINUTE),
                new LethalityAim.Limits(limit(minimum), limit(maximum)),
                channels.get(),
                cooling.get(),
                reduction.optional());
    }

    private static OptionalDouble limit(Entry<Double> entry) {
        return entry.optional().map(OptionalDouble::of).orElseGet(OptionalDouble::empty);
    }

    private static Entry<ProbeChoice> probes(Slot slot) {
        if (slot.isList()) {
            Entry<List<String>> names = slot.list(Slot::text);
            return names.kept()
                    .map(n -> Entry.of(new ProbeChoice(Optional.empty(), n)))
                    .orElseGet(Entry::broken);
        }
        return slot.parsed("product, load, or a list of channels", LethalityReader::place);
    }

    private static ProbeChoice place(String text) {
        for (Place place : List.of(Place.PRODUCT, Place.LOAD)) {
            if (place.word().equals(text)) {
                return new ProbeChoice(Optional.of(place), List.of());
            }
        }
        throw new IllegalArgumentException("\"" + text + "\" is not one of: product, load; or list channels");
    }

    private static DecimalReduction decimalReduction(Section at) {
        Entry<String> of = at.need("of").text();
        Entry<Double> time = at.need("time").parsed("a duration such as 0.25 min", QuantityText::seconds);
        Entry<String> source = at.need("source").text();
        return new DecimalReduction(of.get(), time.get(), source.get());
    }

    private static boolean counted(String text) {
        return switch (text) {
            case "counted" -> true;
            case "not-counted" -> false;
            default -> throw new IllegalArgumentException("\"" + text + "\" is not one of: counted, not-counted");
        };
    }
}
