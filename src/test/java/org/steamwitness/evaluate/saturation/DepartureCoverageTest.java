package org.steamwitness.evaluate.saturation;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.steam.Saturation;
import org.steamwitness.trace.Place;

/**
 * Monte Carlo in place of the formula: chambers of known departure are measured by sensors with a calibration error, a
 * lag, a delay, noise and a resolution of their own, and the departure found has to lie within 1.96 of its stated
 * standard uncertainties around the true one in 95 % of them; 93 to 97 % do.
 */
class DepartureCoverageTest {

    private static final int TRIALS = 4000;
    private static final int SAMPLES = 161;
    private static final int STEADY = 100;

    @ParameterizedTest(
            name = "u(T) {0} K, u(p) {1} kPa, noise {2} K, step {3} K, ramp {4} K/s, lag {5} s +- {6} s, delay {7} s")
    @CsvSource({
        "0.10, 1.0, 0.03, 0.01, 0.00, 0, 0.0, 0",
        "0.05, 0.2, 0.02, 0.10, 0.00, 0, 0.0, 0",
        "0.05, 0.2, 0.01, 0.01, 0.10, 6, 1.0, 0",
        "0.25, 0.2, 0.01, 0.01, 0.10, 0, 0.0, 4",
        "0.25, 1.0, 0.05, 0.10, 0.05, 8, 2.0, 2"
    })
    void coversTheTruthAsOftenAsItClaims(
            double uKelvin,
            double uKilopascal,
            double noise,
            double step,
            double ramp,
            double lag,
            double uLag,
            double delay) {
        Random dice = new Random(2008);
        int inside = 0;
        for (int trial = 0; trial < TRIALS; trial++) {
            double calibration = uKelvin * dice.nextGaussian();
            double gauge = uKilopascal * dice.nextGaussian();
            double ownLag = lag + uLag * dice.nextGaussian();
            double ownDelay = delay * (2 * dice.nextDouble() - 1);
            double start = 121 + dice.nextDouble();
            double[] celsius = new double[SAMPLES];
            double[] kilopascal = new double[SAMPLES];
            for (int i = 0; i < SAMPLES; i++) {
                double rising = i < STEADY ? 0 : ramp;
                double truth = start + rising * 5 * (i - STEADY);
                double shown = truth - rising * (ownLag + ownDelay) + calibration + noise * dice.nextGaussian();
                celsius[i] = Math.rint(shown / step) * step;
                kilopascal[i] = Saturation.pascalAt(truth + 273.15) / 1000 + gauge;
            }
            Departure departure = departure(celsius, kilopascal, new double[] {uKelvin, uKilopascal, lag, uLag, delay});
            boolean covered = Math.abs(departure.kelvinAt(130)) <= 1.96 * departure.uncertaintyAt(130);
            inside += covered ? 1 : 0;
        }
        assertThat(inside / (double) TRIALS).isBetween(0.93, 0.97);
    }

    private static Departure departure(double[] celsius, double[] kilopascal, double[] stated) {
        Bench bench = Bench.every(5, SAMPLES)
                .scanning(stated[4])
                .with(
                        Bench.lagging(
                                Bench.temperature("chamber", Place.REFERENCE, stated[0], celsius),
                                stated[2],
                                stated[3]),
                        Bench.pressure(stated[1], kilopascal));
        Instruments instruments = Instruments.of(bench.trace(), bench.plan());
        return new Departure(
                instruments.channels().get(0),
                instruments.channels().get(1),
                SaturationColumns.of(instruments.channels().get(1).channel().values()),
                bench.trace().seconds(),
                bench.plan());
    }
}
