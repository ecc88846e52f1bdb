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

/** The columns of a log that can be read by what their headers say, each as a channel named as its header is. */
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
        if (column.quantity().isEmpty() || column.unit().isEmpty()) {
            return Optional.empty();
        }
        String unit = column.unit().get();
        return Optional.of(new ColumnRule(
                column.name(),
                "#" + column.position(),
                column.quantity().get(),
                unit,
                column.datum().orElse(column.quantity().get() == QuantityKind.PRESSURE ? Datum.GAUGE : Datum.ABSOLUTE),
                toSi(column.quantity().get(), unit)));
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
