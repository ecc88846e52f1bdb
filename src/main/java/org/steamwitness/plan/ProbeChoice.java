package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import org.steamwitness.trace.Place;

/**
 * Which temperature channels a lethality is wanted of: all at one place, or those named.
 *
 * @param place the place; empty if channels are named
 * @param names channels of the plan; empty if a place is meant
 */
public record ProbeChoice(Optional<Place> place, List<String> names) {

    /** All product probes. */
    public static final ProbeChoice PRODUCT = new ProbeChoice(Optional.of(Place.PRODUCT), List.of());

    /**
     * Takes a copy of the names.
     *
     * @param place the place; empty if channels are named
     * @param names channels of the plan; empty if a place is meant
     */
    public ProbeChoice {
        names = List.copyOf(names);
    }

    boolean includes(String name, Place where) {
        return place.map(p -> p == where).orElseGet(() -> names.contains(name));
    }

    /**
     * The choice in words, as a plan writes it.
     *
     * @return such as "product" or "chamber, drain"
     */
    public String words() {
        return place.map(Place::word).orElseGet(() -> String.join(", ", names));
    }
}
