package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * Curvature of the connection without torsion, with the signs of Misner, Thorne &amp; Wheeler (1973): R^k_lij = ∂_i Γ^k_lj
 * − ∂_j Γ^k_li + Γ^k_mi Γ^m_lj − Γ^k_mj Γ^m_li, R_lj = R^k_lkj.
 */
final class Curvature {

    private final Geometry geometry;
    private final ExpressionGraph graph;
    private final int n;
    private PairMatrix riemann;
    private Node[][] ricci;
    private Node scalar;

    Curvature(Geometry geometry) {
        this.geometry = geometry;
        this.graph = geometry.metric().graph();
        this.n = geometry.metric().dimension();
    }

    /** Curvature whose tensor is known. */
    Curvature(Geometry geometry, PairMatrix riemann) {
        this(geometry);
        this.riemann = riemann;
    }

    /**
     * R_klij, each independent component once: for four different indices the third of the components with the same ones
     * follows from the cyclic identity.
     */
    PairMatrix riemann() {
        if (riemann == null) {
            riemann = new PairMatrix(graph, n);
            for (int a = 0; a < riemann.pairs(); a++) {
                for (int b = 0; b <= a; b++) {
                    int k = riemann.greater(a);
                    int l = riemann.smaller(a);
                    int i = riemann.greater(b);
                    int j = riemann.smaller(b);
                    // R_klij + R_kijl + R_kjli = 0; with k > l > i > j this is the last of the three
                    boolean follows = l > i;
                    riemann.set(
                            a,
                            b,
                            follows
                                    ? graph.negate(graph.add(riemann.at(k, i, j, l), riemann.at(k, j, l, i)))
                                    : component(k, l, i, j));
                }
            }
        }
        return riemann;
    }

    /**
     * R_klij = ½ (∂_l ∂_i g_kj + ∂_k ∂_j g_li − ∂_k ∂_i g_lj − ∂_l ∂_j g_ki) + Γ^p_li Γ_pkj − Γ^p_lj Γ_pki (Landau &amp;
     * Lifshitz 1971, The Classical Theory of Fields, section 92).
     */
    private Node component(int k, int l, int i, int j) {
        List<Node> terms = new ArrayList<>();
        terms.add(half(second(l, i, k, j)));
        terms.add(half(second(k, j, l, i)));
        terms.add(graph.negate(half(second(k, i, l, j))));
        terms.add(graph.negate(half(second(l, j, k, i))));
        for (int p = 0; p < n; p++) {
            terms.add(graph.multiply(geometry.christoffel()[p][l][i], geometry.firstKind()[p][k][j]));
            terms.add(graph.negate(graph.multiply(geometry.christoffel()[p][l][j], geometry.firstKind()[p][k][i])));
        }
        return graph.sum(terms);
    }

    private Node half(Node node) {
        return graph.multiple(BigFraction.ONE_HALF, node);
    }

    /** ∂_a ∂_b g_ij. */
    private Node second(int a, int b, int i, int j) {
        Node first = geometry.metricDerivative()[Math.min(a, b)][i][j];
        Node second = derivative(first, Math.max(a, b));
        graph.keep(second);
        return second;
    }

    private Node derivative(Node node, int coordinate) {
        Symbol symbol = geometry.metric().coordinates().get(coordinate);
        return geometry.differentiation().derivative(node, symbol);
    }

