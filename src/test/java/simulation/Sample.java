package simulation;

import java.time.LocalDateTime;
import java.util.List;

/**
 * One of the runs that are kept as files.
 *
 * @param name of the run
 * @param variant its kind
 * @param faulty whether the fault is imposed
 * @param style of the log
 * @param start when the log begins
 */
record Sample(String name, Variant variant, boolean faulty, LogStyle style, LocalDateTime start) {

    static List<Sample> all() {
        return List.of(
                of("R2-0413", Variant.RETORT_PLAIN, LogStyle.MONTHS_FIRST, 13, 13),
                of("R2-0414", Variant.RETORT_POCKET, LogStyle.DECIMAL_COMMA, 14, 8),
                of("R2-0415", Variant.RETORT_RESIDUAL_AIR, LogStyle.WIDE, 15, 9),
                of("R2-0416", Variant.RETORT_SUPERHEAT, LogStyle.DEGREE_SIGN, 16, 10),
                of("R2-0417", Variant.RETORT_DIP_AND_FULL_HOLD, LogStyle.PLAIN, 17, 7),
                of("R2-0418", Variant.RETORT_QUIRKS, LogStyle.DEGREE_SIGN, 18, 11),
                of("S1-0420", Variant.POROUS_PLAIN, LogStyle.ELAPSED, 20, 9),
                new Sample("S1-0421", Variant.LEAK_RATE, false, LogStyle.ELAPSED, at(21, 6)),
                of("S1-0422", Variant.LEAK_RATE, LogStyle.DECIMAL_COMMA, 22, 6),
                new Sample("S2-0423", Variant.FLUIDS, false, LogStyle.WIDE, at(23, 12)),
                new Sample("R3-0424", Variant.STEAM_AIR, false, LogStyle.DECIMAL_COMMA, at(24, 14)),
                new Sample("K1-0427", Variant.COOKER_SEALED, false, LogStyle.STOPWATCH, at(27, 15)),
                of("K1-0428", Variant.COOKER_DRY, LogStyle.PLAIN, 28, 16),
                of("K1-0429", Variant.COOKER_DISCHARGING, LogStyle.MONTHS_FIRST, 29, 10));
    }

    private static Sample of(String name, Variant variant, LogStyle style, int day, int hour) {
        return new Sample(name, variant, true, style, at(day, hour));
    }

    private static LocalDateTime at(int day, int hour) {
        return LocalDateTime.of(2026, 4, day, hour, 20);
    }

    SimulatedRun run() {
        return variant.run(new Variant.Setting(name, faulty && variant.hasFault(), style, new Jitter(0)), start);
    }
}
