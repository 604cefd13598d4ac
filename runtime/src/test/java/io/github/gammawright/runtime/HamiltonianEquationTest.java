package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** Orbits round Schwarzschild's hole, in the form of Hamilton. */
class HamiltonianEquationTest {

    /**
     * Kepler's third law holds for circular orbits in the coordinate time: (dφ/dt)² = M/r³ (Misner, Thorne &amp; Wheeler 1973,
     * Gravitation, sec. 25.5; from memory). At r = 6 M and beyond they are stable.
     */
    @Test
    void circularOrbitsKeepKeplersThirdLaw() {
        HamiltonianEquation equation = new HamiltonianEquation(3, Kernels::schwarzschildFlow);
        MetricTensor metric = new MetricTensor(3, Kernels::schwarzschildMetric);
        for (double radius : new double[] {8, 20, 100}) {
            double angularVelocity = Math.sqrt(1 / (radius * radius * radius));
            double[] point = {0, radius, 0};
            double[] velocity = {1, 0, angularVelocity};
            new Normalization(metric, Signature.MOSTLY_PLUS).rescale(point, velocity, Causality.TIMELIKE);
            double[] momentum = new double[3];
            metric.lower(point, velocity, momentum);
            double[] start = equation.state(point, momentum);

            double properTime = 2 * Math.PI / velocity[2];
            double[] end = new DormandPrince853Integrator(1e-8, 100, 1e-12, 1e-12)
                    .integrate(equation, new ODEState(0, start), properTime)
                    .getPrimaryState();

            assertThat(end[2]).isCloseTo(2 * Math.PI, within(1e-9));
            assertThat(end[0]).isCloseTo(2 * Math.PI / angularVelocity, within(1e-9 * end[0]));
            assertThat(end[1]).isCloseTo(radius, within(1e-8));
            // Energy and angular momentum belong to cyclic coordinates.
            assertThat(end[3]).isEqualTo(momentum[0]);
            assertThat(end[5]).isEqualTo(momentum[2]);
        }
    }
}
