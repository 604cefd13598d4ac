package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.kernels.KerrChristoffel;
import io.github.gammawright.samples.kernels.KerrInverseMetric;
import io.github.gammawright.samples.kernels.KerrNonZeroChristoffel;
import io.github.gammawright.samples.kernels.KerrVolumeElement;
import io.github.gammawright.samples.kernels.SchwarzschildChristoffel;
import org.junit.jupiter.api.Test;

/**
 * The connection of Kerr's metric in Boyer–Lindquist coordinates against its closed forms: Boyer &amp; Lindquist 1967;
 * Bardeen, Press &amp; Teukolsky 1972; Frolov &amp; Novikov 1998, Black Hole Physics, appendix (all from memory).
 */
class KerrTest {

    private static final int T = 0;
    private static final int R = 1;
    private static final int THETA = 2;
    private static final int PHI = 3;

    /** M, a, r, θ and the relative error allowed, larger where r − r₊ has lost digits. */
    private static final double[][] CASES = {
        {1, 0.6, 6, 1.25, 2e-14},
        {1, 0.6, 3.5, 0.75, 2e-14},
        {1, -0.6, 3.5, 2.25, 2e-14},
        {1, 0.6, 50, 2.5, 2e-14},
        {1, 0.6, 4, 0.0009765625, 2e-14}, // close to the axis
        {1, 0.6, 1.80078125, 1.5, 2e-12}, // close to the horizon
        {1, 1, 1.5, 1, 2e-14}, // as much spin as there can be
        {2.5, 0.125, 12, 0.5, 2e-14},
    };

    @Test
    void allTwentySymbolsHaveTheirClosedForms() {
        int compared = 0;
        for (double[] row : CASES) {
            double[] point = {0.5, row[2], row[3], -0.25};
            compared += closedForms(row[0], row[1], row[2], row[3])
                    .compareWith(new KerrChristoffel(row[0], row[1]).valuesAt(point), row[4]);
        }
        assertThat(compared).isEqualTo(20 * CASES.length);
    }

