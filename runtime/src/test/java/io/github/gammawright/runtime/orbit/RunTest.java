package io.github.gammawright.runtime.orbit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.StateFunction;
import io.github.gammawright.runtime.conserved.ConservedQuantity;
import io.github.gammawright.runtime.conserved.DriftMonitor;
import io.github.gammawright.runtime.conserved.KerrConstants;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.ode.nonstiff.AdamsMoultonIntegrator;
import org.junit.jupiter.api.Test;

class RunTest {

    private final KerrByHand schwarzschild = new KerrByHand(0);
    private final HamiltonianEquation equation = new HamiltonianEquation(4, schwarzschild::flow);

    /** At rest at r = 10: E² = 1 − 2/10. */
    private double[] atRest(double r) {
        return new double[] {0, r, Math.PI / 2, 0, -Math.sqrt(1 - 2 / r), 0, 0, 0};
    }

    /** A bound orbit of semilatus rectum p and eccentricity e, at periapsis (Cutler, Kennefick &amp; Poisson 1994; from memory). */
    private static double[] bound(double p, double e) {
        double energy = Math.sqrt(((p - 2) * (p - 2) - 4 * e * e) / (p * (p - 3 - e * e)));
        double momentum = p / Math.sqrt(p - 3 - e * e);
        return new double[] {0, p / (1 + e), Math.PI / 2, 0, -energy, 0, 0, momentum};
    }

    /**
     * Free fall from rest: proper and coordinate time of the cycloid (Misner, Thorne &amp; Wheeler 1973, sec. 25.5 and 31.3;
     * from memory), computed with 60 digits.
     */
    @Test
    void freeFallTakesTheTimeOfTheCycloid() {
        Event arrival = Event.surface("r = 2.5", 1, 2.5, Direction.DECREASING).stop();
        Ending ending = new Run(equation).watch(arrival).follow(0, atRest(10), 1000);
        assertThat(ending.stoppedBy("r = 2.5")).isTrue();
        assertThat(ending.parameter()).isCloseTo(33.09850746898763, within(1e-11));
        assertThat(ending.state()[0]).isCloseTo(43.24961705904839, within(1e-11));
    }

    /** The horizon is reached at finite proper time, but not by this chart. */
    @Test
    void theHorizonIsANamedOutcome() {
        Ending ending = new Run(equation).within(schwarzschild::inDomain).follow(0, atRest(10), 1000);
        assertThat(ending.outcome()).isEqualTo(Outcome.LEFT_DOMAIN);
        assertThat(ending.parameter()).isCloseTo(33.70086985189233, within(1e-5));
        assertThat(ending.state()[1]).isGreaterThan(2).isCloseTo(2, within(1e-5));
        for (double value : ending.state()) {
            assertThat(value).isFinite();
        }
        assertThat(ending.evaluations()).isLessThan(1_000_000);
    }

    /** A domain that ends where the motion is smooth: the run creeps up to its edge. */
    @Test
    void anEdgeIsReachedClosely() {
        Ending ending = new Run(equation).within(x -> x[1] > 5).follow(0, atRest(10), 1000);
        assertThat(ending.outcome()).isEqualTo(Outcome.LEFT_DOMAIN);
        assertThat(ending.state()[1]).isBetween(5.0, 5.0 + 1e-9);
        assertThat(ending.evaluations()).isLessThan(10_000);
    }

    /** An orbit that only comes close to an edge goes on, and with long steps again. */
    @Test
    void grazingAnEdgeDoesNotEndARun() {
        double[] start = bound(10, 0.25);
        Ending free = new Run(equation).follow(0, start, 3000);
        double edge = 10 / 1.25 - 1e-5;
        Ending grazing = new Run(equation).within(x -> x[1] > edge).follow(0, start, 3000);
        assertThat(grazing.completed()).isTrue();
        assertThat(grazing.state()[1]).isCloseTo(free.state()[1], within(1e-8));
        assertThat(grazing.evaluations()).isLessThan(3 * free.evaluations());
    }

