package io.github.gammawright.runtime.conserved;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.Root;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.runtime.StateFunction;
import org.junit.jupiter.api.Test;

class DriftMonitorTest {

    /**
     * Energy, axial momentum and Carter's constant of M = 1, a = 0.5, r = 8, θ = 1.25, (u^r, u^θ, u^φ) = (0.125, 0.03125,
     * 0.046875), computed with 60 digits from Carter (1968) and the line element (formulas from memory).
     */
    @Test
    void constantsOfKerrHaveTheirPublishedForms() {
        MetricTensor metric = new MetricTensor(4, new KerrByHand(0.5)::metric);
        double[] point = {0, 8, 1.25, 0};
        double[] velocity = {0, 0.125, 0.03125, 0.046875};
        new Normalization(metric, Signature.MOSTLY_PLUS)
                .solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        assertThat(velocity[0]).isCloseTo(1.263341679630623, within(1e-14));
        double[] state = new double[8];
        System.arraycopy(point, 0, state, 0, 4);
        System.arraycopy(velocity, 0, state, 4, 4);
        assertThat(value(ConservedQuantity.norm(metric), state)).isCloseTo(-1, within(1e-14));
        assertThat(value(ConservedQuantity.cyclicMomentum("energy", metric, 0), state))
                .isCloseTo(-0.9529036191245869, within(1e-14));
        assertThat(value(ConservedQuantity.cyclicMomentum("axial momentum", metric, 3), state))
                .isCloseTo(2.572483116516941, within(1e-14));
        double carter = 4.736021870373719;
        assertThat(value(ConservedQuantity.ofVelocity("Carter", metric, KerrConstants.carter(0.5, 1)), state))
                .isCloseTo(carter, within(1e-13));
        double[] canonical = state.clone();
        double[] momentum = new double[4];
        metric.lower(point, velocity, momentum);
        System.arraycopy(momentum, 0, canonical, 4, 4);
        assertThat(value(ConservedQuantity.ofMomentum("Carter", 4, KerrConstants.carter(0.5, 1)), canonical))
                .isCloseTo(carter, within(1e-13));
        assertThat(value(ConservedQuantity.momentum("energy", 4, 0), canonical)).isEqualTo(momentum[0]);
    }

    private static double value(ConservedQuantity quantity, double[] state) {
        return quantity.function().value(0, state);
    }

    @Test
    void theWorstChangeIsKeptWithItsPlace() {
        DriftMonitor monitor = new DriftMonitor(
                0.1,
                new ConservedQuantity("first", StateFunction.entry(0)),
                new ConservedQuantity("second", StateFunction.entry(1)));
        assertThat(monitor.look(0, new double[] {-4, 0})).isTrue();
        assertThat(monitor.look(1, new double[] {-4.2, 0.01})).isTrue();
        assertThat(monitor.look(2, new double[] {-4, 0.02})).isTrue();
        assertThat(monitor.worst()).isCloseTo(0.05, within(1e-15));
        assertThat(monitor.worstName()).isEqualTo("first");
        assertThat(monitor.report().get(0).worstAt()).isEqualTo(1);
        assertThat(monitor.report().get(0).last()).isEqualTo(-4);
        assertThat(monitor.report().get(1).worst()).isEqualTo(0.02); // absolute, since it starts from 0
        assertThat(monitor.look(3, new double[] {-4, 0.2})).isFalse();
        assertThat(monitor.worstName()).isEqualTo("second");
        monitor.start(0, new double[] {1, 1});
        assertThat(monitor.worst()).isZero();
    }

    @Test
    void whatIsNotANumberIsBeyondAnyLimit() {
        DriftMonitor monitor = new DriftMonitor(1, new ConservedQuantity("first", StateFunction.entry(0)));
        monitor.start(0, new double[] {1});
        assertThat(monitor.look(1, new double[] {Double.NaN})).isFalse();
        assertThat(monitor.worst()).isInfinite();
        assertThat(monitor.look(2, new double[] {1})).isFalse();
        assertThatThrownBy(() -> new DriftMonitor(-1)).isInstanceOf(IllegalArgumentException.class);
        assertThat(new DriftMonitor().worstName()).isEmpty();
    }
}
