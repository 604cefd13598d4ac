package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;

/** −Γ^k_ij u^i v^j: from the Γ that are there, or by sweeps over g(u, v) without any. */
final class ParallelTransport {

    private final Geometry geometry;
    private final ExpressionGraph graph;
    private final int n;
    private final InnerProduct product;

    ParallelTransport(Geometry geometry) {
        this.geometry = geometry;
        this.graph = geometry.metric().graph();
        this.n = geometry.metric().dimension();
        this.product = new InnerProduct(geometry);
    }

    /** dv^k/dλ; k. */
    List<Node> rates() {
        List<Symbol> velocity = geometry.metric().velocities();
        List<Symbol> vector = product.symbols(Symbol.Kind.VECTOR, 0);
        if (geometry.route().flow() == Route.Flow.CONTRACTION) {
            return contracted(velocity, vector);
        }
        List<Node> force =
                product.connection(velocity, vector).stream().map(graph::negate).toList();
        return geometry.inverse().raise(force);
    }

    private List<Node> contracted(List<Symbol> u, List<Symbol> v) {
        List<Node> rates = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    terms.add(graph.negate(graph.multiply(geometry.christoffel()[k][i][j], pair(u, v, i, j))));
                }
            }
            rates.add(graph.sum(terms));
        }
        return rates;
    }

    private Node pair(List<Symbol> u, List<Symbol> v, int i, int j) {
        Node pair = graph.multiply(graph.symbol(u.get(i)), graph.symbol(v.get(j)));
        if (i != j) {
            pair = graph.add(pair, graph.multiply(graph.symbol(u.get(j)), graph.symbol(v.get(i))));
            graph.keep(pair);
        }
        return pair;
    }
}
