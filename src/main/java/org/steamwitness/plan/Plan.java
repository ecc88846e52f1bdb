package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.Told;

/**
 * What a cycle on this equipment must do, as people wrote and approved it.
 *
 * @param id the plan's identity across its revisions
 * @param title what it is for, in words
 * @param revision 1 or more
 * @param status draft or in force
 * @param basis where its figures come from
 * @param equipment the chamber it is for
 * @param process what kind of cycle it describes
 * @param medium what heats the load
 * @param atmosphere where the pressure of the atmosphere comes from
 * @param chamber the chamber and what is in it
 * @param reading what it says of how its logs are written
 * @param channels the channels it needs, in its own order
 * @param steps the holds it asks for, one after the other; empty if the process has none
 * @param sampling how often the log has to sample
 * @param longestGapSeconds longest time between two samples that a line may bridge
 * @param scanDelaySeconds how far apart the channels of one row may have been read, at most
 * @param saturation how far from saturation a probe may stand in the hold phase
 * @param lethality what it asks of product probes; may be empty
 * @param limits what else it sets limits on; may be empty
 * @param marksDecide whether an entered mark goes before the boundary found in the log
 * @param markAgreementSeconds how far an entered mark and the found boundary may lie apart
 * @param decision how values are held against limits
 * @param requiredEntries run sheet keys that have to be filled in
 */
public record Plan(
        String id,
        String title,
        int revision,
        PlanStatus status,
        Basis basis,
        String equipment,
        CycleProcess process,
        Medium medium,
        AtmosphereSource atmosphere,
        Optional<Chamber> chamber,
        Told reading,
        List<PlannedChannel> channels,
        List<HoldStep> steps,
        Optional<Sampling> sampling,
        double longestGapSeconds,
        double scanDelaySeconds,
        Optional<SaturationTolerance> saturation,
        List<LethalityAim> lethality,
        List<Limit> limits,
        boolean marksDecide,
        OptionalDouble markAgreementSeconds,
        DecisionRule decision,
        Set<String> requiredEntries) {

    /**
     * Reads a plan.
     *
     * @param file base name of the file, for messages
     * @param bytes the file as it is
     * @return the plan, or all that is wrong with it
     */
    public static AsWritten<Plan> read(String file, byte[] bytes) {
        return Document.read(file, bytes, PlanReader::plan);
    }

    /**
     * The first hold it asks for.
     *
     * @return empty if the process has none
     */
    public Optional<Hold> hold() {
        return steps.stream().findFirst().map(HoldStep::hold);
    }

    /**
     * How the log is to be read for this plan.
     *
     * @return one rule a channel
     */
    public ReadingRules readingRules() {
        return new ReadingRules(channels.stream().map(PlannedChannel::rule).toList(), reading);
    }

    /**
     * Where the plan's figures come from.
     *
     * @param document name or number of the document
     * @param edition its edition
     * @param by who answers for it, by function
     * @param date when
     */
    public record Basis(String document, String edition, String by, String date) {}
}
