package simulation.plant;

/** Sees the plant after every time step. */
@FunctionalInterface
public interface Watcher {

    /** Called at the start of the run and after each time step. */
    void see(Plant plant);
}
