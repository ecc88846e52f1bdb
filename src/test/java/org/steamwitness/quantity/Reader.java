package org.steamwitness.quantity;

/** Every way to read a quantity, by a name that a table of tests can hold. */
enum Reader {
    TEMPERATURE,
    DIFFERENCE,
    DURATION,
    PRESSURE,
    ATMOSPHERE,
    PRESSURE_DIFFERENCE,
    MASS,
    VOLUME,
    LENGTH,
    ALTITUDE,
    SPECIFIC_HEAT,
    ENERGY,
    FRACTION,
    TEMPERATURE_RATE,
    PRESSURE_RATE,
    MASS_FLOW,
    ROTATION,
    POWER,
    HEAT_LOSS;

    double read(String text) {
        return switch (this) {
            case TEMPERATURE -> QuantityText.kelvin(text);
            case DIFFERENCE -> QuantityText.kelvinDifference(text);
            case DURATION -> QuantityText.seconds(text);
            case PRESSURE -> QuantityText.pressure(text).pascal();
            case ATMOSPHERE -> QuantityText.atmospherePascal(text);
            case PRESSURE_DIFFERENCE -> QuantityText.pascalDifference(text);
            case MASS -> AmountText.massKilogram(text);
            case VOLUME -> AmountText.volumeCubicMetre(text);
            case LENGTH -> AmountText.lengthMetre(text);
            case ALTITUDE -> AmountText.altitudeMetre(text);
            case SPECIFIC_HEAT -> AmountText.specificHeatJoulePerKilogramKelvin(text);
            case ENERGY -> AmountText.energyJoule(text);
            case FRACTION -> AmountText.fraction(text);
            case TEMPERATURE_RATE -> RateText.temperatureRateKelvinPerSecond(text);
            case PRESSURE_RATE -> RateText.pressureRatePascalPerSecond(text);
            case MASS_FLOW -> RateText.massFlowKilogramPerSecond(text);
            case ROTATION -> RateText.rotationPerSecond(text);
            case POWER -> RateText.powerWatt(text);
            case HEAT_LOSS -> RateText.heatLossWattPerKelvin(text);
        };
    }
}
