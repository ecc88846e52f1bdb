package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/**
 * The columns of a log that hold numbers, each as a channel named as its header is, in the unit that the header names.
 * Without a unit the numbers stay as they are and nothing is taken for a fault.
 */
final class Suggestion {

    private Suggestion() {}

    static List<ColumnRule> rules(LogForm form) {
        List<ColumnRule> rules = new ArrayList<>();
        for (FoundColumn column : form.columns()) {
            if (!form.times().contains(column.position() - 1)) {
                rule(column).ifPresent(rules::add);
            }
        }
        return rules;
    }

    private static Optional<ColumnRule> rule(FoundColumn column) {
        if (!column.numeric()) {
            return Optional.empty();
        }
        QuantityKind kind = column.quantity().orElse(QuantityKind.STATE);
        if (column.unit().isEmpty()) {
            return Optional.of(new ColumnRule(
                    column.name(), "#" + column.position(), QuantityKind.STATE, "", Datum.ABSOLUTE, number -> number));
        }
        String unit = column.unit().get();
        return Optional.of(new ColumnRule(
                column.name(),
                "#" + column.position(),
                kind,
                unit,
                column.datum().orElse(kind == QuantityKind.PRESSURE ? Datum.GAUGE : Datum.ABSOLUTE),
                toSi(kind, unit)));
    }

    private static DoubleUnaryOperator toSi(QuantityKind quantity, String unit) {
        if (quantity == QuantityKind.TEMPERATURE) {
            for (TemperatureUnit each : TemperatureUnit.values()) {
                if (each.symbol().equals(unit)) {
                    return each::toKelvin;
                }
            }
        }
        for (PressureUnit each : PressureUnit.values()) {
            if (each.symbol().equals(unit)) {
                return each::toPascal;
            }
        }
        throw new IllegalArgumentException("no unit of " + quantity + ": " + unit);
    }
}
