package org.steamwitness.plan;

import java.util.Optional;
import java.util.function.Function;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Understands what a channel says of its column: the unit, and the datum of a pressure. */
final class ColumnRuleReader {

    private ColumnRuleReader() {}

    static Entry<ColumnRule> rule(Section at, Entry<String> name, Entry<String> column, Entry<QuantityKind> kind) {
        Optional<QuantityKind> known = kind.kept();
        if (known.isEmpty()) {
            at.need("unit").parsed("a unit such as degC", Function.identity());
            at.may("datum");
            return Entry.broken();
        }
        if (known.get() != QuantityKind.PRESSURE && at.has("datum")) {
            at.may("datum").refused("only a pressure has a datum");
        }
        return switch (known.get()) {
            case TEMPERATURE -> temperature(at, name, column);
            case PRESSURE -> pressure(at, name, column);
            default -> plain(at, name, column, known.get());
        };
    }

    private static Entry<ColumnRule> temperature(Section at, Entry<String> name, Entry<String> column) {
        Entry<TemperatureUnit> unit = at.need("unit").word(TemperatureUnit.class, TemperatureUnit::symbol);
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

    private static Entry<ColumnRule> pressure(Section at, Entry<String> name, Entry<String> column) {
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

    private static Entry<ColumnRule> plain(Section at, Entry<String> name, Entry<String> column, QuantityKind kind) {
        Entry<PlainUnit> unit =
                at.need("unit").parsed("one of: " + PlainUnit.symbols(kind), text -> PlainUnit.written(kind, text));
        return all(name, column, unit)
                ? Entry.of(new ColumnRule(
                        name.get(),
                        column.get(),
                        kind,
                        unit.get().symbol(),
                        Datum.ABSOLUTE,
                        unit.get().toSi()))
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
}
