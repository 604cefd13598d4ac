package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.samples.kernels.SphereChristoffel;
import io.github.gammawright.samples.kernels.SphereGeodesicAcceleration;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** The sphere: do Carmo 1976, Differential Geometry of Curves and Surfaces, ch. 4 (from memory). */
class SphereTest {

    @Property
    void theTwoSymbolsHaveTheirClosedForms(
            @ForAll @DoubleRange(min = 0.5, max = 1000) @Scale(12) double radius,
            @ForAll @DoubleRange(min = 0.0001, max = 3.1415) @Scale(12) double theta) {
        int compared = new ExpectedConnection(2)
                .with(0, 1, 1, -Math.sin(theta) * Math.cos(theta))
                .with(1, 0, 1, Math.cos(theta) / Math.sin(theta))
                .compareWith(new SphereChristoffel(radius).valuesAt(new double[] {theta, 0.5}), 1e-15);
        assertThat(compared).isEqualTo(2);
    }

    /** Geodesics are great circles: where one starts from the equator, sin(latitude) = sin(inclination) sin(way/R). */
    @Test
    void geodesicsAreGreatCircles() {
        double inclination = 0.75;
        double radius = 2.5;
        GeodesicEquation equation = new GeodesicEquation(2, new SphereGeodesicAcceleration(radius)::evaluate);
        double[] start = equation.state(
                new double[] {Math.PI / 2, 0},
                new double[] {-Math.sin(inclination) / radius, Math.cos(inclination) / radius});
        for (double way : new double[] {0.5, 2, 5, 15}) {
            double[] end = new DormandPrince853Integrator(1e-8, 1, 1e-13, 1e-13)
                    .integrate(equation, new ODEState(0, start), way)
                    .getPrimaryState();
            assertThat(Math.cos(end[0])).isCloseTo(Math.sin(inclination) * Math.sin(way / radius), within(1e-11));
        }
    }
}
