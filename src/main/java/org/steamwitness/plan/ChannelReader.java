package org.steamwitness.plan;

import java.time.LocalDate;
import java.util.List;
import java.util.function.Function;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureReading;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Understands one entry of {@code channels}. */
final class ChannelReader {

    /** Uncertainties without a coverage factor of their own are expanded by two; common practice, no source. */
    private static final double EXPANDED = 2;

    private ChannelReader() {}

    static PlannedChannel channel(Section at) {
        Entry<String> name = at.need("name").text();
        Entry<String> column = at.need("column").text();
        Entry<QuantityKind> kind = at.need("quantity").word(QuantityKind.class, QuantityKind::word);
        Entry<Place> place = at.need("place").word(Place.class, Place::word);
        Entry<Contact> contact = at.may("contact").word(Contact.class, Contact::word);
        Entry<LocalDate> due = at.may("due").parsed("a date such as 2027-02-01", LocalDate::parse);
        Entry<String> certificate = at.may("certificate").text();
        boolean pressure = kind.kept().filter(k -> k == QuantityKind.PRESSURE).isPresent();
        boolean temperature =
                kind.kept().filter(k -> k == QuantityKind.TEMPERATURE).isPresent();
        Entry<ColumnRule> rule = ColumnRuleReader.rule(at, name, column, kind);
        Function<String, Double> difference =
                pressure ? QuantityText::pascalDifference : QuantityText::kelvinDifference;
        Entry<PlannedChannel.StatedUncertainty> uncertainty = pressure || temperature
                ? at.may("uncertainty").section(section -> uncertainty(section, difference, pressure ? "bar" : "K"))
                : left(at, "uncertainty", kind);
        Entry<PlannedChannel.Lag> lag = temperature ? at.may("lag").section(ChannelReader::lag) : left(at, "lag", kind);
        Entry<Boolean> required = at.may("required").either("yes", "no");
        Entry<List<SensorCorrection>> corrections = pressure || temperature
                ? at.may("corrections").anyNumber(section -> correction(section, rule, difference))
                : left(at, "corrections", kind);
        Place where = place.get();
        kind.get();
        return new PlannedChannel(
                rule.get(),
                where,
                contact.or(where.steamContact() ? Contact.STEAM : Contact.SEALED),
                uncertainty.optional(),
                lag.optional(),
                certificate.optional(),
                required.or(true),
                corrections.or(List.of()),
                due.optional());
    }

    private static SensorCorrection correction(
            Section at, Entry<ColumnRule> rule, Function<String, Double> difference) {
        at.may("at");
        at.may("add");
        ColumnRule channel = rule.get();
        Entry<Double> reading = channel.kind() == QuantityKind.TEMPERATURE
                ? at.need("at").parsed("a temperature such as 121.0 degC", QuantityText::kelvin)
                : at.need("at").parsed("a pressure such as 2.0 bar(g)", text -> pascal(text, channel.datum()));
        Entry<Double> add = at.need("add").parsed("a difference such as 0.1 K", difference);
        return new SensorCorrection(reading.get(), add.get());
    }

    private static double pascal(String text, Datum datum) {
        PressureReading reading = QuantityText.pressure(text);
        if (reading.datum() != datum) {
            throw new IllegalArgumentException(
                    "\"" + text + "\" is not counted as the channel is; expected (" + datum.mark() + ")");
        }
        return reading.pascal();
    }

    /** A key that waits for its quantity: it is unknown only where a quantity that has no such key is named. */
    private static <T> Entry<T> left(Section at, String key, Entry<QuantityKind> kind) {
        if (kind.kept().isEmpty()) {
            at.may(key);
        }
        return Entry.absent();
    }

    private static PlannedChannel.StatedUncertainty uncertainty(
            Section at, Function<String, Double> difference, String unit) {
        Entry<Double> calibration = at.need("calibration").parsed("an uncertainty such as 0.2 " + unit, difference);
        Entry<Double> drift = at.may("drift").parsed("an uncertainty such as 0.1 " + unit, difference);
        Entry<Double> shared = at.may("shared").parsed("an uncertainty such as 0.1 " + unit, difference);
        Entry<Double> coverage = at.need("coverage").parsed("a number such as 2", ChannelReader::coverage);
        return new PlannedChannel.StatedUncertainty(calibration.get(), drift.or(0.0), shared.or(0.0), coverage.get());
    }

    private static PlannedChannel.Lag lag(Section at) {
        Entry<Double> value = at.need("value").parsed("a duration such as 6 s", QuantityText::seconds);
        Entry<Double> uncertainty = at.need("uncertainty").parsed("a duration such as 2 s", QuantityText::seconds);
        return new PlannedChannel.Lag(value.get(), uncertainty.get() / EXPANDED);
    }

    private static double coverage(String text) {
        double factor = Double.parseDouble(text);
        if (!(factor >= 1 && factor <= 4)) {
            throw new IllegalArgumentException("\"" + text + "\" is no coverage factor; expected 1 to 4");
        }
        return factor;
    }
}
