package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class MetricTensorTest {

    private final MetricTensor plane = new MetricTensor(2, Kernels::polarPlaneMetric);
    private final double[] point = {3, 0.5};

    @Test
    void productsAndLoweredIndicesFollowTheComponents() {
        double[] u = {1, 2};
        double[] v = {5, 0.25};
        assertThat(plane.product(point, u, v)).isEqualTo(5 + 9 * 0.5);
        assertThat(plane.square(point, u)).isEqualTo(37);
        double[] lowered = new double[2];
        plane.lower(point, u, lowered);
        assertThat(lowered).containsExactly(1, 18);
        assertThat(plane.dimension()).isEqualTo(2);
    }

    @Test
    void wrongArraysAreRefused() {
        double[] u = {1, 2};
        assertThatThrownBy(() -> plane.lower(point, u, u))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("another array");
        assertThatThrownBy(() -> plane.product(point, u, new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a vector has 3 entries, and 2 are needed");
        assertThatThrownBy(() -> new MetricTensor(0, Kernels::polarPlaneMetric))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
