package simulation;

/** What makes one run of the steam sterilizer differ from the plain one. */
enum PorousTwist {
    /** Four vacuum pulses, a plateau at 134 degC, drying under vacuum. */
    PLAIN,
    /** Air stays in one pack. */
    POCKET,
    /** Too few and too shallow pulses: air stays all over. */
    SHALLOW_PULSES,
    /** Air leaks in while the chamber is below the atmosphere. */
    LEAKING,
    /** Four pulses, ten minutes shut, four pulses above the atmosphere. */
    POSITIVE_PULSES,
    /** Drying with pulses of air. */
    PULSED_DRYING,
    /** Plateaus at 90, 110 and 121 degC. */
    STEPS,
    /** The same, with a probe that reads low by the same kelvins. */
    STEPS_OFFSET,
    /** The same, with a transducer that reads high by the same kilopascals. */
    STEPS_PRESSURE_ERROR
}
