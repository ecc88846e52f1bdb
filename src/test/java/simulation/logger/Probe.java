package simulation.logger;

import java.util.List;
import simulation.plant.Plant;
import simulation.plant.Spot;

/** A temperature probe: it follows its place by a lag, and errs by an offset, by noise, or by a fault. */
public final class Probe implements Instrument {

    private final Spot spot;
    private final double lagSeconds;
    private final double offset;
    private final double noise;
    private final List<ProbeFault> faults;
    private double celsius = Double.NaN;
    private double stuck = Double.NaN;
    private ProbeFault.Kind fault;

    /** A probe without faults. */
    public Probe(Spot spot, double lagSeconds, double offset, double noise) {
        this(spot, lagSeconds, offset, noise, List.of());
    }

    /** A probe with faults. */
    public Probe(Spot spot, double lagSeconds, double offset, double noise, List<ProbeFault> faults) {
        this.spot = spot;
        this.lagSeconds = lagSeconds;
        this.offset = offset;
        this.noise = noise;
        this.faults = List.copyOf(faults);
    }

    @Override
    public void see(Plant plant) {
        fault = null;
        for (ProbeFault each : faults) {
            if (each.when().isOpen(plant.timeline())) {
                fault = each.kind();
            }
        }
        double place = fault == ProbeFault.Kind.SLIPPED ? plant.gas().celsius() : spot.celsius();
        if (Double.isNaN(celsius)) {
            celsius = place;
        }
        double lag = fault == ProbeFault.Kind.SLIPPED ? Math.min(lagSeconds, 4) : lagSeconds;
        celsius += (place - celsius) * Math.min(1, plant.seconds() / lag);
    }

    @Override
    public double read(Noise random) {
        double reading = celsius + offset + random.of(noise);
        if (fault == ProbeFault.Kind.OPEN) {
            return Double.NaN;
        }
        if (fault == ProbeFault.Kind.SPIKE) {
            return reading + 37;
        }
        if (fault == ProbeFault.Kind.FROZEN) {
            stuck = Double.isNaN(stuck) ? reading : stuck;
            return stuck;
        }
        return reading;
    }
}
