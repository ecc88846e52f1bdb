package org.steamwitness.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;

/**
 * A unit as headers and cells write it.
 *
 * @param quantity what is measured in it
 * @param symbol the unit as plans write it
 * @param datum what a pressure is counted from, where the unit's spelling says so
 */
record UnitText(QuantityKind quantity, String symbol, Optional<Datum> datum) {

    private static final List<Spelling> SPELLINGS = spellings();

    static Optional<UnitText> of(String text) {
        String plain =
                text.strip().replace("\u00B0", "deg").replace("\u00BA", "deg").replace(" ", "");
        return SPELLINGS.stream()
                .filter(s -> s.exact ? s.text.equals(plain) : s.text.equals(plain.toLowerCase(Locale.ROOT)))
                .map(Spelling::unit)
                .findFirst();
    }

    /** Without the pair of brackets around it, if there is one. */
    static String bare(String text) {
        String stripped = text.strip();
        int last = stripped.length() - 1;
        boolean paired = last > 0
                && ((stripped.charAt(0) == '[' && stripped.charAt(last) == ']')
                        || (stripped.charAt(0) == '(' && stripped.charAt(last) == ')'));
        return paired ? stripped.substring(1, last).strip() : stripped;
    }

    private static List<Spelling> spellings() {
        List<Spelling> all = new ArrayList<>();
        temperature(all, TemperatureUnit.CELSIUS, "degc", "deg.c", "celsius", "degcelsius");
        temperature(all, TemperatureUnit.FAHRENHEIT, "degf", "deg.f", "fahrenheit", "degfahrenheit");
        temperature(all, TemperatureUnit.KELVIN, "kelvin");
        all.add(new Spelling("C", true, unit(TemperatureUnit.CELSIUS)));
        all.add(new Spelling("F", true, unit(TemperatureUnit.FAHRENHEIT)));
        all.add(new Spelling("K", true, unit(TemperatureUnit.KELVIN)));
        for (PressureUnit unit : PressureUnit.values()) {
            pressure(all, unit, unit.symbol().toLowerCase(Locale.ROOT));
        }
        pressure(all, PressureUnit.PSI, "lb/in2", "lbf/in2");
        pressure(all, PressureUnit.KILOGRAM_FORCE_PER_SQUARE_CENTIMETRE, "kg/cm2", "kg/cm\u00B2", "kgf/cm\u00B2");
        return List.copyOf(all);
    }

    private static void temperature(List<Spelling> all, TemperatureUnit unit, String... texts) {
        for (String text : texts) {
            all.add(new Spelling(text, false, unit(unit)));
        }
    }

    private static UnitText unit(TemperatureUnit unit) {
        return new UnitText(QuantityKind.TEMPERATURE, unit.symbol(), Optional.empty());
    }

    /** A pressure unit alone, and with the usual endings that tell what it counts from. */
    private static void pressure(List<Spelling> all, PressureUnit unit, String... texts) {
        for (String text : texts) {
            all.add(new Spelling(text, false, new UnitText(QuantityKind.PRESSURE, unit.symbol(), Optional.empty())));
            for (String ending : List.of("a", "(a)", "abs", "abs.", "(abs)", "absolute")) {
                all.add(new Spelling(
                        text + ending,
                        false,
                        new UnitText(QuantityKind.PRESSURE, unit.symbol(), Optional.of(Datum.ABSOLUTE))));
            }
            for (String ending : List.of("g", "(g)", "gauge", "(gauge)")) {
                all.add(new Spelling(
                        text + ending,
                        false,
                        new UnitText(QuantityKind.PRESSURE, unit.symbol(), Optional.of(Datum.GAUGE))));
            }
        }
    }

    private record Spelling(String text, boolean exact, UnitText unit) {}
}
