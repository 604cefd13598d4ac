package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.conserved.ConservedQuantity;
import io.github.gammawright.runtime.conserved.DriftMonitor;
import io.github.gammawright.runtime.conserved.KerrConstants;
import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.samples.kernels.KerrGeodesicAcceleration;
import io.github.gammawright.samples.kernels.KerrMetric;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Bound orbits in position–velocity form by the default integrator keep energy, axial momentum and Carter's constant. The
 * orbits are those of Schmidt 2002, Class. Quantum Grav. 19, 2743, with p = 6, e = 0.5 and p = 12, e = 0.3 at a = 0.9 and θ
 * from π/3 (constants from closed forms, from memory).
 */
class KerrConstantsTest {

    private static final double SPIN = 0.9;

    private static void follow(int periods, double limit) {
        double[][] cases = {
            {4, 0.9418161811457918, 2.513146042747530, 2.128179922614577},
            {12 / 1.3, 0.9676623757097362, -3.726603450581618, 4.642076071772689},
        };
        KerrGeodesicAcceleration kernel = new KerrGeodesicAcceleration(1, SPIN);
        MetricTensor metric = new MetricTensor(4, new KerrMetric(1, SPIN)::evaluate);
        GeodesicEquation equation = new GeodesicEquation(4, kernel::evaluate);
        for (double[] row : cases) {
            double[] point = {0, row[0], Math.PI / 2, 0};
            double[] velocity = new double[4];
            metric.raise(point, new double[] {-row[1], 0, -Math.sqrt(row[3]), row[2]}, velocity);
            DriftMonitor monitor = new DriftMonitor(
                    ConservedQuantity.norm(metric),
                    ConservedQuantity.cyclicMomentum("energy", metric, 0),
                    ConservedQuantity.cyclicMomentum("axial momentum", metric, 3),
                    ConservedQuantity.ofVelocity("Carter", metric, KerrConstants.carter(SPIN, 1)));
            Event periapsis = Event.closestApproach("periapsis", 1).stopAfter(periods);
            Ending ending = new Run(equation)
                    .within(kernel::inDomain)
                    .watch(periapsis)
                    .watch(monitor)
                    .follow(0, equation.state(point, velocity), 1e7);
            assertThat(ending.stoppedBy("periapsis")).isTrue();
            assertThat(monitor.worst()).as(monitor.report().toString()).isLessThan(limit);
        }
    }

    @Test
    void tenPeriods() {
        follow(10, 1e-11);
    }

    @Test
    @Tag("campaign")
    void aThousandPeriods() {
        follow(1000, 1e-10);
    }
}
