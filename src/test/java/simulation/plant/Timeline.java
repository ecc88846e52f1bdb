package simulation.plant;

import java.util.LinkedHashMap;
import java.util.Map;

/** The time of the run and when its steps began. */
public final class Timeline {

    private final Map<String, Double> starts = new LinkedHashMap<>();
    private long steps;
    private final int stepsPerSecond;

    Timeline(int stepsPerSecond) {
        this.stepsPerSecond = stepsPerSecond;
    }

    /** Seconds since the run began. */
    public double now() {
        return (double) steps / stepsPerSecond;
    }

    /** When a step first began; NaN if it has not. */
    public double start(String step) {
        return starts.getOrDefault(step, Double.NaN);
    }

    /** Every step with its start, in order. */
    public Map<String, Double> starts() {
        return java.util.Collections.unmodifiableMap(starts);
    }

    void begin(String step) {
        starts.putIfAbsent(step, now());
    }

    void tick() {
        steps++;
    }

    boolean isWholeSecond() {
        return steps % stepsPerSecond == 0;
    }
}
