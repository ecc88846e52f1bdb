package org.steamwitness.quantity;

import java.util.List;

/**
 * Rates and flows as plans and run sheets write them, such as {@code 0.3 bar/min}, {@code 1.2 K/s}, {@code 28 W/K}.
 * Each method is named after the quantity and the SI unit that it returns.
 *
 * @see QuantityText
 */
public final class RateText {

    private static final Scale KILOGRAM = Scale.times("kg", 1);

    private static final Wording TEMPERATURE_RATE =
            new Wording("a rate of temperature such as 2.5 K/min", Scale.rates(Scale.temperatureSteps()));
    private static final Wording PRESSURE_RATE =
            new Wording("a rate of pressure such as 0.3 bar/min", Scale.rates(Scale.pressures()));
    private static final Wording MASS_FLOW =
            new Wording("a mass flow such as 120 kg/h", List.of(KILOGRAM.per(Scale.HOUR), KILOGRAM.per(Scale.MINUTE)));
    private static final Wording ROTATION = new Wording(
            "a rotation such as 12 1/min or 12 rpm", List.of(Scale.parts("1/min", 60), Scale.parts("rpm", 60)));
    private static final Wording POWER =
            new Wording("a power such as 9 kW", List.of(Scale.times("kW", 1000), Scale.times("W", 1)));
    private static final Wording HEAT_LOSS = new Wording("a heat loss such as 28 W/K", List.of(Scale.times("W/K", 1)));

    private RateText() {}

    /**
     * Reads a rate of temperature, of either sign.
     *
     * @param text such as "2.5 K/min", "0.1 K/s"; degC and degF per time are refused and the message gives the kelvin
     * @return kelvin per second
     * @throws QuantityException if it is not one
     */
    public static double temperatureRateKelvinPerSecond(String text) {
        return StepInKelvin.read(TEMPERATURE_RATE, text);
    }

    /**
     * Reads a rate of pressure, of either sign, which has no datum.
     *
     * @param text such as "0.3 bar/min", "1.3 mbar/min", "2 kPa/s"; any unit of pressure per min or s
     * @return pascal per second
     * @throws QuantityException if it is not one
     */
    public static double pressureRatePascalPerSecond(String text) {
        return PRESSURE_RATE.read(text);
    }

    /**
     * Reads a mass flow.
     *
     * @param text such as "120 kg/h", "2 kg/min"
     * @return kilogram per second, zero or more
     * @throws QuantityException if it is not one
     */
    public static double massFlowKilogramPerSecond(String text) {
        return MASS_FLOW.readZeroOrMore(text);
    }

    /**
     * Reads a rotation.
     *
     * @param text such as "12 1/min" or, as the trade writes it, "12 rpm"
     * @return turns per second, zero or more
     * @throws QuantityException if it is not one
     */
    public static double rotationPerSecond(String text) {
        return ROTATION.readZeroOrMore(text);
    }

    /**
     * Reads a power.
     *
     * @param text such as "9 kW", "750 W"
     * @return watt, zero or more
     * @throws QuantityException if it is not one
     */
    public static double powerWatt(String text) {
        return POWER.readZeroOrMore(text);
    }

    /**
     * Reads the heat that a chamber loses for each kelvin above its surroundings.
     *
     * @param text such as "28 W/K"
     * @return watt per kelvin, zero or more
     * @throws QuantityException if it is not one
     */
    public static double heatLossWattPerKelvin(String text) {
        return HEAT_LOSS.readZeroOrMore(text);
    }
}
