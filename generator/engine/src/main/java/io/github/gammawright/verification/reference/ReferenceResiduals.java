package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.Expression;
import java.util.ArrayList;
import java.util.List;

/**
 * What vanishes at a point if a statement about the metric holds there. Components are row-major over all indices; an
 * undefined one says nothing.
 */
public final class ReferenceResiduals {

    private final MetricSeries series;
    private final ReferenceGeometry geometry;
    private final int n;

    /**
     * Residuals at a point.
     *
     * @param series the definition in the coordinates alone, to the order that {@link #order} says
     */
    ReferenceResiduals(MetricSeries series) {
        this.series = series;
        this.geometry = new ReferenceGeometry(series.metric(), 0);
        this.n = geometry.dimension();
    }

    /** How many derivatives of a metric of n dimensions are needed. */
    static int order(int n) {
        return n == 3 ? 3 : 2;
    }

    /** R_ij, which vanishes in a vacuum. */
    public List<Real> ricci() {
        List<Real> residuals = new ArrayList<>();
        for (Taylor[] row : new ReferenceCurvature(geometry).ricci()) {
            add(row, residuals);
        }
        return residuals;
    }

    /** R_ij − Λ g_ij for an expression Λ that is free of differentials. */
    public List<Real> einstein(Expression constant) {
        Taylor lambda = series.scalar(constant);
        Taylor[][] ricci = new ReferenceCurvature(geometry).ricci();
        List<Real> residuals = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                residuals.add(
                        ricci[i][j].minus(lambda.times(geometry.metric()[i][j])).value());
            }
        }
        return residuals;
    }

    /**
     * What vanishes if the metric is conformal to a flat one: Weyl's C^k_lij in four dimensions and more, Cotton's C_ijk
     * in three (Eisenhart 1926, §28); nothing in one and two, where every metric is (source from memory).
     */
    public List<Real> conformalCurvature() {
        List<Real> residuals = new ArrayList<>();
        if (n > 3) {
            for (Taylor[][][] k : new ReferenceCurvature(geometry).weyl()) {
                for (Taylor[][] l : k) {
                    for (Taylor[] i : l) {
                        add(i, residuals);
                    }
                }
            }
        } else if (n == 3) {
            cotton(residuals);
        }
        return residuals;
    }

    /** C_ijk = ∇_k S_ij − ∇_j S_ik of S_ij = R_ij − R g_ij / 4; i, j, k. */
    private void cotton(List<Real> residuals) {
        ReferenceCurvature curvature = new ReferenceCurvature(geometry);
        Taylor quarter = curvature.scalar().dividedBy(4);
        Taylor[][] schouten = new Taylor[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                schouten[i][j] = curvature.ricci()[i][j].minus(quarter.times(geometry.metric()[i][j]));
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                for (int k = 0; k < n; k++) {
                    residuals.add(covariantDerivative(schouten, i, j, k)
                            .minus(covariantDerivative(schouten, i, k, j))
                            .value());
                }
            }
        }
    }

    /** ∇_k S_ij. */
    private Taylor covariantDerivative(Taylor[][] s, int i, int j, int k) {
        Taylor derivative = geometry.derivative(s[i][j], k);
        for (int m = 0; m < n; m++) {
            derivative = derivative
                    .minus(geometry.christoffel()[m][k][i].times(s[m][j]))
                    .minus(geometry.christoffel()[m][k][j].times(s[i][m]));
        }
        return derivative;
    }

    /** ξ^k ∂_k g_ij + g_kj ∂_i ξ^k + g_ik ∂_j ξ^k for a vector field ξ, which vanishes if that is Killing's. */
    public List<Real> killing(List<Expression> field) {
        Taylor[] xi = field.stream().map(series::scalar).toArray(Taylor[]::new);
        Taylor[][] g = geometry.metric();
        List<Real> residuals = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                Taylor sum = geometry.zero(0);
                for (int k = 0; k < n; k++) {
                    sum = sum.plus(xi[k].times(geometry.derivative(g[i][j], k)))
                            .plus(g[k][j].times(geometry.derivative(xi[k], i)))
                            .plus(g[i][k].times(geometry.derivative(xi[k], j)));
                }
                residuals.add(sum.value());
            }
        }
        return residuals;
    }

    /** ∂_k g_ij for one k. */
    public List<Real> derivativeOfMetric(int k) {
        List<Real> residuals = new ArrayList<>();
        for (Taylor[] row : geometry.metric()) {
            for (Taylor component : row) {
                residuals.add(geometry.derivative(component, k).value());
            }
        }
        return residuals;
    }

    private static void add(Taylor[] row, List<Real> residuals) {
        for (Taylor component : row) {
            residuals.add(component.value());
        }
    }
}
