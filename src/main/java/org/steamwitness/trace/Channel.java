package org.steamwitness.trace;

import org.steamwitness.quantity.Datum;

/**
 * One column of the log as it was read.
 *
 * @param rule which column it is and how its numbers were understood
 * @param values samples in kelvin or pascal, the pressure counted from the rule's datum; NaN where missing
 */
public record Channel(ReadingRules.ColumnRule rule, Column values) {

    /**
     * The channel's values counted from vacuum.
     *
     * @param atmospherePascal absolute pressure of the atmosphere, used only by gauge pressures
     * @return kelvin, or absolute pascal
     */
    public Column absolute(double atmospherePascal) {
        return rule.datum() == Datum.GAUGE ? values.plus(rule.datum().toAbsolute(atmospherePascal)) : values;
    }
}
