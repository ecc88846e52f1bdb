package org.steamwitness.intake;

import java.util.Map;
import java.util.TreeMap;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/**
 * What a channel showed instead of measurements: words such as OPEN, and numbers beyond what its sensor can read. They
 * are missing samples, counted by their text. The ranges are wide, so that nothing a chamber does is taken for a code;
 * common practice, no source.
 */
final class FaultCodes {

    private static final double LOWEST_KELVIN = 173.15;
    private static final double HIGHEST_KELVIN = 623.15;
    private static final double LOWEST_GAUGE_PASCAL = -110e3;
    private static final double LOWEST_ABSOLUTE_PASCAL = -10e3;
    private static final double HIGHEST_PASCAL = 20e6;
    private static final int MOST_TEXTS = 5;

    private final double lowest;
    private final double highest;
    private final Map<String, Integer> texts = new TreeMap<>();
    private int samples;

    FaultCodes(ColumnRule rule) {
        this.lowest = switch (rule.kind()) {
            case TEMPERATURE -> LOWEST_KELVIN;
            case PRESSURE -> rule.datum() == Datum.GAUGE ? LOWEST_GAUGE_PASCAL : LOWEST_ABSOLUTE_PASCAL;
            default -> -Double.MAX_VALUE;
        };
        this.highest = switch (rule.kind()) {
            case TEMPERATURE -> HIGHEST_KELVIN;
            case PRESSURE -> HIGHEST_PASCAL;
            default -> Double.MAX_VALUE;
        };
    }

    /** The lowest value in SI units that the sensor could have measured. */
    double lowest() {
        return lowest;
    }

    /** The highest such value. */
    double highest() {
        return highest;
    }

    /** Whether a value in SI units is one that the sensor could have measured. */
    boolean possible(double value) {
        return value >= lowest && value <= highest;
    }

    void count(String text) {
        samples++;
        String plain = text.strip();
        if (texts.containsKey(plain) || texts.size() < MOST_TEXTS) {
            texts.merge(plain, 1, Integer::sum);
        }
    }

    int samples() {
        return samples;
    }

    /** The texts and how often each stood, such as "850 (12 times), OPEN (3 times)". */
    String words() {
        StringBuilder words = new StringBuilder();
        texts.forEach((text, times) -> words.append(words.isEmpty() ? "" : ", ")
                .append(FieldText.shortened(text))
                .append(times == 1 ? " (once)" : " (" + times + " times)"));
        return words.toString();
    }
}
