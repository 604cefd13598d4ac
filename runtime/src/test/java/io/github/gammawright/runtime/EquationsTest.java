package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** The forms of the geodesic equation against each other and against closed forms. */
class EquationsTest {

    private static final double SPIN = 0.5;

    private final Spacetime kerr = Spacetime.kerr(SPIN);
    private final MetricTensor metric = new MetricTensor(4, kerr::metric);

    private static double[] integrate(CurveEquation equation, double from, double[] state, double to) {
        return new DormandPrince853Integrator(1e-10, 100, 1e-13, 1e-13)
                .integrate(equation, new ODEState(from, state), to)
                .getPrimaryState();
    }

    private double[] velocity(double[] point) {
        double[] velocity = {0, 0.02, 0.01, 0.045};
        new Normalization(metric, Signature.MOSTLY_PLUS)
                .solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        return velocity;
    }

    /** One orbit by proper time and by coordinate time, by velocities and by momenta, ends at one place. */
    @Test
    void allFormsFollowOneOrbit() {
        double[] point = {0, 9, 1.25, 0};
        double[] velocity = velocity(point);
        GeodesicEquation affine = new GeodesicEquation(4, kerr::acceleration);
        double[] end = integrate(affine, 0, affine.state(point, velocity), 40);

        GeodesicByTimeEquation byTime = new GeodesicByTimeEquation(4, kerr::accelerationByTime);
        double[] endByTime = integrate(byTime, 0, byTime.state(point, velocity), end[0]);
        double[] momentum = new double[4];
        metric.lower(point, velocity, momentum);
        HamiltonianByTimeEquation canonical =
                new HamiltonianByTimeEquation(4, kerr::flowByTime, TimeMomentum.constant(momentum[0]));
        double[] endCanonical = integrate(canonical, 0, canonical.state(point, momentum), end[0]);
        for (int k = 1; k < 4; k++) {
            assertThat(endByTime[k - 1]).isCloseTo(end[k], within(1e-9));
            assertThat(endByTime[2 + k]).isCloseTo(end[4 + k] / end[4], within(1e-10));
            assertThat(endCanonical[k - 1]).isCloseTo(end[k], within(1e-9));
        }
        double[] endPoint = new double[4];
        double[] endMomentum = new double[4];
        canonical.point(end[0], endCanonical, endPoint);
        canonical.momentum(end[0], endCanonical, endMomentum);
        assertThat(endPoint[0]).isEqualTo(end[0]);
        metric.raise(endPoint, endMomentum, endMomentum);
        for (int k = 0; k < 4; k++) {
            assertThat(endMomentum[k]).isCloseTo(end[4 + k], within(1e-9));
        }
    }

    /**
     * Light in a universe of dust: the comoving distance from t_1 to t_2 is 3 (t_2^⅓ − t_1^⅓) and the momentum p_x stays
     * (Weinberg 1972, Gravitation and Cosmology, ch. 14; from memory). Here p_0 must follow from the mass shell.
     */
    @Test
    void theMassShellSuppliesTheTimeComponentWhereItChanges() {
        Spacetime dust = Spacetime.dust();
        TimeMomentum shell = TimeMomentum.onMassShell(4, dust::inverseMetric, 0, Root.SMALLER);
        HamiltonianByTimeEquation equation = new HamiltonianByTimeEquation(4, dust::flowByTime, shell);
        double[] end = integrate(equation, 1, equation.state(new double[] {1, 0, 0, 0}, new double[] {0, 2, 0, 0}), 8);
        assertThat(end[0]).isCloseTo(3, within(1e-11));
        assertThat(end[3]).isCloseTo(2, within(1e-14));
        double[] momentum = new double[4];
        equation.momentum(8, end, momentum);
        // The energy falls as 1/a = t^(−2/3).
        assertThat(momentum[0]).isCloseTo(-2 * 0.25, within(1e-12));
    }

    /** Products of transported vectors with each other and with the velocity stay. */
    @Test
    void transportKeepsProducts() {
        double[] point = {0, 8, 1.25, 0};
        double[] velocity = velocity(point);
        double[] first = {0.1, 1, 0.2, 0};
        double[] second = {0, -0.5, 0.1, 0.2};
        TransportEquation equation = new TransportEquation(4, 2, kerr::acceleration, kerr::transport);
        double[] start = equation.state(point, velocity, first, second);
        double[] end = integrate(equation, 0, start, 40);
        double[] endPoint = Arrays.copyOf(end, 4);
        double[][] before = {velocity, first, second};
        double[][] after = new double[3][4];
        after[0] = Arrays.copyOfRange(end, 4, 8);
        equation.vector(end, 0, after[1]);
        equation.vector(end, 1, after[2]);
        for (int a = 0; a < 3; a++) {
            for (int b = a; b < 3; b++) {
                assertThat(metric.product(endPoint, after[a], after[b]))
                        .isCloseTo(metric.product(point, before[a], before[b]), within(1e-10));
            }
        }
        assertThat(after[1]).isNotEqualTo(first);
    }

