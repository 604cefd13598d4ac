package io.github.gammawright.verification;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelInstance.Defect;
import java.util.ArrayList;
import java.util.List;

/** The identities that the quantities of every metric meet. Signs are those of Misner, Thorne &amp; Wheeler (1973). */
enum Identity {
    INVERSE("inverse", "g_ik g^kj − δ_i^j", List.of(Quantity.METRIC, Quantity.INVERSE_METRIC)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] g = at.of(Quantity.METRIC);
            Approximate[] inverse = at.of(Quantity.INVERSE_METRIC);
            out.matrix((i, j) -> out.sum(k -> g[out.at(i, k)].times(inverse[out.at(k, j)]))
                    .minus(Approximate.exactly(i == j ? 1 : 0)));
        }
    },

    VOLUME("volume", "|det g| − √|g|²", List.of(Quantity.METRIC, Quantity.VOLUME_ELEMENT)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate determinant = Determinants.of(at.of(Quantity.METRIC), out.dimension());
            Approximate volume = at.of(Quantity.VOLUME_ELEMENT)[0];
            Approximate size = determinant.value() < 0 ? determinant.times(-1) : determinant;
            out.add(size.minus(volume.times(volume)));
        }
    },

    METRIC_COMPATIBILITY(
            "metric compatibility",
            "∂_k g_ij − g_im Γ^m_kj − g_jm Γ^m_ki",
            List.of(Quantity.METRIC, Quantity.METRIC_DERIVATIVE, Quantity.CHRISTOFFEL)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] g = at.of(Quantity.METRIC);
            Approximate[] derivative = at.of(Quantity.METRIC_DERIVATIVE);
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            out.tensor((k, i, j) -> derivative[out.at(k, i, j)].minus(out.sum(m -> g[out.at(i, m)]
                    .times(gamma[out.at(m, k, j)])
                    .plus(g[out.at(j, m)].times(gamma[out.at(m, k, i)])))));
        }
    },

    FIRST_KIND(
            "symbols of the first kind",
            "∂_k g_ij − Γ_ikj − Γ_jki",
            List.of(Quantity.METRIC_DERIVATIVE, Quantity.CHRISTOFFEL_FIRST_KIND)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] derivative = at.of(Quantity.METRIC_DERIVATIVE);
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL_FIRST_KIND);
            out.tensor((k, i, j) ->
                    derivative[out.at(k, i, j)].minus(gamma[out.at(i, k, j)]).minus(gamma[out.at(j, k, i)]));
        }
    },

    RAISING(
            "raising",
            "g_km Γ^m_ij − Γ_kij",
            List.of(Quantity.METRIC, Quantity.CHRISTOFFEL, Quantity.CHRISTOFFEL_FIRST_KIND)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] g = at.of(Quantity.METRIC);
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            Approximate[] first = at.of(Quantity.CHRISTOFFEL_FIRST_KIND);
            out.tensor((k, i, j) ->
                    out.sum(m -> g[out.at(k, m)].times(gamma[out.at(m, i, j)])).minus(first[out.at(k, i, j)]));
        }
    },

    SYMMETRY("symmetry", "Γ^k_ij − Γ^k_ji", List.of(Quantity.CHRISTOFFEL)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            // They are one number, so that not even rounding is allowed for.
            out.tensor(
                    (k, i, j) -> Approximate.exactly(gamma[out.at(k, i, j)].value() - gamma[out.at(k, j, i)].value()));
        }
    },

    TRACE(
            "trace",
            "Γ^m_mk − ½ g^ij ∂_k g_ij",
            List.of(Quantity.CHRISTOFFEL, Quantity.INVERSE_METRIC, Quantity.METRIC_DERIVATIVE)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            Approximate[] inverse = at.of(Quantity.INVERSE_METRIC);
            Approximate[] derivative = at.of(Quantity.METRIC_DERIVATIVE);
            out.vector(k -> out.sum(m -> gamma[out.at(m, m, k)])
                    .minus(out.sum(i -> out.sum(j -> inverse[out.at(i, j)].times(derivative[out.at(k, i, j)])))
                            .times(0.5)));
        }
    },

    TRACE_OF_CONNECTION(
            "trace of the connection",
            "Γ^m_mk, alone − summed",
            List.of(Quantity.CHRISTOFFEL, Quantity.CHRISTOFFEL_TRACE)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            Approximate[] trace = at.of(Quantity.CHRISTOFFEL_TRACE);
            out.vector(k -> trace[k].minus(out.sum(m -> gamma[out.at(m, m, k)])));
        }
    },

    CONTRACTION(
            "contraction",
            "g^ij Γ^k_ij, alone − summed",
            List.of(Quantity.CHRISTOFFEL, Quantity.INVERSE_METRIC, Quantity.CONTRACTED_CHRISTOFFEL)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            Approximate[] inverse = at.of(Quantity.INVERSE_METRIC);
            Approximate[] contracted = at.of(Quantity.CONTRACTED_CHRISTOFFEL);
            out.vector(k -> contracted[k].minus(out.sum(
                    i -> out.sum(j -> inverse[out.at(i, j)].times(gamma[out.at(k, i, j)])))));
        }
    },

    EULER_LAGRANGE(
            "Euler–Lagrange", "a^k + Γ^k_ij u^i u^j", List.of(Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            Approximate[] gamma = at.of(Quantity.CHRISTOFFEL);
            Approximate[] acceleration = at.with(Quantity.GEODESIC_ACCELERATION, u);
            out.vector(k -> acceleration[k].plus(out.sum(
                    i -> out.sum(j -> gamma[out.at(k, i, j)].times(u[i]).times(u[j])))));
        }
    },

    HAMILTON_LAGRANGE(
            "Hamilton = Lagrange",
            "dx^i/dλ − u^i, then dp_i/dλ − ½ ∂_i g_jk u^j u^k, at p_i = g_ij u^j",
            List.of(Quantity.METRIC, Quantity.INVERSE_METRIC, Quantity.METRIC_DERIVATIVE, Quantity.HAMILTONIAN_FLOW)) {
        @Override
        void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect {
            int n = out.dimension();
            Approximate[] g = at.of(Quantity.METRIC);
            Approximate[] inverse = at.of(Quantity.INVERSE_METRIC);
            Approximate[] derivative = at.of(Quantity.METRIC_DERIVATIVE);
            double[] p = new double[n];
            Approximate[] error = new Approximate[n];
            for (int i = 0; i < n; i++) {
                int row = i;
                Approximate momentum = out.sum(j -> g[out.at(row, j)].times(u[j]));
                p[i] = momentum.value();
                error[i] = new Approximate(0, momentum.error());
            }
            Approximate[] flow = at.with(Quantity.HAMILTONIAN_FLOW, p);
            // What the momentum's own error moves: the velocity, and by it the force.
            Approximate[] velocity = new Approximate[n];
            for (int i = 0; i < n; i++) {
                int row = i;
                velocity[i] = Approximate.exactly(u[i]).plus(out.sum(j -> inverse[out.at(row, j)].times(error[j])));
            }
            out.vector(i -> flow[i].minus(velocity[i]));
            out.vector(i -> flow[n + i].minus(out.sum(j -> out.sum(
                            k -> derivative[out.at(i, j, k)].times(velocity[j]).times(velocity[k])))
                    .times(0.5)));
        }
    };

    private final String text;
    private final String formula;
    private final List<Quantity> quantities;

    Identity(String text, String formula, List<Quantity> quantities) {
        this.text = text;
        this.formula = formula;
        this.quantities = quantities;
    }

    String text() {
        return text;
    }

    /** What must vanish. */
    String formula() {
        return formula;
    }

    /** The quantities that it connects. */
    List<Quantity> quantities() {
        return quantities;
    }

    /**
     * Computes what must vanish.
     *
     * @param u a velocity
     */
    abstract void residuals(IdentityPoint at, double[] u, Residuals out) throws Defect;

    /** Components of something that must vanish, in order. */
    static final class Residuals {

        private final int n;
        private final List<Approximate> values = new ArrayList<>();
        private final List<List<Integer>> indices = new ArrayList<>();

        Residuals(int n) {
            this.n = n;
        }

        int dimension() {
            return n;
        }

        List<Approximate> values() {
            return values;
        }

        /** The indices of each value. */
        List<List<Integer>> indices() {
            return indices;
        }

        int at(int i, int j) {
            return i * n + j;
        }

        int at(int k, int i, int j) {
            return (k * n + i) * n + j;
        }

        Approximate sum(Vector terms) {
            Approximate sum = Approximate.ZERO;
            for (int i = 0; i < n; i++) {
                sum = sum.plus(terms.at(i));
            }
            return sum;
        }

        void add(Approximate value, Integer... at) {
            values.add(value);
            indices.add(List.of(at));
        }

        void vector(Vector components) {
            for (int i = 0; i < n; i++) {
                add(components.at(i), i);
            }
        }

        void matrix(Matrix components) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    add(components.at(i, j), i, j);
                }
            }
        }

        void tensor(Tensor components) {
            for (int k = 0; k < n; k++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        add(components.at(k, i, j), k, i, j);
                    }
                }
            }
        }

        interface Vector {
            Approximate at(int i);
        }

        interface Matrix {
            Approximate at(int i, int j);
        }

        interface Tensor {
            Approximate at(int k, int i, int j);
        }
    }
}
