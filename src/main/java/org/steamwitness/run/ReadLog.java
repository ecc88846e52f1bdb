package org.steamwitness.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.finding.Finding;
import org.steamwitness.intake.FoundColumn;
import org.steamwitness.intake.Intake;
import org.steamwitness.intake.LogReader;
import org.steamwitness.plan.AsWritten;
import org.steamwitness.plan.Plan;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.PressureUnit;
import org.steamwitness.quantity.Printed;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.run.LogSurvey.ColumnSurvey;
import org.steamwitness.run.LogSurvey.Figures;
import org.steamwitness.trace.Channel;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Noise;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.Resolution;
import org.steamwitness.trace.Told;
import org.steamwitness.trace.Trace;

/** Reads a log to show how it is understood: the first step with a log that is new to the program. */
public final class ReadLog {

    /** A pressure that starts below it starts at the atmosphere counted as zero; common practice, no source. */
    private static final double HIGHEST_GAUGE_START_PASCAL = 20e3;

    /** The atmosphere lies between these, from the sea to 3,000 m; common practice, no source. */
    private static final double LOWEST_ATMOSPHERE_PASCAL = 68e3;

    private static final double HIGHEST_ATMOSPHERE_PASCAL = 107e3;

    private final NamedBytes log;
    private final Optional<NamedBytes> plan;
    private final Progress progress;

    /**
     * Prepares the reading.
     *
     * @param log the logger file
     * @param plan a plan whose part {@code reading} says what need not be found
     * @param progress is told of the advance
     */
    public ReadLog(NamedBytes log, Optional<NamedBytes> plan, Progress progress) {
        this.log = log;
        this.plan = plan;
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
        Told told = Told.NOTHING;
        if (plan.isPresent()) {
            AsWritten<Plan> read = Plan.read(plan.get().name(), plan.get().bytes());
            if (read.value().isEmpty()) {
                return new Outcome.Refused(read.problems());
            }
            told = read.value().get().reading();
        }
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
        boolean onePressure = read.columns().stream()
                        .filter(c -> c.quantity()
                                .filter(q -> q == QuantityKind.PRESSURE)
                                .isPresent())
                        .count()
                == 1;
        List<org.steamwitness.plan.FoundColumn> forPlan = new ArrayList<>();
        for (FoundColumn column : read.columns()) {
            Optional<Channel> channel = read.trace().channels().stream()
                    .filter(c -> c.rule().header().equals("#" + column.position()))
                    .findFirst();
            Optional<Datum> datum = channel.flatMap(c -> datum(column, c));
            columns.add(column(read, column, channel, datum));
            if (channel.isPresent()
                    && (column.quantity().isPresent() || column.unit().isPresent())) {
                forPlan.add(new org.steamwitness.plan.FoundColumn(
                        column.header(), column.quantity(), column.unit(), datum, place(column, onePressure)));
            }
        }
        return new LogSurvey(
                extent(read.trace()),
                read.guesses().stream()
                        .map(g -> new LogSurvey.Point(
                                g.what(), g.value(), g.basis().word(), g.evidence()))
                        .toList(),
                columns,
                read.reading().refused().stream()
                        .map(r -> new LogSurvey.Refusal(r.fromLine(), r.toLine(), r.rows(), r.column(), r.reason()))
                        .toList(),
                read.findings(),
                forPlan);
    }

    /** The only pressure of a log is the chamber's, unless its header says otherwise. */
    private static Optional<Place> place(FoundColumn column, boolean onePressure) {
        boolean pressure =
                column.quantity().filter(q -> q == QuantityKind.PRESSURE).isPresent();
        return column.place().isEmpty() && pressure && onePressure ? Optional.of(Place.CHAMBER) : column.place();
    }

    private static LogSurvey.Extent extent(Trace trace) {
        return new LogSurvey.Extent(
                trace.size(),
                trace.lineOf(0),
                trace.lineOf(trace.size() - 1),
                instant(trace, 0),
                instant(trace, trace.lastSeconds()),
                trace.interval().medianSeconds(),
                trace.interval().longestSeconds());
    }

    private static String instant(Trace trace, double seconds) {
        return trace.clock()
                .localAt(seconds)
                .map(l -> l.replace('T', ' '))
                .orElseGet(() -> Printed.duration(seconds) + " since the start");
    }

    private static ColumnSurvey column(
            Intake.Read read, FoundColumn column, Optional<Channel> channel, Optional<Datum> datum) {
        boolean time = read.times().contains(column.position() - 1);
        boolean pressure =
                column.quantity().filter(q -> q == QuantityKind.PRESSURE).isPresent();
        return new ColumnSurvey(
                column.position(),
                column.header(),
                column.quantity().map(QuantityKind::word).orElse("?"),
                column.unit().orElse("?"),
                pressure ? datum.map(Datum::word).orElse("?") : "",
                column.datum().isEmpty() && datum.isPresent(),
                column.place().map(Place::word).orElse("?"),
                channel.map(c -> List.of(figures(read.trace().seconds(), c))).orElse(List.of()),
                channel.isPresent() ? "" : time ? "tells the time" : "not read: no column of numbers");
    }

    private static Optional<Datum> datum(FoundColumn column, Channel channel) {
        boolean pressure = channel.rule().kind() == QuantityKind.PRESSURE;
        return column.datum().isPresent() || !pressure ? column.datum() : byStart(channel.values());
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
