package io.github.gammawright.runtime.published;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.IntegratorFactory;
import io.github.gammawright.runtime.orbit.Run;
import org.junit.jupiter.api.Test;

/** Light round holes of mass 1, against closed forms that were evaluated with 60 digits (formulas from memory). */
class LightTest {

    private static final IntegratorFactory FINE = IntegratorFactory.tolerances(1e-14, 1e-13);

    private final HamiltonianEquation schwarzschild = new HamiltonianEquation(4, new KerrByHand(0)::flow);

    /** Light at its closest approach, in the equatorial plane, with energy 1. */
    private static double[] atClosest(double r) {
        return new double[] {0, r, Math.PI / 2, 0, -1, 0, 0, r / Math.sqrt(1 - 2 / r)};
    }

    private static double closest(double impact) {
        return 2 * impact / Math.sqrt(3) * Math.cos(Math.acos(-3 * Math.sqrt(3) / impact) / 3);
    }

    /**
     * Deflection between infinite distances, 4 √(r0/Q) (K(k) − F(ψ, k)) − π (Darwin 1959; Chandrasekhar 1983, sec. 20). Half
     * of it is followed, from the closest approach to r = R, and the rest ∫ dr φ'(r) beyond added: with u = 1/R and impact
     * parameter b it is ∫_0^u du/√(1/b² − u² + 2u³), by a series in u.
     */
    @Test
    void deflectionFollowsFromEllipticIntegrals() {
        double[][] cases = {
            {5.25, 4.194799708234656},
            {5.5, 2.553020182345338},
            {6, 1.719388310230169},
            {7, 1.127639104731336},
            {10, 0.5903957876058273},
            {20, 0.2361359953884700},
            {100, 0.04122253974927366},
        };
        for (double[] row : cases) {
            double b = row[0];
            double far = 1e4 * b;
            Event arrival = Event.surface("far", 1, far, Direction.INCREASING).stop();
            Ending ending =
                    new Run(schwarzschild).integrator(FINE).watch(arrival).follow(0, atClosest(closest(b)), 1e9);
            assertThat(ending.stoppedBy("far")).isTrue();
            double u = 1 / far;
            double rest = b * u + b * b * b * (u * u * u / 6 - u * u * u * u / 4);
            // b is exact for 5.25, 5.5, …; near the critical one the angle feels its last digit.
            assertThat(2 * (ending.state()[3] + rest) - Math.PI).isCloseTo(row[1], within(2e-11));
        }
    }

    /**
     * Coordinate time from the closest approach to a radius (Weinberg 1972, Gravitation and Cosmology, sec. 8.7), by
     * quadrature of the exact integrand: the same finite radii on both sides.
     */
    @Test
    void lightIsDelayed() {
        double[][] cases = {{10, 100, 107.5383197445792}, {4, 50, 62.33301602523182}, {100, 10000, 10011.18569106367}};
        for (double[] row : cases) {
            Event arrival =
                    Event.surface("arrival", 1, row[1], Direction.INCREASING).stop();
            Ending ending =
                    new Run(schwarzschild).integrator(FINE).watch(arrival).follow(0, atClosest(row[0]), 1e6);
            assertThat(ending.state()[0]).isCloseTo(row[2], within(1e-11 * row[2]));
        }
    }

    /** The critical impact parameter 3√3 M (Darwin 1959): a little less is caught, a little more escapes. */
    @Test
    void lightIsCaughtBelowTheCriticalImpactParameter() {
        KerrByHand hole = new KerrByHand(0);
        double critical = 3 * Math.sqrt(3);
        for (int sign : new int[] {-1, 1}) {
            double b = critical * (1 + sign * 1e-9);
            double r = 100;
            double radial = -Math.sqrt(1 - (1 - 2 / r) * b * b / (r * r)) / (1 - 2 / r);
            double[] start = {0, r, Math.PI / 2, 0, -1, radial, 0, b};
            Ending ending = new Run(schwarzschild)
                    .within(hole::inDomain)
                    .watch(Event.surface("caught", 1, 2.1, Direction.DECREASING).stop())
                    .watch(Event.surface("away", 1, 101, Direction.INCREASING).stop())
                    .follow(0, start, 1e4);
            assertThat(ending.stoppedBy(sign < 0 ? "caught" : "away")).isTrue();
        }
    }

