package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.steamwitness.trace.ReadingRules;

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
 * @param channels the channels it needs, in its own order
 * @param hold the hold it asks for
 * @param longestGapSeconds longest time between two samples that a line may bridge
 * @param scanDelaySeconds how far apart the channels of one row may have been read, at most
 * @param saturation how far from saturation a probe may stand in the hold phase
 * @param lethality what it asks of product probes; may be empty
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
        List<PlannedChannel> channels,
        Hold hold,
        double longestGapSeconds,
        double scanDelaySeconds,
        Optional<SaturationTolerance> saturation,
        List<LethalityAim> lethality,
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
     * How the log is to be read for this plan.
     *
     * @return one rule a channel
     */
    public ReadingRules readingRules() {
        return new ReadingRules(channels.stream().map(PlannedChannel::rule).toList());
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
