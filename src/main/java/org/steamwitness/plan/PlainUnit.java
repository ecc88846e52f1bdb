package org.steamwitness.plan;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.steamwitness.trace.QuantityKind;

/** Units of logged quantities that are neither temperatures nor pressures. */
enum PlainUnit {
    KILOGRAM_PER_HOUR(QuantityKind.FLOW, "kg/h", 1 / 3600.0),
    KILOGRAM_PER_MINUTE(QuantityKind.FLOW, "kg/min", 1 / 60.0),
    METRE(QuantityKind.LEVEL, "m", 1),
    MILLIMETRE(QuantityKind.LEVEL, "mm", 1e-3),
    PER_MINUTE(QuantityKind.ROTATION, "1/min", 1 / 60.0),
    RPM(QuantityKind.ROTATION, "rpm", 1 / 60.0),
    OFF_ON(QuantityKind.STATE, "0/1", 1);

    private final QuantityKind kind;
    private final String symbol;
    private final double factor;

    PlainUnit(QuantityKind kind, String symbol, double factor) {
        this.kind = kind;
        this.symbol = symbol;
        this.factor = factor;
    }

    String symbol() {
        return symbol;
    }

    DoubleUnaryOperator toSi() {
        return number -> number * factor;
    }

    static List<PlainUnit> of(QuantityKind kind) {
        return Arrays.stream(values()).filter(unit -> unit.kind == kind).toList();
    }

    /** The unit of a kind that is written so. */
    static PlainUnit written(QuantityKind kind, String symbol) {
        return of(kind).stream()
                .filter(unit -> unit.symbol.equals(symbol))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("\"" + symbol + "\" is not one of: " + symbols(kind)));
    }

    static String symbols(QuantityKind kind) {
        return String.join(", ", of(kind).stream().map(PlainUnit::symbol).toList());
    }
}
