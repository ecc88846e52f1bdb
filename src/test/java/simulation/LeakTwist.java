package simulation;

/** What makes one air-leakage test differ from the plain one. */
enum LeakTwist {
    /** A tight chamber, or with its fault a leaking one. */
    RATE,
    /** Water is left in the chamber and boils off during the test. */
    WET,
    /** The walls warm the chamber during the test. */
    WARMING
}
