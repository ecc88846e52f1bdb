package org.steamwitness.record;

/**
 * One phase.
 *
 * @param name its purpose
 * @param index 1 for the first phase of the run
 * @param startSeconds its start
 * @param endSeconds start of the next phase, or the last sample
 * @param durationSeconds how long it lasted
 * @param startLocal its start by the log's clock
 * @param endLocal its end by the log's clock
 * @param foundBy what set its start
 * @param mark the mark entered for its start
 * @param pressureKilopascal the chamber's absolute pressure
 * @param temperatureCelsius the first starting channel's temperature
 */
public record PhasePart(
        String name,
        int index,
        double startSeconds,
        double endSeconds,
        double durationSeconds,
        Given<String> startLocal,
        Given<String> endLocal,
        String foundBy,
        Given<Mark> mark,
        Given<Course> pressureKilopascal,
        Given<Course> temperatureCelsius) {

    /**
     * A mark beside the boundary that was used.
     *
     * @param seconds the mark as entered
     * @param differenceSeconds boundary minus mark
     */
    public record Mark(double seconds, double differenceSeconds) {}

    /**
     * How a quantity went through the phase.
     *
     * @param start first sample
     * @param end last sample
     * @param lowest lowest sample
     * @param highest highest sample
     * @param mean mean of the samples
     */
    public record Course(double start, double end, double lowest, double highest, double mean) {}
}
