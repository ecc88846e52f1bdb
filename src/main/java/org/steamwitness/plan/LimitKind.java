package org.steamwitness.plan;

import java.util.EnumSet;
import java.util.Locale;
import java.util.Set;

/** What a limit can be set on: a closed list. */
public enum LimitKind {
    /** Temperature of the coldest container at the start. */
    INITIAL_TEMPERATURE(Measure.TEMPERATURE),
    /** Time from closing to steam on. */
    TIME_TO_STEAM_ON(Measure.DURATION),
    /** Venting: a time and a temperature together, in any of several ways. */
    VENT(Measure.DURATION, Measure.TEMPERATURE),
    /** Time from steam on to the hold. */
    COME_UP_TIME(Measure.DURATION),
    /** Time from steam on to steam off. */
    PROCESS_TIME(Measure.DURATION),
    /** Time in the hold's band. */
    HOLDING_TIME(Measure.DURATION),
    /** Temperatures of a phase. */
    TEMPERATURE(Measure.TEMPERATURE),
    /** Pressures of a phase. */
    PRESSURE(Measure.PRESSURE),
    /** Highest less lowest of the probes at one time. */
    SPREAD(Measure.TEMPERATURE_DIFFERENCE),
    /** Recorder less indicating instrument. */
    RECORDER_AGAINST_INDICATING(Measure.TEMPERATURE_DIFFERENCE),
    /** A probe less the reference. */
    PROBE_AGAINST_REFERENCE(Measure.TEMPERATURE_DIFFERENCE),
    /** How many pulses the air removal has. */
    PULSES(Measure.COUNT),
    /** Lowest pressure of each pulse. */
    PULSE_DEPTH(Measure.PRESSURE),
    /** Highest pressure of each pulse. */
    PULSE_PEAK(Measure.PRESSURE),
    /** Time that slower probes take to reach the band. */
    EQUILIBRATION(Measure.DURATION),
    /** How fast a temperature changes. */
    TEMPERATURE_RATE(Measure.TEMPERATURE_RATE),
    /** How fast a pressure changes. */
    PRESSURE_RATE(Measure.PRESSURE_RATE),
    /** Pressure above that of saturation. */
    OVERPRESSURE(Measure.PRESSURE_DIFFERENCE),
    /** Distance from saturation. */
    SATURATION(Measure.TEMPERATURE_DIFFERENCE),
    /** Lethality, in time at its reference. */
    LETHALITY(Measure.DURATION),
    /** Cook value, in time at its reference. */
    COOK_VALUE(Measure.DURATION),
    /** Rise of pressure under vacuum. */
    AIR_LEAKAGE(Measure.PRESSURE_RATE),
    /** Time or pressure of drying. */
    DRYING(Measure.DURATION, Measure.PRESSURE),
    /** Temperature at the end of cooling. */
    COOLING_END_TEMPERATURE(Measure.TEMPERATURE),
    /** Temperature of the load when the door is freed. */
    LOAD_TEMPERATURE_AT_RELEASE(Measure.TEMPERATURE),
    /** Flow of a medium. */
    FLOW(Measure.MASS_FLOW),
    /** Level of water. */
    LEVEL(Measure.LENGTH),
    /** Rotation of the load. */
    ROTATION(Measure.ROTATION),
    /** Time from the first to the last phase. */
    TOTAL_TIME(Measure.DURATION),
    /** Jacket less chamber. */
    JACKET_ABOVE_CHAMBER(Measure.TEMPERATURE_DIFFERENCE);

    private final Measure first;
    private final Measure second;

    LimitKind(Measure only) {
        this(only, only);
    }

    LimitKind(Measure first, Measure second) {
        this.first = first;
        this.second = second;
    }

    /**
     * The word used in plans and records.
     *
     * @return such as "come-up-time"
     */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** What its figures may be stated in. */
    Set<Measure> measures() {
        return EnumSet.of(first, second);
    }

    /** What its figures are stated in as a rule. */
    Measure usual() {
        return first;
    }

    /** Whether a window of time belongs to it. */
    boolean overTime() {
        return this == TEMPERATURE_RATE || this == PRESSURE_RATE || this == AIR_LEAKAGE;
    }

    /** Whether it may name one of the plan's lethalities. */
    boolean named() {
        return this == LETHALITY || this == COOK_VALUE;
    }
}
