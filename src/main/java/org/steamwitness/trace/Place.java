package org.steamwitness.trace;

/** Where a channel's sensor sits. */
public enum Place {
    /** The point that stands for the chamber by the plan's choice. */
    REFERENCE("reference", true),
    /** In the chamber's steam. */
    CHAMBER("chamber", true),
    /** In the drain, where air leaves last. */
    DRAIN("drain", true),
    /** In the steam between the packs of the load. */
    FREE_SPACE("free-space", true),
    /** Inside a porous load that steam reaches. */
    LOAD("load", true),
    /** Inside a sealed container. */
    PRODUCT("product", false),
    /** In the jacket. */
    JACKET("jacket", false),
    /** On a wall. */
    WALL("wall", false),
    /** In the water of the chamber. */
    WATER("water", false),
    /** In the steam supply. */
    SUPPLY("supply", false),
    /** In the room. */
    AMBIENT("ambient", false);

    private final String word;
    private final boolean steamContact;

    Place(String word, boolean steamContact) {
        this.word = word;
        this.steamContact = steamContact;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "free-space"
     */
    public String word() {
        return word;
    }

    /**
     * Tells whether a sensor at this place stands in the chamber's steam, so that its temperature can be held against
     * saturation.
     *
     * @return true for steam-contact places
     */
    public boolean steamContact() {
        return steamContact;
    }
}
