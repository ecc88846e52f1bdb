package org.steamwitness.steam;

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

/** Samples a second of the saturation check: temperature and slope at each pressure of a column of a million. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class SaturationBenchmark {

    private static final int SAMPLES = 1_000_000;

    private double[] pascal = {};
    private double[] kelvin = {};
    private double[] kelvinPerPascal = {};

    /** A cycle's pressures: from 4 kPa to 310 kPa and back, without two equal neighbours. */
    @Setup
    public void fill() {
        pascal = new double[SAMPLES];
        kelvin = new double[SAMPLES];
        kelvinPerPascal = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            double share = Math.abs(2.0 * i / SAMPLES - 1);
            pascal[i] = 310e3 - share * 306e3;
        }
    }

    @Benchmark
    @OperationsPerInvocation(SAMPLES)
    public double[] temperature() {
        for (int i = 0; i < SAMPLES; i++) {
            kelvin[i] = Saturation.kelvinAt(pascal[i]);
        }
        return kelvin;
    }

    @Benchmark
    @OperationsPerInvocation(SAMPLES)
    public double[] temperatureAndSlope() {
        for (int i = 0; i < SAMPLES; i++) {
            kelvin[i] = Saturation.kelvinAt(pascal[i]);
            kelvinPerPascal[i] = Saturation.kelvinPerPascalAt(pascal[i]);
        }
        return kelvinPerPascal;
    }
}
