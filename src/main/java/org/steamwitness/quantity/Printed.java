package org.steamwitness.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers as people read them: fixed decimals, full stop, the same on every machine. Decisions are never made on
 * printed numbers.
 */
public final class Printed {

    /** Twelve digits carry every measured value whole and drop what conversion between units left behind. */
    private static final MathContext TWELVE_DIGITS = new MathContext(12, RoundingMode.HALF_EVEN);

    private Printed() {}

    /**
     * Rounds to twelve significant digits, so that a reading of 120.5 degC that went through kelvin is 120.5 again.
     *
     * @param value a finite number
     * @return the nearest number of twelve digits
     */
    public static double twelveDigits(double value) {
        return new BigDecimal(value).round(TWELVE_DIGITS).doubleValue() + 0.0;
    }

    /**
     * Prints with fixed decimals, half rounded away from zero.
     *
     * @param value a finite number
     * @param decimals 0 to 12
     * @return such as "121.10"; never "-0.0"
     */
    public static String fixed(double value, int decimals) {
        BigDecimal rounded = new BigDecimal(value).round(TWELVE_DIGITS).setScale(decimals, RoundingMode.HALF_UP);
        return rounded.toPlainString();
    }

    /**
     * Prints with fixed decimals and a sign in front, also of positive numbers.
     *
     * @param value a finite number
     * @param decimals 0 to 12
     * @return such as "+0.25"
     */
    public static String signed(double value, int decimals) {
        String text = fixed(value, decimals);
        return text.startsWith("-") ? text : "+" + text;
    }

    /**
     * Prints a temperature as plans write it, so that it can be read back.
     *
     * @param kelvin a temperature
     * @param unit the unit to print
     * @param decimals 0 to 12
     * @return such as "121.10 degC"
     */
    public static String temperature(double kelvin, TemperatureUnit unit, int decimals) {
        return fixed(unit.ofKelvin(kelvin), decimals) + " " + unit.symbol();
    }

    /**
     * Prints a pressure with its datum as plans write it, so that it can be read back.
     *
     * @param pascal a pressure counted from the datum
     * @param unit the unit to print
     * @param datum what the pressure is counted from
     * @param decimals 0 to 12
     * @return such as "2.05 bar(a)"
     */
    public static String pressure(double pascal, PressureUnit unit, Datum datum, int decimals) {
        return fixed(unit.ofPascal(pascal), decimals) + " " + unit.symbol() + "(" + datum.mark() + ")";
    }

    /**
     * Prints a duration.
     *
     * @param seconds zero or more
     * @return such as "42 min 05 s", "1 h 02 min 05 s", "12.5 s" below a minute
     */
    public static String duration(double seconds) {
        if (seconds < 60) {
            String text = fixed(seconds, 1);
            return (text.endsWith(".0") ? text.substring(0, text.length() - 2) : text) + " s";
        }
        long whole = StrictMath.round(seconds);
        String tail = twoDigits(whole % 60) + " s";
        if (whole < 3600) {
            return whole / 60 + " min " + tail;
        }
        return whole / 3600 + " h " + twoDigits(whole / 60 % 60) + " min " + tail;
    }

    private static String twoDigits(long value) {
        return value < 10 ? "0" + value : Long.toString(value);
    }
}
