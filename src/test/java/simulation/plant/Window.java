package simulation.plant;

/**
 * A time counted from the start of a step of the cycle.
 *
 * @param step the step
 * @param after seconds from its start
 * @param length seconds; infinite if it stays
 */
public record Window(String step, double after, double length) {

    /** From the first moment to the last. */
    public static Window always() {
        return new Window("", 0, Double.POSITIVE_INFINITY);
    }

    /** Whether now lies in it. */
    public boolean isOpen(Timeline timeline) {
        double since = timeline.now() - from(timeline);
        return since >= 0 && since < length;
    }

    /** When it begins, in seconds from the start of the run; NaN if the step has not come. */
    public double from(Timeline timeline) {
        return (step.isEmpty() ? 0 : timeline.start(step)) + after;
    }

    /** When it ends, in seconds from the start of the run. */
    public double to(Timeline timeline) {
        return from(timeline) + length;
    }
}
