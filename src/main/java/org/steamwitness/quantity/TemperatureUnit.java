package org.steamwitness.quantity;

/** Units of temperature, and of temperature difference, which has no zero of its own. */
public enum TemperatureUnit {
    /** Degree Celsius: 0 degC is 273.15 K. */
    CELSIUS("degC", 1, 273.15),
    /** Degree Fahrenheit: 32 degF is 273.15 K, a step of 1.8 degF is 1 K. */
    FAHRENHEIT("degF", 1.8, 459.67),
    /** Kelvin. */
    KELVIN("K", 1, 0);

    private final String symbol;
    private final double stepsPerKelvin;
    private final double zeroAboveAbsolute;

    TemperatureUnit(String symbol, double stepsPerKelvin, double zeroAboveAbsolute) {
        this.symbol = symbol;
        this.stepsPerKelvin = stepsPerKelvin;
        this.zeroAboveAbsolute = zeroAboveAbsolute;
    }

    /**
     * The unit as plans and run sheets write it.
     *
     * @return such as "degC"
     */
    public String symbol() {
        return symbol;
    }

    /**
     * Converts a temperature.
     *
     * @param value temperature in this unit
     * @return kelvin
     */
    public double toKelvin(double value) {
        return (value + zeroAboveAbsolute) / stepsPerKelvin;
    }

    /**
     * Converts a temperature.
     *
     * @param kelvin temperature in kelvin
     * @return temperature in this unit
     */
    public double ofKelvin(double kelvin) {
        return kelvin * stepsPerKelvin - zeroAboveAbsolute;
    }

    /**
     * Converts a difference of temperatures, which knows no zero.
     *
     * @param value difference in this unit
     * @return kelvin
     */
    public double differenceToKelvin(double value) {
        return value / stepsPerKelvin;
    }
}
