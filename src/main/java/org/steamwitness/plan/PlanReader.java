package org.steamwitness.plan;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Understands the keys of a plan. */
final class PlanReader {

    private static final double DEFAULT_LONGEST_GAP_SECONDS = 10;
    private static final double DEFAULT_SHORTEST_SECONDS = 10;

    /** Uncertainties without a coverage factor of their own are expanded by two; common practice, no source. */
    private static final double EXPANDED = 2;

    private PlanReader() {}

    static Plan plan(Section at) {
        Entry<Integer> format = at.need("plan-format").whole(1, 1);
        Entry<String> id = at.need("id").text();
        Entry<String> title = at.need("title").text();
        Entry<Integer> revision = at.need("revision").whole(1, 9999);
        Entry<PlanStatus> status = at.need("status").word(PlanStatus.class, PlanStatus::word);
        Entry<Plan.Basis> basis = at.need("basis").section(PlanReader::basis);
        Entry<String> equipment = at.need("equipment").text();
        Entry<CycleProcess> process = at.need("process").word(CycleProcess.class, CycleProcess::word);
        Entry<Medium> medium = at.need("medium").word(Medium.class, Medium::word);
        Entry<AtmosphereSource> atmosphere = at.need("atmosphere").word(AtmosphereSource.class, AtmosphereSource::word);
        Entry<List<PlannedChannel>> channels = at.need("channels").list(slot -> slot.section(PlanReader::channel));
        Entry<Hold> hold = at.need("hold").section(PlanReader::hold);
        Entry<Double> longestGap = at.may("longest-gap").parsed("a duration such as 10 s", QuantityText::seconds);
        Entry<Double> scanDelay = at.may("scan-delay").parsed("a duration such as 2 s", QuantityText::seconds);
        Entry<SaturationTolerance> saturation = at.may("saturation").section(PlanReader::saturation);
        Entry<List<LethalityAim>> lethality = at.may("lethality").list(slot -> slot.section(LethalityReader::aim));
        Entry<DecisionRule> decision = at.need("decision").section(PlanReader::decision);
        Entry<Set<String>> required = at.may("run-sheet").section(PlanReader::requiredEntries);
        format.get();
        atmosphere.get();
        Plan plan = new Plan(
                id.get(),
                title.get(),
                revision.get(),
                status.get(),
                basis.get(),
                equipment.get(),
                process.get(),
                medium.get(),
                channels.get(),
                hold.get(),
                longestGap.or(DEFAULT_LONGEST_GAP_SECONDS),
                scanDelay.or(0.0),
                saturation.optional(),
                lethality.or(List.of()),
                decision.get(),
                required.or(Set.of()));
        checkWhole(at, plan);
        return plan;
    }

    private static Plan.Basis basis(Section at) {
        Entry<String> document = at.need("document").text();
        Entry<String> edition = at.need("edition").text();
        Entry<String> by = at.need("by").text();
        Entry<LocalDate> date = at.need("date").parsed("a date such as 2026-02-20", LocalDate::parse);
        return new Plan.Basis(
                document.get(), edition.get(), by.get(), date.get().toString());
    }

    private static PlannedChannel channel(Section at) {
        Entry<String> name = at.need("name").text();
        Entry<String> column = at.need("column").text();
        Entry<QuantityKind> kind = at.need("quantity").word(QuantityKind.class, QuantityKind::word);
        Entry<Place> place = at.need("place").word(Place.class, Place::word);
        Entry<Contact> contact = at.may("contact").word(Contact.class, Contact::word);
        Entry<LocalDate> due = at.may("due").parsed("a date such as 2027-02-01", LocalDate::parse);
        Entry<String> certificate = at.may("certificate").text();
        boolean pressure = kind.kept().filter(k -> k == QuantityKind.PRESSURE).isPresent();
        Entry<ColumnRule> rule = pressure ? pressureRule(at, name, column) : temperatureRule(at, name, column);
        Function<String, Double> difference =
                pressure ? QuantityText::pascalDifference : QuantityText::kelvinDifference;
        Entry<PlannedChannel.StatedUncertainty> uncertainty =
                at.may("uncertainty").section(section -> uncertainty(section, difference));
        Entry<PlannedChannel.Lag> lag =
                pressure ? Entry.absent() : at.may("lag").section(PlanReader::lag);
        Place where = place.get();
        kind.get();
        return new PlannedChannel(
                rule.get(),
                where,
                contact.or(where.steamContact() ? Contact.STEAM : Contact.SEALED),
                uncertainty.optional(),
                lag.optional(),
                certificate.optional(),
                due.optional());
    }

