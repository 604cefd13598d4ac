package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;

/** What the right-hand sides allocate, counted in bytes by the JVM. */
class AllocationTest {

    private static final int CALLS = 10_000;

    private final ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();

    @Test
    void derivativesAllocateNothing() {
        PhaseSpaceEquation[] equations = {
            new GeodesicEquation(2, Kernels::sphereAcceleration),
            new HamiltonianEquation(3, Kernels::schwarzschildFlow),
        };
        for (PhaseSpaceEquation equation : equations) {
            double[] state = new double[equation.getDimension()];
            java.util.Arrays.fill(state, 1.5);
            double[] derivatives = new double[state.length];
            assertThat(allocatedBy(() -> equation.derivatives(state, derivatives)))
                    .isZero();
        }
    }

    /** An array of 2n doubles and its header; no more than that. */
    @Test
    void hipparchusGetsOneArrayACall() {
        GeodesicEquation equation = new GeodesicEquation(2, Kernels::sphereAcceleration);
        double[] state = {1, 0, 0.5, 0.5};
        assertThat(allocatedBy(() -> equation.computeDerivatives(0, state))).isBetween(32L, 56L);
    }

    /** Bytes per call, rounded down, so that what the JVM itself needs once in the loop doesn't count. */
    private long allocatedBy(Runnable call) {
        call.run();
        long before = threads.getCurrentThreadAllocatedBytes();
        for (int i = 0; i < CALLS; i++) {
            call.run();
        }
        return (threads.getCurrentThreadAllocatedBytes() - before) / CALLS;
    }
}
