package io.github.gammawright.benchmarks;

import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.function.DoubleUnaryOperator;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * What single operations cost: where each waits for the one before, and where eight chains run side by side. Functions are
 * followed by an addition that keeps their argument in range, and their own time is what exceeds that of additions alone.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@State(Scope.Thread)
@Fork(1)
@Warmup(iterations = 5, time = 100, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 20, time = 50, timeUnit = TimeUnit.MILLISECONDS)
public class OperationBenchmark {

    static final int STEPS = 4096;
    private static final int CHAINS = 8;

    /** Near 1, and no constant to the compiler. */
    private static double shift = 0.3;

    static final Map<String, DoubleUnaryOperator> STEP = Map.ofEntries(
            Map.entry("add", x -> x + shift),
            Map.entry("multiply", x -> x * shift + shift),
            Map.entry("divide", x -> shift / x + shift),
            Map.entry("sqrt", x -> Math.sqrt(x) + shift),
            Map.entry("cbrt", x -> Math.cbrt(x) + shift),
            Map.entry("sin", x -> Math.sin(x) + shift),
            Map.entry("cos", x -> Math.cos(x) + shift),
            Map.entry("tan", x -> Math.tan(x) * 0.1 + shift),
            Map.entry("asin", x -> Math.asin(x) * 0.1 + shift),
            Map.entry("acos", x -> Math.acos(x) * 0.1 + shift),
            Map.entry("atan", x -> Math.atan(x) + shift),
            Map.entry("atan2", x -> Math.atan2(x, shift) + shift),
            Map.entry("sinh", x -> Math.sinh(x) * 0.1 + shift),
            Map.entry("cosh", x -> Math.cosh(x) * 0.1 + shift),
            Map.entry("tanh", x -> Math.tanh(x) + shift),
            Map.entry("exp", x -> Math.exp(x) * 0.1 + shift),
            Map.entry("log", x -> Math.log(x) * 0.1 + 1 + shift),
            Map.entry("pow", x -> Math.pow(x, shift) + shift));

    /** The operation. */
    @Param({
        "add",
        "multiply",
        "divide",
        "sqrt",
        "cbrt",
        "sin",
        "cos",
        "tan",
        "asin",
        "acos",
        "atan",
        "atan2",
        "sinh",
        "cosh",
        "tanh",
        "exp",
        "log",
        "pow"
    })
    String operation;

    private DoubleUnaryOperator step;

    /** Looks the operation up. */
    @Setup
    public void prepare() {
        step = STEP.get(operation);
    }

    /** Each operation waits for the one before. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double latency() {
        double x = 0.7;
        for (int i = 0; i < STEPS; i++) {
            x = step.applyAsDouble(x);
        }
        return x;
    }

    /** Eight chains side by side. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double throughput() {
        double a = 0.71;
        double b = 0.72;
        double c = 0.73;
        double d = 0.74;
        double e = 0.75;
        double f = 0.76;
        double g = 0.77;
        double h = 0.78;
        for (int i = 0; i < STEPS; i += CHAINS) {
            a = step.applyAsDouble(a);
            b = step.applyAsDouble(b);
            c = step.applyAsDouble(c);
            d = step.applyAsDouble(d);
            e = step.applyAsDouble(e);
            f = step.applyAsDouble(f);
            g = step.applyAsDouble(g);
            h = step.applyAsDouble(h);
        }
        return a + b + c + d + e + f + g + h;
    }
}