    private static Entry<ColumnRule> temperatureRule(Section at, Entry<String> name, Entry<String> column) {
        Entry<TemperatureUnit> unit = at.need("unit").word(TemperatureUnit.class, TemperatureUnit::symbol);
        if (at.has("datum")) {
            at.may("datum").refused("only a pressure has a datum");
        }
        return all(name, column, unit)
                ? Entry.of(new ColumnRule(
                        name.get(),
                        column.get(),
                        QuantityKind.TEMPERATURE,
                        unit.get().symbol(),
                        Datum.ABSOLUTE,
                        unit.get()::toKelvin))
                : Entry.broken();
    }

    private static Entry<ColumnRule> pressureRule(Section at, Entry<String> name, Entry<String> column) {
        Entry<PressureUnit> unit = at.need("unit").word(PressureUnit.class, PressureUnit::symbol);
        Entry<Datum> datum = at.need("datum").word(Datum.class, Datum::word);
        return all(name, column, unit, datum)
                ? Entry.of(new ColumnRule(
                        name.get(),
                        column.get(),
                        QuantityKind.PRESSURE,
                        unit.get().symbol(),
                        datum.get(),
                        unit.get()::toPascal))
                : Entry.broken();
    }

    private static boolean all(Entry<?>... entries) {
        for (Entry<?> entry : entries) {
            if (entry.kept().isEmpty()) {
                return false;
            }
        }
        return true;
    }

