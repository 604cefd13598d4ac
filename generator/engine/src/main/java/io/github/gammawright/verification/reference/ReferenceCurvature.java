package io.github.gammawright.verification.reference;

/**
 * The curvature of a metric that is given as power series, with the signs of Misner, Thorne &amp; Wheeler (1973):
 * R^k_lij = ∂_i Γ^k_lj − ∂_j Γ^k_li + Γ^k_mi Γ^m_lj − Γ^k_mj Γ^m_li, R_lj = R^k_lkj.
 */
final class ReferenceCurvature {

    private final ReferenceGeometry geometry;
    private final int n;
    /** The order to which curvature is known. */
    private final int order;

    private Taylor[][][][] riemann;
    private Taylor[][] ricci;

    ReferenceCurvature(ReferenceGeometry geometry) {
        this.geometry = geometry;
        this.n = geometry.dimension();
        this.order = geometry.order() - 2;
    }

    /** R^k_lij; k, l, i, j. */
    Taylor[][][][] riemann() {
        if (riemann == null) {
            riemann = new Taylor[n][n][n][n];
            for (int k = 0; k < n; k++) {
                for (int l = 0; l < n; l++) {
                    for (int i = 0; i < n; i++) {
                        riemann[k][l][i][i] = geometry.zero(order);
                        for (int j = 0; j < i; j++) {
                            riemann[k][l][i][j] = component(k, l, i, j);
                            riemann[k][l][j][i] = riemann[k][l][i][j].negate();
                        }
                    }
                }
            }
        }
        return riemann;
    }

    private Taylor component(int k, int l, int i, int j) {
        Taylor[][][] gamma = geometry.christoffel();
        Taylor positive = geometry.derivative(gamma[k][l][j], i);
        Taylor negative = geometry.derivative(gamma[k][l][i], j);
        for (int m = 0; m < n; m++) {
            positive = ReferenceGeometry.plusProduct(positive, gamma[k][m][i], gamma[m][l][j]);
            negative = ReferenceGeometry.plusProduct(negative, gamma[k][m][j], gamma[m][l][i]);
        }
        return positive.minus(negative);
    }

    /** R_klij = g_km R^m_lij; k, l, i, j. */
    Taylor[][][][] loweredRiemann() {
        return contracted(geometry.metric(), riemann(), false);
    }

    /** C_klij = g_km C^m_lij; k, l, i, j. */
    Taylor[][][][] loweredWeyl() {
        return contracted(geometry.metric(), weyl(), false);
    }

    /** a_km t_mlij, or with the second index instead a_lm t_kmij. */
    private Taylor[][][][] contracted(Taylor[][] a, Taylor[][][][] t, boolean second) {
        Taylor[][][][] contracted = new Taylor[n][n][n][n];
        for (int k = 0; k < n; k++) {
            for (int l = 0; l < n; l++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        Taylor sum = geometry.zero(order);
                        for (int m = 0; m < n; m++) {
                            sum = second
                                    ? ReferenceGeometry.plusProduct(sum, a[l][m], t[k][m][i][j])
                                    : ReferenceGeometry.plusProduct(sum, a[k][m], t[m][l][i][j]);
                        }
                        contracted[k][l][i][j] = sum;
                    }
                }
            }
        }
        return contracted;
    }

    /** R_lj = R^k_lkj. */
    Taylor[][] ricci() {
        if (ricci == null) {
            ricci = new Taylor[n][n];
            for (int l = 0; l < n; l++) {
                for (int j = 0; j < n; j++) {
                    Taylor sum = geometry.zero(order);
                    for (int k = 0; k < n; k++) {
                        sum = sum.plus(riemann()[k][l][k][j]);
                    }
                    ricci[l][j] = sum;
                }
            }
        }
        return ricci;
    }

    /** g^ij R_ij. */
    Taylor scalar() {
        Taylor[][] inverse = geometry.inverse(order);
        Taylor sum = geometry.zero(order);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                sum = ReferenceGeometry.plusProduct(sum, inverse[i][j], ricci()[i][j]);
            }
        }
        return sum;
    }

    /** R_ij − ½ g_ij R. */
    Taylor[][] einstein() {
        Taylor half = scalar().half();
        Taylor[][] einstein = new Taylor[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                einstein[i][j] = ricci()[i][j].minus(geometry.metric()[i][j].times(half));
            }
        }
        return einstein;
    }

    /**
     * R_klij R^klij. With the pairs of R^kl_ij the sum is R^kl_ij R^ij_kl, which needs one index of each raised only.
     */
    Taylor kretschmann() {
        Taylor[][][][] raised = contracted(geometry.inverse(order), riemann(), true);
        Taylor sum = geometry.zero(order);
        for (int k = 0; k < n; k++) {
            for (int l = 0; l < n; l++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        sum = ReferenceGeometry.plusProduct(sum, raised[k][l][i][j], raised[i][j][k][l]);
                    }
                }
            }
        }
        return sum;
    }

    /**
     * C^k_lij = R^k_lij − (δ^k_i R_lj − δ^k_j R_li + R^k_i g_lj − R^k_j g_li) / (n − 2) + R (δ^k_i g_lj − δ^k_j g_li) /
     * ((n − 1)(n − 2)); absent for n ≤ 3.
     */
    Taylor[][][][] weyl() {
        Taylor[][][][] weyl = new Taylor[n][n][n][n];
        Taylor[][] metric = geometry.metric();
        Taylor[][] mixed = n > 3 ? mixedRicci() : null;
        for (int k = 0; k < n; k++) {
            for (int l = 0; l < n; l++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        if (n <= 3) {
                            weyl[k][l][i][j] = geometry.zero(order);
                            continue;
                        }
                        Taylor trace = mixed[k][i].times(metric[l][j]).minus(mixed[k][j].times(metric[l][i]));
                        Taylor flat = geometry.zero(order);
                        if (k == i) {
                            trace = trace.plus(ricci()[l][j]);
                            flat = flat.plus(metric[l][j]);
                        }
                        if (k == j) {
                            trace = trace.minus(ricci()[l][i]);
                            flat = flat.minus(metric[l][i]);
                        }
                        Taylor scalarPart = flat.times(scalar()).dividedBy((n - 1L) * (n - 2));
                        weyl[k][l][i][j] = riemann()[k][l][i][j]
                                .minus(trace.dividedBy(n - 2L))
                                .plus(scalarPart);
                    }
                }
            }
        }
        return weyl;
    }

    /** R^k_i = g^km R_mi. */
    private Taylor[][] mixedRicci() {
        Taylor[][] inverse = geometry.inverse(order);
        Taylor[][] mixed = new Taylor[n][n];
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                Taylor sum = geometry.zero(order);
                for (int m = 0; m < n; m++) {
                    sum = ReferenceGeometry.plusProduct(sum, inverse[k][m], ricci()[m][i]);
                }
                mixed[k][i] = sum;
            }
        }
        return mixed;
    }
}
