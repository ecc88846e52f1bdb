package org.steamwitness.record;

/**
 * What the log shows of one channel. Figures are in degrees Celsius or absolute kilopascal, resolution and uncertainty
 * in kelvin or kilopascal.
 *
 * @param name in plan and record
 * @param column its header in the log
 * @param quantity what it measures
 * @param place where its sensor sits
 * @param contact what touches the sensor
 * @param unit unit of the log's numbers
 * @param datum what a pressure is counted from
 * @param samples samples with a value
 * @param missing samples without one
 * @param resolution smallest step seen often
 * @param noise standard deviation of a steady stretch
 * @param uncertainty standard uncertainty that all samples share, as the plan states it
 * @param intervalSeconds time between samples
 * @param correction what was added to the log's numbers
 * @param certificate calibration certificate
 * @param due when the next calibration is due
 * @param state whether the sensor can be trusted
 * @param lowest lowest sample
 * @param highest highest sample
 */
public record ChannelPart(
        String name,
        String column,
        String quantity,
        String place,
        String contact,
        String unit,
        String datum,
        int samples,
        int missing,
        Given<Double> resolution,
        Given<Double> noise,
        Given<Double> uncertainty,
        Interval intervalSeconds,
        Given<String> correction,
        Given<String> certificate,
        Given<String> due,
        Given<String> state,
        Given<Double> lowest,
        Given<Double> highest) {

    /**
     * Time between samples.
     *
     * @param median the median
     * @param longest the longest
     */
    public record Interval(double median, double longest) {}
}
