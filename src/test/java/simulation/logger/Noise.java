package simulation.logger;

import java.util.Random;

/** Random errors of instruments, the same on every machine. */
public final class Noise {

    private final Random random;

    /** Takes its seed. */
    public Noise(long seed) {
        random = new Random(seed);
    }

    double of(double sigma) {
        double sum = -6;
        for (int i = 0; i < 12; i++) {
            sum += random.nextDouble();
        }
        return sigma * sum;
    }
}
