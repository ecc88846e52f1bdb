package org.steamwitness.plan;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.steamwitness.trace.QuantityKind;

/** Units of logged quantities that are neither temperatures nor pressures. */
enum PlainUnit {
    KILOGRAM_PER_HOUR(QuantityKind.FLOW, "kg/h", 3600),
    KILOGRAM_PER_MINUTE(QuantityKind.FLOW, "kg/min", 60),
    METRE(QuantityKind.LEVEL, "m", 1),
    MILLIMETRE(QuantityKind.LEVEL, "mm", 1000),
    PER_MINUTE(QuantityKind.ROTATION, "1/min", 60),
    RPM(QuantityKind.ROTATION, "rpm", 60),
    OFF_ON(QuantityKind.STATE, "0/1", 1);

    private final QuantityKind kind;
    private final String symbol;
    /** How many of the unit are one of the SI unit. */
    private final int parts;

    PlainUnit(QuantityKind kind, String symbol, int parts) {
        this.kind = kind;
        this.symbol = symbol;
        this.parts = parts;
    }

    String symbol() {
        return symbol;
    }

    DoubleUnaryOperator toSi() {
        return number -> number / parts;
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
