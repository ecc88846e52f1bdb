package org.steamwitness.record;

import java.util.List;

/**
 * The result of one run with its evidence, as {@code record.json} holds it. Temperatures in degrees Celsius,
 * differences in kelvin, absolute pressures in kilopascal, times in seconds from the first sample, lethality in
 * minutes.
 *
 * @param schema name and version of this shape
 * @param provenance from what and by what it was made
 * @param reading how the log was read
 * @param run what was entered by hand
 * @param plan the plan
 * @param channels what the log shows of each channel
 * @param phases the phases, in order of time
 * @param pulses pressure pulses of the air removal
 * @param saturation steam-contact probes held against saturation
 * @param hold the hold
 * @param lethality lethality at the product probes
 * @param energy energy per phase
 * @param airLeakage air leakage
 * @param criteria limits held against values
 * @param verdict all together
 * @param findings what the reader must know
 * @param notJudged what was not judged, and why
 * @param cautions what to heed, whatever the verdict says
 */
public record CycleRecord(
        String schema,
        Provenance provenance,
        ReadingPart reading,
        RunPart run,
        PlanPart plan,
        List<ChannelPart> channels,
        List<PhasePart> phases,
        Given<List<String>> pulses,
        SaturationPart saturation,
        HoldPart hold,
        List<LethalityPart> lethality,
        Given<String> energy,
        Given<String> airLeakage,
        List<CriterionPart> criteria,
        VerdictPart verdict,
        List<FindingPart> findings,
        List<NotJudged> notJudged,
        List<Caution> cautions) {

    /** Name and version of the shape that this program writes. */
    public static final String SCHEMA = "steamwitness-record/1";

    /**
     * Something that was not judged.
     *
     * @param what in words
     * @param why in words
     */
    public record NotJudged(String what, String why) {}

    /**
     * Something to heed.
     *
     * @param text in words
     */
    public record Caution(String text) {}
}
