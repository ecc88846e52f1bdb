package org.steamwitness.intake;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/**
 * The header of a column taken apart: its name, and what name and unit suggest of the column. Suggestions are for
 * people to confirm; nothing is evaluated by them.
 *
 * @param raw as written
 * @param name without the unit
 * @param unit the unit, where one that is known was found
 */
record HeaderText(String raw, String name, Optional<UnitText> unit) {

    /** A unit in brackets at the end. */
    private static final Pattern BRACKETED = Pattern.compile("(.*?)\\s*[\\[(]([^\\[\\]]+?)[\\])]\\s*");

    /** What may stand between a name and its unit. */
    private static final Pattern PARTING = Pattern.compile("\\s+in\\s+|\\s*/\\s*|\\s*,\\s*|[\\s_]+");

    private static final Map<Place, List<String>> PLACES = Map.ofEntries(
            Map.entry(Place.DRAIN, List.of("drain")),
            Map.entry(Place.PRODUCT, List.of("product", "can", "jar", "pouch", "core", "food")),
            Map.entry(Place.LOAD, List.of("load", "pack", "bottle")),
            Map.entry(Place.FREE_SPACE, List.of("free", "space", "top", "bottom")),
            Map.entry(Place.JACKET, List.of("jacket")),
            Map.entry(Place.WALL, List.of("wall")),
            Map.entry(Place.WATER, List.of("water", "bath")),
            Map.entry(Place.SUPPLY, List.of("supply", "main", "header")),
            Map.entry(Place.AMBIENT, List.of("ambient", "room")),
            Map.entry(Place.REFERENCE, List.of("reference", "steam", "control", "master")),
            Map.entry(Place.CHAMBER, List.of("chamber", "retort", "vessel")));

    static HeaderText of(String raw, String unitBelow) {
        String text = raw.strip();
        Optional<UnitText> below = UnitText.of(UnitText.bare(unitBelow));
        if (below.isPresent()) {
            return new HeaderText(raw, text, below);
        }
        Matcher bracketed = BRACKETED.matcher(text);
        if (bracketed.matches()) {
            Optional<UnitText> unit = UnitText.of(bracketed.group(2));
            if (unit.isPresent() && !bracketed.group(1).isBlank()) {
                return new HeaderText(raw, bracketed.group(1).strip(), unit);
            }
        }
        Matcher parting = PARTING.matcher(text);
        while (parting.find()) {
            Optional<UnitText> unit = UnitText.of(text.substring(parting.end()));
            if (unit.isPresent() && parting.start() > 0) {
                return new HeaderText(raw, text.substring(0, parting.start()).strip(), unit);
            }
        }
        return new HeaderText(raw, text, Optional.empty());
    }

    /** What it measures, by its unit or else by the words of its name. */
    Optional<QuantityKind> quantity() {
        if (unit.isPresent()) {
            return Optional.of(unit.get().quantity());
        }
        String words = words();
        if (words.matches("t[0-9]*( .*)?") || words.contains("temp")) {
            return Optional.of(QuantityKind.TEMPERATURE);
        }
        if (words.matches("p[0-9]*( .*)?") || words.contains("press")) {
            return Optional.of(QuantityKind.PRESSURE);
        }
        return Optional.empty();
    }

    /** What a pressure is counted from, by its unit or else by the words of its name. */
    Optional<Datum> datum() {
        Optional<Datum> byUnit = unit.flatMap(UnitText::datum);
        if (byUnit.isPresent()) {
            return byUnit;
        }
        String words = words();
        if (words.contains("gauge")) {
            return Optional.of(Datum.GAUGE);
        }
        return words.contains("abs") ? Optional.of(Datum.ABSOLUTE) : Optional.empty();
    }

    /** Where its sensor may sit, by the words of its name. */
    Optional<Place> place() {
        List<String> words = List.of(words().split(" ", -1));
        return PLACES.entrySet().stream()
                .filter(e -> words.stream().anyMatch(w -> e.getValue().contains(w.replaceAll("[0-9]+$", ""))))
                .map(Map.Entry::getKey)
                .sorted()
                .findFirst();
    }

    /** Two headers that people would call the same: case, spaces, degree signs and brackets do not count. */
    static String alike(String header) {
        return header.strip()
                .toLowerCase(Locale.ROOT)
                .replace("\u00BA", "\u00B0")
                .replaceAll("[\\s_]+", " ");
    }

    private String words() {
        return name.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", " ").strip();
    }
}
