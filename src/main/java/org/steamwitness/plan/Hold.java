package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;

/**
 * The hold that the plan asks for.
 *
 * @param atLeastKelvin lowest temperature of the band, inclusive
 * @param atMostKelvin highest temperature of the band, inclusive
 * @param setPointKelvin what the controller aims at
 * @param durationSeconds how long every starting channel has to stay in the band
 * @param startChannels names of the channels that all have to be in the band
 */
public record Hold(
        double atLeastKelvin,
        double atMostKelvin,
        Optional<Double> setPointKelvin,
        double durationSeconds,
        List<String> startChannels) {

    /**
     * Checks the band.
     *
     * @param atLeastKelvin lowest temperature of the band, inclusive
     * @param atMostKelvin highest temperature of the band, inclusive
     * @param setPointKelvin what the controller aims at
     * @param durationSeconds how long every starting channel has to stay in the band
     * @param startChannels names of the channels that all have to be in the band
     * @throws IllegalArgumentException if the band is upside down or the duration zero
     */
    public Hold {
        if (!(atLeastKelvin < atMostKelvin)) {
            throw new IllegalArgumentException("at-least must lie below at-most");
        }
        if (!(durationSeconds > 0)) {
            throw new IllegalArgumentException("the hold's duration must exceed zero");
        }
        startChannels = List.copyOf(startChannels);
    }

    /**
     * Tells whether a temperature lies in the band.
     *
     * @param kelvin a temperature, not NaN
     * @return true on both limits too
     */
    public boolean contains(double kelvin) {
        return kelvin >= atLeastKelvin && kelvin <= atMostKelvin;
    }
}
