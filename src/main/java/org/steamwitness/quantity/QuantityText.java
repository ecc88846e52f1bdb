package org.steamwitness.quantity;

import java.util.List;

/**
 * Temperatures, pressures and times as plans and run sheets write them: a number, a space, a unit, and for pressures
 * the datum in brackets, such as {@code 121.1 degC}, {@code 0.25 K}, {@code 15 min}, {@code 3.0 bar(g)},
 * {@code 205 kPa(a)}. The decimal mark is a full stop, whatever the machine's locale. A text converts by the same
 * arithmetic as a logged column, so that a sample of 121.1 and a limit of {@code 121.1 degC} are equal to the last bit.
 *
 * @see AmountText
 * @see RateText
 */
public final class QuantityText {

    private static final double LOWEST_ATMOSPHERE = 30e3;
    private static final double HIGHEST_ATMOSPHERE = 120e3;

    private static final Wording TEMPERATURE = new Wording("a temperature such as 121.1 degC", Scale.temperatures());
    private static final Wording STEP =
            new Wording("a temperature difference such as 0.25 K", Scale.temperatureSteps());
    private static final Wording DURATION =
            new Wording("a duration such as 15 min", List.of(Scale.SECOND, Scale.MINUTE, Scale.HOUR));
    private static final Wording PRESSURE =
            new Wording("a pressure with its datum such as 205 kPa(a) or 1.04 bar(g)", Scale.pressures());
    private static final Wording ATMOSPHERE =
            new Wording("the pressure of the atmosphere such as 1008 hPa", Scale.pressures());
    private static final Wording PRESSURE_DIFFERENCE =
            new Wording("a pressure difference such as 0.02 bar", Scale.pressures());

    private QuantityText() {}

    /**
     * Reads a temperature.
     *
     * @param text such as "121.1 degC", "250 degF", "394.25 K"
     * @return kelvin, above zero
     * @throws QuantityException if it is not one
     */
    public static double kelvin(String text) {
        double kelvin = TEMPERATURE.read(text);
        if (kelvin <= 0) {
            throw TEMPERATURE.refusal(text, " lies at or below absolute zero");
        }
        return kelvin;
    }

    /**
     * Reads a difference of temperatures, of either sign.
     *
     * @param text such as "0.25 K"; degC and degF are refused, since they would be taken for temperatures, and the
     *     message gives the kelvin
     * @return kelvin
     * @throws QuantityException if it is not one
     */
    public static double kelvinDifference(String text) {
        return StepInKelvin.read(STEP, text);
    }

    /**
     * Reads a duration.
     *
     * @param text such as "15 min", "30 s", "1.5 h"
     * @return seconds, zero or more
     * @throws QuantityException if it is not one
     */
    public static double seconds(String text) {
        return DURATION.readZeroOrMore(text);
    }

    /**
     * Reads a pressure with its datum. A gauge reading below zero is a vacuum.
     *
     * @param text such as "3.0 bar(g)", "205 kPa(a)" or "-0.9 bar(g)"; a pressure without datum is refused
     * @return the pressure and its datum, not below vacuum
     * @throws QuantityException if it is not one
     */
    public static PressureReading pressure(String text) {
        Wording.Written written = PRESSURE.apart(text);
        refuseTradeSpelling(text, written.unit());
        double pascal = PRESSURE.toSi(text, written);
        Datum datum = written.datum()
                .orElseThrow(() -> new QuantityException("\"" + text
                        + "\" does not say what it is counted from; write " + text + "(a) for absolute or " + text
                        + "(g) for gauge"));
        if (datum == Datum.ABSOLUTE && pascal < 0) {
            throw PRESSURE.refusal(text, " lies below vacuum; only a gauge pressure, (g), may be negative");
        }
        if (datum == Datum.GAUGE && pascal < -HIGHEST_ATMOSPHERE) {
            throw PRESSURE.refusal(text, " lies below vacuum under any atmosphere");
        }
        return new PressureReading(pascal, datum);
    }

    /**
     * Reads the pressure of the atmosphere, which is absolute by its nature and so needs no datum.
     *
     * @param text such as "1008 hPa"
     * @return absolute pressure in pascal, 30 kPa to 120 kPa
     * @throws QuantityException if it is not one
     */
    public static double atmospherePascal(String text) {
        Wording.Written written = ATMOSPHERE.apart(text);
        double pascal = ATMOSPHERE.toSi(text, written);
        if (written.datum().filter(Datum.GAUGE::equals).isPresent()) {
            throw new QuantityException(
                    "\"" + text + "\" is a gauge pressure; the atmosphere is absolute, as 1008 hPa");
        }
        if (!(pascal >= LOWEST_ATMOSPHERE && pascal <= HIGHEST_ATMOSPHERE)) {
            throw new QuantityException("\"" + text
                    + "\" is no pressure of an atmosphere; expected 300 hPa to 1200 hPa, read at the place of the"
                    + " chamber and not reduced to sea level");
        }
        return pascal;
    }

    /**
     * Reads a difference of pressures, of either sign, which has no datum.
     *
     * @param text such as "0.02 bar"
     * @return pascal
     * @throws QuantityException if it is not one
     */
    public static double pascalDifference(String text) {
        return PRESSURE_DIFFERENCE.read(text);
    }

    /** The trade also writes psig, psia, barg and bara; they are answered with the spelling that is read. */
    private static void refuseTradeSpelling(String text, String unit) {
        String stem = unit.substring(0, unit.length() - 1);
        String last = unit.substring(unit.length() - 1);
        if ((last.equals("a") || last.equals("g"))
                && PRESSURE.scale(unit).isEmpty()
                && PRESSURE.scale(stem).isPresent()) {
            throw PRESSURE.refusal(text, ": unknown unit " + unit + ", write " + stem + "(" + last + ")");
        }
    }
}