    /**
     * Circular photon orbits 2M (1 + cos(2/3 arccos(∓a/M))) with b = ±r^{3/2} + a (Bardeen, Press &amp; Teukolsky 1972): the
     * radial force vanishes there, and the light stays for a quarter of a turn though the orbit is unstable.
     */
    @Test
    void photonOrbitsAreCircular() {
        double[][] cases = {
            {0.5, 2.347296355333861, 4.096266658713868},
            {0.5, 3.532088886237956, -6.138155724715450},
            {0.9, 1.557854627423383, 2.844421403476169},
            {0.9, 3.910267939103037, -6.832319230446667},
        };
        for (double[] row : cases) {
            double a = row[0];
            double r = 2 * (1 + Math.cos(2.0 / 3 * Math.acos(-Math.signum(row[2]) * a)));
            assertThat(r).isCloseTo(row[1], within(1e-14));
            HamiltonianEquation kerr = new HamiltonianEquation(4, new KerrByHand(a)::flow);
            double[] state = {0, row[1], Math.PI / 2, 0, -1, 0, 0, row[2]};
            double[] rate = new double[8];
            kerr.derivatives(state, rate);
            assertThat(rate[5]).isCloseTo(0, within(1e-12));
            Ending ending = new Run(kerr)
                    .watch(Event.surface("quarter", 3, Math.signum(row[2]) * Math.PI / 2, Direction.BOTH)
                            .stop())
                    .follow(0, state, 100);
            assertThat(ending.state()[1]).isCloseTo(row[1], within(1e-9));
        }
    }

    /**
     * The edge of Kerr's shadow (Bardeen 1973): light that ends on a spherical photon orbit of radius r has L/E = (r² (3 − r)
     * − a² (r + 1))/(a (r − 1)) and Q/E² = r³ (4a² − r (r − 3)²)/(a² (r − 1)²). Rays from afar just inside are caught, just
     * outside escape.
     */
    @Test
    void theShadowHasItsEdge() {
        double a = 0.9;
        KerrByHand hole = new KerrByHand(a);
        HamiltonianEquation kerr = new HamiltonianEquation(4, hole::flow);
        double horizon = 1 + Math.sqrt(1 - a * a);
        int compared = 0;
        for (double r : new double[] {1.75, 2.25, 2.75, 3.25, 3.7}) {
            double axial = (r * r * (3 - r) - a * a * (r + 1)) / (a * (r - 1));
            double carter = r * r * r * (4 * a * a - r * (r - 3) * (r - 3)) / (a * a * (r - 1) * (r - 1));
            for (int sign : new int[] {-1, 1}) {
                // Away from the middle of the shadow, whose celestial coordinates scale as L and √Q seen edge-on.
                double scale = 1 + sign * 1e-5;
                double l = axial * scale;
                double q = carter * scale * scale;
                double far = 500;
                double delta = far * far - 2 * far + a * a;
                double p = far * far + a * a - a * l;
                double radial = p * p - delta * (q + (l - a) * (l - a));
                double[] start = {0, far, Math.PI / 2, 0, -1, -Math.sqrt(radial) / delta, Math.sqrt(q), l};
                Ending ending = new Run(kerr)
                        .watch(Event.surface("caught", 1, 1.02 * horizon, Direction.DECREASING)
                                .stop())
                        .watch(Event.surface("away", 1, 510, Direction.INCREASING)
                                .stop())
                        .follow(0, start, 5000);
                assertThat(ending.stoppedBy(sign < 0 ? "caught" : "away"))
                        .as("r = " + r + ", " + sign)
                        .isTrue();
                compared++;
            }
        }
        assertThat(compared).isEqualTo(10);
    }
}
