package io.github.gammawright.benchmarks;

import static io.github.gammawright.benchmarks.KerrInputs.MASS;
import static io.github.gammawright.benchmarks.KerrInputs.SPIN;

import io.github.gammawright.benchmarks.kernels.KerrGeodesicAcceleration;
import io.github.gammawright.benchmarks.kernels.KerrHamiltonianFlow;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
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

/** One right-hand side of the geodesic equation round Kerr's hole, by kernels and through the runtime's adapters. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@State(Scope.Thread)
@Fork(3)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class GeodesicBenchmark {

    private final DenseContraction contraction = new DenseContraction(MASS, SPIN);
    private final ExpertAcceleration expertAcceleration = new ExpertAcceleration(MASS, SPIN);
    private final ExpertFlow expertFlow = new ExpertFlow(MASS, SPIN);
    private final KerrGeodesicAcceleration acceleration = new KerrGeodesicAcceleration(MASS, SPIN);
    private final KerrHamiltonianFlow flow = new KerrHamiltonianFlow(MASS, SPIN);
    private final GeodesicEquation geodesicEquation =
            new GeodesicEquation(4, new KerrGeodesicAcceleration(MASS, SPIN)::evaluate);
    private final HamiltonianEquation hamiltonianEquation =
            new HamiltonianEquation(4, new KerrHamiltonianFlow(MASS, SPIN)::evaluate);

    private final double[] result = new double[4];
    private final double[] state = new double[8];
    private final double[] derivatives = new double[8];

    /** The expert's 64 symbols, contracted with the velocity twice. */
    @Benchmark
    public double[] denseContraction(KerrInputs inputs) {
        inputs.advance();
        contraction.evaluate(inputs.point(), inputs.vector(), result);
        return result;
    }

    /** The acceleration by an expert's hand. */
    @Benchmark
    public double[] expertAcceleration(KerrInputs inputs) {
        inputs.advance();
        expertAcceleration.evaluate(inputs.point(), inputs.vector(), result);
        return result;
    }

    /** Hamilton's equations by an expert's hand. */
    @Benchmark
    public double[] expertFlow(KerrInputs inputs) {
        inputs.advance();
        expertFlow.evaluate(inputs.point(), inputs.vector(), derivatives);
        return derivatives;
    }

    /** The generated kernel for the acceleration. */
    @Benchmark
    public double[] geodesicAcceleration(KerrInputs inputs) {
        inputs.advance();
        acceleration.evaluate(inputs.point(), inputs.vector(), result);
        return result;
    }

    /** The generated kernel for Hamilton's equations. */
    @Benchmark
    public double[] hamiltonianFlow(KerrInputs inputs) {
        inputs.advance();
        flow.evaluate(inputs.point(), inputs.vector(), derivatives);
        return derivatives;
    }

    /** The acceleration through the runtime's adapter, the state put together in place. */
    @Benchmark
    public double[] geodesicEquation(KerrInputs inputs) {
        fill(inputs);
        geodesicEquation.derivatives(state, derivatives);
        return derivatives;
    }

    /** Hamilton's equations through the runtime's adapter, the state put together in place. */
    @Benchmark
    public double[] hamiltonianEquation(KerrInputs inputs) {
        fill(inputs);
        hamiltonianEquation.derivatives(state, derivatives);
        return derivatives;
    }

    private void fill(KerrInputs inputs) {
        inputs.advance();
        System.arraycopy(inputs.point(), 0, state, 0, 4);
        System.arraycopy(inputs.vector(), 0, state, 4, 4);
    }
}
