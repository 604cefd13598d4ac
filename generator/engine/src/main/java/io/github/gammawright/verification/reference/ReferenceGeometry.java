package io.github.gammawright.verification.reference;

/**
 * The connection of a metric that is given as power series. Every result is a series too, known to as many orders less
 * as derivatives have been taken. Signs are those of Misner, Thorne &amp; Wheeler (1973).
 */
final class ReferenceGeometry {

    private final Taylor[][] metric;
    private final int firstVariable;
    private final TaylorRing ring;
    private final int dimension;
    private final TaylorMatrix[] inverses;
    private Taylor[][][] derivative;
    private Taylor[][][] firstKind;
    private Taylor[][][] christoffel;

    /**
     * Takes the metric.
     *
     * @param firstVariable the variable of the ring that is the first coordinate; the others follow it
     */
    ReferenceGeometry(Taylor[][] metric, int firstVariable) {
        this.metric = metric;
        this.firstVariable = firstVariable;
        this.ring = metric[0][0].ring();
        this.dimension = metric.length;
        this.inverses = new TaylorMatrix[ring.order() + 1];
    }

    int dimension() {
        return dimension;
    }

    TaylorRing ring() {
        return ring;
    }

    /** The order to which the metric is known. */
    int order() {
        return metric[0][0].order();
    }

    /** g_ij. */
    Taylor[][] metric() {
        return metric;
    }

    /** g^ij to the given order. */
    Taylor[][] inverse(int order) {
        return matrix(order).inverse();
    }

    /** det g to the full order. */
    Taylor determinant() {
        return matrix(order()).determinant();
    }

    private TaylorMatrix matrix(int order) {
        if (inverses[order] == null) {
            Taylor[][] truncated = new Taylor[dimension][dimension];
            for (int i = 0; i < dimension; i++) {
                for (int j = 0; j < dimension; j++) {
                    truncated[i][j] = metric[i][j].truncated(order);
                }
            }
            inverses[order] = TaylorMatrix.invert(truncated, ring);
        }
        return inverses[order];
    }

    /** ∂_k of a series. */
    Taylor derivative(Taylor series, int k) {
        return series.derivative(firstVariable + k);
    }

    /** ∂_k g_ij; k, i, j. */
    Taylor[][][] metricDerivative() {
        if (derivative == null) {
            derivative = Symmetric.table(dimension, (k, i, j) -> derivative(metric[i][j], k));
        }
        return derivative;
    }

    /** Γ_kij = ½ (∂_i g_kj + ∂_j g_ki − ∂_k g_ij); k, i, j. */
    Taylor[][][] firstKind() {
        if (firstKind == null) {
            Taylor[][][] d = metricDerivative();
            firstKind = Symmetric.table(
                    dimension,
                    (k, i, j) -> d[i][k][j].plus(d[j][k][i]).minus(d[k][i][j]).half());
        }
        return firstKind;
    }

    /** Γ^k_ij = g^kl Γ_lij; k, i, j. */
    Taylor[][][] christoffel() {
        if (christoffel == null) {
            Taylor[][] inverse = inverse(order() - 1);
            Taylor[][][] lower = firstKind();
            christoffel = Symmetric.table(dimension, (k, i, j) -> {
                Taylor sum = zero(order() - 1);
                for (int l = 0; l < dimension; l++) {
                    sum = plusProduct(sum, inverse[k][l], lower[l][i][j]);
                }
                return sum;
            });
        }
        return christoffel;
    }

    /** The absent series, to an order. */
    Taylor zero(int order) {
        return ring.zero().truncated(order);
    }

    /** sum + a b, without work where a or b is absent. */
    static Taylor plusProduct(Taylor sum, Taylor a, Taylor b) {
        return a.isAbsent() || b.isAbsent() ? sum : sum.plus(a.times(b));
    }
}