    /**
     * Perihelion advance 4 √(p/(p − 6 + 2e)) K(4e/(p − 6 + 2e)) − 2π and radial period (Darwin 1961; Cutler, Kennefick &amp;
     * Poisson 1994; from memory), computed with 60 digits.
     */
    @Test
    void periapsisAdvancesAsTheEllipticIntegralsSay() {
        double[][] cases = {
            {10, 0.25, 3.680759603477391, 337.0205228458510},
            {8, 0.5, 6.969920054713167, 377.4384922205274},
            {7.5, 0.5, 9.355191929495739, 382.3089556707567},
            {20, 0.75, 1.242924177918922, 2100.139857552209},
            {100, 0.2, 0.1974475160236573, 6881.339650863806},
            {12, 0.9, 2.760398504808206, 3367.217025959104},
        };
        for (double[] row : cases) {
            List<double[]> visits = new ArrayList<>();
            Event periapsis = Event.closestApproach("periapsis", 1)
                    .tell((parameter, state) -> visits.add(state))
                    .stopAfter(3);
            double[] start = bound(row[0], row[1]);
            Ending ending = new Run(equation).watch(periapsis).follow(0, start, 1e6);
            assertThat(ending.stoppedBy("periapsis")).isTrue();
            // The start may count or not, as rounding has it; two visits in a row are a period apart.
            double[] before = visits.get(1);
            double[] after = visits.get(2);
            assertThat(after[3] - before[3] - 2 * Math.PI).isCloseTo(row[2], within(2e-10));
            assertThat(after[0] - before[0]).isCloseTo(row[3], within(1e-11 * row[3] * 10));
        }
    }

    @Test
    void crossingsAreCountedByDirection() {
        KerrByHand kerr = new KerrByHand(0.9);
        HamiltonianEquation tilted = new HamiltonianEquation(4, kerr::flow);
        double[] start = {0, 4, Math.PI / 2, 0, -0.9418161811457918, 0, Math.sqrt(2.128179922614577), 2.513146042747529
        };
        Event up = Event.surface("up", 2, Math.PI / 2, Direction.DECREASING);
        Event down = Event.surface("down", 2, Math.PI / 2, Direction.INCREASING);
        Event both = Event.surface("both", 2, Math.PI / 2, Direction.BOTH);
        Event nearest = Event.closestApproach("nearest", 1);
        Event farthest = Event.farthestPoint("farthest", 1);
        Ending there = new Run(tilted)
                .watch(up)
                .watch(down)
                .watch(both)
                .watch(nearest)
                .watch(farthest)
                .follow(0, start, 2000);
        assertThat(there.completed()).isTrue();
        assertThat(both.count()).isEqualTo(up.count() + down.count()).isGreaterThan(5);
        assertThat(Math.abs(up.count() - down.count())).isLessThanOrEqualTo(1);
        assertThat(Math.abs(nearest.count() - farthest.count())).isLessThanOrEqualTo(1);
        int ups = up.count();
        int nearests = nearest.count();
        int downs = down.count();
        // Back again, what went up comes down, and what is near is near.
        Ending back = new Run(tilted).watch(up).watch(down).watch(nearest).follow(2000, there.state(), 0);
        assertThat(down.count()).isEqualTo(ups);
        assertThat(up.count()).isEqualTo(downs);
        assertThat(nearest.count()).isBetween(nearests - 1, nearests + 1);
        assertThat(back.state()[1]).isCloseTo(4, within(1e-8));
    }

    @Test
    void driftBeyondTheLimitEndsARun() {
        ConservedQuantity carter = ConservedQuantity.ofMomentum("Carter", 4, KerrConstants.carter(0.9, 1));
        KerrByHand kerr = new KerrByHand(0.9);
        HamiltonianEquation tilted = new HamiltonianEquation(4, kerr::flow);
        double[] start = {0, 4, Math.PI / 2, 0, -0.9418161811457918, 0, Math.sqrt(2.128179922614577), 2.513146042747529
        };
        DriftMonitor strict = new DriftMonitor(1e-9, carter);
        Ending coarse = new Run(tilted)
                .integrator(IntegratorFactory.tolerances(1e-4, 1e-4))
                .watch(strict)
                .follow(0, start, 5000);
        assertThat(coarse.outcome()).isEqualTo(Outcome.DRIFT);
        assertThat(coarse.detail()).isEqualTo("Carter");
        assertThat(coarse.parameter()).isLessThan(5000);
        Ending fine = new Run(tilted).watch(strict).follow(0, start, 5000);
        assertThat(fine.completed()).as(fine + " " + strict.report()).isTrue();
        assertThat(strict.worst()).isBetween(0.0, 1e-11);
    }

