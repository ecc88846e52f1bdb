package org.steamwitness.evaluate.lethality;

import org.steamwitness.plan.LethalityAim;
import org.steamwitness.trace.SegmentWalk;

/**
 * Lethality F = integral of 10^((T - T_ref)/z) dt, exact for a temperature that runs straight between samples: the
 * logarithmic mean of the lethal rates at both ends times the time between them,
 * {@code dt (L2 - L1)/ln(L2/L1) = dt L1 expm1(a)/a} with {@code a = ln10 (T2 - T1)/z}. Below a floor nothing counts;
 * a segment that crosses the floor is cut where it crosses.
 */
final class LethalityIntegral implements SegmentWalk.Visitor {

    private static final double LN_10 = 2.302585092994046;

    /** Below this the difference of two rates loses digits and the series of expm1(a)/a is exact to rounding. */
    private static final double SMALL = 1e-2;

    private final double referenceKelvin;
    private final double ratePerKelvin;
    private final double floorKelvin;
    private final double offsetKelvin;

    private double seconds;
    private double lastKelvin = Double.NaN;
    private double lastRate;

    /**
     * Starts an integral at zero.
     *
     * @param aim reference temperature, z and floor
     * @param offsetKelvin added to every temperature, to see what a shared error of the sensor would change
     */
    LethalityIntegral(LethalityAim aim, double offsetKelvin) {
        this.referenceKelvin = aim.referenceKelvin();
        this.ratePerKelvin = LN_10 / aim.zKelvin();
        this.floorKelvin = aim.floorKelvin().orElse(Double.NEGATIVE_INFINITY);
        this.offsetKelvin = offsetKelvin;
    }

    /** What has been summed so far, in seconds at the reference temperature. */
    double seconds() {
        return seconds;
    }

    @Override
    public void segment(double startSeconds, double startValue, double endSeconds, double endValue) {
        double start = startValue + offsetKelvin;
        double end = endValue + offsetKelvin;
        double duration = endSeconds - startSeconds;
        if (start >= floorKelvin && end >= floorKelvin) {
            add(start, end, duration);
        } else if (start > floorKelvin || end > floorKelvin) {
            double above = (Math.max(start, end) - floorKelvin) / Math.abs(end - start);
            add(Math.max(start, floorKelvin), Math.max(end, floorKelvin), duration * above);
        }
    }

    private void add(double start, double end, double duration) {
        double startRate = rate(start);
        double endRate = rate(end);
        double a = ratePerKelvin * (end - start);
        double mean = Math.abs(a) < SMALL
                ? startRate * (1 + a / 2 * (1 + a / 3 * (1 + a / 4 * (1 + a / 5 * (1 + a / 6)))))
                : (endRate - startRate) / a;
        seconds += mean * duration;
    }

    /** One exponential a sample: the end of a segment is the start of the next. */
    private double rate(double kelvin) {
        if (kelvin != lastKelvin) {
            lastKelvin = kelvin;
            lastRate = StrictMath.exp(ratePerKelvin * (kelvin - referenceKelvin));
        }
        return lastRate;
    }
}
