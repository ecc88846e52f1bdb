package org.steamwitness.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.intake.FoundColumn;
import org.steamwitness.intake.Intake;
import org.steamwitness.intake.LogReader;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.run.LogSurvey.ColumnSurvey;
import org.steamwitness.run.LogSurvey.Figures;
import org.steamwitness.trace.Channel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Noise;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.Resolution;
import org.steamwitness.trace.Told;

/** Reads a log to show how it is understood: the first step with a log that is new to the program. */
public final class ReadLog {

    /** A pressure that starts below it starts at the atmosphere counted as zero; common practice, no source. */
    private static final double HIGHEST_GAUGE_START_PASCAL = 20e3;

    /** The atmosphere lies between these, from the sea to 3,000 m; common practice, no source. */
    private static final double LOWEST_ATMOSPHERE_PASCAL = 68e3;

    private static final double HIGHEST_ATMOSPHERE_PASCAL = 107e3;

    private final NamedBytes log;
    private final Told told;
    private final Progress progress;

    /**
     * Prepares the reading.
     *
     * @param log the logger file
     * @param told what need not be found
     * @param progress is told of the advance
     */
    public ReadLog(NamedBytes log, Told told, Progress progress) {
        this.log = log;
        this.told = told;
        this.progress = progress;
    }

    /** What became of the reading. */
    public sealed interface Outcome {

        /**
         * The log was understood.
         *
         * @param survey how
         */
        record Surveyed(LogSurvey survey) implements Outcome {}

        /**
         * It can't be understood.
         *
         * @param findings why
         */
        record Refused(List<Finding> findings) implements Outcome {}

        /** Nobody wants it any more. */
        record Cancelled() implements Outcome {}
    }

    /**
     * Reads the log.
     *
     * @return how it was understood, or why not
     */
    public Outcome outcome() {
        ReadingRules rules = new ReadingRules(List.of(), told);
        Intake intake = new LogReader(log.name(), rules, Optional.empty(), progress).survey(log.bytes());
        if (intake instanceof Intake.Unreadable unreadable) {
            return new Outcome.Refused(unreadable.findings());
        }
        if (intake instanceof Intake.Read read) {
            return new Outcome.Surveyed(survey(read));
        }
        return new Outcome.Cancelled();
    }

    private static LogSurvey survey(Intake.Read read) {
        List<ColumnSurvey> columns = new ArrayList<>();
        for (FoundColumn column : read.columns()) {
            Optional<Channel> channel = read.trace().channels().stream()
                    .filter(c -> c.rule().header().equals("#" + column.position()))
                    .findFirst();
            columns.add(channel.map(c -> ofChannel(read, column, c)).orElseGet(() -> withoutSamples(read, column)));
        }
        return new LogSurvey(read.trace(), read.reading(), read.guesses(), List.copyOf(columns), read.findings());
    }

    private static ColumnSurvey withoutSamples(Intake.Read read, FoundColumn column) {
        boolean time = read.times().contains(column.position() - 1);
        return new ColumnSurvey(
                column,
                column.datum(),
                "",
                Optional.empty(),
                time ? "tells the time" : "not read: no column of numbers");
    }

    private static ColumnSurvey ofChannel(Intake.Read read, FoundColumn column, Channel channel) {
        Optional<Datum> datum = column.datum();
        String basis = datum.isPresent() ? "by its header" : "";
        boolean pressure = channel.rule().kind() == QuantityKind.PRESSURE
                && !channel.rule().unit().isEmpty();
        if (pressure && datum.isEmpty()) {
            datum = byStart(channel.values());
            basis = datum.isPresent() ? "by where it starts" : "";
        }
        return new ColumnSurvey(
                column, datum, basis, Optional.of(figures(read.trace().seconds(), channel)), "");
    }

    private static Optional<Datum> byStart(Column pascal) {
        double start = firstOf(pascal);
        if (Math.abs(start) < HIGHEST_GAUGE_START_PASCAL) {
            return Optional.of(Datum.GAUGE);
        }
        return start > LOWEST_ATMOSPHERE_PASCAL && start < HIGHEST_ATMOSPHERE_PASCAL
                ? Optional.of(Datum.ABSOLUTE)
                : Optional.empty();
    }

    private static double firstOf(Column column) {
        for (int i = 0; i < column.size(); i++) {
            if (!column.missing(i)) {
                return column.at(i);
            }
        }
        return Double.NaN;
    }

    private static Figures figures(Column seconds, Channel channel) {
        Column values = channel.values();
        int missing = 0;
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < values.size(); i++) {
            missing += values.missing(i) ? 1 : 0;
            lowest = values.missing(i) ? lowest : Math.min(lowest, values.at(i));
            highest = values.missing(i) ? highest : Math.max(highest, values.at(i));
        }
        Scale scale = Scale.of(channel.rule().unit());
        return new Figures(
                values.size() - missing,
                missing,
                scale.value(lowest),
                scale.value(highest),
                scale.step(Resolution.of(values)),
                scale.step(Noise.of(seconds, values)));
    }

    /** Turns SI values back into the unit of a column. */
    private record Scale(double offset, double perUnit) {

        static Scale of(String unit) {
            for (TemperatureUnit each : TemperatureUnit.values()) {
                if (each.symbol().equals(unit)) {
                    return new Scale(each.toKelvin(0), each.toKelvin(1) - each.toKelvin(0));
                }
            }
            for (PressureUnit each : PressureUnit.values()) {
                if (each.symbol().equals(unit)) {
                    return new Scale(0, each.toPascal(1));
                }
            }
            return new Scale(0, 1);
        }

        double value(double si) {
            return (si - offset) / perUnit;
        }

        OptionalDouble step(OptionalDouble si) {
            return si.isPresent() ? OptionalDouble.of(si.getAsDouble() / perUnit) : si;
        }
    }
}