    /** Deviations and the transition matrix agree with each other and with differences of neighbouring orbits. */
    @Test
    void neighboursFollowTheDeviationAndTheTransitionMatrix() {
        double[] point = {0, 10, 1.25, 0};
        double[] velocity = velocity(point);
        double[] xi = {0, 1e-3, 2e-3, -1e-3};
        double[] xiRate = {1e-4, 2e-4, 0, 1e-4}; // dξ/dλ
        double[] eta = new double[4];
        kerr.transport(point, velocity, xi, eta);
        for (int k = 0; k < 4; k++) {
            eta[k] = xiRate[k] - eta[k]; // Dξ = dξ + Γ u ξ
        }
        double span = 30;

        DeviationEquation deviation = new DeviationEquation(4, 1, kerr::acceleration, kerr::transport, kerr::deviation);
        double[] end = integrate(deviation, 0, deviation.state(point, velocity, xi, eta), span);
        double[] byDeviation = new double[4];
        deviation.separation(end, 0, byDeviation);

        GeodesicEquation geodesic = new GeodesicEquation(4, kerr::acceleration);
        VariationalEquation variational = new VariationalEquation(
                geodesic, VariationalEquation.ofGeodesics(4, kerr::christoffel, kerr::christoffelDerivative));
        double[] start = geodesic.state(point, velocity);
        double[] extended = integrate(variational, 0, variational.state(start), span);

        double h = 1e-2;
        double[] plus = start.clone();
        double[] minus = start.clone();
        for (int k = 0; k < 4; k++) {
            plus[k] += h * xi[k];
            minus[k] -= h * xi[k];
            plus[4 + k] += h * xiRate[k];
            minus[4 + k] -= h * xiRate[k];
        }
        double[] above = integrate(geodesic, 0, plus, span);
        double[] below = integrate(geodesic, 0, minus, span);

        double[] all = new double[8];
        System.arraycopy(xi, 0, all, 0, 4);
        System.arraycopy(xiRate, 0, all, 4, 4);
        for (int k = 0; k < 4; k++) {
            double byMatrix = 0;
            for (int b = 0; b < 8; b++) {
                byMatrix += variational.transition(extended, k, b) * all[b];
            }
            double size = Math.abs(byMatrix) + 1e-4;
            assertThat(byDeviation[k]).isCloseTo(byMatrix, within(1e-9 * size));
            assertThat((above[k] - below[k]) / (2 * h)).isCloseTo(byMatrix, within(1e-5 * size));
        }
        // Phase space keeps its volume for the geodesic spray by x and u only up to √|g|; the point must be the base's.
        double[] endPoint = new double[4];
        variational.point(span, extended, endPoint);
        assertThat(endPoint).containsExactly(Arrays.copyOf(extended, 4));
    }

    @Test
    void raisingUndoesLowering() {
        double[] point = {0, 3, 0.75, 0};
        double[] vector = {1, -0.25, 0.5, 0.125};
        double[] covector = new double[4];
        metric.lower(point, vector, covector);
        double[] back = new double[4];
        metric.raise(point, covector, back);
        for (int i = 0; i < 4; i++) {
            assertThat(back[i]).isCloseTo(vector[i], within(1e-14));
        }
        MetricTensor degenerate = new MetricTensor(2, (x, g) -> Arrays.fill(g, 1));
        assertThatThrownBy(() -> degenerate.raise(point, new double[2], new double[2]))
                .isInstanceOf(NormalizationException.class)
                .hasMessageContaining("no inverse");
    }

    @Test
    void wrongShapesAreRefused() {
        assertThatThrownBy(() -> new GeodesicByTimeEquation(1, kerr::accelerationByTime))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new HamiltonianByTimeEquation(1, kerr::flowByTime, TimeMomentum.constant(-1)))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TransportEquation(4, -1, kerr::acceleration, kerr::transport))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new DeviationEquation(4, 0, kerr::acceleration, kerr::transport, kerr::deviation))
                .isInstanceOf(IllegalArgumentException.class);
        TransportEquation transport = new TransportEquation(4, 1, kerr::acceleration, kerr::transport);
        assertThatThrownBy(() -> transport.derivatives(0, new double[11], new double[12]))
                .hasMessageContaining("11")
                .hasMessageContaining("12");
        assertThatThrownBy(() -> transport.state(new double[4], new double[4]))
                .hasMessageContaining("8 entries together, and a state has 12");
        assertThatThrownBy(() -> transport.state(new double[4], new double[4], new double[5]))
                .isInstanceOf(IllegalArgumentException.class);
        GeodesicByTimeEquation byTime = new GeodesicByTimeEquation(4, kerr::accelerationByTime);
        assertThatThrownBy(() -> byTime.state(new double[4], new double[4])).hasMessageContaining("not 0");
    }
}
