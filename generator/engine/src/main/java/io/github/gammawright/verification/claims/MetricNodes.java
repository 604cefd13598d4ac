package io.github.gammawright.verification.claims;

import io.github.gammawright.algebra.NormalForms.Term;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * The tensors that claims speak of, each component as a sum of products of values of the graph: what a proof needs that
 * doesn't trust the graph's own zeros. Signs are those of Misner, Thorne &amp; Wheeler (1973).
 */
final class MetricNodes {

    private final MetricGraph metric;
    private final ExpressionGraph graph;
    private final Differentiation differentiation;
    private final int n;
    private final int mostNodes;
    private List<Node> christoffel;
    private List<Node> inverse;
    private Node[][][][] riemann;

    /** More nodes would be needed than are allowed. */
    static final class TooLarge extends RuntimeException {}

    MetricNodes(MetricGraph metric, int mostNodes) {
        this.metric = metric;
        this.graph = metric.graph();
        this.differentiation = new Differentiation(graph);
        this.n = metric.dimension();
        this.mostNodes = mostNodes;
    }

    ExpressionGraph graph() {
        return graph;
    }

    MetricGraph metric() {
        return metric;
    }

    /** The value of a sum; 0 if it vanishes at random points of the prime field. */
    Node value(List<Term> sum) {
        List<Node> terms = new ArrayList<>();
        for (Term term : sum) {
            terms.add(graph.multiple(term.coefficient(), graph.product(term.factors())));
        }
        requireRoom();
        return graph.sum(terms);
    }

    private void requireRoom() {
        if (graph.nodes().size() > mostNodes) {
            throw new TooLarge();
        }
    }

    /** ∂_k of a value. */
    Node derivative(Node node, int k) {
        requireRoom();
        return differentiation.derivative(node, metric.coordinates().get(k));
    }

    private Node g(int i, int j) {
        return metric.components()[i][j];
    }

    /** ξ^k ∂_k g_ij + g_kj ∂_i ξ^k + g_ik ∂_j ξ^k for all i ≥ j. */
    List<List<Term>> killing(List<Node> field) {
        List<List<Term>> all = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                List<Term> sum = new ArrayList<>();
                for (int k = 0; k < n; k++) {
                    sum.add(term(1, field.get(k), derivative(g(i, j), k)));
                    sum.add(term(1, g(k, j), derivative(field.get(k), i)));
                    sum.add(term(1, g(i, k), derivative(field.get(k), j)));
                }
                all.add(sum);
            }
        }
        return all;
    }

    /** R_ij − Λ g_ij for all i ≥ j: ∂_k Γ^k_ij − ∂_j Γ^k_ki + Γ^k_km Γ^m_ij − Γ^k_jm Γ^m_ki − Λ g_ij. */
    List<List<Term>> einstein(Node constant) {
        List<List<Term>> all = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                List<Term> sum = new ArrayList<>(List.of(term(-1, constant, g(i, j))));
                for (int k = 0; k < n; k++) {
                    sum.addAll(riemannTerms(k, i, k, j));
                }
                all.add(sum);
            }
        }
        return all;
    }

    /** R^k_lij. */
    private List<Term> riemannTerms(int k, int l, int i, int j) {
        List<Term> sum = new ArrayList<>();
        sum.add(term(1, derivative(gamma(k, l, j), i)));
        sum.add(term(-1, derivative(gamma(k, l, i), j)));
        for (int m = 0; m < n; m++) {
            sum.add(term(1, gamma(k, m, i), gamma(m, l, j)));
            sum.add(term(-1, gamma(k, m, j), gamma(m, l, i)));
        }
        return sum;
    }

    /** C_klij of four dimensions and more, for all pairs kl ≥ ij with k &gt; l and i &gt; j. */
    List<List<Term>> weyl() {
        Node[][] ricci = new Node[n][n];
        List<Term> trace = new ArrayList<>();
        for (int l = 0; l < n; l++) {
            for (int j = 0; j < n; j++) {
                List<Term> sum = new ArrayList<>();
                for (int k = 0; k < n; k++) {
                    sum.add(term(1, riemann(k, l, k, j)));
                }
                ricci[l][j] = value(sum);
                trace.add(term(1, inverse(l, j), ricci[l][j]));
            }
        }
        Node scalar = value(trace);
        List<List<Term>> all = new ArrayList<>();
        for (int k = 1; k < n; k++) {
            for (int l = 0; l < k; l++) {
                for (int i = 1; i <= k; i++) {
                    for (int j = 0; j < i; j++) {
                        if (i < k || j <= l) {
                            all.add(weyl(k, l, i, j, ricci, scalar));
                        }
                    }
                }
            }
        }
        return all;
    }

    private List<Term> weyl(int k, int l, int i, int j, Node[][] ricci, Node scalar) {
        List<Term> sum = new ArrayList<>();
        for (int m = 0; m < n; m++) {
            sum.add(term(1, g(k, m), riemann(m, l, i, j)));
        }
        BigFraction c = new BigFraction(1, n - 2);
        sum.add(new Term(c.negate(), List.of(g(k, i), ricci[l][j])));
        sum.add(new Term(c, List.of(g(k, j), ricci[l][i])));
        sum.add(new Term(c.negate(), List.of(g(l, j), ricci[k][i])));
        sum.add(new Term(c, List.of(g(l, i), ricci[k][j])));
        BigFraction d = new BigFraction(1, (n - 1) * (n - 2));
        sum.add(new Term(d, List.of(scalar, g(k, i), g(l, j))));
        sum.add(new Term(d.negate(), List.of(scalar, g(k, j), g(l, i))));
        return sum;
    }

    private Node riemann(int k, int l, int i, int j) {
        if (riemann == null) {
            riemann = new Node[n][n][n][n];
        }
        if (riemann[k][l][i][j] == null) {
            riemann[k][l][i][j] = value(riemannTerms(k, l, i, j));
        }
        return riemann[k][l][i][j];
    }

    private Node gamma(int k, int i, int j) {
        if (christoffel == null) {
            christoffel = geometry().components(Quantity.CHRISTOFFEL);
        }
        return christoffel.get((k * n + i) * n + j);
    }

    private Node inverse(int i, int j) {
        if (inverse == null) {
            inverse = geometry().components(Quantity.INVERSE_METRIC);
        }
        return inverse.get(i * n + j);
    }

    private Geometry geometry() {
        return new Geometry(metric, Route.candidates(metric, List.of()).get(0));
    }

    static Term term(int coefficient, Node... factors) {
        return new Term(new BigFraction(coefficient), List.of(factors));
    }
}
