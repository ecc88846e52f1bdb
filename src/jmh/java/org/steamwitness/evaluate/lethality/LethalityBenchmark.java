package org.steamwitness.evaluate.lethality;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.ProbeChoice;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.SegmentWalk;

/** Samples a second of the lethality integral: one walk over a column of a million temperatures. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class LethalityBenchmark {

    private static final int SAMPLES = 1_000_000;
    private static final LethalityAim F0 = new LethalityAim(
            "F0",
            394.26,
            10,
            OptionalDouble.empty(),
            LethalityUnit.MINUTE,
            LethalityAim.Limits.atLeast(360),
            ProbeChoice.PRODUCT,
            true,
            Optional.empty());

    private SegmentWalk walk = new SegmentWalk(Column.of(0), Column.of(0), 10);

    /** A product's temperatures: from 20 degC to 121 degC and back, without two equal neighbours. */
    @Setup
    public void fill() {
        double[] seconds = new double[SAMPLES];
        double[] kelvin = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            seconds[i] = i;
            kelvin[i] = 394.15 - Math.abs(2.0 * i / SAMPLES - 1) * 101;
        }
        walk = new SegmentWalk(Column.of(seconds), Column.of(kelvin), 10);
    }

    @Benchmark
    @OperationsPerInvocation(SAMPLES)
    public double integral() {
        LethalityIntegral integral = new LethalityIntegral(F0, 0);
        walk.over(0, SAMPLES - 1, integral);
        return integral.seconds();
    }
}
