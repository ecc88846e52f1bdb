package simulation;

import java.util.Random;

/** Small differences between runs of one kind. Seed 0 is the nominal run. */
final class Jitter {

    private final long seed;
    private final Random random;

    Jitter(long seed) {
        this.seed = seed;
        this.random = new Random(seed * 0x9E3779B97F4A7C15L + 11);
    }

    /** A value that differs by up to a spread either way. */
    double about(double nominal, double spread) {
        double draw = 2 * random.nextDouble() - 1;
        return seed == 0 ? nominal : nominal + draw * spread;
    }

    /** A value that differs by up to a share of itself either way. */
    double scaled(double nominal, double share) {
        return about(nominal, nominal * share);
    }

    /** A value in whole steps. */
    double stepped(double nominal, double spread, double step) {
        return StrictMath.rint(about(nominal, spread) / step) * step;
    }

    /** One of several, the first for the nominal run. */
    int oneOf(int count) {
        int draw = random.nextInt(count);
        return seed == 0 ? 0 : draw;
    }

    long seed() {
        return seed;
    }
}
