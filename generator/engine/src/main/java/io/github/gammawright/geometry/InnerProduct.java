package io.github.gammawright.geometry;

import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/**
 * The metric applied to vectors that do not depend on the point, either by its components or by the author's quadratic
 * form, whose structure it keeps: g(x, y) is then half the rate of change of the form at x along y.
 */
final class InnerProduct {

    private final MetricGraph metric;
    private final Differentiation differentiation;
    private final boolean byForm;
    private final ExpressionGraph graph;
    private final int n;

    InnerProduct(Geometry geometry) {
        this.metric = geometry.metric();
        this.differentiation = geometry.differentiation();
        this.byForm = geometry.route().flow() == Route.Flow.AUTHORS_FORM
                && metric.quadraticForm().isPresent();
        this.graph = metric.graph();
        this.n = metric.dimension();
    }

    /** g_ij x^i y^j. */
    Node of(List<Symbol> x, List<Symbol> y) {
        if (byForm) {
            Node form = metric.quadraticForm().get();
            Node product = x.equals(y)
                    ? form
                    : graph.multiple(
                            BigFraction.ONE_HALF, differentiation.directional(form, pairs(metric.velocities(), y)));
            return at(x, List.of(product)).get(0);
        }
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                Node factor = graph.multiply(graph.symbol(x.get(i)), graph.symbol(y.get(j)));
                if (i != j) {
                    factor = graph.add(factor, graph.multiply(graph.symbol(x.get(j)), graph.symbol(y.get(i))));
                    graph.keep(factor);
                }
                terms.add(graph.multiply(metric.components()[i][j], factor));
            }
        }
        return graph.sum(terms);
    }

    /** g_kj x^j; k. */
    List<Node> lowered(List<Symbol> x) {
        List<Node> covector = new ArrayList<>();
        if (byForm) {
            Node half =
                    graph.multiple(BigFraction.ONE_HALF, metric.quadraticForm().get());
            covector.addAll(at(x, differentiation.gradient(half, metric.velocities())));
        } else {
            for (int k = 0; k < n; k++) {
                List<Node> terms = new ArrayList<>();
                for (int j = 0; j < n; j++) {
                    terms.add(graph.multiply(metric.components()[k][j], graph.symbol(x.get(j))));
                }
                covector.add(graph.sum(terms));
            }
        }
        covector.forEach(graph::keep);
        return covector;
    }

    private List<Node> at(List<Symbol> x, List<Node> values) {
        if (x.equals(metric.velocities())) {
            return values;
        }
        Transfer transfer = Transfer.substituting(graph, pairs(metric.velocities(), x));
        return values.stream().map(transfer::copy).toList();
    }

    private Map<Symbol, Node> pairs(List<Symbol> symbols, List<Symbol> values) {
        Map<Symbol, Node> pairs = new LinkedHashMap<>();
        for (int i = 0; i < n; i++) {
            pairs.put(symbols.get(i), graph.symbol(values.get(i)));
        }
        return pairs;
    }

    /** The rate of change of values along a vector. */
    List<Node> along(List<Symbol> vector, List<Node> values) {
        return differentiation.directional(values, pairs(metric.coordinates(), vector));
    }

    /** The vector's components as symbols of a kind, from the given number on. */
    List<Symbol> symbols(Symbol.Kind kind, int from) {
        List<Symbol> symbols = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            symbols.add(Symbol.of(kind, metric.coordinates().get(i).name(), from + i));
        }
        return symbols;
    }

    /**
     * Γ_kij x^i y^j = ½ ((x·∂) g_kj y^j + (y·∂) g_kj x^j − ∂_k g(x, y)); k.
     */
    List<Node> connection(List<Symbol> x, List<Symbol> y) {
        List<Node> first = along(x, lowered(y));
        List<Node> second = x.equals(y) ? first : along(y, lowered(x));
        List<Node> gradient = differentiation.gradient(of(x, y), metric.coordinates());
        List<Node> covector = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            Node sum = graph.sum(List.of(first.get(k), second.get(k), graph.negate(gradient.get(k))));
            Node half = graph.multiple(BigFraction.ONE_HALF, sum);
            graph.keep(half);
            covector.add(half);
        }
        return covector;
    }
}
