package org.steamwitness.steam;

import java.util.function.DoubleUnaryOperator;

/**
 * The zero of a continuous function between two arguments at which its signs differ: T. R. Chandrupatla, Advances in
 * Engineering Software 28 (1997) 145-149, inverse quadratic interpolation where the three last points allow it,
 * bisection elsewhere. Stops at a few units in the last place.
 */
final class Root {

    /** Bisection alone needs fewer steps for any two finite doubles of one sign. */
    private static final int MOST_STEPS = 200;

    private Root() {}

    static double between(double low, double high, DoubleUnaryOperator function) {
        double a = high;
        double b = low;
        double atA = function.applyAsDouble(a);
        double atB = function.applyAsDouble(b);
        if (!(Math.signum(atA) * Math.signum(atB) <= 0)) {
            throw new IllegalArgumentException(
                    "no change of sign between " + low + " (" + atB + ") and " + high + " (" + atA + ")");
        }
        double share = 0.5;
        for (int step = 0; step < MOST_STEPS; step++) {
            boolean aIsNearer = Math.abs(atA) < Math.abs(atB);
            double best = aIsNearer ? a : b;
            double least = 2 * Math.ulp(best) / Math.abs(b - a);
            if (least > 0.5 || atA == 0 || atB == 0) {
                return best;
            }
            double x = a + Math.min(Math.max(share, least), 1 - least) * (b - a);
            double atX = function.applyAsDouble(x);
            double c;
            double atC;
            if (atX > 0 == atA > 0) {
                c = a;
                atC = atA;
            } else {
                c = b;
                atC = atB;
                b = a;
                atB = atA;
            }
            a = x;
            atA = atX;
            share = interpolated(a, atA, b, atB, c, atC);
        }
        throw new IllegalArgumentException("no zero found between " + low + " and " + high);
    }

    /** The share of the way from a to b where the inverse parabola through the three points is zero, or one half. */
    private static double interpolated(double a, double atA, double b, double atB, double c, double atC) {
        double xi = (a - b) / (c - b);
        double phi = (atA - atB) / (atC - atB);
        if (phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi) {
            return atA / (atB - atA) * atC / (atB - atC) + (c - a) / (b - a) * atA / (atC - atA) * atB / (atC - atB);
        }
        return 0.5;
    }
}
