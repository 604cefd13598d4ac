package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;

/** ∂_l Γ^k_ij; l, k, i, j. */
final class ChristoffelDerivative {

    private final Geometry geometry;
    private final ExpressionGraph graph;
    private final int n;

    ChristoffelDerivative(Geometry geometry) {
        this.geometry = geometry;
        this.graph = geometry.metric().graph();
        this.n = geometry.metric().dimension();
    }

    /** All components, row-major. */
    List<Node> components() {
        Node[] components = new Node[n * n * n * n];
        for (int l = 0; l < n; l++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    List<Node> rates = rates(l, i, j);
                    for (int k = 0; k < n; k++) {
                        graph.keep(rates.get(k));
                        components[((l * n + k) * n + i) * n + j] = rates.get(k);
                        components[((l * n + k) * n + j) * n + i] = rates.get(k);
                    }
                }
            }
        }
        return List.of(components);
    }

    private List<Node> rates(int l, int i, int j) {
        Symbol symbol = geometry.metric().coordinates().get(l);
        List<Node> rates = new ArrayList<>();
        if (geometry.route().second() == Route.Second.CONNECTION) {
            for (int k = 0; k < n; k++) {
                rates.add(geometry.differentiation().derivative(geometry.christoffel()[k][i][j], symbol));
            }
            return rates;
        }
        // from g_km Γ^m_ij = Γ_kij, so that the inverse needs no derivative
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            terms.add(geometry.differentiation().derivative(geometry.firstKind()[k][i][j], symbol));
            for (int m = 0; m < n; m++) {
                terms.add(graph.negate(
                        graph.multiply(geometry.metricDerivative()[l][k][m], geometry.christoffel()[m][i][j])));
            }
            Node sum = graph.sum(terms);
            graph.keep(sum);
            rates.add(sum);
        }
        return geometry.inverse().raise(rates);
    }
}