    @Test
    void statesOnTheWayAreHandedOn() {
        double[] start = bound(10, 0.25);
        List<Double> times = new ArrayList<>();
        List<double[]> samples = new ArrayList<>();
        List<Double> steps = new ArrayList<>();
        DenseOutput dense = new DenseOutput();
        Ending ending = new Run(equation)
                .recordSamples(10, (parameter, state) -> {
                    times.add(parameter);
                    samples.add(state.clone());
                })
                .recordSteps((parameter, state) -> steps.add(parameter))
                .recordDense(dense)
                .follow(0, start, -105);
        assertThat(times).hasSize(11).startsWith(0.0, -10.0).endsWith(-100.0);
        assertThat(steps).hasSize(dense.steps() + 1);
        assertThat(dense.from()).isEqualTo(0);
        assertThat(dense.to()).isEqualTo(-105);
        assertThat(dense.stateAt(-105)).containsExactly(ending.state());
        for (int i = 0; i < times.size(); i++) {
            assertThat(dense.stateAt(times.get(i))[1]).isCloseTo(samples.get(i)[1], within(1e-12));
        }
        assertThatThrownBy(() -> dense.stateAt(1)).hasMessageContaining("not between");
        assertThatThrownBy(() -> new DenseOutput().stateAt(1)).hasMessageContaining("no step");
    }

    @Test
    void otherIntegratorsServeToo() {
        double[] start = bound(10, 0.25);
        Ending byDefault = new Run(equation).follow(0, start, 300);
        Ending byAdams = new Run(equation)
                .integrator((smallest, largest) -> new AdamsMoultonIntegrator(6, smallest, largest, 1e-12, 1e-12))
                .follow(0, start, 300);
        assertThat(byAdams.state()[1]).isCloseTo(byDefault.state()[1], within(1e-7));
        Ending light =
                new Run(equation).tolerancesFor(StateKind.LIGHT).maximalStep(1).follow(0, start, 300);
        assertThat(light.evaluations()).isGreaterThan(300 * 11);
    }

    @Test
    void runsEndWhereTheyMustNotGoOn() {
        double[] start = bound(10, 0.25);
        Ending few = new Run(equation).maxEvaluations(100).follow(0, start, 1e5);
        assertThat(few.outcome()).isEqualTo(Outcome.TOO_MANY_EVALUATIONS);
        assertThat(few.parameter()).isBetween(1.0, 1e4);
        assertThat(few.toString()).startsWith("TOO_MANY_EVALUATIONS at parameter");
        // A rate that grows beyond all bounds.
        HamiltonianEquation pole = new HamiltonianEquation(1, (x, p, result) -> {
            result[0] = 1;
            result[1] = 1 / ((1 - x[0]) * (1 - x[0]));
        });
        Ending stuck = new Run(pole).follow(0, new double[] {0, 0}, 2);
        assertThat(stuck.outcome()).isEqualTo(Outcome.STEP_TOO_SMALL);
        assertThat(stuck.parameter()).isCloseTo(1, within(1e-6));
        for (double value : stuck.state()) {
            assertThat(value).isFinite();
        }
        assertThat(new Run(equation).follow(3, start, 3).completed()).isTrue();
    }

    @Test
    void wrongInputIsRefused() {
        double[] start = bound(10, 0.25);
        assertThatThrownBy(() -> new Run(equation).follow(0, new double[7], 1))
                .hasMessageContaining("8 entries, not 7");
        assertThatThrownBy(() -> new Run(equation).within(x -> x[1] > 50).follow(0, start, 1))
                .hasMessageContaining("outside the domain");
        double[] bad = start.clone();
        bad[5] = Double.NaN;
        assertThatThrownBy(() -> new Run(equation).follow(0, bad, 1)).hasMessageContaining("NaN");
        assertThatThrownBy(() -> new Run(equation).maximalStep(0)).hasMessageContaining("at most 0");
        assertThatThrownBy(() -> new Run(equation).recordSamples(-1, (parameter, state) -> {}))
                .hasMessageContaining("interval");
        assertThatThrownBy(() -> new Run(equation).eventTolerance(0)).hasMessageContaining("tolerance");
        assertThatThrownBy(() ->
                        Event.where("x", StateFunction.entry(0), Direction.BOTH).stopAfter(0))
                .hasMessageContaining("after 0 times");
    }
}
