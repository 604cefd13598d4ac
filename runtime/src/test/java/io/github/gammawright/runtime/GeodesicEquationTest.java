package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** Geodesics whose shape is known: straight lines in polar coordinates, great circles on a sphere. */
class GeodesicEquationTest {

    private static final double TOLERANCE = 1e-13;

    private final GeodesicEquation plane = new GeodesicEquation(2, Kernels::polarPlaneAcceleration);

    @Test
    void geodesicsOfThePlaneAreStraight() {
        // From (1, 0) with the velocity (0.3, 0.4) in Cartesian components.
        double[] start = plane.state(new double[] {1, 0}, new double[] {0.3, 0.4});
        for (double parameter : new double[] {5, -5}) {
            double[] end = integrate(plane, start, parameter);
            double x = 1 + 0.3 * parameter;
            double y = 0.4 * parameter;
            assertThat(end[0]).isCloseTo(Math.hypot(x, y), within(1e-11));
            assertThat(end[1]).isCloseTo(Math.atan2(y, x), within(1e-11));
        }
    }

    @Test
    void greatCirclesClose() {
        // do Carmo (1976), Differential Geometry of Curves and Surfaces, sec. 4-4 (from memory): the geodesics of a
        // sphere
        // are its great circles; at unit angular speed one closes after 2π, half way its latitude has changed sign.
        GeodesicEquation sphere = new GeodesicEquation(2, Kernels::sphereAcceleration);
        double theta = 1.0;
        double[] start = sphere.state(new double[] {theta, 0.25}, new double[] {0.6, 0.8 / Math.sin(theta)});
        double[] half = integrate(sphere, start, Math.PI);
        assertThat(half[0]).isCloseTo(Math.PI - theta, within(1e-10));
        assertThat(half[1]).isCloseTo(0.25 + Math.PI, within(1e-10));
        double[] whole = integrate(sphere, start, 2 * Math.PI);
        assertThat(whole[0]).isCloseTo(theta, within(1e-10));
        assertThat(whole[1]).isCloseTo(0.25 + 2 * Math.PI, within(1e-10));
        assertThat(whole[2]).isCloseTo(start[2], within(1e-10));
        assertThat(whole[3]).isCloseTo(start[3], within(1e-10));
    }

    @Test
    void bothWaysToTheDerivativesAgreeAndLeaveTheStateAlone() {
        double[] state = {2, 0.5, 0.25, -1.5};
        double[] expected = {0.25, -1.5, 4.5, 0.375};
        assertThat(plane.computeDerivatives(0, state)).containsExactly(expected);
        assertThat(state).containsExactly(2, 0.5, 0.25, -1.5);
        plane.derivatives(state, state);
        assertThat(state).containsExactly(expected);
        assertThat(plane.computeDerivatives(0, state)).isNotSameAs(plane.computeDerivatives(0, state));
    }

    @Test
    void wrongLengthsAreRefusedWithBothNumbers() {
        assertThatThrownBy(() -> plane.derivatives(new double[3], new double[4]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("state has 3 entries, and 4 are needed");
        assertThatThrownBy(() -> plane.derivatives(new double[4], new double[5]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("derivatives has 5 entries, and 4 are needed");
        assertThatThrownBy(() -> plane.state(new double[2], new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a state needs a point and a vector of 2 entries each, not 2 and 3");
        assertThatThrownBy(() -> new GeodesicEquation(0, Kernels::polarPlaneAcceleration))
                .isInstanceOf(IllegalArgumentException.class);
    }

    private static double[] integrate(GeodesicEquation equation, double[] start, double parameter) {
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-8, 1, TOLERANCE, TOLERANCE);
        return integrator.integrate(equation, new ODEState(0, start), parameter).getPrimaryState();
    }
}
