package org.steamwitness.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/** The channels of a drafted plan: those of a preset, each with the column that fits, and the columns left over. */
final class DraftChannels {

    private final Preset preset;
    private final List<FoundColumn> columns;
    private final List<FoundColumn> free;
    private final Set<String> names = new LinkedHashSet<>();
    private final List<String> lines = new ArrayList<>();

    DraftChannels(Preset preset, List<FoundColumn> columns) {
        this.preset = preset;
        this.columns = columns;
        this.free = new ArrayList<>(columns);
    }

    List<String> lines() {
        for (Wanted wanted : wanted()) {
            Optional<FoundColumn> column = free.stream().filter(wanted::fits).findFirst();
            if (column.isPresent()) {
                free.remove(column.get());
                write(wanted.name(), wanted.place().word(), column.get());
            } else if (wanted.neededIn(preset.text())) {
                lines.add("  # the hold names this channel; no column of the log looked like it");
                write(
                        wanted.name(),
                        wanted.place().word(),
                        new FoundColumn(
                                "?",
                                Optional.of(wanted.kind()),
                                Optional.empty(),
                                Optional.empty(),
                                Optional.of(wanted.place())));
            } else {
                lines.add("  # no column looked like the preset's channel " + wanted.name() + " ("
                        + wanted.kind().word() + ", " + wanted.place().word() + ")");
            }
        }
        for (FoundColumn column : List.copyOf(free)) {
            write(ChannelName.of(column.header(), names), place(column), column);
        }
        return lines;
    }

    /** A second pressure at the chamber would be refused, so its place is left open. */
    private static String place(FoundColumn column) {
        boolean second = column.measures(QuantityKind.PRESSURE)
                && column.place().filter(Place.CHAMBER::equals).isPresent();
        return second ? OpenPlace.WRITTEN : column.place().map(Place::word).orElse(OpenPlace.WRITTEN);
    }

    private void write(String name, String place, FoundColumn column) {
        names.add(name);
        if (columns.contains(column)) {
            lines.add("  # column " + QuotedText.comment(column.header()));
        }
        StringBuilder entry = new StringBuilder("  - {name: " + QuotedText.of(name) + ", column: "
                + QuotedText.of(column.header()) + ", quantity: "
                + column.quantity().map(QuantityKind::word).orElse(OpenPlace.WRITTEN) + ", place: " + place
                + ", unit: " + column.unit().map(QuotedText::of).orElse(OpenPlace.WRITTEN));
        if (column.measures(QuantityKind.PRESSURE)) {
            entry.append(", datum: ").append(column.datum().map(Datum::word).orElse(OpenPlace.WRITTEN));
        }
        lines.add(entry.append(',').toString());
        lines.add("     uncertainty: {calibration: " + OpenPlace.WRITTEN + ", coverage: 2}}");
    }

    private List<Wanted> wanted() {
        List<Wanted> all = new ArrayList<>();
        Object root = new Load(LoadSettings.builder().build()).loadFromString(preset.text());
        for (Object entry : (List<?>) ((Map<?, ?>) root).get("channels")) {
            Map<?, ?> keys = (Map<?, ?>) entry;
            all.add(new Wanted(
                    String.valueOf(keys.get("name")),
                    named(QuantityKind.values(), QuantityKind::word, keys.get("quantity")),
                    named(Place.values(), Place::word, keys.get("place"))));
        }
        return all;
    }

    private static <E> E named(E[] all, Function<E, String> word, Object wanted) {
        return Arrays.stream(all)
                .filter(each -> word.apply(each).equals(wanted))
                .findFirst()
                .orElseThrow();
    }

    /** A channel of the preset. */
    private record Wanted(String name, QuantityKind kind, Place place) {

        boolean fits(FoundColumn column) {
            return column.measures(kind) && column.mayStandAt(place);
        }

        boolean neededIn(String text) {
            return text.lines()
                    .filter(line -> line.contains("starts:"))
                    .anyMatch(line -> line.matches(".*\\[(.*, )?" + name + "(,.*)?].*"));
        }
    }
}
