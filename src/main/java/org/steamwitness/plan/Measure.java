package org.steamwitness.plan;

import org.steamwitness.quantity.AmountText;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.quantity.RateText;
import org.steamwitness.quantity.TemperatureUnit;

/** What kind of quantity a limit is stated in, and how it is written. */
public enum Measure {
    /** A temperature. */
    TEMPERATURE("°C", "a temperature such as 121.1 degC"),
    /** A difference of temperatures. */
    TEMPERATURE_DIFFERENCE("K", "a temperature difference such as 1.5 K"),
    /** A duration. */
    DURATION("s", "a duration such as 15 min"),
    /** A pressure with its datum. */
    PRESSURE("kPa", "a pressure such as 205 kPa(a)"),
    /** A difference of pressures. */
    PRESSURE_DIFFERENCE("kPa", "a pressure difference such as 0.2 bar"),
    /** A rate of temperature. */
    TEMPERATURE_RATE("K/min", "a rate such as 2.5 K/min"),
    /** A rate of pressure. */
    PRESSURE_RATE("kPa/min", "a rate such as 0.3 bar/min"),
    /** A mass flow. */
    MASS_FLOW("kg/h", "a flow such as 120 kg/h"),
    /** A length. */
    LENGTH("mm", "a level such as 73 mm"),
    /** A rotation. */
    ROTATION("1/min", "a rotation such as 12 rpm"),
    /** A number of events. */
    COUNT("1", "a whole number such as 4");

    private final String unit;
    private final String expected;

    Measure(String unit, String expected) {
        this.unit = unit;
        this.expected = expected;
    }

    /**
     * The unit in which people read a figure of this kind.
     *
     * @return such as "kPa/min"
     */
    public String unit() {
        return unit;
    }

    /**
     * A figure as people read it.
     *
     * @param si in the SI unit of the measure
     * @return in {@link #unit()}
     */
    public double printed(double si) {
        return switch (this) {
            case TEMPERATURE -> TemperatureUnit.CELSIUS.ofKelvin(si);
            case PRESSURE, PRESSURE_DIFFERENCE -> si / 1000;
            case PRESSURE_RATE -> si * 60 / 1000;
            case TEMPERATURE_RATE, ROTATION -> si * 60;
            case MASS_FLOW -> si * 3600;
            case LENGTH -> si * 1000;
            case TEMPERATURE_DIFFERENCE, DURATION, COUNT -> si;
        };
    }

    String expected() {
        return expected;
    }

    Limit.Figure figure(String text) {
        Datum datum = this == PRESSURE ? QuantityText.pressure(text).datum() : Datum.ABSOLUTE;
        return new Limit.Figure(si(text), datum, text);
    }

    private double si(String text) {
        return switch (this) {
            case TEMPERATURE -> QuantityText.kelvin(text);
            case TEMPERATURE_DIFFERENCE -> QuantityText.kelvinDifference(text);
            case DURATION -> QuantityText.seconds(text);
            case PRESSURE -> QuantityText.pressure(text).pascal();
            case PRESSURE_DIFFERENCE -> QuantityText.pascalDifference(text);
            case TEMPERATURE_RATE -> RateText.temperatureRateKelvinPerSecond(text);
            case PRESSURE_RATE -> RateText.pressureRatePascalPerSecond(text);
            case MASS_FLOW -> RateText.massFlowKilogramPerSecond(text);
            case LENGTH -> AmountText.lengthMetre(text);
            case ROTATION -> RateText.rotationPerSecond(text);
            case COUNT -> count(text);
        };
    }

    private static double count(String text) {
        int count = Integer.parseInt(text);
        if (count < 0 || count > 1000) {
            throw new NumberFormatException(text);
        }
        return count;
    }
}
