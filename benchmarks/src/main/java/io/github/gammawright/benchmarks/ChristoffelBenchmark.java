package io.github.gammawright.benchmarks;

import static io.github.gammawright.benchmarks.KerrInputs.MASS;
import static io.github.gammawright.benchmarks.KerrInputs.SPIN;

import io.github.gammawright.benchmarks.kernels.KerrFull;
import io.github.gammawright.benchmarks.kernels.KerrNonZero;
import io.github.gammawright.benchmarks.kernels.KerrSharedFull;
import io.github.gammawright.benchmarks.kernels.KerrSharedNonZero;
import io.github.gammawright.runtime.PointKernel;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * All Christoffel symbols of Kerr's metric at one point. Each method returns the array of the result, which JMH then
 * hands to a blackhole; {@link #baseline} shows what the harness itself takes.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@State(Scope.Thread)
@Fork(3)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class ChristoffelBenchmark {

    private final ExpertNonZero expertNonZero = new ExpertNonZero(MASS, SPIN);
    private final ExpertFull expertFull = new ExpertFull(MASS, SPIN);
    private final KerrNonZero generatedNonZero = new KerrNonZero(MASS, SPIN);
    private final KerrFull generatedFull = new KerrFull(MASS, SPIN);
    private final KerrSharedNonZero sharedNonZero = new KerrSharedNonZero(MASS, SPIN);
    private final KerrSharedFull sharedFull = new KerrSharedFull(MASS, SPIN);
    private final PointKernel graphAlone = GraphAlone.kernel(MASS, SPIN);
    private final NaiveEmission naive = new NaiveEmission(MASS, SPIN);
    private final FiniteDifferences finiteDifferences = new FiniteDifferences(MASS, SPIN);
    private final AutomaticDifferentiation automaticDifferentiation = new AutomaticDifferentiation(MASS, SPIN);
    private final ComputerAlgebra computerAlgebra = new ComputerAlgebra(MASS, SPIN);

    private final double[] nonZero = new double[20];
    private final double[] full = new double[64];

    /** Fetches a point and stores one number. */
    @Benchmark
    public double[] baseline(KerrInputs inputs) {
        inputs.advance();
        nonZero[0] = inputs.point()[1];
        return nonZero;
    }

    /** By an expert's hand, the twenty symbols. */
    @Benchmark
    public double[] expertNonZero(KerrInputs inputs) {
        inputs.advance();
        expertNonZero.evaluate(inputs.point(), nonZero);
        return nonZero;
    }

    /** By an expert's hand, all 64 entries. */
    @Benchmark
    public double[] expertFull(KerrInputs inputs) {
        inputs.advance();
        expertFull.evaluate(inputs.point(), full);
        return full;
    }

    /** Generated, layout non-zero. */
    @Benchmark
    public double[] generatedNonZero(KerrInputs inputs) {
        inputs.advance();
        generatedNonZero.evaluate(inputs.point(), nonZero);
        return nonZero;
    }

    /** Generated, layout full. */
    @Benchmark
    public double[] generatedFull(KerrInputs inputs) {
        inputs.advance();
        generatedFull.evaluate(inputs.point(), full);
        return full;
    }

    /** Generated, layout non-zero, sine and cosine computed together. */
    @Benchmark
    public double[] sharedNonZero(KerrInputs inputs) {
        inputs.advance();
        sharedNonZero.evaluate(inputs.point(), nonZero);
        return nonZero;
    }

    /** Generated, layout full, sine and cosine computed together. */
    @Benchmark
    public double[] sharedFull(KerrInputs inputs) {
        inputs.advance();
        sharedFull.evaluate(inputs.point(), full);
        return full;
    }

    /** The expression graph as it was built. */
    @Benchmark
    public double[] graphAlone(KerrInputs inputs) {
        inputs.advance();
        graphAlone.evaluate(inputs.point(), nonZero);
        return nonZero;
    }

    /** Closed forms with {@code Math.pow} and trigonometry in place. */
    @Benchmark
    public double[] naiveEmission(KerrInputs inputs) {
        inputs.advance();
        naive.evaluate(inputs.point(), nonZero);
        return nonZero;
    }

    /** Central differences of the metric, numeric inverse. */
    @Benchmark
    public double[] finiteDifferences(KerrInputs inputs) {
        inputs.advance();
        finiteDifferences.evaluate(inputs.point(), full);
        return full;
    }

    /** Hipparchus's {@code Gradient}, numeric inverse. */
    @Benchmark
    public double[] automaticDifferentiation(KerrInputs inputs) {
        inputs.advance();
        automaticDifferentiation.evaluate(inputs.point(), full);
        return full;
    }

    /** Symja's numeric evaluator on the closed forms. */
    @Benchmark
    public double[] computerAlgebra(KerrInputs inputs) {
        inputs.advance();
        computerAlgebra.evaluate(inputs.point(), nonZero);
        return nonZero;
    }
}
