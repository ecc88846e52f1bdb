package simulation;

import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;

/** Three cycles of one retort in one log; the run sheet asks for the second. Its fault: the sheet does not say which. */
final class ThreeCycles {

    private static final int MINUTES_APART = 95;

    private ThreeCycles() {}

    static SimulatedRun make(Variant.Setting setting, LocalDateTime start) {
        StringBuilder log = new StringBuilder();
        SimulatedRun asked = null;
        for (int i = 0; i < 3; i++) {
            long seed = setting.jitter().seed() == 0 ? 0 : setting.jitter().seed() * 3 + i;
            SimulatedRun one = new RetortRun(setting.name(), RetortTwist.PLAIN, false, LogStyle.PLAIN, new Jitter(seed))
                    .make(start.plusMinutes((long) i * MINUTES_APART - seed % 97));
            String text = new String(one.log(), StandardCharsets.UTF_8);
            log.append(i == 0 ? text : text.substring(text.indexOf('\n') + 1));
            asked = i == 1 ? one : asked;
        }
        Truth truth = asked.truth();
        LocalDateTime first = truth.start();
        String part = "log-part: {from: " + clock(first) + ", to: "
                + clock(first.plusSeconds((long) truth.history().end())) + "}\n";
        String sheet = asked.sheet().replace("zone:", part + "zone:");
        Truth told = new Truth(
                setting.name(),
                "retort-three-cycles",
                setting.jitter().seed(),
                setting.faulty(),
                first,
                truth.interval(),
                truth.atmosphere(),
                truth.spots(),
                truth.phases(),
                truth.attempts(),
                truth.faults(),
                truth.lethality(),
                truth.leakPascalPerSecond(),
                setting.faulty() ? Expected.NOT_EVALUATED : Expected.MET,
                truth.figures(),
                truth.history(),
                truth.balance());
        return new SimulatedRun(
                setting.name(),
                asked.extension(),
                log.toString().getBytes(StandardCharsets.UTF_8),
                asked.plan(),
                setting.faulty() ? asked.sheet() : sheet,
                told);
    }

    private static String clock(LocalDateTime time) {
        return java.time.format.DateTimeFormatter.ofPattern("HH:mm:ss", java.util.Locale.ROOT)
                .format(time);
    }
}
