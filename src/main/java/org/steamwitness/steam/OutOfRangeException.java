package org.steamwitness.steam;

/** A property was asked for outside the range in which its formula holds. Nothing is clamped. */
public final class OutOfRangeException extends IllegalArgumentException {

    private static final long serialVersionUID = 1L;

    /**
     * Names the quantity, the value and the range.
     *
     * @param what the quantity, such as "saturation temperature: absolute pressure"
     * @param value the value that was refused, NaN included
     * @param low the lowest value allowed
     * @param high the highest value allowed
     * @param unit the unit of all three
     */
    public OutOfRangeException(String what, double value, double low, double high, String unit) {
        super(what + " " + value + " " + unit + " lies outside " + low + " to " + high + " " + unit);
    }

    /** Returns the value when it lies in the closed range; NaN never does. */
    static double within(String what, double value, double low, double high, String unit) {
        if (!(value >= low && value <= high)) {
            throw new OutOfRangeException(what, value, low, high, unit);
        }
        return value;
    }
}
