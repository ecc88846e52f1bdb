package simulation;

/** What makes one retort run differ from the plain one. */
enum RetortTwist {
    PLAIN,
    /** A plain run whose log has every oddity. */
    QUIRKS,
    /** Air stays at the free-space probe for some minutes of the hold phase. */
    POCKET,
    /** Air stays at the drain for some minutes of the hold phase. */
    DRAIN_POCKET,
    /** The vent shuts far too early and the bleeders stay shut. */
    RESIDUAL_AIR,
    /** The vent shuts early; the bleeders drive the rest out. */
    LEAVING_AIR,
    /** Compressed air creeps in through its valve during the hold phase. */
    AIR_COMING_IN,
    /** The main sends superheated steam. */
    SUPERHEAT,
    /** Steam fails; the whole hold phase is run once more. */
    DIP_AND_FULL_HOLD,
    /** Steam fails; the rest of the hold phase is run, no more. */
    DIP_AND_SHORT_HOLD,
    /** A plant at 1500 m. */
    ALTITUDE,
    /** Over the set point, under the limit, then settled. */
    OVERSHOOT,
    /** The temperature creeps through the limit. */
    CREEP,
    /** Two logs' worth of trouble: the log begins hot and ends in the hold phase. */
    CUT,
    /** Air gathers at the drain for a few seconds, regularly. */
    DRAIN_DIPS,
    /** The valve hunts faster than the probes follow. */
    RIPPLE,
    /** The pressure falls below the atmosphere at the start of cooling. */
    COOLING_DIP,
    /** The transducer reads high by the same kilopascals. */
    PRESSURE_HIGH,
    /** The transducer drifts upwards. */
    PRESSURE_DRIFT,
    /** The free-space probe reads high. */
    HIGH_PROBE,
    /** Only the chamber's own probe is there. */
    ONE_PROBE,
    /** The free-space probe is open. */
    DEAD_PROBE,
    /** The drain's probe stops moving in the hold phase. */
    FROZEN_PROBE,
    /** One sample of the free-space probe is wild. */
    SPIKE,
    /** A can's probe falls out into the chamber. */
    SLIPPED_PROBE
}
