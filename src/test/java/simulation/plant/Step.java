package simulation.plant;

/**
 * One step of a cycle's programme.
 *
 * @param name its name; a name that comes again keeps the start of the first
 * @param settings valves, pump, heater
 * @param until when the next step begins
 */
public record Step(String name, Settings settings, Until until) {

    /** A step of a fixed length. */
    public static Step of(String name, double seconds, Settings settings) {
        return new Step(name, settings, (plant, since) -> since >= seconds - 1e-9);
    }

    /** When a step is over. */
    @FunctionalInterface
    public interface Until {
        /** Asked at every time step, with the seconds since the step began. */
        boolean reached(Plant plant, double since);
    }
}
