package org.steamwitness.intake;

import java.util.Optional;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/**
 * A column of a log and what its header suggests.
 *
 * @param position 1 for the first
 * @param header as written; "#3" where there is none
 * @param name the header without its unit
 * @param numeric whether its fields are numbers
 * @param quantity what it may measure
 * @param unit the unit of its numbers, as plans write it
 * @param datum what a pressure may be counted from
 * @param place where its sensor may sit
 */
public record FoundColumn(
        int position,
        String header,
        String name,
        boolean numeric,
        Optional<QuantityKind> quantity,
        Optional<String> unit,
        Optional<Datum> datum,
        Optional<Place> place) {

    static FoundColumn of(int index, String header, boolean numeric, String unitBelow) {
        if (header.isBlank()) {
            String name = "#" + (index + 1);
            Optional<UnitText> unit = UnitText.of(unitBelow);
            return new FoundColumn(
                    index + 1,
                    name,
                    name,
                    numeric,
                    unit.map(UnitText::quantity),
                    unit.map(UnitText::symbol),
                    unit.flatMap(UnitText::datum),
                    Optional.empty());
        }
        HeaderText text = HeaderText.of(header, unitBelow);
        return new FoundColumn(
                index + 1,
                header.strip(),
                text.name(),
                numeric,
                text.quantity(),
                text.unit().map(UnitText::symbol),
                text.datum(),
                text.place());
    }

    /**
     * Tells whether a plan's header means this column.
     *
     * @param wanted as the plan writes it
     * @return exactly the header, or "#3" for the third column
     */
    boolean isNamed(String wanted) {
        return header.equals(wanted) || wanted.equals("#" + position);
    }

    /** Tells whether people would call both the same: case, spaces and the unit in the header do not count. */
    boolean isAlike(String wanted) {
        String alike = HeaderText.alike(wanted);
        return HeaderText.alike(header).equals(alike) || HeaderText.alike(name).equals(alike);
    }
}
