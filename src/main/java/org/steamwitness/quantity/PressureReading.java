package org.steamwitness.quantity;

import java.util.Objects;

/**
 * A pressure with its datum, as somebody wrote it down.
 *
 * @param pascal the value counted from the datum; below zero only for gauge, as a vacuum
 * @param datum what it is counted from
 */
public record PressureReading(double pascal, Datum datum) {

    /**
     * Refuses what is no pressure.
     *
     * @param pascal the value counted from the datum, finite; zero or more when absolute
     * @param datum what it is counted from
     * @throws QuantityException if the value is not finite, or absolute and below zero
     */
    public PressureReading {
        Objects.requireNonNull(datum, "datum");
        if (!Double.isFinite(pascal) || (datum == Datum.ABSOLUTE && pascal < 0)) {
            throw new QuantityException(pascal + " Pa(" + datum.mark() + ") is no pressure");
        }
    }

    /**
     * The same pressure counted from vacuum.
     *
     * @param atmospherePascal absolute pressure of the atmosphere; not looked at when the reading is absolute
     * @return absolute pressure in pascal, zero or more
     * @throws QuantityException if a gauge reading lies below vacuum under that atmosphere
     * @throws IllegalArgumentException if the reading is a gauge reading and the atmosphere is not a positive number
     */
    public double absolutePascal(double atmospherePascal) {
        double absolute = pascal + datum.toAbsolute(atmospherePascal);
        if (absolute < 0) {
            throw new QuantityException(Printed.pressure(pascal, PressureUnit.KILOPASCAL, datum, 3)
                    + " lies below vacuum under an atmosphere of " + Printed.fixed(atmospherePascal / 1000, 3)
                    + " kPa");
        }
        return absolute;
    }
}
