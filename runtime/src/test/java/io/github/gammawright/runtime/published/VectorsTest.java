package io.github.gammawright.runtime.published;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.DeviationEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.runtime.Spacetime;
import io.github.gammawright.runtime.TransportEquation;
import io.github.gammawright.runtime.frame.Handedness;
import io.github.gammawright.runtime.frame.LightBundle;
import io.github.gammawright.runtime.frame.Observers;
import io.github.gammawright.runtime.frame.OrthonormalFrame;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.runtime.orbit.StateKind;
import java.util.Arrays;
import org.junit.jupiter.api.Test;

/** Transported vectors and light bundles against what the literature says of them (formulas from memory). */
class VectorsTest {

    /**
     * A gyroscope on a circular orbit turns by 2π (1 − √(1 − 3M/r ± 2a√M/r^{3/2})) a revolution against the radial
     * direction (de Sitter 1916; Schiff 1960; Rindler &amp; Perlick 1990), computed with 60 digits.
     */
    @Test
    void gyroscopesTurnOnCircularOrbits() {
        double[][] cases = {{0, 10, 1.026295321356200}, {0.5, 10, 0.9088658615622365}, {0.9, 6, 1.325937305380813}};
        for (double[] row : cases) {
            double a = row[0];
            double r = row[1];
            Spacetime kerr = Spacetime.kerr(a);
            MetricTensor metric = new MetricTensor(4, kerr::metric);
            double omega = 1 / (Math.pow(r, 1.5) + a);
            double[] point = {0, r, Math.PI / 2, 0};
            OrthonormalFrame frame = new Observers(metric, Signature.MOSTLY_PLUS)
                    .frame(point, new double[] {1, 0, 0, omega}, Handedness.RIGHT);
            double[] u = frame.vector(0);
            TransportEquation equation = new TransportEquation(4, 1, kerr::acceleration, kerr::transport);
            double[] end = new Run(equation)
                    .tolerancesFor(StateKind.BUNDLE)
                    .follow(0, equation.state(point, u, frame.vector(1)), 2 * Math.PI / u[3])
                    .state();
            assertThat(end[3]).isCloseTo(2 * Math.PI, within(1e-9));
            double[] spin = new double[4];
            equation.vector(end, 0, spin);
            double[] inFrame = frame.toFrame(spin);
            // Seen from far away the spin has turned by that angle; e_3 lies along the motion.
            double angle = Math.atan2(inFrame[3], inFrame[1]);
            assertThat(Math.abs(angle)).isCloseTo(row[2], within(1e-8));
        }
    }

    /**
     * Walker and Penrose's constant of a polarisation along light (Walker &amp; Penrose 1970; Chandrasekhar 1983, sec. 60;
     * Connors, Piran &amp; Stark 1980): κ = (A − iB)(r − ia cos θ).
     */
    @Test
    void polarisationKeepsWalkerAndPenrosesConstant() {
        double a = 0.9375;
        Spacetime kerr = Spacetime.kerr(a);
        double[] point = {0, 6, 1, 0};
        double[] light = {1.222485650733652, -0.5, 0.125, 0.0625};
        double[] polarisation = {0, 0, -0.05568157586026812, 0.1838519741312127};
        TransportEquation equation = new TransportEquation(4, 1, kerr::acceleration, kerr::transport);
        double[] start = equation.state(point, light, polarisation);
        double[] end = new Run(equation)
                .tolerancesFor(StateKind.BUNDLE)
                .follow(0, start, 32)
                .state();
        double[] before = walkerPenrose(a, start);
        double[] after = walkerPenrose(a, end);
        assertThat(before[0]).isCloseTo(0.02261664783363956, within(1e-12));
        assertThat(before[1]).isCloseTo(4.635737568376408, within(1e-12));
        assertThat(after[0]).isCloseTo(before[0], within(1e-9));
        assertThat(after[1]).isCloseTo(before[1], within(1e-9));
    }

    private static double[] walkerPenrose(double a, double[] y) {
        double r = y[1];
        double s = Math.sin(y[2]);
        double c = Math.cos(y[2]);
        double first = y[4] * y[9] - y[5] * y[8] + a * s * s * (y[5] * y[11] - y[7] * y[9]);
        double second = ((r * r + a * a) * (y[7] * y[10] - y[6] * y[11]) - a * (y[4] * y[10] - y[6] * y[8])) * s;
        return new double[] {first * r - second * a * c, -second * r - first * a * c};
    }

    /**
     * Etherington's reciprocity (1933; Ellis 1971): the distances from either end of a ray, each with light of unit energy at
     * its own vertex, are as 1 + z, the ratio of the energies.
     */
    @Test
    void distancesAreReciprocal() {
        double a = 0.5;
        Spacetime kerr = Spacetime.kerr(a);
        MetricTensor metric = new MetricTensor(4, kerr::metric);
        Observers observers = new Observers(metric, Signature.MOSTLY_PLUS);
        DeviationEquation equation = new DeviationEquation(4, 2, kerr::acceleration, kerr::transport, kerr::deviation);
        LightBundle bundle = new LightBundle(metric, equation);

        double[] source = {0, 9, 1.25, 0};
        OrthonormalFrame there = observers.frame(source, observers.staticVelocity(source), Handedness.RIGHT);
        // Into a direction in the plane of e_1 and e_3, with e_2 and a third vector as the screen.
        double[] light = there.toCoordinates(1, -0.8, 0, 0.6);
        double[] sent = new Run(equation)
                .tolerancesFor(StateKind.BUNDLE)
                .follow(0, bundle.vertex(source, light, there.vector(2), there.toCoordinates(0, 0.6, 0, 0.8)), 20)
                .state();
        double[] arrival = Arrays.copyOf(sent, 4);
        double[] k = Arrays.copyOfRange(sent, 4, 8);
        double[] u = observers.staticVelocity(arrival);
        double energy = -metric.product(arrival, k, u);
        // Back from there: a screen orthogonal to the light and the observer.
        double[] ahead = new double[4];
        for (int i = 0; i < 4; i++) {
            ahead[i] = k[i] / energy - u[i];
        }
        OrthonormalFrame here = observers.frame(
                arrival, u, Handedness.RIGHT, ahead, new double[] {0, 0, 1, 0}, new double[] {0, 1, 0.3, 0});
        double[] seen = new Run(equation)
                .tolerancesFor(StateKind.BUNDLE)
                .follow(20, bundle.vertex(arrival, k, here.vector(2), here.vector(3)), 0)
                .state();
        assertThat(seen[1]).isCloseTo(9, within(1e-8));
        // The light had unit energy at the source; from the observer's vertex rates are by λ, so that D grows by its
        // energy.
        double fromSource = bundle.distance(20, sent);
        double fromObserver = bundle.distance(0, seen) * energy;
        assertThat(fromSource / fromObserver).isCloseTo(1 / energy, within(1e-8));
        assertThat(bundle.magnification(20, sent, fromSource)).isCloseTo(1, within(1e-12));
        assertThat(energy).isNotCloseTo(1, within(1e-3));
    }
}
