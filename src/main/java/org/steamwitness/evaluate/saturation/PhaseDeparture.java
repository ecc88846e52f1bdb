package org.steamwitness.evaluate.saturation;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.trace.Column;

/**
 * What one probe showed in one phase.
 *
 * @param channel the probe
 * @param phase the phase
 * @param states how many samples were in each state that occurred
 * @param longestUnjudgedSeconds longest time between two samples that could be judged, or from the phase's ends to them
 * @param figures its departures; empty if no sample could be judged
 */
public record PhaseDeparture(
        BoundChannel channel,
        Phase phase,
        Map<SampleState, Integer> states,
        double longestUnjudgedSeconds,
        Optional<Figures> figures) {

    static PhaseDeparture of(
            Departure departure, Phase phase, Column seconds, SampleStates states, double toleranceKelvin, double z) {
        Map<SampleState, Integer> counts = new EnumMap<>(SampleState.class);
        int judged = 0;
        int lowest = -1;
        int highest = -1;
        int lowestInside = -1;
        int highestInside = -1;
        double sum = 0;
        double squares = 0;
        double air = 0;
        double airHighest = Double.NEGATIVE_INFINITY;
        double smallestAir = 0;
        double lastJudged = seconds.at(phase.from());
        double longestUnjudged = 0;
        for (int i = phase.from(); i < phase.end(); i++) {
            counts.merge(states.at(i), 1, Integer::sum);
            double kelvin = departure.kelvinAt(i);
            if (Double.isNaN(kelvin)) {
                continue;
            }
            judged++;
            longestUnjudged = Math.max(longestUnjudged, seconds.at(i) - lastJudged);
            lastJudged = seconds.at(i);
            sum += kelvin;
            squares += kelvin * kelvin;
            lowest = lowest < 0 || kelvin < departure.kelvinAt(lowest) ? i : lowest;
            highest = highest < 0 || kelvin > departure.kelvinAt(highest) ? i : highest;
            if (!states.at(i).outside()) {
                lowestInside = lowestInside < 0 || kelvin < departure.kelvinAt(lowestInside) ? i : lowestInside;
                highestInside = highestInside < 0 || kelvin > departure.kelvinAt(highestInside) ? i : highestInside;
            }
            double fraction = departure.airFractionAt(i);
            air += fraction;
            airHighest = Math.max(airHighest, fraction);
            smallestAir = Math.max(
                    smallestAir, departure.airFractionFor(toleranceKelvin + z * departure.uncertaintyAt(i), i));
        }
        longestUnjudged = Math.max(longestUnjudged, seconds.at(phase.end() - 1) - lastJudged);
        Optional<Figures> figures = judged == 0
                ? Optional.empty()
                : Optional.of(new Figures(
                        extreme(departure, lowest),
                        extreme(departure, highest),
                        extreme(departure, lowestInside < 0 ? lowest : lowestInside),
                        extreme(departure, highestInside < 0 ? highest : highestInside),
                        sum / judged,
                        Math.sqrt(squares / judged),
                        air / judged,
                        airHighest,
                        smallestAir));
        return new PhaseDeparture(departure.channel(), phase, counts, longestUnjudged, figures);
    }

    private static Extreme extreme(Departure departure, int index) {
        return new Extreme(departure.kelvinAt(index), departure.uncertaintyAt(index), index);
    }

    /**
     * A least or greatest departure.
     *
     * @param kelvin the departure
     * @param uncertaintyKelvin its standard uncertainty
     * @param index its sample
     */
    public record Extreme(double kelvin, double uncertaintyKelvin, int index) {}

    /**
     * Departures over the samples that could be judged.
     *
     * @param lowest least departure, the first if there are several
     * @param highest greatest departure
     * @param lowestInside least departure within the tolerance; the least of all if there is none
     * @param highestInside greatest departure within the tolerance; the greatest of all if there is none
     * @param meanKelvin mean departure
     * @param rmsKelvin root of the mean square departure
     * @param airFractionMean mean equivalent air fraction
     * @param airFractionHighest highest equivalent air fraction
     * @param smallestAirFraction the least air fraction that this probe would have confirmed at every sample
     */
    public record Figures(
            Extreme lowest,
            Extreme highest,
            Extreme lowestInside,
            Extreme highestInside,
            double meanKelvin,
            double rmsKelvin,
            double airFractionMean,
            double airFractionHighest,
            double smallestAirFraction) {}
}
