package simulation.logger;

import simulation.plant.Plant;

/** A pressure transducer of the chamber, with offset, drift and noise. */
public final class Transducer implements Instrument {

    private final double offset;
    private final double driftPerHour;
    private final double noise;
    private double pascal;
    private double hours;

    /** Its errors, in pascal. */
    public Transducer(double offset, double driftPerHour, double noise) {
        this.offset = offset;
        this.driftPerHour = driftPerHour;
        this.noise = noise;
    }

    @Override
    public void see(Plant plant) {
        pascal = plant.gas().pascal();
        hours = plant.timeline().now() / 3600;
    }

    @Override
    public double read(Noise random) {
        return pascal + offset + driftPerHour * hours + random.of(noise);
    }
}
