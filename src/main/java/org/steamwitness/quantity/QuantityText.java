package org.steamwitness.quantity;

import java.util.Arrays;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * Quantities as plans and run sheets write them: a number, a space, a unit, and for pressures the datum in brackets,
 * such as {@code 121.1 degC}, {@code 0.25 K}, {@code 15 min}, {@code 3.0 bar(g)}, {@code 205 kPa(a)}. The decimal
 * mark is a full stop, whatever the machine's locale.
 */
public final class QuantityText {

    private static final Pattern SHAPE = Pattern.compile(
            "(?<number>[+-]?[0-9]{1,15}(?:\\.[0-9]{1,15})?) ?(?<unit>[A-Za-z][A-Za-z0-9/]*)(?:\\((?<datum>[ag])\\))?");

    private static final Map<String, Double> SECONDS = Map.of("s", 1.0, "min", 60.0, "h", 3600.0);

    private final String text;
    private final double number;
    private final String unit;
    private final String datum;

    private QuantityText(String text, double number, String unit, String datum) {
        this.text = text;
        this.number = number;
        this.unit = unit;
        this.datum = datum;
    }

    /**
     * Reads a temperature.
     *
     * @param text such as "121.1 degC", "250 degF", "394.25 K"
     * @return kelvin, above zero
     * @throws QuantityException if it is not one
     */
    public static double kelvin(String text) {
        QuantityText written = of(text, "a temperature such as 121.1 degC");
        written.refuseDatum("a temperature such as 121.1 degC");
        double kelvin = written.unitAmong(bySymbol(TemperatureUnit.values(), TemperatureUnit::symbol))
                .toKelvin(written.number);
        if (kelvin <= 0) {
            throw new QuantityException("\"" + text + "\" lies at or below absolute zero");
        }
        return kelvin;
    }

    /**
     * Reads a difference of temperatures.
     *
     * @param text such as "0.25 K"; degC and degF are refused, since they would be taken for temperatures
     * @return kelvin
     * @throws QuantityException if it is not one
     */
    public static double kelvinDifference(String text) {
        QuantityText written = of(text, "a temperature difference such as 0.25 K");
        written.refuseDatum("a temperature difference such as 0.25 K");
        return written.unitAmong(Map.of(TemperatureUnit.KELVIN.symbol(), TemperatureUnit.KELVIN))
                .differenceToKelvin(written.number);
    }

    /**
     * Reads a duration.
     *
     * @param text such as "15 min", "30 s", "1.5 h"
     * @return seconds, zero or more
     * @throws QuantityException if it is not one
     */
    public static double seconds(String text) {
        QuantityText written = of(text, "a duration such as 15 min");
        written.refuseDatum("a duration such as 15 min");
        double seconds = written.number * written.unitAmong(SECONDS);
        if (seconds < 0) {
            throw new QuantityException("\"" + text + "\" is negative; expected a duration such as 15 min");
        }
        return seconds;
    }

    /**
     * Reads a pressure with its datum.
     *
     * @param text such as "3.0 bar(g)" or "205 kPa(a)"; a pressure without datum is refused
     * @return the pressure and its datum
     * @throws QuantityException if it is not one
     */
    public static PressureReading pressure(String text) {
        QuantityText written = of(text, "a pressure with its datum such as 205 kPa(a) or 1.04 bar(g)");
        double pascal = written.unitAmong(bySymbol(PressureUnit.values(), PressureUnit::symbol))
                .toPascal(written.number);
        if (written.datum == null) {
            throw new QuantityException("\"" + text + "\" does not say what it is counted from; write " + text
                    + "(a) for absolute or " + text + "(g) for gauge");
        }
        return new PressureReading(pascal, written.datum.equals("g") ? Datum.GAUGE : Datum.ABSOLUTE);
    }

    /**
     * Reads the pressure of the atmosphere, which is absolute by its nature and so needs no datum.
     *
     * @param text such as "1008 hPa"
     * @return absolute pressure in pascal, 30 kPa to 120 kPa
     * @throws QuantityException if it is not one
     */
    public static double atmospherePascal(String text) {
        QuantityText written = of(text, "the pressure of the atmosphere such as 1008 hPa");
        double pascal = written.unitAmong(bySymbol(PressureUnit.values(), PressureUnit::symbol))
                .toPascal(written.number);
        if ("g".equals(written.datum)) {
            throw new QuantityException(
                    "\"" + text + "\" is a gauge pressure; the atmosphere is absolute, as 1008 hPa");
        }
        if (!(pascal >= 30e3 && pascal <= 120e3)) {
            throw new QuantityException("\"" + text
                    + "\" is no pressure of an atmosphere; expected 300 hPa to 1200 hPa, read at the place of the"
                    + " chamber and not reduced to sea level");
        }
        return pascal;
    }

    /**
     * Reads a difference of pressures, which has no datum.
     *
     * @param text such as "0.02 bar"
     * @return pascal
     * @throws QuantityException if it is not one
     */
    public static double pascalDifference(String text) {
        QuantityText written = of(text, "a pressure difference such as 0.02 bar");
        written.refuseDatum("a pressure difference such as 0.02 bar");
        return written.unitAmong(bySymbol(PressureUnit.values(), PressureUnit::symbol))
                .toPascal(written.number);
    }

    private static QuantityText of(String text, String expected) {
        Matcher shape = SHAPE.matcher(text);
        if (!shape.matches()) {
            throw new QuantityException("\"" + text + "\" is not " + expected);
        }
        return new QuantityText(
                text, Double.parseDouble(shape.group("number")), shape.group("unit"), shape.group("datum"));
    }

    private void refuseDatum(String expected) {
        if (datum != null) {
            throw new QuantityException("\"" + text + "\" is not " + expected);
        }
    }

    private <U> U unitAmong(Map<String, U> units) {
        U known = units.get(unit);
        if (known == null) {
            throw new QuantityException("\"" + text + "\": unknown unit " + unit + "; known here: "
                    + String.join(", ", new TreeMap<>(units).keySet()));
        }
        return known;
    }

    private static <U> Map<String, U> bySymbol(U[] units, Function<U, String> symbol) {
        return Arrays.stream(units).collect(Collectors.toMap(symbol, Function.identity()));
    }
}
