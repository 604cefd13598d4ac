package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Generated kernels of motion in curved space against results of the literature, all cited from memory. */
class CurvedMotionTest {

    private static final double[] MASS = {1};

    /**
     * A vector carried round a circle of latitude comes back turned by 2π(1 − cos θ), the solid angle inside (do Carmo
     * 1976, Differential Geometry of Curves and Surfaces, section 4-4, example 1).
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.3, 1, 2.2})
    void aVectorCarriedRoundACircleOfLatitudeTurnsByTheSolidAngle(double theta) {
        TrialKernel transport = TrialKernel.of("sphere", Quantity.PARALLEL_TRANSPORT, Layout.FULL);
        int steps = 400;
        double h = 2 * StrictMath.PI / steps;
        double[] vector = {1, 0};
        for (int step = 0; step < steps; step++) {
            double[] k1 = rate(transport, theta, vector, new double[2], 0);
            double[] k2 = rate(transport, theta, vector, k1, h / 2);
            double[] k3 = rate(transport, theta, vector, k2, h / 2);
            double[] k4 = rate(transport, theta, vector, k3, h);
            for (int i = 0; i < 2; i++) {
                vector[i] += h / 6 * (k1[i] + 2 * k2[i] + 2 * k3[i] + k4[i]);
            }
        }
        // in the orthonormal frame e_θ, e_φ/sin θ; the vector turns against the sense of the circle by 2π cos θ
        double turned = 2 * StrictMath.PI * (1 - StrictMath.cos(theta));
        assertThat(vector[0]).isCloseTo(StrictMath.cos(turned), within(1e-8));
        assertThat(vector[1] * StrictMath.sin(theta)).isCloseTo(StrictMath.sin(turned), within(1e-8));
    }

    private static double[] rate(TrialKernel transport, double theta, double[] vector, double[] slope, double step) {
        double[] moved = {vector[0] + step * slope[0], vector[1] + step * slope[1]};
        return transport.values(new double[] {1}, new double[] {theta, 0}, new double[] {0, 1}, moved);
    }

    /**
     * Neighbours of a circular orbit of Schwarzschild's metric with L² = M r²/(r − 3M) are driven apart along the radius
     * by M (2r + ... )/r³: the tidal components are −(M/r³)(2 + 3L²/r²), (M/r³)(1 + 3L²/r²) and M/r³ along r, θ and the
     * motion (Chandrasekhar 1983, The Mathematical Theory of Black Holes; Marck 1983, Proc. R. Soc. A 385, 431).
     */
    @ParameterizedTest
    @ValueSource(doubles = {4.5, 6, 10, 40})
    void circularOrbitsFeelTheTidesOfMarck(double r) {
        TrialKernel deviation = TrialKernel.of("schwarzschild", Quantity.GEODESIC_DEVIATION, Layout.FULL);
        double m = 1;
        double momentum2 = m * r * r / (r - 3 * m);
        double[] point = {0, r, StrictMath.PI / 2, 0};
        double[] velocity = {StrictMath.sqrt(r / (r - 3 * m)), 0, 0, StrictMath.sqrt(momentum2) / (r * r)};
        double scale = m / (r * r * r);
        double[] radial = deviation.values(MASS, point, velocity, new double[] {0, 1, 0, 0});
        assertThat(radial[1]).isCloseTo(scale * (2 + 3 * momentum2 / (r * r)), within(1e-13 * scale * 10));
        double[] polar = deviation.values(MASS, point, velocity, new double[] {0, 0, 1, 0});
        assertThat(polar[2]).isCloseTo(-scale * (1 + 3 * momentum2 / (r * r)), within(1e-13 * scale * 10));
        // along the motion, orthogonal to the velocity: (L/√f, …) with g(u, ξ) = 0
        double f = 1 - 2 * m / r;
        double[] along = {velocity[3] * r * r / f, 0, 0, velocity[0]};
        double[] third = deviation.values(MASS, point, velocity, along);
        assertThat(third[0]).isCloseTo(-scale * along[0], within(1e-12 * scale * Math.abs(along[0])));
        assertThat(third[3]).isCloseTo(-scale * along[3], within(1e-12 * scale * Math.abs(along[3])));
    }

    /** dφ/dt = √(M/r³) on a circular orbit, Kepler's third law (Misner, Thorne &amp; Wheeler 1973, section 25.5). */
    @Test
    void circularOrbitsByTimeFollowKepler() {
        TrialKernel acceleration = TrialKernel.of("schwarzschild", Quantity.GEODESIC_ACCELERATION_BY_TIME, Layout.FULL);
        double r = 8;
        double omega = StrictMath.sqrt(1 / (r * r * r));
        double[] point = {0, r, StrictMath.PI / 2, 0};
        double[] rates = acceleration.values(MASS, point, new double[] {0, 0, omega});
        assertThat(rates).hasSize(3);
        for (double rate : rates) {
            assertThat(rate).isCloseTo(0, within(1e-17));
        }
        assertThat(acceleration.index("index", 1)).isZero();
        TrialKernel flow = TrialKernel.of("schwarzschild", Quantity.HAMILTONIAN_FLOW_BY_TIME, Layout.FULL);
        double time = 1 / StrictMath.sqrt(1 - 3 / r);
        double[] momentum = {-(1 - 2 / r) * time, 0, 0, r * r * omega * time};
        double[] motion = flow.values(MASS, point, momentum);
        assertThat(motion).hasSize(6);
        assertThat(motion[2]).isCloseTo(omega, within(1e-15));
        for (int i : new int[] {0, 1, 3, 4, 5}) {
            assertThat(motion[i]).isCloseTo(0, within(1e-16));
        }
    }
}
