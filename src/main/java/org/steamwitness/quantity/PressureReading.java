package org.steamwitness.quantity;

/**
 * A pressure with its datum, as somebody wrote it down.
 *
 * @param pascal the value counted from the datum
 * @param datum what it is counted from
 */
public record PressureReading(double pascal, Datum datum) {

    /**
     * The same pressure counted from vacuum.
     *
     * @param atmospherePascal absolute pressure of the atmosphere
     * @return absolute pressure in pascal
     */
    public double absolutePascal(double atmospherePascal) {
        return pascal + datum.toAbsolute(atmospherePascal);
    }
}
