package org.steamwitness.quantity;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;

/**
 * A unit as people write it and what makes its numbers SI.
 *
 * @param symbol such as "kJ/(kg K)"
 * @param toSi turns a number in this unit into the SI number
 */
record Scale(String symbol, DoubleUnaryOperator toSi) {

    static final Scale SECOND = times("s", 1);
    static final Scale MINUTE = times("min", 60);
    static final Scale HOUR = times("h", 3600);

    /** One of the unit is so many of the SI unit. */
    static Scale times(String symbol, double factor) {
        return new Scale(symbol, value -> value * factor);
    }

    /** So many of the unit are one of the SI unit; dividing by a whole number keeps 95 % at 0.95. */
    static Scale parts(String symbol, double divisor) {
        return new Scale(symbol, value -> value / divisor);
    }

    Scale per(Scale time) {
        return new Scale(symbol + "/" + time.symbol, value -> toSi.applyAsDouble(value) / time.toSi.applyAsDouble(1));
    }

    /** Every unit per minute and per second. */
    static List<Scale> rates(List<Scale> units) {
        return units.stream()
                .flatMap(unit -> Stream.of(unit.per(MINUTE), unit.per(SECOND)))
                .toList();
    }

    static List<Scale> temperatures() {
        return Arrays.stream(TemperatureUnit.values())
                .map(unit -> new Scale(unit.symbol(), unit::toKelvin))
                .toList();
    }

    /** The kelvin alone: a step in another unit would be taken for a temperature. */
    static List<Scale> temperatureSteps() {
        return List.of(new Scale(TemperatureUnit.KELVIN.symbol(), TemperatureUnit.KELVIN::differenceToKelvin));
    }

    static List<Scale> pressures() {
        return Arrays.stream(PressureUnit.values())
                .map(unit -> new Scale(unit.symbol(), unit::toPascal))
                .toList();
    }
}
