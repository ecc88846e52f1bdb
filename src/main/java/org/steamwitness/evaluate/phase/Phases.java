package org.steamwitness.evaluate.phase;

import java.util.List;
import java.util.Optional;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.Trace;

/**
 * All phases of a run and all its attempts at a hold.
 *
 * @param phases cover the run from first to last sample without overlap
 * @param attempts in order of time
 */
public record Phases(List<Phase> phases, List<HoldAttempt> attempts) {

    /**
     * Finds the phases.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @return phases and attempts
     */
    public static Phases of(Trace trace, BoundPlan plan) {
        List<HoldAttempt> attempts = HoldAttempts.of(trace, plan);
        return new Phases(new PhaseFinder(trace, plan, longest(trace, attempts)).find(), attempts);
    }

    /**
     * The hold phase: the longest attempt.
     *
     * @return empty if the band was never held
     */
    public Optional<Phase> hold() {
        return phases.stream().filter(p -> p.name() == PhaseName.HOLD).findFirst();
    }

    /**
     * The attempt that is the hold phase.
     *
     * @return empty if the band was never held
     */
    public Optional<HoldAttempt> judged() {
        return hold().flatMap(phase ->
                attempts.stream().filter(a -> a.from() == phase.from()).findFirst());
    }

    private static Optional<HoldAttempt> longest(Trace trace, List<HoldAttempt> attempts) {
        HoldAttempt longest = null;
        double seconds = -1;
        for (HoldAttempt attempt : attempts) {
            double proven = trace.seconds().at(attempt.to()) - trace.seconds().at(attempt.from());
            if (proven > seconds) {
                longest = attempt;
                seconds = proven;
            }
        }
        return Optional.ofNullable(longest);
    }
}
