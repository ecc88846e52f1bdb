package org.steamwitness.plan;

import java.util.Locale;

/** What chambers, containers and loads are made of. */
public enum Material {
    /** Stainless steel. */
    STAINLESS_STEEL,
    /** Carbon steel. */
    CARBON_STEEL,
    /** Aluminium. */
    ALUMINIUM,
    /** Copper. */
    COPPER,
    /** Brass. */
    BRASS,
    /** Glass of bottles and jars. */
    GLASS,
    /** Borosilicate glass. */
    BOROSILICATE_GLASS,
    /** Polypropylene. */
    POLYPROPYLENE,
    /** Silicone rubber. */
    SILICONE_RUBBER,
    /** Cotton textile, dry. */
    COTTON,
    /** Water. */
    WATER;

    /**
     * The word used in plans.
     *
     * @return such as "stainless-steel"
     */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