    private static PlannedChannel.StatedUncertainty uncertainty(Section at, Function<String, Double> difference) {
        Entry<Double> calibration = at.need("calibration").parsed("a quantity such as 0.2 K", difference);
        Entry<Double> drift = at.may("drift").parsed("a quantity such as 0.1 K", difference);
        Entry<Double> shared = at.may("shared").parsed("a quantity such as 0.1 K", difference);
        Entry<Double> coverage = at.need("coverage").parsed("a number such as 2", PlanReader::coverage);
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

    private static Hold hold(Section at) {
        Entry<Double> atLeast = at.need("at-least").parsed("a temperature such as 121.1 degC", QuantityText::kelvin);
        Entry<Double> atMost = at.need("at-most").parsed("a temperature such as 124.1 degC", QuantityText::kelvin);
        Entry<Double> setPoint = at.may("set-point").parsed("a temperature such as 122.0 degC", QuantityText::kelvin);
        Entry<Double> duration = at.need("duration").parsed("a duration such as 42 min", QuantityText::seconds);
        Entry<List<String>> starts = at.need("starts").section(PlanReader::starts);
        return new Hold(atLeast.get(), atMost.get(), setPoint.optional(), duration.get(), starts.get());
    }

    private static List<String> starts(Section at) {
        Entry<String> when = at.need("when").parsed("one of: all", PlanReader::all);
        Entry<List<String>> channels = at.need("channels").list(Slot::text);
        when.get();
        return channels.get();
    }

    private static String all(String text) {
        if (!text.equals("all")) {
            throw new IllegalArgumentException("\"" + text + "\" is not one of: all");
        }
        return text;
    }

    private static SaturationTolerance saturation(Section at) {
        Entry<Double> air =
                at.need("air").parsed("a temperature difference such as 1.0 K", QuantityText::kelvinDifference);
        Entry<Double> superheat =
                at.need("superheat").parsed("a temperature difference such as 2.0 K", QuantityText::kelvinDifference);
        Entry<Double> shortest = at.may("shortest").parsed("a duration such as 10 s", QuantityText::seconds);
        return new SaturationTolerance(air.get(), superheat.get(), shortest.or(DEFAULT_SHORTEST_SECONDS));
    }

    private static DecisionRule decision(Section at) {
        Entry<Boolean> guarded = at.need("rule").parsed("one of: guarded, simple", PlanReader::guarded);
        if (guarded.kept().filter(g -> !g).isPresent()) {
            return DecisionRule.SIMPLE;
        }
        Entry<Double> conformance =
                at.need("conformance").parsed("a probability such as 95 %", PlanReader::probability);
        return new DecisionRule(guarded.get(), conformance.get());
    }

    private static boolean guarded(String text) {
        return switch (text) {
            case "guarded" -> true;
            case "simple" -> false;
            default -> throw new IllegalArgumentException("\"" + text + "\" is not one of: guarded, simple");
        };
    }

    private static double probability(String text) {
        if (!text.matches("[0-9]{2}(\\.[0-9]{1,3})? ?%")) {
            throw new IllegalArgumentException("\"" + text + "\" is not a probability such as 95 %");
        }
        double percent = Double.parseDouble(text.substring(0, text.length() - 1).strip());
        if (!(percent > 50)) {
            throw new IllegalArgumentException(
                    "\"" + text + "\" is too low; expected more than 50 % and less than 100 %");
        }
        return percent / 100;
    }

    private static Set<String> requiredEntries(Section at) {
        Entry<List<String>> keys = at.need("required")
                .list(slot -> slot.parsed("a run sheet key", key -> {
                    if (!RunSheet.ENTRIES.contains(key)) {
                        throw new IllegalArgumentException(
                                "\"" + key + "\" is no run sheet entry; known: " + String.join(", ", RunSheet.ENTRIES));
                    }
                    return key;
                }));
        return new LinkedHashSet<>(keys.get());
    }

    /** What only the whole plan can tell. */
    private static void checkWhole(Section at, Plan plan) {
        Set<String> names = new HashSet<>();
        for (PlannedChannel channel : plan.channels()) {
            if (!names.add(channel.name())) {
                at.refuse("channels", "two channels are named \"" + channel.name() + "\"");
            }
            if (plan.decision().guarded() && channel.uncertainty().isEmpty()) {
                at.refuse(
                        "channels",
                        "a guarded decision needs the uncertainty of channel \"" + channel.name()
                                + "\"; state it, or decide by the simple rule");
            }
        }
        Map<String, PlannedChannel> byName = new HashMap<>();
        plan.channels().forEach(channel -> byName.put(channel.name(), channel));
        for (String start : plan.hold().startChannels()) {
            PlannedChannel channel = byName.get(start);
            if (channel == null) {
                at.refuse("hold", "starts.channels names \"" + start + "\", which is not among the channels");
            } else if (channel.rule().kind() != QuantityKind.TEMPERATURE || channel.place() == Place.PRODUCT) {
                at.refuse("hold", "starts.channels names \"" + start + "\"; expected a temperature in the chamber");
            }
        }
        for (LethalityAim aim : plan.lethality()) {
            for (String probe : aim.probes().names()) {
                PlannedChannel channel = byName.get(probe);
                if (channel == null || channel.rule().kind() != QuantityKind.TEMPERATURE) {
                    at.refuse("lethality", "channels names \"" + probe + "\", which is no temperature channel");
                }
            }
        }
        long pressures = plan.channels().stream()
                .filter(c -> c.rule().kind() == QuantityKind.PRESSURE && c.place() == Place.CHAMBER)
                .count();
        if (pressures > 1) {
            at.refuse("channels", "two channels measure the chamber's pressure; expected one");
        }
        if (plan.medium().saturated() && plan.saturation().isEmpty()) {
            at.refuse("saturation", "required key is missing: the medium is saturated steam");
        }
    }

    /** Where the pressure of the atmosphere comes from. */
    private enum AtmosphereSource {
        ENTERED("entered");

        private final String word;

        AtmosphereSource(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }
}
