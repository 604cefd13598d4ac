package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.kernels.KerrChristoffel;
import io.github.gammawright.samples.kernels.KerrChristoffelTrace;
import io.github.gammawright.samples.kernels.KerrConnection;
import io.github.gammawright.samples.kernels.KerrInverseMetric;
import io.github.gammawright.samples.kernels.KerrMetric;
import io.github.gammawright.samples.kernels.KerrMetricDerivative;
import io.github.gammawright.samples.kernels.KerrVolumeElement;
import java.util.HashSet;
import java.util.Set;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/** What holds for every connection of a metric (common practice, no source, unless one is named), tried on Kerr's. */
class ConnectionIdentitiesTest {

    private static final int N = 4;

    /** Of the 64 symbols in four dimensions 40 are independent, n²(n+1)/2 (Weinberg 1972, sec. 6.7; from memory). */
    @Test
    void fortyOfSixtyFourSymbolsAreIndependent() {
        assertThat(KerrChristoffel.LENGTH).isEqualTo(64);
        assertThat(KerrConnection.CHRISTOFFEL_LENGTH).isEqualTo(40);
        assertThat(KerrConnection.METRIC_LENGTH).isEqualTo(10);
        double[] point = {0, 6, 1.25, 0};
        double[] full = new KerrChristoffel(1, 0.5).valuesAt(point);
        double[] metric = new double[10];
        double[] packed = new double[40];
        new KerrConnection(1, 0.5).evaluate(point, metric, packed);
        Set<Integer> places = new HashSet<>();
        for (int k = 0; k < N; k++) {
            for (int i = 0; i < N; i++) {
                for (int j = 0; j < N; j++) {
                    double value = full[KerrChristoffel.index(k, i, j)];
                    assertThat(full[KerrChristoffel.index(k, j, i)]).isEqualTo(value);
                    int place = KerrConnection.christoffelIndex(k, i, j);
                    assertThat(packed[place]).isCloseTo(value, within(1e-14 * Math.abs(value)));
                    places.add(place);
                }
            }
        }
        assertThat(places).hasSize(40);
    }

    /** ∇_k g_ij = ∂_k g_ij − Γ^m_ki g_mj − Γ^m_kj g_im = 0. */
    @Property
    void theMetricIsCovariantlyConstant(
            @ForAll @DoubleRange(min = -0.96875, max = 0.96875) @Scale(12) double a,
            @ForAll @DoubleRange(min = 2.0625, max = 60) @Scale(12) double r,
            @ForAll @DoubleRange(min = 0.03125, max = 3.109375) @Scale(12) double theta) {
        double[] point = {0, r, theta, 0};
        double[] g = new KerrMetric(1, a).valuesAt(point);
        double[] derivative = new KerrMetricDerivative(1, a).valuesAt(point);
        double[] gamma = new KerrChristoffel(1, a).valuesAt(point);
        int compared = 0;
        for (int k = 0; k < N; k++) {
            for (int i = 0; i < N; i++) {
                for (int j = 0; j < N; j++) {
                    double sum = derivative[KerrMetricDerivative.index(k, i, j)];
                    double size = Math.abs(sum);
                    for (int m = 0; m < N; m++) {
                        double first = gamma[KerrChristoffel.index(m, k, i)] * g[KerrMetric.index(m, j)];
                        double second = gamma[KerrChristoffel.index(m, k, j)] * g[KerrMetric.index(i, m)];
                        sum -= first + second;
                        size += Math.abs(first) + Math.abs(second);
                    }
                    assertThat(sum).as("∇_%d g_%d%d", k, i, j).isCloseTo(0, within(4e-13 * size));
                    compared++;
                }
            }
        }
        assertThat(compared).isEqualTo(64);
    }

    /** Γ^m_mk = ∂_k ln √|g|, where √|g| = Σ sin θ: 2r/Σ and cot θ − 2a² sin θ cos θ/Σ. */
    @Property
    void theTraceIsTheGradientOfTheLogarithmOfTheVolumeElement(
            @ForAll @DoubleRange(min = -0.96875, max = 0.96875) @Scale(12) double a,
            @ForAll @DoubleRange(min = 2.0625, max = 60) @Scale(12) double r,
            @ForAll @DoubleRange(min = 0.03125, max = 3.109375) @Scale(12) double theta) {
        double[] point = {0, r, theta, 0};
        double sine = Math.sin(theta);
        double cosine = Math.cos(theta);
        double sigma = r * r + a * a * cosine * cosine;
        double[] expected = {0, 2 * r / sigma, cosine / sine - 2 * a * a * sine * cosine / sigma, 0};
        double[] gamma = new KerrChristoffel(1, a).valuesAt(point);
        double[] trace = new KerrChristoffelTrace(1, a).valuesAt(point);
        int compared = 0;
        for (int k = 0; k < N; k++) {
            double sum = 0;
            double size = 1e-3;
            for (int m = 0; m < N; m++) {
                sum += gamma[KerrChristoffel.index(m, m, k)];
                size += Math.abs(gamma[KerrChristoffel.index(m, m, k)]);
            }
            assertThat(sum).isCloseTo(expected[k], within(1e-13 * size));
            assertThat(trace[k]).isCloseTo(expected[k], within(1e-13 * size));
            compared++;
        }
        assertThat(compared).isEqualTo(4);
    }

    /** The same by finite differences of the kernel for √|g|, for which no closed form is needed. */
    @Test
    void theTraceIsTheSlopeOfTheVolumeElement() {
        double[] point = {0, 6, 1.25, 0};
        double[] trace = new KerrChristoffelTrace(1, 0.5).valuesAt(point);
        KerrVolumeElement volume = new KerrVolumeElement(1, 0.5);
        double step = 1e-5;
        for (int k = 0; k < N; k++) {
            double[] above = point.clone();
            above[k] += step;
            double[] below = point.clone();
            below[k] -= step;
            double slope = (Math.log(volume.valuesAt(above)[0]) - Math.log(volume.valuesAt(below)[0])) / (2 * step);
            assertThat(trace[k]).isCloseTo(slope, within(1e-9));
        }
    }

    /** g^im g_mj is the unit matrix. */
    @Test
    void theInverseIsOne() {
        double[] point = {0, 3.5, 0.75, 0};
        double[] g = new KerrMetric(1, 0.9).valuesAt(point);
        double[] inverse = new KerrInverseMetric(1, 0.9).valuesAt(point);
        for (int i = 0; i < N; i++) {
            for (int j = 0; j < N; j++) {
                double sum = 0;
                for (int m = 0; m < N; m++) {
                    sum += inverse[KerrInverseMetric.index(i, m)] * g[KerrMetric.index(m, j)];
                }
                assertThat(sum).isCloseTo(i == j ? 1 : 0, within(1e-14));
            }
        }
    }
}
