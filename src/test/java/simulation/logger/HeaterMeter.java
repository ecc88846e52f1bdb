package simulation.logger;

import simulation.plant.Flow;
import simulation.plant.Plant;

/** Counts what the heater has taken, in joule. */
public final class HeaterMeter implements Instrument {

    private double joule;

    @Override
    public void see(Plant plant) {
        joule = plant.ledger().of(Flow.HEATER_J);
    }

    @Override
    public double read(Noise random) {
        return joule;
    }
}
