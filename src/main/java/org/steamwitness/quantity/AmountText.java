package org.steamwitness.quantity;

import java.util.List;
import java.util.regex.Pattern;

/**
 * Amounts of things as plans and run sheets write them, such as {@code 640 kg}, {@code 1.9 m3},
 * {@code 3.55 kJ/(kg K)}, {@code 95 %}. Each method is named after the quantity and the SI unit that it returns.
 *
 * <p>Factors: prefixes, minute, hour and litre are exact by the SI; the pound is exactly 0.45359237 kg and the foot
 * exactly 0.3048 m by the international yard and pound agreement of 1959.
 *
 * @see QuantityText
 */
public final class AmountText {

    private static final Pattern BARE = Pattern.compile("[+-]?[0-9]{1,15}(?:\\.[0-9]{1,15})?");

    private static final Scale METRE = Scale.times("m", 1);
    private static final Scale FOOT = Scale.times("ft", 0.3048);

    private static final Wording MASS = new Wording(
            "a mass such as 640 kg",
            List.of(Scale.times("kg", 1), Scale.parts("g", 1000), Scale.times("lb", 0.45359237)));
    private static final Wording VOLUME = new Wording(
            "a volume such as 1.9 m3",
            List.of(Scale.times("m3", 1), Scale.parts("dm3", 1000), Scale.parts("l", 1000), Scale.parts("ml", 1e6)));
    private static final Wording LENGTH =
            new Wording("a length such as 73 mm", List.of(METRE, Scale.parts("mm", 1000), FOOT));
    private static final Wording ALTITUDE = new Wording("an altitude such as 350 m", List.of(METRE, FOOT));
    private static final Wording SPECIFIC_HEAT = new Wording(
            "a specific heat such as 3.55 kJ/(kg K)",
            List.of(Scale.times("kJ/(kg K)", 1000), Scale.times("J/(kg K)", 1)));
    private static final Wording ENERGY = new Wording(
            "an energy such as 2.5 kWh",
            List.of(Scale.times("kJ", 1e3), Scale.times("MJ", 1e6), Scale.times("kWh", 3.6e6)));
    private static final Wording FRACTION =
            new Wording("a fraction such as 0.97 or a percentage such as 97 %", List.of(Scale.parts("%", 100)));

    private AmountText() {}

    /**
     * Reads a mass.
     *
     * @param text such as "640 kg", "410 g", "2.2 lb"
     * @return kilogram, above zero
     * @throws QuantityException if it is not one
     */
    public static double massKilogram(String text) {
        return MASS.readPositive(text);
    }

    /**
     * Reads a volume.
     *
     * @param text such as "1.9 m3", "22 l", "22 dm3", "850 ml"
     * @return cubic metre, above zero
     * @throws QuantityException if it is not one
     */
    public static double volumeCubicMetre(String text) {
        return VOLUME.readPositive(text);
    }

    /**
     * Reads a length.
     *
     * @param text such as "1.2 m", "73 mm", "3 ft"
     * @return metre, above zero
     * @throws QuantityException if it is not one
     */
    public static double lengthMetre(String text) {
        return LENGTH.readPositive(text);
    }

    /**
     * Reads an altitude above sea level, as {@link StandardAtmosphere} takes it.
     *
     * @param text such as "350 m", "-20 m", "5200 ft"
     * @return metre, -500 to 9000
     * @throws QuantityException if it is not one
     */
    public static double altitudeMetre(String text) {
        double metre = ALTITUDE.read(text);
        if (!StandardAtmosphere.covers(metre)) {
            throw ALTITUDE.refusal(text, " lies outside -500 m to 9000 m");
        }
        return metre;
    }

    /**
     * Reads a specific heat.
     *
     * @param text such as "3.55 kJ/(kg K)", "500 J/(kg K)"
     * @return joule per kilogram and kelvin, above zero
     * @throws QuantityException if it is not one
     */
    public static double specificHeatJoulePerKilogramKelvin(String text) {
        return SPECIFIC_HEAT.readPositive(text);
    }

    /**
     * Reads an energy.
     *
     * @param text such as "900 kJ", "12 MJ", "2.5 kWh"
     * @return joule, zero or more
     * @throws QuantityException if it is not one
     */
    public static double energyJoule(String text) {
        return ENERGY.readZeroOrMore(text);
    }

    /**
     * Reads a part of a whole. Without the per cent sign it is the fraction itself, so that 1 is all of it.
     *
     * @param text such as "95 %" or "0.97"
     * @return fraction, 0 to 1
     * @throws QuantityException if it is not one
     */
    public static double fraction(String text) {
        double fraction = BARE.matcher(text).matches() ? Double.parseDouble(text) : FRACTION.read(text);
        if (!(fraction >= 0 && fraction <= 1)) {
            throw FRACTION.refusal(text, " lies outside 0 to 1, which is 0 % to 100 %");
        }
        return fraction;
    }
}
