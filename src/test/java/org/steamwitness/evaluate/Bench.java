package org.steamwitness.evaluate;

import java.time.LocalDateTime;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.Contact;
import org.steamwitness.plan.DecisionRule;
import org.steamwitness.plan.Hold;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.Marks;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.PlannedChannel;
import org.steamwitness.plan.ProbeChoice;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.LogClock;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace;

/** Small runs for tests of the evaluation: columns in degC and kPa, a plan that each test bends to its need. */
public final class Bench {

    private final double[] seconds;
    private List<BoundChannel> channels = List.of();
    private Hold hold = new Hold(121.1 + 273.15, 124.1 + 273.15, Optional.empty(), 60, List.of("chamber"));
    private List<LethalityAim> lethality = List.of();
    private List<Limit> limits = List.of();
    private List<String> unheeded = List.of();
    private double longestGap = 10;
    private double scanDelay;
    private DecisionRule decision = new DecisionRule(true, 0.95);
    private Marks marks = new Marks(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

    private Bench(double[] seconds) {
        this.seconds = seconds;
    }

    public static Bench every(double step, int samples) {
        double[] seconds = new double[samples];
        for (int i = 0; i < samples; i++) {
            seconds[i] = i * step;
        }
        return new Bench(seconds);
    }

    public static Bench at(double... seconds) {
        return new Bench(seconds);
    }

    public static BoundChannel temperature(String name, Place place, double common, double... celsius) {
        return new BoundChannel(
                name,
                QuantityKind.TEMPERATURE,
                place,
                place.steamContact() ? Contact.STEAM : Contact.SEALED,
                Column.of(Arrays.stream(celsius).map(c -> c + 273.15).toArray()),
                PlannedChannel.Lag.NONE,
                OptionalDouble.of(common),
                0);
    }

    public static BoundChannel pressure(double commonKilopascal, double... kilopascal) {
        return new BoundChannel(
                "pressure",
                QuantityKind.PRESSURE,
                Place.CHAMBER,
                Contact.STEAM,
                Column.of(Arrays.stream(kilopascal).map(p -> p * 1000).toArray()),
                PlannedChannel.Lag.NONE,
                OptionalDouble.of(commonKilopascal * 1000),
                0);
    }

    public Bench with(BoundChannel... measured) {
        channels = List.of(measured);
        return this;
    }

    public Bench holding(double requiredSeconds) {
        hold = new Hold(
                hold.atLeastKelvin(), hold.atMostKelvin(), Optional.empty(), requiredSeconds, List.of("chamber"));
        return this;
    }

    public Bench aiming(LethalityAim... aims) {
        lethality = List.of(aims);
        return this;
    }

    public Bench limiting(Limit... set) {
        limits = List.of(set);
        return this;
    }

    /** F at the product probes with z 10 K. */
    public static LethalityAim aim(double referenceCelsius, double minimumSeconds, boolean coolingCounted) {
        return new LethalityAim(
                "F0",
                referenceCelsius + 273.15,
                10,
                OptionalDouble.empty(),
                LethalityUnit.MINUTE,
                LethalityAim.Limits.atLeast(minimumSeconds),
                ProbeChoice.PRODUCT,
                coolingCounted,
                Optional.empty());
    }

    /** The same channel, a part of whose uncertainty is the same error in all that share it. */
    public static BoundChannel sharing(BoundChannel channel, double shared) {
        return new BoundChannel(
                channel.name(),
                channel.kind(),
                channel.place(),
                channel.contact(),
                channel.values(),
                channel.lag(),
                channel.commonUncertainty(),
                shared);
    }

    /** The same channel with a stated lag. */
    public static BoundChannel lagging(BoundChannel channel, double seconds, double uncertaintySeconds) {
        return new BoundChannel(
                channel.name(),
                channel.kind(),
                channel.place(),
                channel.contact(),
                channel.values(),
                new PlannedChannel.Lag(seconds, uncertaintySeconds),
                channel.commonUncertainty(),
                channel.sharedUncertainty());
    }

    public Bench unheeding(String... demands) {
        unheeded = List.of(demands);
        return this;
    }

    public Bench bridging(double longestGapSeconds) {
        longestGap = longestGapSeconds;
        return this;
    }

    public Bench scanning(double delaySeconds) {
        scanDelay = delaySeconds;
        return this;
    }

    public Bench deciding(DecisionRule rule) {
        decision = rule;
        return this;
    }

    public Bench marked(double steamOn, double ventClosed, double steamOff) {
        marks = new Marks(known(steamOn), known(ventClosed), known(steamOff));
        return this;
    }

    public Trace trace() {
        int[] lines = new int[seconds.length];
        Arrays.setAll(lines, i -> i + 2);
        LogClock clock = new LogClock(LocalDateTime.of(2026, 3, 14, 8, 0), Optional.empty());
        return new Trace(clock, Column.of(seconds), lines, List.of());
    }

    public BoundPlan plan() {
        return new BoundPlan(
                channels,
                hold,
                channels.stream().filter(c -> c.name().equals("chamber")).toList(),
                Optional.of(new SaturationTolerance(1, 2, 10)),
                lethality,
                limits,
                unheeded,
                decision,
                longestGap,
                scanDelay,
                marks,
                false,
                new Plan.Basis("SP-1", "1", "process authority", "2026-01-01"));
    }

    private static OptionalDouble known(double seconds) {
        return Double.isNaN(seconds) ? OptionalDouble.empty() : OptionalDouble.of(seconds);
    }
}
