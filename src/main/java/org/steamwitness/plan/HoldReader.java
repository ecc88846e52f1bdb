package org.steamwitness.plan;

import java.util.List;
import org.steamwitness.quantity.QuantityText;

/** Understands {@code hold}. */
final class HoldReader {

    private HoldReader() {}

    /** One step, or a list of them. */
    static Entry<List<HoldStep>> steps(Slot slot) {
        if (slot.isList()) {
            return slot.list(each -> each.section(HoldReader::step));
        }
        Entry<HoldStep> only = slot.section(HoldReader::step);
        if (slot.isEmpty()) {
            return Entry.absent();
        }
        return only.kept().map(step -> Entry.of(List.of(step))).orElseGet(Entry::broken);
    }

    private static HoldStep step(Section at) {
        Entry<Boolean> fails = at.may("interruption").either("fails", "restarts");
        Entry<Double> equilibration = at.may("equilibration").parsed("a duration such as 30 s", QuantityText::seconds);
        Entry<HoldStep.AllowedExcursion> excursion = at.may("allowed-excursion").section(HoldReader::excursion);
        Entry<Double> atLeast = at.need("at-least").parsed("a temperature such as 121.1 degC", QuantityText::kelvin);
        Entry<Double> atMost = at.need("at-most").parsed("a temperature such as 124.1 degC", QuantityText::kelvin);
        Entry<Double> setPoint = at.may("set-point").parsed("a temperature such as 122.0 degC", QuantityText::kelvin);
        Entry<Double> duration = at.need("duration").parsed("a duration such as 42 min", QuantityText::seconds);
        Entry<Starts> starts = at.need("starts").section(HoldReader::starts);
        Hold hold = new Hold(
                atLeast.get(),
                atMost.get(),
                setPoint.optional(),
                duration.get(),
                starts.get().channels());
        return new HoldStep(hold, starts.get().any(), fails.or(false), equilibration.or(0.0), excursion.optional());
    }

    private static HoldStep.AllowedExcursion excursion(Section at) {
        Entry<Double> depth =
                at.need("depth").parsed("a temperature difference such as 0.3 K", QuantityText::kelvinDifference);
        Entry<Double> longest = at.need("longest").parsed("a duration such as 5 s", QuantityText::seconds);
        Entry<String> source = at.need("source").text();
        return new HoldStep.AllowedExcursion(depth.get(), longest.get(), source.get());
    }

    private static Starts starts(Section at) {
        Entry<Boolean> any = at.need("when").either("any", "all");
        Entry<List<String>> channels = at.need("channels").list(Slot::text);
        return new Starts(any.get(), channels.get());
    }

    private record Starts(boolean any, List<String> channels) {}
}
