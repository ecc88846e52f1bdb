package simulation;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Random;

/**
 * An invented retort run in saturated steam, two hours at five seconds. Steam comes on at 08:12, drives the air out
 * until the vent closes at 08:19, heats to 122 degC, holds until 09:10; then water cools under a cushion of air. The
 * cans follow the chamber through two lags in a row.
 */
public final class SaturatedSteamRun {

    private static final LocalDateTime START = LocalDateTime.of(2026, 3, 14, 8, 5);
    private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss", Locale.ROOT);
    private static final double ATMOSPHERE = 100_800;
    private static final int SAMPLES = 1441;
    private static final double STEP = 5;
    private static final double STEAM_ON = 420;
    private static final double VENT_CLOSED = 840;
    private static final double AT_TEMPERATURE = 1290;
    private static final double STEAM_OFF = 3900;

    private final SteamTable steam = new SteamTable();
    private final Random noise = new Random(20260314);

    /**
     * Prepares the run.
     *
     * @throws IOException if the steam table can't be read
     */
    public SaturatedSteamRun() throws IOException {}

    /** The log as a logger would write it. */
    public String log() {
        StringBuilder log = new StringBuilder("time,T1 steam,T2 drain,T3 free space,P1,T5,T6\n");
        double slow1 = 68.0;
        double can1 = 68.0;
        double slow2 = 68.6;
        double can2 = 68.6;
        for (int i = 0; i < SAMPLES; i++) {
            double t = i * STEP;
            double chamber = chamber(t);
            double air = air(t);
            slow1 += STEP / 150 * (chamber - slow1);
            can1 += STEP / 950 * (slow1 - can1);
            slow2 += STEP / 130 * (chamber - slow2);
            can2 += STEP / 870 * (slow2 - can2);
            log.append(TIME.format(START.plusSeconds((long) t)));
            write(log, chamber + 0.03 + gauss(0.03), 2);
            write(log, chamber - 0.12 - 40 * air * (chamber > 60 ? 0.5 : 0) + gauss(0.03), 2);
            write(log, chamber - 0.05 - 12 * air * (chamber > 60 ? 0.5 : 0) + gauss(0.03), 2);
            write(log, (pascal(t, chamber, air) - ATMOSPHERE + gauss(100)) / 1e5, 3);
            write(log, can1 + gauss(0.02), 2);
            write(log, can2 + gauss(0.02), 2);
            log.append('\n');
        }
        return log.toString();
    }

    private double chamber(double t) {
        if (t < STEAM_ON) {
            return 24;
        }
        if (t < VENT_CLOSED) {
            return 24 + 84 * (1 - StrictMath.exp(-(t - STEAM_ON) / 130));
        }
        if (t < AT_TEMPERATURE) {
            double atVent = 24 + 84 * (1 - StrictMath.exp(-(VENT_CLOSED - STEAM_ON) / 130));
            double share = (t - VENT_CLOSED) / (AT_TEMPERATURE - VENT_CLOSED);
            return atVent + (122.0 - atVent) * (1 - StrictMath.exp(-4 * share)) / (1 - StrictMath.exp(-4));
        }
        if (t <= STEAM_OFF) {
            return 122.0 + 0.25 * StrictMath.sin((t - AT_TEMPERATURE) * 2 * StrictMath.PI / 95);
        }
        return 27 + 95 * StrictMath.exp(-(t - STEAM_OFF) / 300);
    }

    /** Share of air in the chamber's gas, by volume. */
    private static double air(double t) {
        if (t < STEAM_ON) {
            return 1;
        }
        return t < STEAM_OFF ? StrictMath.exp(-(t - STEAM_ON) / 75) : 0;
    }

    private double pascal(double t, double chamber, double air) {
        if (t < STEAM_ON) {
            return ATMOSPHERE;
        }
        if (t <= STEAM_OFF) {
            return Math.max(ATMOSPHERE, steam.pascalAt(chamber) / (1 - Math.min(air, 0.9)));
        }
        double cushion = 215_000 - ATMOSPHERE;
        return ATMOSPHERE + cushion * StrictMath.exp(-(t - STEAM_OFF) / 900);
    }

    private double gauss(double sigma) {
        double sum = -6;
        for (int i = 0; i < 12; i++) {
            sum += noise.nextDouble();
        }
        return sigma * sum;
    }

    private static void write(StringBuilder log, double value, int decimals) {
        log.append(',')
                .append(new BigDecimal(value)
                        .setScale(decimals, RoundingMode.HALF_UP)
                        .toPlainString());
    }
}
