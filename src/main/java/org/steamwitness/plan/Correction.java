package org.steamwitness.plan;

import java.time.LocalTime;

/** What a person corrected in the evaluation of a run, with the reason. */
public sealed interface Correction {

    /**
     * Why.
     *
     * @return in words
     */
    String reason();

    /**
     * Who.
     *
     * @return name or function
     */
    String by();

    /**
     * When the correction was entered.
     *
     * @return date and time, as written
     */
    String at();

    /**
     * What is corrected.
     *
     * @return in words
     */
    String what();

    /**
     * A boundary of a phase is moved.
     *
     * @param phase the phase
     * @param start true for its start, false for its end
     * @param to the boundary's new time, by the log's clock
     * @param reason why
     * @param by who
     * @param at when it was entered
     */
    record MovedBoundary(PlannedPhase phase, boolean start, LocalTime to, String reason, String by, String at)
            implements Correction {

        @Override
        public String what() {
            return (start ? "start of " : "end of ") + phase.word() + " moved to " + to;
        }
    }

    /**
     * A probe is left out.
     *
     * @param channel channel of the plan
     * @param reason why
     * @param by who
     * @param at when it was entered
     */
    record ExcludedProbe(String channel, String reason, String by, String at) implements Correction {

        @Override
        public String what() {
            return "channel " + channel + " left out";
        }
    }
}
