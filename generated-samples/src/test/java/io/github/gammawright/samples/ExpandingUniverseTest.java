package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.kernels.FlrwFlatChristoffel;
import io.github.gammawright.samples.kernels.FlrwFlatChristoffelTrace;
import io.github.gammawright.samples.kernels.FlrwFlatSphericalChristoffel;
import org.junit.jupiter.api.Test;

/**
 * Expanding universes with flat space, whose scale factor is an object of the caller: Friedmann 1922; Robertson 1935;
 * Weinberg 1972, Gravitation and Cosmology, ch. 14–15; Carroll 2004, Spacetime and Geometry, ch. 8 (from memory).
 */
class ExpandingUniverseTest {

    private static final double[] TIMES = {0.25, 1, 2.5, 13.75};

    @Test
    void cartesianCoordinatesHaveSixSymbols() {
        FlrwFlatChristoffel kernel = new FlrwFlatChristoffel(ScaleFactors::dust);
        double[] a = new double[2];
        int compared = 0;
        for (double t : TIMES) {
            ScaleFactors.dust(t, a);
            ExpectedConnection expected = new ExpectedConnection(4);
            for (int i = 1; i < 4; i++) {
                expected.with(0, i, i, a[0] * a[1]).with(i, 0, i, a[1] / a[0]);
            }
            compared += expected.compareWith(kernel.valuesAt(new double[] {t, 1, 2, 3}), 1e-15);
        }
        assertThat(compared).isEqualTo(6 * TIMES.length);
    }

    @Test
    void sphericalCoordinatesHaveTwelve() {
        FlrwFlatSphericalChristoffel kernel = new FlrwFlatSphericalChristoffel(ScaleFactors::radiation);
        double[] a = new double[2];
        double r = 1.5;
        double theta = 1.25;
        double s = Math.sin(theta);
        double c = Math.cos(theta);
        int compared = 0;
        for (double t : TIMES) {
            ScaleFactors.radiation(t, a);
            double rate = a[1] / a[0];
            compared += new ExpectedConnection(4)
                    .with(0, 1, 1, a[0] * a[1])
                    .with(0, 2, 2, a[0] * a[1] * r * r)
                    .with(0, 3, 3, a[0] * a[1] * r * r * s * s)
                    .with(1, 0, 1, rate)
                    .with(2, 0, 2, rate)
                    .with(3, 0, 3, rate)
                    .with(1, 2, 2, -r)
                    .with(1, 3, 3, -r * s * s)
                    .with(2, 1, 2, 1 / r)
                    .with(3, 1, 3, 1 / r)
                    .with(2, 3, 3, -s * c)
                    .with(3, 2, 3, c / s)
                    .compareWith(kernel.valuesAt(new double[] {t, r, theta, 0.5}), 1e-15);
        }
        assertThat(compared).isEqualTo(12 * TIMES.length);
    }

    /** √|g| = a³ for flat space in Cartesian coordinates, so that Γ^m_mt = 3 ȧ/a (common practice, no source). */
    @Test
    void theTraceIsThreeTimesTheExpansionRate() {
        double[] trace = new FlrwFlatChristoffelTrace(ScaleFactors::exponential).valuesAt(new double[] {2.5, 0, 0, 0});
        assertThat(trace[0]).isCloseTo(3 * ScaleFactors.RATE, within(1e-15));
        assertThat(trace).hasSize(4).endsWith(0, 0, 0);
    }

    @Test
    void theCallersMemoryServesInsteadOfAnAllocation() {
        FlrwFlatChristoffel kernel = new FlrwFlatChristoffel(ScaleFactors::dust);
        double[] point = {2.5, 0, 0, 0};
        double[] result = new double[FlrwFlatChristoffel.LENGTH];
        kernel.evaluateWith(new double[FlrwFlatChristoffel.WORKSPACE_LENGTH], point, result);
        assertThat(result).containsExactly(kernel.valuesAt(point));
        assertThatThrownBy(() -> kernel.evaluateWith(new double[0], point, result))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
