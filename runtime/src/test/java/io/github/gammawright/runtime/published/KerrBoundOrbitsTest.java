package io.github.gammawright.runtime.published;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.CurveEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.PhaseSpaceEquation;
import io.github.gammawright.runtime.conserved.ConservedQuantity;
import io.github.gammawright.runtime.conserved.DriftMonitor;
import io.github.gammawright.runtime.conserved.KerrConstants;
import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.runtime.symplectic.GaussLegendre;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Bound orbits round Kerr's hole of a = 0.9, against the frequencies in closed form (Schmidt 2002, Class. Quantum Grav. 19,
 * 2743; Fujita &amp; Hikida 2009, Class. Quantum Grav. 26, 135002; from memory), computed with 60 digits.
 */
class KerrBoundOrbitsTest {

    private static final double SPIN = 0.9;

    private record Case(
            String name,
            double start,
            double energy,
            double axial,
            double carter,
            double radial,
            double polar,
            double radialByTime) {

        double[] state() {
            return new double[] {0, start, Math.PI / 2, 0, -energy, 0, -Math.sqrt(carter), axial, 0};
        }

        /** Affine parameter of a radial period, to a percent. */
        double period() {
            return 2 * Math.PI / radial * (name.equals("A") ? 53.03 : 160.7);
        }
    }

    static List<Case> cases() {
        return List.of(
                new Case(
                        "A",
                        4,
                        0.9418161811457918,
                        2.513146042747530,
                        2.128179922614577,
                        1.972021200723097,
                        2.915694507676422,
                        0.02939559387878006),
                new Case(
                        "C",
                        12 / 1.3,
                        0.9676623757097362,
                        -3.726603450581618,
                        4.642076071772689,
                        2.397758102459963,
                        4.308347822424694,
                        0.01297975189327061));
    }

    /** Hamilton's equations with Mino's time, dλ = dτ/Σ, as one more entry. */
    private static final class WithMinoTime extends CurveEquation {

        private final PhaseSpaceEquation flow = new HamiltonianEquation(4, new KerrByHand(SPIN)::flow);
        private final double[] state = new double[8];
        private final double[] rate = new double[8];

        WithMinoTime() {
            super(4, 9);
        }

        @Override
        public void derivatives(double parameter, double[] y, double[] derivatives) {
            System.arraycopy(y, 0, state, 0, 8);
            flow.derivatives(state, rate);
            System.arraycopy(rate, 0, derivatives, 0, 8);
            double cosine = Math.cos(y[2]);
            derivatives[8] = 1 / (y[1] * y[1] + SPIN * SPIN * cosine * cosine);
        }
    }

    private static DriftMonitor monitor() {
        return new DriftMonitor(
                ConservedQuantity.momentum("energy", 4, 0),
                ConservedQuantity.momentum("axial momentum", 4, 3),
                ConservedQuantity.ofMomentum("Carter", 4, KerrConstants.carter(SPIN, 1)));
    }

    private static final class Visits implements Event.Listener {

        private double[] first;
        private double[] last;
        private int count;

        @Override
        public void occurred(double parameter, double[] state) {
            first = count == 0 ? state : first;
            last = state;
            count++;
        }

        double frequency(int entry) {
            return 2 * Math.PI * (count - 1) / (last[entry] - first[entry]);
        }
    }

    private static void frequencies(Case orbit, int periods, double tolerance, double drift) {
        Visits periapses = new Visits();
        Visits lowest = new Visits();
        DriftMonitor monitor = monitor();
        Ending ending = new Run(new WithMinoTime())
                .watch(Event.closestApproach("periapsis", 1).tell(periapses))
                .watch(Event.closestApproach("highest latitude", 2).tell(lowest))
                .watch(monitor)
                .follow(0, orbit.state(), periods * orbit.period());
        assertThat(ending.completed()).isTrue();
        assertThat(periapses.count).isBetween((int) (0.97 * periods), (int) (1.03 * periods) + 2);
        assertThat(periapses.frequency(8)).isCloseTo(orbit.radial(), within(tolerance * orbit.radial()));
        assertThat(lowest.frequency(8)).isCloseTo(orbit.polar(), within(tolerance * orbit.polar()));
        // The time from one periapsis to the next swings with the latitude: only the average counts.
        assertThat(periapses.frequency(0)).isCloseTo(orbit.radialByTime(), within(1e-3 * orbit.radialByTime()));
        assertThat(monitor.worst()).isLessThan(drift);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void radialAndPolarFrequencies(Case orbit) {
        frequencies(orbit, 25, 1e-9, 1e-11);
    }

    @Tag("campaign")
    @ParameterizedTest
    @MethodSource("cases")
    void aThousandPeriods(Case orbit) {
        frequencies(orbit, 1000, 1e-9, 1e-10);
    }

    private static void collocation(Case orbit, int periods, double step) {
        GaussLegendre method = new GaussLegendre(new HamiltonianEquation(4, new KerrByHand(SPIN)::flow), 6, step);
        double[] state = java.util.Arrays.copyOf(orbit.state(), 8);
        method.start(0, state);
        DriftMonitor firstHalf = monitor();
        DriftMonitor all = monitor();
        firstHalf.start(0, state);
        all.start(0, state);
        long steps = (long) (periods * orbit.period() / step);
        for (long i = 0; i < steps; i++) {
            assertThat(method.advance()).isTrue();
            method.copyState(state);
            all.look(method.parameter(), state);
            if (i < steps / 2) {
                firstHalf.look(method.parameter(), state);
            }
        }
        assertThat(method.iterations()).isLessThan(8 * steps);
        // No trend: the whole run is not much worse than its first half.
        assertThat(all.worst()).isLessThan(3 * firstHalf.worst() + 2e-14);
        assertThat(all.report().get(0).worst()).isLessThan(1e-13);
        assertThat(all.report().get(1).worst()).isLessThan(1e-13);
        assertThat(all.report().get(2).worst()).isLessThan(1e-12);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void collocationKeepsTheConstants(Case orbit) {
        collocation(orbit, 10, orbit.name().equals("A") ? 0.125 : 0.5);
    }

    @Tag("campaign")
    @ParameterizedTest
    @MethodSource("cases")
    void collocationKeepsTheConstantsForAThousandPeriods(Case orbit) {
        collocation(orbit, 1000, orbit.name().equals("A") ? 0.125 : 0.5);
    }
}
