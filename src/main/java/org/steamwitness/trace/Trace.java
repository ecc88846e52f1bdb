package org.steamwitness.trace;

import java.util.Arrays;
import java.util.List;

/** The samples of one log: one time base, named channels, SI units, missing samples kept as missing. */
public final class Trace {

    private final LogClock clock;
    private final Column seconds;
    private final int[] lines;
    private final List<Channel> channels;

    /**
     * Puts the columns on their time base.
     *
     * @param clock date and time of the first sample
     * @param seconds times from the first sample, strictly rising, none missing, at least one
     * @param lines the log's line of each sample, as an editor counts them
     * @param channels columns as long as the time base
     * @throws IllegalArgumentException if the lengths differ, there is no sample, or time does not rise
     */
    public Trace(LogClock clock, Column seconds, int[] lines, List<Channel> channels) {
        if (seconds.size() == 0) {
            throw new IllegalArgumentException("a trace needs at least one sample");
        }
        for (int i = 1; i < seconds.size(); i++) {
            if (!(seconds.at(i) > seconds.at(i - 1))) {
                throw new IllegalArgumentException("time does not rise at sample " + i);
            }
        }
        if (lines.length != seconds.size()
                || channels.stream().anyMatch(c -> c.values().size() != seconds.size())) {
            throw new IllegalArgumentException("every column needs as many samples as the time base");
        }
        this.clock = clock;
        this.seconds = seconds;
        this.lines = lines.clone();
        this.channels = List.copyOf(channels);
    }

    /**
     * The same samples with another clock.
     *
     * @param other what tells their dates and times
     * @return a trace that shares this one's columns
     */
    public Trace withClock(LogClock other) {
        return new Trace(other, seconds, lines, channels);
    }

    /**
     * A part of the samples, with a time base that starts at its first one.
     *
     * @param from index of the first sample
     * @param to index of the last sample, not before the first
     * @return a trace of its own
     */
    public Trace part(int from, int to) {
        double[] own = new double[to - from + 1];
        for (int i = 0; i < own.length; i++) {
            own[i] = seconds.at(from + i) - seconds.at(from);
        }
        List<Channel> parts = channels.stream()
                .map(c -> new Channel(c.rule(), c.values().part(from, to)))
                .toList();
        return new Trace(
                clock.startingAt(seconds.at(from)), Column.of(own), Arrays.copyOfRange(lines, from, to + 1), parts);
    }

    /**
     * The clock that tells dates and times.
     *
     * @return never null
     */
    public LogClock clock() {
        return clock;
    }

    /**
     * Times of the samples.
     *
     * @return seconds from the first sample, strictly rising
     */
    public Column seconds() {
        return seconds;
    }

    /**
     * How many samples each column has.
     *
     * @return one or more
     */
    public int size() {
        return seconds.size();
    }

    /**
     * Time of the last sample.
     *
     * @return seconds from the first sample
     */
    public double lastSeconds() {
        return seconds.at(size() - 1);
    }

    /**
     * The log's line of a sample, as an editor counts lines.
     *
     * @param index 0 to {@code size() - 1}
     * @return 1 or more
     */
    public int lineOf(int index) {
        return lines[index];
    }

    /**
     * The channels in the order of the plan.
     *
     * @return an immutable list
     */
    public List<Channel> channels() {
        return channels;
    }

    /**
     * Median and longest time between neighbouring samples.
     *
     * @return both zero when there is one sample only
     */
    public SamplingInterval interval() {
        double[] steps = new double[size() - 1];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = seconds.at(i + 1) - seconds.at(i);
        }
        Arrays.sort(steps);
        return steps.length == 0
                ? new SamplingInterval(0, 0)
                : new SamplingInterval(steps[steps.length / 2], steps[steps.length - 1]);
    }

    /**
     * First sample at or after an instant.
     *
     * @param instant seconds from the first sample
     * @return 0 to {@code size()}, the latter if there is none
     */
    public int indexAtOrAfter(double instant) {
        int low = 0;
        int high = size();
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (seconds.at(middle) < instant) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /**
     * Time between neighbouring samples.
     *
     * @param medianSeconds the median
     * @param longestSeconds the longest
     */
    public record SamplingInterval(double medianSeconds, double longestSeconds) {}
}
