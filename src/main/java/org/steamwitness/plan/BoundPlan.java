package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace;

/**
 * A plan and a run sheet tied to one trace: channels are columns, all is SI, nothing is left to a default.
 *
 * @param channels all channels, in the order of the plan; a gauge pressure without a known atmosphere is left out
 * @param hold the hold asked for
 * @param startChannels the channels that all have to be in the hold's band
 * @param saturation tolerances, where the medium is meant to stand at saturation
 * @param lethality lethality aims
 * @param limits what else the plan sets limits on
 * @param unheeded what plan and run sheet ask for that this version does not heed and without which nothing that is
 *     decided may stand
 * @param decision how values are held against limits
 * @param longestGapSeconds longest time between two samples that a line may bridge
 * @param scanDelaySeconds how far apart the channels of one row may have been read, at most
 * @param marks instants entered by hand
 * @param draft whether the plan is not in force
 * @param source where the limits come from
 */
public record BoundPlan(
        List<BoundChannel> channels,
        Hold hold,
        List<BoundChannel> startChannels,
        Optional<SaturationTolerance> saturation,
        List<LethalityAim> lethality,
        List<Limit> limits,
        List<String> unheeded,
        DecisionRule decision,
        double longestGapSeconds,
        double scanDelaySeconds,
        Marks marks,
        boolean draft,
        Plan.Basis source) {

    /**
     * Ties plan and run sheet to a trace.
     *
     * @param plan as written
     * @param sheet as written
     * @param trace read by the plan's own reading rules
     * @return the bound plan and what did not fit
     */
    public static Bound of(Plan plan, RunSheet sheet, Trace trace) {
        return new Binding(plan, sheet, trace).bound();
    }

    /**
     * The chamber's pressure.
     *
     * @return its channel; empty if none is planned or it can't be made absolute
     */
    public Optional<BoundChannel> pressure() {
        return channels.stream()
                .filter(c -> c.kind() == QuantityKind.PRESSURE && c.place() == Place.CHAMBER)
                .findFirst();
    }

    /**
     * The channels whose sensors stand in the chamber's steam.
     *
     * @return in the order of the plan
     */
    public List<BoundChannel> inSteam() {
        return channels.stream().filter(BoundChannel::inSteam).toList();
    }

    /**
     * The channels whose sensors measure a product.
     *
     * @return in the order of the plan
     */
    public List<BoundChannel> inProduct() {
        return channels.stream().filter(BoundChannel::inProduct).toList();
    }

    /**
     * The channels that a lethality is wanted of.
     *
     * @param aim one of the plan's
     * @return in the order of the plan; empty if the plan has none such
     */
    public List<BoundChannel> probesOf(LethalityAim aim) {
        return channels.stream()
                .filter(c -> c.kind() == QuantityKind.TEMPERATURE)
                .filter(c -> aim.probes().includes(c.name(), c.place()))
                .toList();
    }

    /**
     * What binding gives.
     *
     * @param plan the bound plan
     * @param findings what did not fit
     */
    public record Bound(BoundPlan plan, List<Finding> findings) {}
}
