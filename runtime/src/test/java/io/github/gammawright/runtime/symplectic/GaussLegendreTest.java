package io.github.gammawright.runtime.symplectic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import io.github.gammawright.runtime.CurveEquation;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class GaussLegendreTest {

    /** An oscillator as geodesics of no metric: q' = p, p' = −q. */
    private static final CurveEquation OSCILLATOR = new HamiltonianEquation(1, (x, p, result) -> {
        result[0] = p[0];
        result[1] = -x[0];
    });

    /** q'' = −sin q. */
    private static final CurveEquation PENDULUM = new HamiltonianEquation(1, (x, p, result) -> {
        result[0] = p[0];
        result[1] = -Math.sin(x[0]);
    });

    private static double errorOfOscillator(int order, int steps) {
        GaussLegendre method = new GaussLegendre(OSCILLATOR, order, 2.0 / steps);
        method.start(0, new double[] {1, 0});
        for (int i = 0; i < steps; i++) {
            assertThat(method.advance()).isTrue();
        }
        assertThat(method.parameter()).isCloseTo(2, within(1e-15));
        return Math.hypot(method.state(0) - Math.cos(2), method.state(1) + Math.sin(2));
    }

    /** Halving the step divides the error by 2 to the order. */
    @ParameterizedTest
    @ValueSource(ints = {4, 6})
    void theOrderIsTheOneStated(int order) {
        double ratio = errorOfOscillator(order, 8) / errorOfOscillator(order, 16);
        assertThat(Math.log(ratio) / Math.log(2)).isCloseTo(order, within(0.1));
    }

    /** Quadratic invariants are kept exactly but for rounding (Cooper 1987; Hairer, Lubich &amp; Wanner 2006, IV.2.2). */
    @ParameterizedTest
    @ValueSource(ints = {4, 6})
    void quadraticInvariantsAreKept(int order) {
        GaussLegendre method = new GaussLegendre(OSCILLATOR, order, 0.25);
        method.start(0, new double[] {1, 0});
        for (int i = 0; i < 100_000; i++) {
            method.advance();
        }
        double energy = method.state(0) * method.state(0) + method.state(1) * method.state(1);
        assertThat(energy).isCloseTo(1, within(2e-14));
    }

    /** The pendulum's energy swings but has no trend: the second half of a long run is no worse than the first. */
    @Test
    void energyHasNoTrend() {
        GaussLegendre method = new GaussLegendre(PENDULUM, 4, 0.2);
        method.start(0, new double[] {2, 0});
        double first = 0;
        double second = 0;
        double energy = -Math.cos(2);
        for (int i = 0; i < 200_000; i++) {
            method.advance();
            double off = Math.abs(method.state(1) * method.state(1) / 2 - Math.cos(method.state(0)) - energy);
            if (i < 100_000) {
                first = Math.max(first, off);
            } else {
                second = Math.max(second, off);
            }
        }
        assertThat(first).isLessThan(1e-4).isGreaterThan(1e-7);
        assertThat(second).isLessThan(1.001 * first);
    }

    @Test
    void aRunBackEndsAtTheStart() {
        GaussLegendre there = new GaussLegendre(PENDULUM, 6, 0.125);
        there.start(0, new double[] {2, 0.25});
        for (int i = 0; i < 1000; i++) {
            there.advance();
        }
        double[] state = new double[2];
        there.copyState(state);
        GaussLegendre back = new GaussLegendre(PENDULUM, 6, -0.125);
        back.start(there.parameter(), state);
        for (int i = 0; i < 1000; i++) {
            back.advance();
        }
        assertThat(back.parameter()).isEqualTo(0);
        assertThat(back.state(0)).isCloseTo(2, within(1e-12));
        assertThat(back.state(1)).isCloseTo(0.25, within(1e-12));
        assertThat(back.steps()).isEqualTo(1000);
        assertThat(back.iterations()).isBetween(3000L, 15000L);
    }

    @Test
    void aStepThatCannotBeMadeChangesNothing() {
        KerrByHand kerr = new KerrByHand(0.5);
        CurveEquation guarded = new HamiltonianEquation(4, (x, p, result) -> {
            kerr.flow(x, p, result);
            if (!kerr.inDomain(x)) {
                java.util.Arrays.fill(result, Double.NaN);
            }
        });
        GaussLegendre method = new GaussLegendre(guarded, 6, 0.25);
        method.start(0, new double[] {0, 3, 1.5, 0, -1, -0.5, 0, 0});
        int made = 0;
        while (made < 1000 && method.advance()) {
            made++;
        }
        assertThat(made).isBetween(1, 100);
        double[] state = new double[8];
        method.copyState(state);
        assertThat(kerr.inDomain(state)).isTrue();
        assertThat(method.advance()).isFalse();
        assertThat(method.state(1)).isEqualTo(state[1]);
    }

    @Test
    void stepsAllocateNothing() {
        GaussLegendre method = new GaussLegendre(new HamiltonianEquation(4, new KerrByHand(0.9)::flow), 6, 0.5);
        method.start(0, new double[] {0, 10, 1.25, 0, -0.96, 0, 0.5, 3.2});
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        method.advance();
        long before = threads.getCurrentThreadAllocatedBytes();
        for (int i = 0; i < 10_000; i++) {
            method.advance();
        }
        assertThat((threads.getCurrentThreadAllocatedBytes() - before) / 10_000).isZero();
    }

    @Test
    void wrongSettingsAreRefused() {
        assertThatThrownBy(() -> new GaussLegendre(PENDULUM, 5, 0.1)).hasMessageContaining("4 or 6, not 5");
        assertThatThrownBy(() -> new GaussLegendre(PENDULUM, 4, 0)).hasMessageContaining("step");
        assertThatThrownBy(() -> new GaussLegendre(PENDULUM, 4, 0.1).start(0, new double[3]))
                .hasMessageContaining("2 entries, not 3");
    }
}
