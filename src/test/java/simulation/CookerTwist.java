package simulation;

/** What makes one pressure-cooker run differ from another. */
enum CookerTwist {
    /** Shut cold with its air, heated, held, left to cool: nothing leaves it. */
    SEALED,
    /** Air driven out, then shut; the weight lets steam out all through the hold. */
    DISCHARGING,
    /** The same with a weight that saws between 112 and 118 degC. */
    SAWING,
    /** Too little water: it boils dry in the hold. */
    DRY
}
