package simulation;

/**
 * A stretch of the run.
 *
 * @param name what it is
 * @param from seconds since the run began
 * @param to seconds since the run began
 */
public record Span(String name, double from, double to) {

    /** How long it lasts. */
    public double length() {
        return to - from;
    }
}
