package io.github.gammawright.benchmarks;

import io.github.gammawright.benchmarks.kernels.KerrGeodesicAcceleration;
import io.github.gammawright.benchmarks.kernels.KerrHamiltonianFlow;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.swarm.DormandPrince;
import io.github.gammawright.runtime.symplectic.GaussLegendre;
import java.util.concurrent.TimeUnit;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
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
 * Steps along a bound orbit round Kerr's hole: the project's own steppers, a loop by hand for comparison, and Hipparchus.
 * Run with {@code -prof gc} to see what is allocated.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@State(Scope.Thread)
@Fork(2)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class StepperBenchmark {

    private static final int STEPS = 100;
    private static final double STEP = 0.25;

    private final KerrHamiltonianFlow flow = new KerrHamiltonianFlow(1, 0.9);
    private final HamiltonianEquation equation = new HamiltonianEquation(4, flow::evaluate);
    private final GeodesicEquation geodesic = new GeodesicEquation(4, new KerrGeodesicAcceleration(1, 0.9)::evaluate);
    private final double[] start = {
        0, 4, Math.PI / 2, 0, -0.9418161811457918, 0, Math.sqrt(2.128179922614577), 2.513146042747530
    };
    private final GaussLegendre collocation = new GaussLegendre(equation, 6, STEP);
    private final DormandPrince dormandPrince = new DormandPrince(equation, 1, 1);
    private final HandWrittenDormandPrince byHand = new HandWrittenDormandPrince(flow);

    /** A step of Gauss–Legendre collocation of order 6. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double gaussLegendre() {
        collocation.start(0, start);
        for (int i = 0; i < STEPS; i++) {
            collocation.advance();
        }
        return collocation.state(1);
    }

    /** A step of the swarm's method. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double dormandPrince() {
        dormandPrince.start(0, start, STEP);
        double error = 0;
        for (int i = 0; i < STEPS; i++) {
            error += dormandPrince.attempt();
            dormandPrince.accept();
            dormandPrince.step(STEP);
        }
        return error + dormandPrince.state()[1];
    }

    /** The same written by hand for this kernel alone. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double dormandPrinceByHand() {
        return byHand.run(start, STEP, STEPS);
    }

    /** One right-hand side within Hipparchus's integrator of order 8, by momenta. */
    @Benchmark
    @OperationsPerInvocation(1200)
    public double hipparchus() {
        // A hundred steps of fixed length, 12 evaluations each, and two more.
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(STEP, STEP, 1, 1);
        return integrator.integrate(equation, new ODEState(0, start), STEP * STEPS)
                .getPrimaryState()[1];
    }

    /** The array that Hipparchus gets from the adapter. */
    @Benchmark
    public double[] computeDerivatives() {
        return geodesic.computeDerivatives(0, start);
    }
}
