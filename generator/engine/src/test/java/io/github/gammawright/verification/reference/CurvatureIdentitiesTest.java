package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.TestMetrics;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Identities of the connection and the curvature (Misner, Thorne &amp; Wheeler 1973, chapters 8 and 13; equation numbers not
 * checked) on metrics with and without symmetries.
 */
class CurvatureIdentitiesTest {

    private static final int DIGITS = 50;

    private static ReferencePoint dense() {
        return new ReferenceEvaluator(TestMetrics.denseEight())
                .at(new double[0], new double[] {0.1, -0.7, 0.3, 0.9, -0.2, 0.6, 1.1, -0.4});
    }

    private static ReferencePoint kerr() {
        return new ReferenceEvaluator(TestMetrics.kerr()).at(new double[] {1, 0.875}, new double[] {0, 2.25, 0.75, 1});
    }

    @Test
    void metricIsCovariantlyConstant() {
        ReferencePoint point = dense();
        List<Real> derivative = point.values(ReferenceQuantity.METRIC_DERIVATIVE);
        List<Real> lower = point.values(ReferenceQuantity.CHRISTOFFEL_FIRST_KIND);
        RealArithmetic arithmetic = RealArithmetic.ofDigits(DIGITS);
        int n = 8;
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    Real sum = arithmetic.add(lower.get((i * n + k) * n + j), lower.get((j * n + k) * n + i));
                    Reals.assertClose(sum, derivative.get((k * n + i) * n + j), DIGITS, 0.01, "∇g " + k + i + j);
                }
            }
        }
    }

    @Test
    void traceIsTheLogarithmicDerivativeOfTheVolume() {
        ReferencePoint point = dense();
        List<Real> trace = point.values(ReferenceQuantity.CHRISTOFFEL_TRACE);
        List<Real> gamma = point.values(ReferenceQuantity.CHRISTOFFEL);
        Real volume = point.values(ReferenceQuantity.VOLUME_ELEMENT).get(0);
        RealArithmetic arithmetic = RealArithmetic.ofDigits(DIGITS);
        ReferenceGeometry geometry = new ReferenceGeometry(point.plainSeries(1).metric(), 0);
        for (int k = 0; k < 8; k++) {
            Real sum = Real.ZERO;
            for (int m = 0; m < 8; m++) {
                sum = arithmetic.add(sum, gamma.get((m * 8 + m) * 8 + k));
            }
            Reals.assertClose(sum, trace.get(k), DIGITS, 0.01, "Γ^m_m" + k);
            // ∂_k det g / (2 det g), where |det g| = volume²
            Real slope = geometry.determinant().derivative(k).value();
            Real square = arithmetic.multiply(volume, volume);
            Real determinant = geometry.determinant().value();
            Reals.assertClose(square, determinant.abs(), DIGITS, 0, "volume²");
            Reals.assertClose(
                    arithmetic.divide(slope, determinant.scaled(1)), trace.get(k), DIGITS, 0.01, "∂ ln √|g| " + k);
        }
    }

    @Test
    void symmetriesOfTheRiemannTensor() {
        ReferencePoint point = dense();
        List<Real> r = point.values(ReferenceQuantity.LOWERED_RIEMANN);
        RealArithmetic arithmetic = RealArithmetic.ofDigits(DIGITS);
        int compared = 0;
        for (int k = 0; k < 4; k++) {
            for (int l = 0; l < 4; l++) {
                for (int i = 4; i < 8; i++) {
                    for (int j = 4; j < 8; j++) {
                        Real here = component(r, k, l, i, j);
                        Reals.assertClose(here, component(r, i, j, k, l), DIGITS, 0.01, "pairs");
                        Reals.assertClose(here, component(r, l, k, i, j).negate(), DIGITS, 0.01, "first pair");
                        Real cyclic = arithmetic.add(
                                here, arithmetic.add(component(r, k, i, j, l), component(r, k, j, l, i)));
                        Reals.assertClose(cyclic, Real.ZERO, DIGITS, 0.1, "cyclic sum");
                        compared++;
                    }
                }
            }
        }
        assertThat(compared).isEqualTo(256);
    }

    private static Real component(List<Real> tensor, int k, int l, int i, int j) {
        return tensor.get(((k * 8 + l) * 8 + i) * 8 + j);
    }

    @Test
    void weylTensorHasNoTraceAndIsAllOfAVacuum() {
        List<Real> weyl = dense().values(ReferenceQuantity.WEYL);
        RealArithmetic arithmetic = RealArithmetic.ofDigits(DIGITS);
        int n = 8;
        for (int l = 0; l < n; l++) {
            for (int j = 0; j < n; j++) {
                Real sum = Real.ZERO;
                for (int k = 0; k < n; k++) {
                    sum = arithmetic.add(sum, weyl.get(((k * n + l) * n + k) * n + j));
                }
                Reals.assertClose(sum, Real.ZERO, DIGITS, 1, "trace " + l + j);
            }
        }
        List<Real> vacuum = kerr().values(ReferenceQuantity.WEYL);
        List<Real> riemann = kerr().values(ReferenceQuantity.RIEMANN);
        for (int i = 0; i < riemann.size(); i++) {
            Reals.assertClose(vacuum.get(i), riemann.get(i), DIGITS, 1, "component " + i);
        }
        MetricDefinition sphere = TestMetrics.named("sphere");
        assertThat(new ReferenceEvaluator(sphere)
                        .at(new double[0], new double[] {1, 0})
                        .values(ReferenceQuantity.WEYL))
                .hasSize(16)
                .allMatch(Real::isZero);
    }

    @Test
    void kerrIsAVacuum() {
        for (Real component : kerr().values(ReferenceQuantity.EINSTEIN)) {
            Reals.assertClose(component, Real.ZERO, DIGITS, 1, "G_ij");
        }
    }

    /** On the unit sphere R^k_ijl = δ^k_j g_il − δ^k_l g_ij. */
    @Test
    void deviationOnTheSphere() {
        double theta = 1.25;
        double[] u = {0.5, -1};
        double[] xi = {0.25, 2};
        List<Real> deviation = new ReferenceEvaluator(TestMetrics.named("sphere"))
                .at(new double[0], new double[] {theta, 0})
                .values(ReferenceQuantity.GEODESIC_DEVIATION, u, xi);
        double s2 = Math.sin(theta) * Math.sin(theta);
        double square = u[0] * u[0] + s2 * u[1] * u[1];
        double mixed = u[0] * xi[0] + s2 * u[1] * xi[1];
        for (int k = 0; k < 2; k++) {
            assertThat(deviation.get(k).toDouble()).isCloseTo(-(xi[k] * square - u[k] * mixed), offset(1e-14));
        }
    }
}
