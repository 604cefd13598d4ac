package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.Root;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.samples.kernels.KerrChristoffel;
import io.github.gammawright.samples.kernels.KerrGeodesicAcceleration;
import io.github.gammawright.samples.kernels.KerrHamiltonianFlow;
import io.github.gammawright.samples.kernels.KerrMetric;
import java.util.Random;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** The two forms of the geodesic equation, against the definition and against each other. */
class GeodesicFormsTest {

    private static final double MASS = 1;
    private static final double SPIN = 0.9;

    private final KerrGeodesicAcceleration acceleration = new KerrGeodesicAcceleration(MASS, SPIN);

    /** a^k = −Γ^k_ij u^i u^j, with Γ from a kernel of its own. */
    @Test
    void theAccelerationIsTheContractedConnection() {
        Random random = new Random(5);
        KerrChristoffel christoffel = new KerrChristoffel(MASS, SPIN);
        for (int n = 0; n < 200; n++) {
            double[] point = {0, 2 + 20 * random.nextDouble(), 0.25 + 2.5 * random.nextDouble(), 0};
            double[] velocity = random.doubles(4, -1, 1).toArray();
            double[] gamma = christoffel.valuesAt(point);
            double[] actual = acceleration.valuesAt(point, velocity);
            for (int k = 0; k < 4; k++) {
                double sum = 0;
                double size = 0;
                for (int i = 0; i < 4; i++) {
                    for (int j = 0; j < 4; j++) {
                        double term = gamma[KerrChristoffel.index(k, i, j)] * velocity[i] * velocity[j];
                        sum -= term;
                        size += Math.abs(term);
                    }
                }
                assertThat(actual[k]).isCloseTo(sum, within(1e-13 * size));
            }
        }
    }

    /**
     * A stable orbit out of the equatorial plane ends at one place in either form, with energy, angular momentum and
     * Carter's constant p_θ² + cos²θ (a²(1 − E²) + L²/sin²θ) (Carter 1968; from memory) as they were.
     */
    @Test
    void bothFormsFollowOneOrbitAndKeepItsConstants() {
        MetricTensor metric = new MetricTensor(4, new KerrMetric(MASS, SPIN)::evaluate);
        double[] point = {0, 10, Math.PI / 2, 0};
        double[] velocity = {0, 0, 0.02, 0.03};
        new Normalization(metric, Signature.MOSTLY_PLUS)
                .solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        double[] momentum = new double[4];
        metric.lower(point, velocity, momentum);

        GeodesicEquation geodesic = new GeodesicEquation(4, acceleration::evaluate);
        HamiltonianEquation hamiltonian = new HamiltonianEquation(4, new KerrHamiltonianFlow(MASS, SPIN)::evaluate);
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-8, 50, 1e-12, 1e-12);
        double[] byVelocity = integrator
                .integrate(geodesic, new ODEState(0, geodesic.state(point, velocity)), 1000)
                .getPrimaryState();
        double[] byMomentum = integrator
                .integrate(hamiltonian, new ODEState(0, hamiltonian.state(point, momentum)), 1000)
                .getPrimaryState();

        for (int k = 0; k < 4; k++) {
            assertThat(byVelocity[k]).isCloseTo(byMomentum[k], within(1e-7));
        }
        double[] end = java.util.Arrays.copyOf(byVelocity, 4);
        double[] endMomentum = new double[4];
        metric.lower(end, java.util.Arrays.copyOfRange(byVelocity, 4, 8), endMomentum);
        assertThat(endMomentum[0]).isCloseTo(momentum[0], within(1e-10));
        assertThat(endMomentum[3]).isCloseTo(momentum[3], within(1e-9));
        double carter = carter(point, momentum);
        assertThat(carter(end, endMomentum)).isCloseTo(carter, within(1e-9 * carter));
    }

    private static double carter(double[] point, double[] p) {
        double cosine = Math.cos(point[2]);
        double sine = Math.sin(point[2]);
        return p[2] * p[2] + cosine * cosine * (SPIN * SPIN * (1 - p[0] * p[0]) + p[3] * p[3] / (sine * sine));
    }
}
