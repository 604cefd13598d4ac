package io.github.gammawright.verification.reference;

/**
 * The 3+1 split of a metric by its first coordinate (Arnowitt, Deser &amp; Misner 1962; York 1979 for the sign of the
 * extrinsic curvature). The lapse is the positive root; where −g^tt ≤ 0 it is undefined.
 */
final class ReferenceSlicing {

    private final ReferenceGeometry geometry;
    private final ReferenceGeometry spatial;
    private final Taylor lapse;
    private final Taylor[] shift;

    ReferenceSlicing(ReferenceGeometry geometry) {
        this.geometry = geometry;
        int n = geometry.dimension();
        Taylor[][] metric = new Taylor[n - 1][n - 1];
        for (int i = 1; i < n; i++) {
            for (int j = 1; j < n; j++) {
                metric[i - 1][j - 1] = geometry.metric()[i][j];
            }
        }
        spatial = new ReferenceGeometry(metric, 1);
        Taylor[][] inverse = geometry.inverse(geometry.order());
        Taylor squared = inverse[0][0].reciprocal().negate();
        lapse = squared.sqrt();
        shift = new Taylor[n - 1];
        for (int i = 1; i < n; i++) {
            shift[i - 1] = inverse[0][i].times(squared);
        }
    }

    /** α = 1/√(−g^tt). */
    Taylor lapse() {
        return lapse;
    }

    /** β^i = −g^ti / g^tt. */
    Taylor[] shift() {
        return shift;
    }

    /** γ_ij = g_ij with its own connection; i, j from the second coordinate on. */
    ReferenceGeometry spatial() {
        return spatial;
    }

    /** ∂_k α over the spatial coordinates. */
    Taylor[] lapseDerivative() {
        Taylor[] derivative = new Taylor[shift.length];
        for (int k = 0; k < shift.length; k++) {
            derivative[k] = spatial.derivative(lapse, k);
        }
        return derivative;
    }

    /** ∂_k β^i over the spatial coordinates; k, i. */
    Taylor[][] shiftDerivative() {
        Taylor[][] derivative = new Taylor[shift.length][shift.length];
        for (int k = 0; k < shift.length; k++) {
            for (int i = 0; i < shift.length; i++) {
                derivative[k][i] = spatial.derivative(shift[i], k);
            }
        }
        return derivative;
    }

    /** K_ij = −½ L_n γ_ij = (β^k ∂_k γ_ij + γ_kj ∂_i β^k + γ_ik ∂_j β^k − ∂_t γ_ij) / 2α. */
    Taylor[][] extrinsicCurvature() {
        int m = shift.length;
        Taylor[][] metric = spatial.metric();
        Taylor[][][] metricDerivative = spatial.metricDerivative();
        Taylor[][] shiftDerivative = shiftDerivative();
        Taylor factor = lapse.reciprocal().half();
        Taylor[][] curvature = new Taylor[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j < m; j++) {
                Taylor sum = geometry.derivative(metric[i][j], 0).negate();
                for (int k = 0; k < m; k++) {
                    sum = ReferenceGeometry.plusProduct(sum, shift[k], metricDerivative[k][i][j]);
                    sum = ReferenceGeometry.plusProduct(sum, metric[k][j], shiftDerivative[i][k]);
                    sum = ReferenceGeometry.plusProduct(sum, metric[i][k], shiftDerivative[j][k]);
                }
                curvature[i][j] = sum.times(factor);
            }
        }
        return curvature;
    }

    /** γ^ij K_ij. */
    Taylor meanCurvature() {
        Taylor[][] inverse = spatial.inverse(geometry.order() - 1);
        Taylor[][] curvature = extrinsicCurvature();
        Taylor sum = geometry.zero(geometry.order() - 1);
        for (int i = 0; i < shift.length; i++) {
            for (int j = 0; j < shift.length; j++) {
                sum = ReferenceGeometry.plusProduct(sum, inverse[i][j], curvature[i][j]);
            }
        }
        return sum;
    }
}
