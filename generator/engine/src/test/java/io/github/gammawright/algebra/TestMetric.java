package io.github.gammawright.algebra;

import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.hipparchus.fraction.BigFraction;

/** Metrics for tests, with their Christoffel symbols computed on the graph by the shortest way to write. */
final class TestMetric {

    final ExpressionGraph graph = new ExpressionGraph();
    final List<Symbol> coordinates = new ArrayList<>();
    Node[][] components;
    Node[][] inverse;

    Node coordinate(String name) {
        Symbol symbol = Symbol.of(Symbol.Kind.COORDINATE, name, coordinates.size());
        coordinates.add(symbol);
        return graph.symbol(symbol);
    }

    Node parameter(String name, int index) {
        return graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, name, index));
    }

    Node number(long value) {
        return graph.constant(value);
    }

    Node sum(Node... terms) {
        return graph.sum(List.of(terms));
    }

    Node product(Node... factors) {
        return graph.product(List.of(factors));
    }

    /** Kerr's metric in Boyer–Lindquist coordinates, the inverse of its t–φ block by cofactors. */
    static TestMetric kerr() {
        TestMetric metric = new TestMetric();
        ExpressionGraph graph = metric.graph;
        metric.coordinate("t");
        Node r = metric.coordinate("r");
        Node theta = metric.coordinate("theta");
        metric.coordinate("phi");
        Node mass = metric.parameter("M", 0);
        Node a = metric.parameter("a", 1);
        Node sin = graph.call(RealFunction.SIN, theta);
        Node cos = graph.call(RealFunction.COS, theta);
        Node sigma = metric.sum(graph.power(r, 2), metric.product(graph.power(a, 2), graph.power(cos, 2)));
        graph.name(sigma, "Sigma");
        Node delta = metric.sum(graph.power(r, 2), metric.product(metric.number(-2), mass, r), graph.power(a, 2));
        graph.name(delta, "Delta");
        Node x = graph.divide(metric.product(metric.number(2), mass, r), sigma);
        Node sin2 = graph.power(sin, 2);
        Node[][] g = new Node[4][4];
        for (Node[] row : g) {
            java.util.Arrays.fill(row, graph.zero());
        }
        g[0][0] = graph.subtract(x, graph.one());
        g[0][3] = g[3][0] = graph.negate(metric.product(x, a, sin2));
        g[1][1] = graph.divide(sigma, delta);
        g[2][2] = sigma;
        g[3][3] = metric.product(
                sin2, metric.sum(graph.power(r, 2), graph.power(a, 2), metric.product(x, graph.power(a, 2), sin2)));
        metric.components = g;
        Node determinant = graph.subtract(graph.multiply(g[0][0], g[3][3]), graph.power(g[0][3], 2));
        Node[][] h = new Node[4][4];
        for (Node[] row : h) {
            java.util.Arrays.fill(row, graph.zero());
        }
        h[0][0] = graph.divide(g[3][3], determinant);
        h[3][3] = graph.divide(g[0][0], determinant);
        h[0][3] = h[3][0] = graph.negate(graph.divide(g[0][3], determinant));
        h[1][1] = graph.reciprocal(g[1][1]);
        h[2][2] = graph.reciprocal(g[2][2]);
        metric.inverse = h;
        return metric;
    }

    /** Γ^k_ij by "kij", those with i ≤ j that are not zero. */
    SortedMap<String, Node> christoffel() {
        Differentiation differentiation = new Differentiation(graph);
        int n = coordinates.size();
        SortedMap<String, Node> symbols = new TreeMap<>();
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                for (int j = i; j < n; j++) {
                    List<Node> terms = new ArrayList<>();
                    for (int l = 0; l < n; l++) {
                        Node first = graph.sum(List.of(
                                differentiation.derivative(components[l][j], coordinates.get(i)),
                                differentiation.derivative(components[l][i], coordinates.get(j)),
                                graph.negate(differentiation.derivative(components[i][j], coordinates.get(l)))));
                        terms.add(graph.multiply(inverse[k][l], first));
                    }
                    Node value = graph.multiple(BigFraction.ONE_HALF, graph.sum(terms));
                    if (!value.isZero()) {
                        symbols.put("" + k + i + j, value);
                    }
                }
            }
        }
        return symbols;
    }
}
