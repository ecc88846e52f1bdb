package org.steamwitness.plan;

import java.util.Objects;
import java.util.Optional;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/**
 * A column as it was found in a log, with what could be told of it.
 *
 * @param header its header, exactly
 * @param quantity what it measures
 * @param unit unit of its numbers, as plans write it, such as "degC"
 * @param datum what a pressure is counted from
 * @param place where its sensor may sit
 */
public record FoundColumn(
        String header,
        Optional<QuantityKind> quantity,
        Optional<String> unit,
        Optional<Datum> datum,
        Optional<Place> place) {

    /**
     * Checks that all is said or left open.
     *
     * @param header its header, exactly
     * @param quantity what it measures
     * @param unit unit of its numbers
     * @param datum what a pressure is counted from
     * @param place where its sensor may sit
     */
    public FoundColumn {
        Objects.requireNonNull(header, "header");
    }

    /**
     * A column of which only the header is known.
     *
     * @param header its header, exactly
     * @return all else open
     */
    public static FoundColumn named(String header) {
        return new FoundColumn(header, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    }

    boolean measures(QuantityKind kind) {
        return quantity.filter(kind::equals).isPresent();
    }

    /** A sensor in the chamber's steam may well be the one that stands for the chamber. */
    boolean mayStandAt(Place wanted) {
        return place.filter(p -> p == wanted || (wanted == Place.REFERENCE && p == Place.CHAMBER))
                .isPresent();
    }
}
