package simulation.plant;

/** A place whose temperature can be felt. */
public interface Spot extends Watcher {

    /** Temperature now. */
    double celsius();
}
