package simulation.plant;

import java.util.List;

/** A programme of steps that a plant runs through while others watch. */
public final class Cycle {

    private static final double LONGEST = 6 * 3600.0;

    private final List<Step> steps;

    /** Takes the steps in order. */
    public Cycle(List<Step> steps) {
        this.steps = List.copyOf(steps);
    }

    /** Runs them all. */
    public void run(Plant plant, List<? extends Watcher> watchers) {
        boolean first = true;
        for (Step step : steps) {
            plant.begin(step);
            double began = plant.timeline().now();
            if (first) {
                watchers.forEach(watcher -> watcher.see(plant));
                first = false;
            }
            while (!step.until().reached(plant, plant.timeline().now() - began)) {
                plant.step();
                watchers.forEach(watcher -> watcher.see(plant));
                if (plant.timeline().now() > LONGEST) {
                    throw new IllegalStateException("step " + step.name() + " never ends");
                }
            }
        }
    }
}
