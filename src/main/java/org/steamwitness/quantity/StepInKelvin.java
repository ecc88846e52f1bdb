package org.steamwitness.quantity;

import java.math.BigDecimal;

/** Steps of temperature: written in kelvin alone; one in degC or degF is answered with its kelvin. */
final class StepInKelvin {

    private StepInKelvin() {}

    /** Reads a difference or, when the wording's units are kelvin per time, a rate. */
    static double read(Wording wording, String text) {
        Wording.Written written = wording.apart(text);
        if (written.datum().isEmpty()) {
            for (TemperatureUnit unit : TemperatureUnit.values()) {
                if (unit != TemperatureUnit.KELVIN && written.unit().startsWith(unit.symbol())) {
                    refuse(wording, text, written, unit);
                }
            }
        }
        return wording.read(text);
    }

    private static void refuse(Wording wording, String text, Wording.Written written, TemperatureUnit unit) {
        String inKelvin = TemperatureUnit.KELVIN.symbol()
                + written.unit().substring(unit.symbol().length());
        if (wording.scale(inKelvin).isPresent()) {
            String number = new BigDecimal(
                            Double.toString(Printed.twelveDigits(unit.differenceToKelvin(written.number()))))
                    .stripTrailingZeros()
                    .toPlainString();
            throw wording.refusal(
                    text, ": a difference of temperatures is written in kelvin, here " + number + " " + inKelvin);
        }
    }
}
