package io.github.gammawright.geometry;

import io.github.gammawright.geometry.MetricGraph.WeightedSquare;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The inverse of a metric D + w l l, with D diagonal and l a one-form: D⁻¹ − w D⁻¹l D⁻¹l / (1 + w l·D⁻¹l) (Sherman &amp;
 * Morrison 1950). Covectors are raised without multiplying out the products of the components of l.
 */
final class RankOneInverse implements InverseMetric {

    private final ExpressionGraph graph;
    private final List<Node> diagonal;
    private final List<Node> direction;
    private final Node weight;
    private final Node determinant;

    private RankOneInverse(ExpressionGraph graph, List<Node> diagonalMetric, WeightedSquare square) {
        this.graph = graph;
        this.diagonal = new ArrayList<>();
        this.direction = new ArrayList<>();
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < diagonalMetric.size(); i++) {
            Node reciprocal = graph.reciprocal(diagonalMetric.get(i));
            diagonal.add(reciprocal);
            Node raised = graph.multiply(reciprocal, square.coefficients().get(i));
            direction.add(raised);
            terms.add(graph.multiply(raised, square.coefficients().get(i)));
        }
        // for a null direction the sum is recognised as zero and the denominator as one
        Node length = graph.sum(terms);
        graph.keep(length);
        Node denominator = graph.add(graph.one(), graph.multiply(square.weight(), length));
        graph.keep(denominator);
        this.weight = graph.negate(graph.divide(square.weight(), denominator));
        graph.keep(weight);
        this.determinant = graph.multiply(graph.product(diagonalMetric), denominator);
    }

    /** The inverse of a metric that its author wrote as coordinate squares and one square of another one-form. */
    static Optional<InverseMetric> of(MetricGraph metric) {
        if (metric.squares().isEmpty()) {
            return Optional.empty();
        }
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        List<Node> diagonal = new ArrayList<>(java.util.Collections.nCopies(n, graph.zero()));
        List<WeightedSquare> others = new ArrayList<>();
        for (WeightedSquare square : metric.squares().get()) {
            int only = onlyCoordinate(square);
            if (only >= 0) {
                Node coefficient = square.coefficients().get(only);
                diagonal.set(
                        only,
                        graph.add(diagonal.get(only), graph.multiply(square.weight(), graph.power(coefficient, 2))));
            } else {
                others.add(square);
            }
        }
        if (others.size() != 1 || diagonal.stream().anyMatch(Node::isZero)) {
            return Optional.empty();
        }
        diagonal.forEach(graph::keep);
        return Optional.of(new RankOneInverse(graph, diagonal, others.get(0)));
    }

    private static int onlyCoordinate(WeightedSquare square) {
        int only = -1;
        for (int i = 0; i < square.coefficients().size(); i++) {
            if (!square.coefficients().get(i).isZero()) {
                if (only >= 0) {
                    return -1;
                }
                only = i;
            }
        }
        return only;
    }

    @Override
    public Node[][] components() {
        int n = diagonal.size();
        Node[][] components = new Node[n][n];
        for (int i = 0; i < n; i++) {
            Node scaled = graph.multiply(weight, direction.get(i));
            graph.keep(scaled);
            for (int j = 0; j <= i; j++) {
                Node product = graph.multiply(scaled, direction.get(j));
                components[i][j] = i == j ? graph.add(diagonal.get(i), product) : product;
                components[j][i] = components[i][j];
            }
        }
        return components;
    }

    @Override
    public List<Node> raise(List<Node> covector) {
        Node along = along(covector);
        Node scaled = graph.multiply(weight, along);
        graph.keep(scaled);
        List<Node> raised = new ArrayList<>();
        for (int i = 0; i < diagonal.size(); i++) {
            raised.add(graph.add(
                    graph.multiply(diagonal.get(i), covector.get(i)), graph.multiply(scaled, direction.get(i))));
        }
        return raised;
    }

    private Node along(List<Node> covector) {
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < diagonal.size(); i++) {
            terms.add(graph.multiply(direction.get(i), covector.get(i)));
        }
        Node along = graph.sum(terms);
        graph.keep(along);
        return along;
    }

    @Override
    public Node square(List<Node> covector) {
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < diagonal.size(); i++) {
            terms.add(graph.multiply(diagonal.get(i), graph.power(covector.get(i), 2)));
        }
        terms.add(graph.multiply(weight, graph.power(along(covector), 2)));
        return graph.sum(terms);
    }

    @Override
    public Node determinant() {
        return determinant;
    }
}
