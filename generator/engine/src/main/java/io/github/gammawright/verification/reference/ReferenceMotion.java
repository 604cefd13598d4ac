package io.github.gammawright.verification.reference;

/** Equations of motion: contractions of the connection and the curvature with vectors at the point. */
final class ReferenceMotion {

    private ReferenceMotion() {}

    /** −Γ^k_ij u^i v^j. */
    static Taylor[] transport(ReferenceGeometry geometry, Taylor[] u, Taylor[] v) {
        int n = geometry.dimension();
        Taylor[][][] gamma = geometry.christoffel();
        Taylor[] result = new Taylor[n];
        for (int k = 0; k < n; k++) {
            Taylor sum = geometry.zero(geometry.order() - 1);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    if (!gamma[k][i][j].isAbsent()) {
                        sum = sum.plus(gamma[k][i][j].times(u[i].times(v[j])));
                    }
                }
            }
            result[k] = sum.negate();
        }
        return result;
    }

    /** −Γ^k_ij v^i v^j + v^k Γ^0_ij v^i v^j, k ≥ 1, with v^0 = 1. */
    static Taylor[] accelerationByTime(ReferenceGeometry geometry, Taylor[] velocity) {
        int n = geometry.dimension();
        Taylor[] v = new Taylor[n];
        v[0] = geometry.ring().constant(Real.ONE);
        System.arraycopy(velocity, 0, v, 1, n - 1);
        Taylor[] affine = transport(geometry, v, v);
        Taylor[] result = new Taylor[n - 1];
        for (int k = 1; k < n; k++) {
            result[k - 1] = affine[k].minus(v[k].times(affine[0]));
        }
        return result;
    }

    /**
     * dx^i/dλ = g^ij p_j, then dp_k/dλ = −½ ∂_k g^ij p_i p_j = ½ ∂_k g_ij dx^i/dλ dx^j/dλ, of H = ½ g^ij p_i p_j; the second form follows from
     * ∂g⁻¹ = −g⁻¹ ∂g g⁻¹.
     */
    static Taylor[] hamiltonianFlow(ReferenceGeometry geometry, Taylor[] momentum) {
        int n = geometry.dimension();
        int order = geometry.order() - 1;
        Taylor[][] inverse = geometry.inverse(order);
        Taylor[][][] derivative = geometry.metricDerivative();
        Taylor[] flow = new Taylor[2 * n];
        for (int i = 0; i < n; i++) {
            flow[i] = geometry.zero(order);
            for (int j = 0; j < n; j++) {
                flow[i] = ReferenceGeometry.plusProduct(flow[i], inverse[i][j], momentum[j]);
            }
        }
        for (int k = 0; k < n; k++) {
            Taylor sum = geometry.zero(order);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    if (!derivative[k][i][j].isAbsent()) {
                        sum = sum.plus(derivative[k][i][j].times(flow[i].times(flow[j])));
                    }
                }
            }
            flow[n + k] = sum.half();
        }
        return flow;
    }

    /** The flow divided by dx^0/dλ: dx^k/dt, then dp_k/dt, k ≥ 1. */
    static Taylor[] hamiltonianFlowByTime(ReferenceGeometry geometry, Taylor[] momentum) {
        int n = geometry.dimension();
        Taylor[] flow = hamiltonianFlow(geometry, momentum);
        Taylor rate = flow[0].reciprocal();
        Taylor[] result = new Taylor[2 * (n - 1)];
        for (int k = 1; k < n; k++) {
            result[k - 1] = flow[k].times(rate);
            result[n - 1 + k - 1] = flow[n + k].times(rate);
        }
        return result;
    }

    /** −R^k_ijl u^i ξ^j u^l. */
    static Taylor[] deviation(ReferenceGeometry geometry, Taylor[] u, Taylor[] separation) {
        int n = geometry.dimension();
        Taylor[][][][] riemann = new ReferenceCurvature(geometry).riemann();
        Taylor[] result = new Taylor[n];
        for (int k = 0; k < n; k++) {
            Taylor sum = geometry.zero(geometry.order() - 2);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    for (int l = 0; l < n; l++) {
                        Taylor component = riemann[k][i][j][l];
                        if (!component.isAbsent()) {
                            sum = sum.plus(
                                    component.times(u[i].times(separation[j]).times(u[l])));
                        }
                    }
                }
            }
            result[k] = sum.negate();
        }
        return result;
    }
}
