package simulation;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import simulation.plant.Plant;
import simulation.plant.Spot;
import simulation.plant.Watcher;

/** The true course of a run, second by second. */
public final class History implements Watcher {

    private final List<Spot> spots;
    private final List<Moment> moments = new ArrayList<>();

    History(List<Spot> spots) {
        this.spots = List.copyOf(spots);
    }

    @Override
    public void see(Plant plant) {
        double now = plant.timeline().now();
        if (now == Math.rint(now)) {
            moments.add(Moment.of(plant, spots));
        }
    }

    /** The plant at a second, or at the last whole second before it. */
    public Moment at(double seconds) {
        int index = (int) Math.min(Math.max(Math.floor(seconds), 0), moments.size() - 1);
        return moments.get(index);
    }

    /** The last second. */
    public double end() {
        return moments.get(moments.size() - 1).seconds();
    }

    /** Every second. */
    public List<Moment> moments() {
        return moments;
    }

    /** First second from a time on at which something holds for a while; the end of the run if it never does. */
    public double first(double from, double staying, Predicate<Moment> holds) {
        double since = Double.NaN;
        for (Moment moment : moments) {
            if (moment.seconds() < from) {
                continue;
            }
            if (!holds.test(moment)) {
                since = Double.NaN;
            } else {
                since = Double.isNaN(since) ? moment.seconds() : since;
                if (moment.seconds() - since >= staying) {
                    return since;
                }
            }
        }
        return end();
    }
}
