package org.steamwitness.evaluate.saturation;

import org.steamwitness.evaluate.instruments.ChannelMeasure;
import org.steamwitness.evaluate.uncertainty.SampleUncertainty;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.steam.Saturation;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.LagCompensated;
import org.steamwitness.trace.Slope;

/**
 * How far one steam-contact probe stands from saturation: d = T - T_sat(p), sample by sample, with the probe's stated
 * lag taken away. A negative departure is air (or a wet or cold sensor), a positive one superheat. The standard
 * uncertainty combines both sensors by the law of propagation, JCGM 100:2008, 5.1.2:
 * u(d)^2 = u(T)^2 + (dT_sat/dp)^2 u(p)^2 + (dT/dt)^2 (u(lag)^2 + u(delay)^2), where the delay between the channels of
 * one row is a rectangle of half width {@code scanDelaySeconds} (4.3.7). The deviation of IF97 itself, about 0.003 K, is
 * left out.
 */
public final class Departure {

    /** Standard deviation of a rectangle of half width one. */
    private static final double HALF_RECTANGLE = Math.sqrt(3);

    private final ChannelMeasure probe;
    private final Column pascal;
    private final SaturationColumns saturation;
    private final double[] kelvin;
    private final double[] uncertainty;

    Departure(
            ChannelMeasure probe,
            ChannelMeasure pressure,
            SaturationColumns saturation,
            Column seconds,
            BoundPlan plan) {
        this.probe = probe;
        this.pascal = pressure.channel().values();
        this.saturation = saturation;
        Column read = probe.channel().values();
        Slope slope = new Slope(seconds, read, plan.longestGapSeconds());
        LagCompensated temperature =
                new LagCompensated(read, slope, probe.channel().lag().seconds());
        double lag = probe.channel().lag().uncertaintySeconds();
        double delay = plan.scanDelaySeconds() / HALF_RECTANGLE;
        double clock = Math.sqrt(lag * lag + delay * delay);
        this.kelvin = new double[read.size()];
        this.uncertainty = new double[read.size()];
        for (int i = 0; i < kelvin.length; i++) {
            double actual = temperature.at(i);
            boolean onTheLine = actual >= Saturation.LOWEST_KELVIN && actual <= Saturation.HIGHEST_KELVIN;
            kelvin[i] = onTheLine ? actual - saturation.kelvin().at(i) : Double.NaN;
            uncertainty[i] = Double.isNaN(kelvin[i])
                    ? Double.NaN
                    : ofProbe(temperature, slope, clock, i)
                            .and(pressure.uncertainty()
                                    .times(saturation.kelvinPerPascal().at(i)))
                            .ofSample();
        }
    }

    private SampleUncertainty ofProbe(LagCompensated temperature, Slope slope, double clockSeconds, int index) {
        SampleUncertainty own = probe.uncertainty();
        double perSecond = clockSeconds == 0 ? 0 : slope.at(index);
        return new SampleUncertainty(own.common(), own.random() * temperature.noiseFactorAt(index))
                .withCommon(Double.isNaN(perSecond) ? 0 : Math.abs(perSecond) * clockSeconds);
    }

    /**
     * The probe.
     *
     * @return a steam-contact channel
     */
    public BoundChannel channel() {
        return probe.channel();
    }

    /**
     * Departure of every sample.
     *
     * @return kelvin; NaN where a sample is missing, or temperature or pressure lies off the saturation line
     */
    public Column kelvin() {
        return Column.of(kelvin);
    }

    double kelvinAt(int index) {
        return kelvin[index];
    }

    /** Standard uncertainty of the departure in kelvin; NaN where there is no departure. */
    double uncertaintyAt(int index) {
        return uncertainty[index];
    }

    /**
     * The air that would explain the departure, by Dalton's law: y = 1 - p_sat(T)/p as a mole fraction. Below zero it
     * is no air.
     */
    double airFractionAt(int index) {
        double temperature = saturation.kelvin().at(index) + kelvin[index];
        return 1 - Saturation.pascalAt(temperature) / pascal.at(index);
    }

    /** The air that a distance below saturation stands for, by the slope of the saturation line, as a mole fraction. */
    double airFractionFor(double kelvinBelow, int index) {
        return kelvinBelow / (pascal.at(index) * saturation.kelvinPerPascal().at(index));
    }
}
