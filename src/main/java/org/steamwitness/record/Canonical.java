package org.steamwitness.record;

import org.steamwitness.quantity.Printed;
import org.steamwitness.quantity.TemperatureUnit;

/** The units of the record, with twelve significant digits. */
final class Canonical {

    private static final double PASCAL_PER_KILOPASCAL = 1e3;
    private static final double SECONDS_PER_MINUTE = 60;

    private Canonical() {}

    static double celsius(double kelvin) {
        return Printed.twelveDigits(TemperatureUnit.CELSIUS.ofKelvin(kelvin));
    }

    static double kilopascal(double pascal) {
        return Printed.twelveDigits(pascal / PASCAL_PER_KILOPASCAL);
    }

    static double minutes(double seconds) {
        return Printed.twelveDigits(seconds / SECONDS_PER_MINUTE);
    }

    static double number(double value) {
        return Printed.twelveDigits(value);
    }
}
