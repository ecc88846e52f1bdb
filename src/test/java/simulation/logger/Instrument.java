package simulation.logger;

import simulation.plant.Watcher;

/** Something that gives a number when the logger asks: degrees Celsius or pascal absolute; NaN for an open circuit. */
public interface Instrument extends Watcher {

    /** The reading. */
    double read(Noise noise);
}