    @Test
    void theLayoutWithoutZerosHoldsTheSameTwenty() {
        assertThat(KerrNonZeroChristoffel.LENGTH).isEqualTo(20);
        double[] point = {0, 6, 1.25, 0};
        double[] full = new KerrChristoffel(1, 0.5).valuesAt(point);
        double[] nonZero = new KerrNonZeroChristoffel(1, 0.5).valuesAt(point);
        int found = 0;
        for (int k = 0; k < 4; k++) {
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j <= i; j++) {
                    int index = KerrNonZeroChristoffel.index(k, i, j);
                    assertThat(KerrNonZeroChristoffel.index(k, j, i)).isEqualTo(index);
                    double expected = full[KerrChristoffel.index(k, i, j)];
                    assertThat(index < 0 ? 0 : nonZero[index]).isCloseTo(expected, within(1e-15 * Math.abs(expected)));
                    found += index < 0 ? 0 : 1;
                }
            }
        }
        assertThat(found).isEqualTo(20);
    }

    /** Carter 1968; Bardeen, Press &amp; Teukolsky 1972 (from memory): g^ij = … /(ΣΔ), √−g = Σ sin θ. */
    @Test
    void theInverseMetricAndTheVolumeElementHaveTheirClosedForms() {
        int compared = 0;
        for (double[] row : CASES) {
            double mass = row[0];
            double a = row[1];
            double r = row[2];
            double s = Math.sin(row[3]);
            double c = Math.cos(row[3]);
            double sigma = r * r + a * a * c * c;
            double delta = r * r - 2 * mass * r + a * a;
            double area = Math.pow(r * r + a * a, 2) - a * a * delta * s * s;
            double[] expected = new double[16];
            expected[KerrInverseMetric.index(T, T)] = -area / (sigma * delta);
            expected[KerrInverseMetric.index(T, PHI)] = -2 * mass * a * r / (sigma * delta);
            expected[KerrInverseMetric.index(PHI, T)] = -2 * mass * a * r / (sigma * delta);
            expected[KerrInverseMetric.index(R, R)] = delta / sigma;
            expected[KerrInverseMetric.index(THETA, THETA)] = 1 / sigma;
            expected[KerrInverseMetric.index(PHI, PHI)] = (delta - a * a * s * s) / (sigma * delta * s * s);
            double[] point = {0, r, row[3], 0};
            double[] actual = new KerrInverseMetric(mass, a).valuesAt(point);
            for (int i = 0; i < 16; i++) {
                assertThat(actual[i])
                        .as("entry %d at r = %s", i, r)
                        .isCloseTo(expected[i], within(row[4] * (Math.abs(expected[i]) + 1e-3)));
                compared++;
            }
            double[] volume = new KerrVolumeElement(mass, a).valuesAt(point);
            assertThat(volume).hasSize(1);
            assertThat(volume[0]).isCloseTo(sigma * s, within(row[4] * sigma * s));
        }
        assertThat(compared).isEqualTo(16 * CASES.length);
    }

    /** Kerr's metric with a = 0 is Schwarzschild's (common practice, no source). */
    @Test
    void withoutSpinItIsSchwarzschild() {
        double[] point = {0, 7.5, 1.25, 0.5};
        double[] expected = new SchwarzschildChristoffel(1.5).valuesAt(point);
        double[] actual = new KerrChristoffel(1.5, 0).valuesAt(point);
        for (int i = 0; i < 64; i++) {
            assertThat(actual[i]).isCloseTo(expected[i], within(1e-14 * Math.abs(expected[i])));
        }
    }

    private static ExpectedConnection closedForms(double m, double a, double r, double theta) {
        double s = Math.sin(theta);
        double c = Math.cos(theta);
        double r2 = r * r;
        double a2 = a * a;
        double s2 = s * s;
        double c2 = c * c;
        double sigma = r2 + a2 * c2;
        double sigma2 = sigma * sigma;
        double sigma3 = sigma2 * sigma;
        double delta = r2 - 2 * m * r + a2;
        double area = (r2 + a2) * (r2 + a2) - a2 * delta * s2;
        double w = r2 - a2 * c2;
        return new ExpectedConnection(4)
                .with(T, T, R, m * (r2 + a2) * w / (sigma2 * delta))
                .with(T, T, THETA, -2 * m * a2 * r * s * c / sigma2)
                .with(T, R, PHI, -m * a * s2 * (r2 * (3 * r2 + a2) + a2 * c2 * (r2 - a2)) / (sigma2 * delta))
                .with(T, THETA, PHI, 2 * m * a2 * a * r * s2 * s * c / sigma2)
                .with(R, T, T, m * delta * w / sigma3)
                .with(R, T, PHI, -m * a * delta * s2 * w / sigma3)
                .with(R, R, R, (r * a2 * s2 - m * w) / (sigma * delta))
                .with(R, R, THETA, -a2 * s * c / sigma)
                .with(R, THETA, THETA, -r * delta / sigma)
                .with(R, PHI, PHI, -delta * s2 * (r * sigma2 - m * a2 * s2 * w) / sigma3)
                .with(THETA, T, T, -2 * m * a2 * r * s * c / sigma3)
                .with(THETA, T, PHI, 2 * m * a * r * (r2 + a2) * s * c / sigma3)
                .with(THETA, R, R, a2 * s * c / (sigma * delta))
                .with(THETA, R, THETA, r / sigma)
                .with(THETA, THETA, THETA, -a2 * s * c / sigma)
                .with(THETA, PHI, PHI, -s * c * (area * sigma + 2 * m * r * a2 * s2 * (r2 + a2)) / sigma3)
                .with(PHI, T, R, m * a * w / (sigma2 * delta))
                .with(PHI, T, THETA, -2 * m * a * r * (c / s) / sigma2)
                .with(PHI, R, PHI, (r * sigma2 + m * (a2 * a2 * s2 * c2 - r2 * (sigma + r2 + a2))) / (sigma2 * delta))
                .with(PHI, THETA, PHI, c / s * (sigma2 + 2 * m * a2 * r * s2) / sigma2);
    }
}
