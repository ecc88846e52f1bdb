package org.steamwitness.evaluate.saturation;

import org.steamwitness.evaluate.instruments.ChannelMeasure;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.steam.Saturation;
import org.steamwitness.trace.Column;

/**
 * How far one steam-contact probe stands from saturation: d = T - T_sat(p), sample by sample. A negative departure is
 * air (or a wet or cold sensor), a positive one superheat. The standard uncertainty combines both sensors by the law of
 * propagation, JCGM 100:2008, 5.1.2: u(d)^2 = u(T)^2 + (dT_sat/dp)^2 u(p)^2.
 */
public final class Departure {

    private final ChannelMeasure probe;
    private final ChannelMeasure pressure;

    Departure(ChannelMeasure probe, ChannelMeasure pressure) {
        this.probe = probe;
        this.pressure = pressure;
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
     * Departure of a sample.
     *
     * @param index of the sample
     * @return kelvin; NaN where a sample is missing, or temperature or pressure lies off the saturation line
     */
    public double kelvinAt(int index) {
        double kelvin = probe.channel().values().at(index);
        return kelvin >= Saturation.LOWEST_KELVIN && kelvin <= Saturation.HIGHEST_KELVIN
                ? kelvin - saturationKelvin(pressure.channel().values(), index)
                : Double.NaN;
    }

    /**
     * Standard uncertainty of the departure.
     *
     * @param index of a sample whose departure is not NaN
     * @return kelvin
     */
    public double uncertaintyAt(int index) {
        double slope = Saturation.kelvinPerPascalAt(pressure.channel().values().at(index));
        double fromProbe = probe.sampleUncertainty();
        double fromPressure = slope * pressure.sampleUncertainty();
        return Math.sqrt(fromProbe * fromProbe + fromPressure * fromPressure);
    }

    /**
     * The air that would explain the departure, by Dalton's law: y = 1 - p_sat(T)/p. Below zero it is no air.
     *
     * @param index of a sample whose departure is not NaN
     * @return mole fraction
     */
    public double airFractionAt(int index) {
        return 1
                - Saturation.pascalAt(probe.channel().values().at(index))
                        / pressure.channel().values().at(index);
    }

    /**
     * The air that a departure of a given size stands for, by the slope of the saturation line.
     *
     * @param kelvin distance below saturation, zero or more
     * @param index of a sample whose departure is not NaN
     * @return mole fraction
     */
    double airFractionFor(double kelvin, int index) {
        double pascal = pressure.channel().values().at(index);
        return kelvin / (pascal * Saturation.kelvinPerPascalAt(pascal));
    }

    /**
     * Saturation temperature of a measured pressure.
     *
     * @param pascal absolute pressures
     * @param index of the sample
     * @return kelvin; NaN where the sample is missing or lies off the saturation line
     */
    static double saturationKelvin(Column pascal, int index) {
        double pressure = pascal.at(index);
        return pressure >= Saturation.LOWEST_PASCAL && pressure <= Saturation.HIGHEST_PASCAL
                ? Saturation.kelvinAt(pressure)
                : Double.NaN;
    }
}
