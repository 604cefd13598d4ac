package io.github.gammawright.runtime.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.Root;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.runtime.Spacetime;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.runtime.orbit.StateKind;
import java.util.Arrays;
import org.hipparchus.analysis.differentiation.DerivativeStructure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class KerrChartsTest {

    private static final double[][] POINTS = {
        {0.5, 3, 1.25, 0.75}, {-2, 8, 0.5, -2.5}, {0, 2.5, 2.75, 3}, {1, 40, 1.5, 0},
    };

    /**
     * Kerr's metric as Kerr and Schild (1965; from memory) have it: η + 2H l l, H = M r³/(r⁴ + a² z²), l = (1, (rx + ay)/(r²
     * + a²), (ry − ax)/(r² + a²), z/r).
     */
    static void kerrSchildMetric(double a, double[] x, double[] g) {
        double r = new KerrCharts(1, a).radius(x[1], x[2], x[3]);
        double sum = r * r + a * a;
        double[] l = {1, (r * x[1] + a * x[2]) / sum, (r * x[2] - a * x[1]) / sum, x[3] / r};
        double twice = 2 * r * r * r / (r * r * r * r + a * a * x[3] * x[3]);
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                g[4 * i + j] = twice * l[i] * l[j] + (i != j ? 0 : i == 0 ? -1 : 1);
            }
        }
    }

    private static Spacetime kerrSchild(double a) {
        return new Spacetime(4, x -> {
            DerivativeStructure half = x[1].square()
                    .add(x[2].square())
                    .add(x[3].square())
                    .subtract(a * a)
                    .divide(2);
            DerivativeStructure r2 =
                    half.add(half.square().add(x[3].square().multiply(a * a)).sqrt());
            DerivativeStructure r = r2.sqrt();
            DerivativeStructure sum = r2.add(a * a);
            DerivativeStructure[] l = {
                r.getField().getOne(),
                r.multiply(x[1]).add(x[2].multiply(a)).divide(sum),
                r.multiply(x[2]).subtract(x[1].multiply(a)).divide(sum),
                x[3].divide(r)
            };
            DerivativeStructure twice = r2.multiply(r)
                    .multiply(2)
                    .divide(r2.square().add(x[3].square().multiply(a * a)));
            DerivativeStructure[][] g = new DerivativeStructure[4][4];
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j < 4; j++) {
                    g[i][j] = twice.multiply(l[i]).multiply(l[j]).add(i != j ? 0 : i == 0 ? -1 : 1);
                }
            }
            return g;
        });
    }

    /** The Jacobian pulls one published form of the metric back to the other. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.6, 0.9, 1})
    void theMetricOfKerrAndSchildBecomesThatOfBoyerAndLindquist(double a) {
        KerrCharts charts = new KerrCharts(1, a);
        double[] image = new double[4];
        double[] jacobian = new double[16];
        double[] target = new double[16];
        double[] expected = new double[16];
        for (double[] point : POINTS) {
            charts.kerrSchild(point, image);
            charts.kerrSchildJacobian(point, jacobian);
            kerrSchildMetric(a, image, target);
            new KerrByHand(a).metric(point, expected);
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j < 4; j++) {
                    double sum = 0;
                    double size = 0;
                    for (int k = 0; k < 4; k++) {
                        for (int l = 0; l < 4; l++) {
                            double term = target[4 * k + l] * jacobian[4 * k + i] * jacobian[4 * l + j];
                            sum += term;
                            size += Math.abs(term);
                        }
                    }
                    assertThat(sum).isCloseTo(expected[4 * i + j], within(1e-14 * (1 + size)));
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.6, 0, 0.9, 1})
    void thereAndBackIsTheStart(double a) {
        KerrCharts charts = new KerrCharts(1, a);
        ChartChange there = charts.toKerrSchild();
        ChartChange back = charts.toBoyerLindquist();
        double[] vector = {1, -0.25, 0.125, 0.5};
        for (double[] point : POINTS) {
            double[] image = there.point(point);
            double[] again = back.point(image);
            double[] v = back.vector(image, there.vector(point, vector));
            double[] p = back.momentum(image, there.momentum(point, vector));
            for (int i = 0; i < 4; i++) {
                assertThat(again[i]).isCloseTo(point[i], within(1e-13 * (1 + Math.abs(point[i]))));
                assertThat(v[i]).isCloseTo(vector[i], within(1e-12));
                assertThat(p[i]).isCloseTo(vector[i], within(1e-12));
            }
            // A momentum on a vector gives the same number in both charts.
            double[] vThere = there.vector(point, vector);
            double[] pThere = there.momentum(point, vector);
            double sum = 0;
            double sumThere = 0;
            for (int i = 0; i < 4; i++) {
                sum += vector[i] * vector[i];
                sumThere += vThere[i] * pThere[i];
            }
            assertThat(sumThere).isCloseTo(sum, within(1e-12));
        }
    }

    /**
     * A body falls in the outer chart, crosses the horizon in the inner one, and its energy, which is the same component
     * p_T = p_t in both, stays. Where light comes out again, the chart is changed back.
     */
    @Test
    void aRunGoesThroughTheHorizonInTheInnerChart() {
        double a = 0.6;
        KerrCharts charts = new KerrCharts(1, a);
        Spacetime outerKerr = Spacetime.kerr(a);
        Spacetime innerKerr = kerrSchild(a);
        MetricTensor outerMetric = new MetricTensor(4, outerKerr::metric);
        double[] point = {0, 8, 1.25, 0.5};
        double[] velocity = {0, -0.2, 0.01, 0.02};
        new Normalization(outerMetric, Signature.MOSTLY_PLUS)
                .solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        double[] momentum = new double[4];
        outerMetric.lower(point, velocity, momentum);

        Run outside = new Run(new GeodesicEquation(4, outerKerr::acceleration))
                .tolerancesFor(StateKind.LIGHT)
                .watch(Event.surface("inwards", 1, 4, Direction.DECREASING).stop());
        Run inside = new Run(new GeodesicEquation(4, innerKerr::acceleration))
                .tolerancesFor(StateKind.LIGHT)
                .watch(Event.where(
                                "deep", (parameter, y) -> charts.radius(y[1], y[2], y[3]) - 1.2, Direction.DECREASING)
                        .stop());
        ChartedRun run = new ChartedRun()
                .in("outer", outside)
                .in("inner", inside)
                .change("outer", "inwards", "inner", charts.toKerrSchild()::velocityState);
        ChartedRun.Arrival arrival =
                run.follow("outer", 0, new GeodesicEquation(4, outerKerr::acceleration).state(point, velocity), 1000);

        assertThat(arrival.chart()).isEqualTo("inner");
        assertThat(arrival.changes()).isEqualTo(1);
        assertThat(arrival.ending().stoppedBy("deep")).isTrue();
        double[] end = arrival.ending().state();
        MetricTensor innerMetric = new MetricTensor(4, innerKerr::metric);
        double[] endPoint = Arrays.copyOf(end, 4);
        double[] endVelocity = Arrays.copyOfRange(end, 4, 8);
        double[] endMomentum = new double[4];
        innerMetric.lower(endPoint, endVelocity, endMomentum);
        assertThat(innerMetric.square(endPoint, endVelocity)).isCloseTo(-1, within(1e-8));
        assertThat(endMomentum[0]).isCloseTo(momentum[0], within(1e-9));
        // The axial momentum x p_y − y p_x.
        assertThat(endPoint[1] * endMomentum[2] - endPoint[2] * endMomentum[1]).isCloseTo(momentum[3], within(1e-9));
        assertThatThrownBy(() -> run.follow("nowhere", 0, end, 1)).hasMessageContaining("no chart called nowhere");
        assertThatThrownBy(() -> charts.toBoyerLindquist().point(endPoint))
                .isInstanceOf(ChartException.class)
                .hasMessageContaining("outside the new chart");
    }

    /** One orbit followed in one chart alone and through a change of charts ends at one place. */
    @Test
    void aChangeOnTheWayLeavesTheOrbitAsItIs() {
        double a = 0.9;
        KerrCharts charts = new KerrCharts(1, a);
        KerrByHand kerr = new KerrByHand(a);
        HamiltonianEquation outer = new HamiltonianEquation(4, kerr::flow);
        HamiltonianEquation inner = new HamiltonianEquation(4, kerrSchild(a)::flow);
        double[] start = {0, 12, Math.PI / 2, 0, -0.9418161811457918, 0, Math.sqrt(2.128179922614577), 2.513146042747529
        };
        double to = 30;
        double[] direct = new Run(outer).follow(0, start, to).state();
        ChartedRun.Arrival arrival = new ChartedRun()
                .in(
                        "outer",
                        new Run(outer)
                                .watch(Event.surface("in", 0, 10, Direction.INCREASING)
                                        .stop()))
                .in("inner", new Run(inner).tolerancesFor(StateKind.LIGHT))
                .change("outer", "in", "inner", charts.toKerrSchild()::momentumState)
                .follow("outer", 0, start, to);
        assertThat(arrival.chart()).isEqualTo("inner");
        double[] back = charts.toBoyerLindquist().momentumState(arrival.ending().state());
        for (int i = 0; i < 8; i++) {
            assertThat(back[i]).isCloseTo(direct[i], within(1e-8));
        }
    }

    @Test
    void wrongInputIsRefused() {
        assertThatThrownBy(() -> new KerrCharts(1, 1.5)).hasMessageContaining("can't have the spin");
        ChartChange change = new KerrCharts(1, 0.5).toKerrSchild();
        assertThatThrownBy(() -> change.velocityState(new double[6])).hasMessageContaining("6 entries");
        ChartChange flat = new ChartChange(2, (x, y) -> {}, (x, j) -> Arrays.fill(j, 1));
        assertThatThrownBy(() -> flat.momentum(new double[2], new double[2])).hasMessageContaining("undone");
    }
}
