package simulation;

import java.time.LocalDateTime;

/**
 * Kinds of runs. Each can be made with any seed, which moves temperatures, times, volumes, masses, leaks, pockets and
 * the errors of the instruments a little; seed 0 is the nominal run. Where a kind has a fault it can be left out.
 */
public enum Variant {
    RETORT_PLAIN(false, Family.RETORT, "PLAIN"),
    RETORT_QUIRKS(false, Family.RETORT, "QUIRKS"),
    RETORT_POCKET(true, Family.RETORT, "POCKET"),
    RETORT_DRAIN_POCKET(true, Family.RETORT, "DRAIN_POCKET"),
    RETORT_RESIDUAL_AIR(true, Family.RETORT, "RESIDUAL_AIR"),
    RETORT_LEAVING_AIR(true, Family.RETORT, "LEAVING_AIR"),
    RETORT_AIR_COMING_IN(true, Family.RETORT, "AIR_COMING_IN"),
    RETORT_SUPERHEAT(true, Family.RETORT, "SUPERHEAT"),
    RETORT_DIP_AND_FULL_HOLD(true, Family.RETORT, "DIP_AND_FULL_HOLD"),
    RETORT_DIP_AND_SHORT_HOLD(true, Family.RETORT, "DIP_AND_SHORT_HOLD"),
    RETORT_ALTITUDE(false, Family.RETORT, "ALTITUDE"),
    RETORT_OVERSHOOT(false, Family.RETORT, "OVERSHOOT"),
    RETORT_CREEP(true, Family.RETORT, "CREEP"),
    RETORT_CUT(true, Family.RETORT, "CUT"),
    RETORT_DRAIN_DIPS(true, Family.RETORT, "DRAIN_DIPS"),
    RETORT_RIPPLE(false, Family.RETORT, "RIPPLE"),
    RETORT_COOLING_DIP(false, Family.RETORT, "COOLING_DIP"),
    RETORT_PRESSURE_HIGH(true, Family.RETORT, "PRESSURE_HIGH"),
    RETORT_PRESSURE_DRIFT(true, Family.RETORT, "PRESSURE_DRIFT"),
    RETORT_HIGH_PROBE(true, Family.RETORT, "HIGH_PROBE"),
    RETORT_ONE_PROBE(false, Family.RETORT, "ONE_PROBE"),
    RETORT_DEAD_PROBE(true, Family.RETORT, "DEAD_PROBE"),
    RETORT_FROZEN_PROBE(true, Family.RETORT, "FROZEN_PROBE"),
    RETORT_SPIKE(true, Family.RETORT, "SPIKE"),
    RETORT_SLIPPED_PROBE(true, Family.RETORT, "SLIPPED_PROBE"),
    RETORT_THREE_CYCLES(true, Family.THREE_CYCLES, ""),
    STEAM_AIR(true, Family.STEAM_AIR, ""),
    POROUS_PLAIN(false, Family.POROUS, "PLAIN"),
    POROUS_POCKET(true, Family.POROUS, "POCKET"),
    POROUS_SHALLOW_PULSES(true, Family.POROUS, "SHALLOW_PULSES"),
    POROUS_LEAKING(true, Family.POROUS, "LEAKING"),
    POROUS_POSITIVE_PULSES(false, Family.POROUS, "POSITIVE_PULSES"),
    POROUS_PULSED_DRYING(false, Family.POROUS, "PULSED_DRYING"),
    POROUS_STEPS(false, Family.POROUS, "STEPS"),
    POROUS_STEPS_OFFSET(true, Family.POROUS, "STEPS_OFFSET"),
    POROUS_STEPS_PRESSURE_ERROR(true, Family.POROUS, "STEPS_PRESSURE_ERROR"),
    LEAK_RATE(true, Family.LEAK, "RATE"),
    LEAK_WET(true, Family.LEAK, "WET"),
    LEAK_WARMING(true, Family.LEAK, "WARMING"),
    FLUIDS(true, Family.FLUIDS, ""),
    COOKER_SEALED(true, Family.COOKER, "SEALED"),
    COOKER_DISCHARGING(false, Family.COOKER, "DISCHARGING"),
    COOKER_SAWING(false, Family.COOKER, "SAWING"),
    COOKER_DRY(true, Family.COOKER, "DRY");

    private static final int YEAR = 2026;

    private final boolean hasFault;
    private final Family family;
    private final String twist;

    Variant(boolean hasFault, Family family, String twist) {
        this.hasFault = hasFault;
        this.family = family;
        this.twist = twist;
    }

    /** Whether the kind has a fault that can be imposed or left out. */
    public boolean hasFault() {
        return hasFault;
    }

    /** A run with a plain log. */
    public SimulatedRun run(long seed, boolean fault) {
        return run(seed, fault, LogStyle.PLAIN);
    }

    /** A run with a log of a style. */
    public SimulatedRun run(long seed, boolean fault, LogStyle style) {
        String name = name().replace('_', '-') + "-" + seed + (fault ? "-F" : "");
        return run(new Setting(name, fault && hasFault, style, new Jitter(seed)), LocalDateTime.of(YEAR, 4, 17, 8, 30));
    }

    SimulatedRun run(Setting setting, LocalDateTime start) {
        String name = setting.name();
        boolean faulty = setting.faulty();
        LogStyle style = setting.style();
        Jitter jitter = setting.jitter();
        return switch (family) {
            case RETORT -> new RetortRun(name, RetortTwist.valueOf(twist), faulty, style, jitter).make(start);
            case THREE_CYCLES -> ThreeCycles.make(setting, start);
            case STEAM_AIR -> new SteamAirRun(name, faulty, style, jitter).make(start);
            case POROUS -> new PorousRun(name, PorousTwist.valueOf(twist), faulty, style, jitter).make(start);
            case LEAK -> new LeakRun(name, LeakTwist.valueOf(twist), faulty, style, jitter).make(start);
            case FLUIDS -> new FluidsRun(name, faulty, style, jitter).make(start);
            case COOKER -> new CookerRun(name, CookerTwist.valueOf(twist), faulty, style, jitter).make(start);
        };
    }

    /** What is simulated. */
    private enum Family {
        RETORT,
        THREE_CYCLES,
        STEAM_AIR,
        POROUS,
        LEAK,
        FLUIDS,
        COOKER
    }

    /**
     * How one run is to be made.
     *
     * @param name of the run
     * @param faulty whether the fault is imposed
     * @param style of the log
     * @param jitter of the figures
     */
    record Setting(String name, boolean faulty, LogStyle style, Jitter jitter) {}
}
