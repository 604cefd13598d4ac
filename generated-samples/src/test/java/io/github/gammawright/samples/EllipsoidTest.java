package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionChristoffel;
import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionChristoffelFirstKind;
import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionMetric;
import org.junit.jupiter.api.Test;

/**
 * The Earth's ellipsoid in geodetic latitude φ and longitude λ. Radii of curvature: Bomford 1980, Geodesy; Rapp 1993;
 * Torge &amp; Müller 2012, Geodesy. Constants: NIMA TR8350.2 (2000), World Geodetic System 1984 (all from memory).
 */
class EllipsoidTest {

    private static final int PHI = 0;
    private static final int LAMBDA = 1;

    /**
     * In metres, with all digits that the source has: φ, the meridian radius M = a(1 − e²)/(1 − e² sin²φ)^(3/2), the
     * prime-vertical radius N = a/√(1 − e² sin²φ).
     */
    @SuppressWarnings("FloatingPointLiteralPrecision")
    private static final double[][] PUBLISHED = {
        {0.5, 6350089.970465150819450754, 6383049.675483407467551261},
        {Math.PI / 4, 6367381.815619548916741117, 6388838.290121147997511201},
        {-1.25, 6393166.496630379935196741, 6397450.531783906422567336},
        {1.5625, 6399589.172964434595701641, 6399592.141493462666993721},
    };

    private final EllipsoidOfRevolutionChristoffel christoffel = new EllipsoidOfRevolutionChristoffel();
    private final EllipsoidOfRevolutionChristoffelFirstKind firstKind = new EllipsoidOfRevolutionChristoffelFirstKind();

    /**
     * The connection alone knows both radii: Γ^φ_λλ = (N/M) sin φ cos φ and Γ_φλλ = M N sin φ cos φ give their ratio and
     * their product. The latitude 1.5625 costs five digits, for its cosine is small.
     */
    @Test
    void theConnectionGivesBothRadiiOfCurvature() {
        int compared = 0;
        for (double[] row : PUBLISHED) {
            double[] point = {row[0], 0.25};
            double sineCosine = Math.sin(row[0]) * Math.cos(row[0]);
            double ratio = christoffel.valuesAt(point)[EllipsoidOfRevolutionChristoffel.index(PHI, LAMBDA, LAMBDA)]
                    / sineCosine;
            double product =
                    firstKind.valuesAt(point)[EllipsoidOfRevolutionChristoffelFirstKind.index(PHI, LAMBDA, LAMBDA)]
                            / sineCosine;
            assertThat(Math.sqrt(product / ratio)).isCloseTo(row[1], within(1e-13 * row[1]));
            assertThat(Math.sqrt(product * ratio)).isCloseTo(row[2], within(1e-13 * row[2]));
            compared += 2;
        }
        assertThat(compared).isEqualTo(8);
    }

    @Test
    void theThreeSymbolsFollowFromTheRadii() {
        double f = 1 / 298.257223563;
        double e2 = f * (2 - f);
        int compared = 0;
        for (double[] row : PUBLISHED) {
            double s = Math.sin(row[0]);
            double c = Math.cos(row[0]);
            compared += new ExpectedConnection(2)
                    .with(PHI, PHI, PHI, 3 * e2 * s * c / (1 - e2 * s * s))
                    .with(PHI, LAMBDA, LAMBDA, row[2] / row[1] * s * c)
                    .with(LAMBDA, PHI, LAMBDA, -row[1] / row[2] * s / c)
                    .compareWith(christoffel.valuesAt(new double[] {row[0], -1}), 1e-13);
        }
        assertThat(compared).isEqualTo(3 * PUBLISHED.length);
    }

    @Test
    void theMetricHoldsTheRadii() {
        EllipsoidOfRevolutionMetric metric = new EllipsoidOfRevolutionMetric();
        for (double[] row : PUBLISHED) {
            double[] g = metric.valuesAt(new double[] {row[0], 0});
            double parallel = row[2] * Math.cos(row[0]);
            assertThat(Math.sqrt(g[0])).isCloseTo(row[1], within(1e-13 * row[1]));
            assertThat(Math.sqrt(g[3])).isCloseTo(parallel, within(1e-13 * parallel));
            assertThat(g[1]).isZero();
            assertThat(g[2]).isZero();
        }
    }
}
