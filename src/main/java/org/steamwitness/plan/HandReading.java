package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.Optional;
import org.steamwitness.quantity.PressureReading;

/**
 * What a person read from the indicating instruments.
 *
 * @param at by the log's clock
 * @param indicatingKelvin the indicating thermometer
 * @param pressure the indicating gauge
 */
public record HandReading(LocalTime at, Optional<Double> indicatingKelvin, Optional<PressureReading> pressure) {

    /**
     * Checks that something was read.
     *
     * @param at by the log's clock
     * @param indicatingKelvin the indicating thermometer
     * @param pressure the indicating gauge
     * @throws IllegalArgumentException if neither was
     */
    public HandReading {
        if (indicatingKelvin.isEmpty() && pressure.isEmpty()) {
            throw new IllegalArgumentException("a reading needs indicating or pressure");
        }
    }
}