    /** t^k_lij of t_klij, or for the curvature tensor itself the same from derivatives of Γ; row-major. */
    List<Node> mixed(PairMatrix lower) {
        boolean byConnection = lower == riemann && geometry.route().second() == Route.Second.CONNECTION;
        Node[] mixed = new Node[n * n * n * n];
        java.util.Arrays.fill(mixed, graph.zero());
        for (int l = 0; l < n; l++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < i; j++) {
                    List<Node> raised = byConnection ? fromConnection(l, i, j) : raised(lower, l, i, j);
                    for (int k = 0; k < n; k++) {
                        graph.keep(raised.get(k));
                        mixed[((k * n + l) * n + i) * n + j] = raised.get(k);
                        mixed[((k * n + l) * n + j) * n + i] = graph.negate(raised.get(k));
                    }
                }
            }
        }
        return List.of(mixed);
    }

    private List<Node> raised(PairMatrix lower, int l, int i, int j) {
        List<Node> covector = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            covector.add(lower.at(k, l, i, j));
        }
        return geometry.inverse().raise(covector);
    }

    private List<Node> fromConnection(int l, int i, int j) {
        List<Node> components = new ArrayList<>();
        Node[][][] gamma = geometry.christoffel();
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            terms.add(derivative(gamma[k][l][j], i));
            terms.add(graph.negate(derivative(gamma[k][l][i], j)));
            for (int m = 0; m < n; m++) {
                terms.add(graph.multiply(gamma[k][m][i], gamma[m][l][j]));
                terms.add(graph.negate(graph.multiply(gamma[k][m][j], gamma[m][l][i])));
            }
            components.add(graph.sum(terms));
        }
        return components;
    }

    /** R_ij, symmetric. */
    Node[][] ricci() {
        if (ricci == null) {
            ricci = new Node[n][n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    Node component = geometry.route().second() == Route.Second.CONNECTION
                            ? ricciFromConnection(i, j)
                            : contracted(i, j);
                    graph.keep(component);
                    ricci[i][j] = component;
                    ricci[j][i] = component;
                }
            }
        }
        return ricci;
    }

    /** g^kl R_kilj. */
    private Node contracted(int i, int j) {
        List<Node> terms = new ArrayList<>();
        Node[][] inverse = geometry.inverse().components();
        for (int k = 0; k < n; k++) {
            for (int l = 0; l < n; l++) {
                terms.add(graph.multiply(inverse[k][l], riemann().at(k, i, l, j)));
            }
        }
        return graph.sum(terms);
    }

    /** ∂_k Γ^k_ij − ∂_i ∂_j ln √|g| + Γ^k_ij ∂_k ln √|g| − Γ^k_il Γ^l_jk. */
    private Node ricciFromConnection(int i, int j) {
        List<Node> terms = new ArrayList<>();
        Node[][][] gamma = geometry.christoffel();
        List<Node> trace = geometry.trace();
        terms.add(graph.negate(derivative(trace.get(i), j)));
        for (int k = 0; k < n; k++) {
            terms.add(derivative(gamma[k][i][j], k));
            terms.add(graph.multiply(gamma[k][i][j], trace.get(k)));
            for (int l = 0; l < n; l++) {
                terms.add(graph.negate(graph.multiply(gamma[k][i][l], gamma[l][j][k])));
            }
        }
        return graph.sum(terms);
    }

    /** g^ij R_ij. */
    Node scalar() {
        if (scalar == null) {
            List<Node> terms = new ArrayList<>();
            Node[][] inverse = geometry.inverse().components();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    Node term = graph.multiply(inverse[i][j], ricci()[i][j]);
                    terms.add(i == j ? term : graph.multiple(BigFraction.TWO, term));
                }
            }
            scalar = graph.sum(terms);
            graph.keep(scalar);
        }
        return scalar;
    }

    /** R_ij − ½ g_ij R. */
    Node[][] einstein() {
        Node half = half(scalar());
        Node[][] einstein = new Node[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                einstein[i][j] = graph.subtract(
                        ricci()[i][j], graph.multiply(geometry.metric().components()[i][j], half));
                einstein[j][i] = einstein[i][j];
            }
        }
        return einstein;
    }

    /**
     * C_klij = R_klij − (g_ki P_lj − g_kj P_li − g_li P_kj + g_lj P_ki) with Schouten's tensor P_ij = (R_ij − R g_ij / (2(n
     * − 1))) / (n − 2); 0 for n ≤ 3.
     */
    PairMatrix weyl() {
        PairMatrix weyl = new PairMatrix(graph, n);
        Node[][] g = geometry.metric().components();
        Node[][] p = n > 3 ? schouten() : null;
        for (int a = 0; a < weyl.pairs(); a++) {
            for (int b = 0; b <= a; b++) {
                if (n <= 3) {
                    weyl.set(a, b, graph.zero());
                    continue;
                }
                int k = weyl.greater(a);
                int l = weyl.smaller(a);
                int i = weyl.greater(b);
                int j = weyl.smaller(b);
                weyl.set(
                        a,
                        b,
                        graph.sum(List.of(
                                riemann().at(a, b),
                                graph.negate(graph.multiply(g[k][i], p[l][j])),
                                graph.multiply(g[k][j], p[l][i]),
                                graph.multiply(g[l][i], p[k][j]),
                                graph.negate(graph.multiply(g[l][j], p[k][i])))));
            }
        }
        return weyl;
    }

    private Node[][] schouten() {
        Node[][] schouten = new Node[n][n];
        Node share = graph.multiple(new BigFraction(1, 2 * (n - 1)), scalar());
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                Node rest = graph.subtract(
                        ricci()[i][j], graph.multiply(geometry.metric().components()[i][j], share));
                schouten[i][j] = graph.multiple(new BigFraction(1, n - 2), rest);
                graph.keep(schouten[i][j]);
                schouten[j][i] = schouten[i][j];
            }
        }
        return schouten;
    }

    /** R_klij R^klij = 4 R^A_B R^B_A over pairs A of k &gt; l and B of i &gt; j. */
    Node kretschmann() {
        PairMatrix lower = riemann();
        int pairs = lower.pairs();
        Node[][] inverse = geometry.inverse().components();
        Node[][] raising = new Node[pairs][pairs];
        for (int a = 0; a < pairs; a++) {
            for (int b = 0; b < pairs; b++) {
                int k = lower.greater(a);
                int l = lower.smaller(a);
                int i = lower.greater(b);
                int j = lower.smaller(b);
                raising[a][b] = graph.subtract(
                        graph.multiply(inverse[k][i], inverse[l][j]), graph.multiply(inverse[k][j], inverse[l][i]));
                graph.keep(raising[a][b]);
            }
        }
        Node[][] mixed = new Node[pairs][pairs];
        for (int a = 0; a < pairs; a++) {
            for (int b = 0; b < pairs; b++) {
                List<Node> terms = new ArrayList<>();
                for (int c = 0; c < pairs; c++) {
                    terms.add(graph.multiply(raising[a][c], lower.at(c, b)));
                }
                mixed[a][b] = graph.sum(terms);
                graph.keep(mixed[a][b]);
            }
        }
        List<Node> terms = new ArrayList<>();
        for (int a = 0; a < pairs; a++) {
            for (int b = 0; b <= a; b++) {
                Node term = graph.multiply(mixed[a][b], mixed[b][a]);
                terms.add(graph.multiple(new BigFraction(a == b ? 4 : 8), term));
            }
        }
        return graph.sum(terms);
    }
}
