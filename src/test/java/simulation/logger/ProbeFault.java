package simulation.logger;

import simulation.plant.Window;

/**
 * What can befall a probe.
 *
 * @param kind open circuit, stuck at its last value, a spike of one sample, or fallen out into the chamber
 * @param when for how long
 */
public record ProbeFault(Kind kind, Window when) {

    /** Kinds of faults. */
    public enum Kind {
        OPEN,
        FROZEN,
        SPIKE,
        SLIPPED
    }
}
