package io.github.gammawright.benchmarks;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * What it costs that more values are alive than a processor has registers: the same products and sums on 24 values, in
 * groups of eight and all at once.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@State(Scope.Thread)
@Fork(1)
@Warmup(iterations = 5, time = 100, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 20, time = 50, timeUnit = TimeUnit.MILLISECONDS)
public class SpillBenchmark {

    /** By how many the values alive at once exceed the sixteen registers in {@link #all}. */
    static final int BEYOND = 8;

    private final double[] inputs = new java.util.Random(1).doubles(24).toArray();
    private double scale = 1.25;

    private static double eight(double[] v, int k, double s) {
        double a = v[k] * s;
        double b = v[k + 1] * s;
        double c = v[k + 2] * s;
        double d = v[k + 3] * s;
        double e = v[k + 4] * s;
        double f = v[k + 5] * s;
        double g = v[k + 6] * s;
        double h = v[k + 7] * s;
        return ((a + b) + (c + d)) + ((e + f) + (g + h)) + ((a * h + b * g) + (c * f + d * e));
    }

    /** At most some ten values alive. */
    @Benchmark
    @OperationsPerInvocation(BEYOND)
    public double groups() {
        return eight(inputs, 0, scale) + eight(inputs, 8, scale) + eight(inputs, 16, scale);
    }

    /** All 24 alive, since each sum is followed by products of the first and the last. */
    @Benchmark
    @OperationsPerInvocation(BEYOND)
    public double all() {
        double[] v = inputs;
        double s = scale;
        double a = v[0] * s;
        double b = v[1] * s;
        double c = v[2] * s;
        double d = v[3] * s;
        double e = v[4] * s;
        double f = v[5] * s;
        double g = v[6] * s;
        double h = v[7] * s;
        double i = v[8] * s;
        double j = v[9] * s;
        double k = v[10] * s;
        double l = v[11] * s;
        double m = v[12] * s;
        double n = v[13] * s;
        double o = v[14] * s;
        double p = v[15] * s;
        double q = v[16] * s;
        double r = v[17] * s;
        double t = v[18] * s;
        double u = v[19] * s;
        double w = v[20] * s;
        double x = v[21] * s;
        double y = v[22] * s;
        double z = v[23] * s;
        double sums = (((a + b) + (c + d)) + ((e + f) + (g + h)))
                + (((i + j) + (k + l)) + ((m + n) + (o + p)))
                + (((q + r) + (t + u)) + ((w + x) + (y + z)));
        return sums
                + ((a * z + b * y) + (c * x + d * w))
                + ((e * u + f * t) + (g * r + h * q))
                + ((i * p + j * o) + (k * n + l * m));
    }
}
