package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/** An inverse metric that is known by its components. */
final class ComponentInverse implements InverseMetric {

    private final ExpressionGraph graph;
    private final Node[][] components;
    private final Node determinant;

    ComponentInverse(ExpressionGraph graph, Node[][] components, Node determinant) {
        this.graph = graph;
        this.components = components;
        this.determinant = determinant;
    }

    @Override
    public Node[][] components() {
        return components;
    }

    @Override
    public List<Node> raise(List<Node> covector) {
        List<Node> raised = new ArrayList<>();
        for (Node[] row : components) {
            List<Node> terms = new ArrayList<>();
            for (int j = 0; j < row.length; j++) {
                terms.add(graph.multiply(row[j], covector.get(j)));
            }
            raised.add(graph.sum(terms));
        }
        return raised;
    }

    @Override
    public Node square(List<Node> covector) {
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < components.length; i++) {
            for (int j = 0; j <= i; j++) {
                Node term = graph.product(List.of(components[i][j], covector.get(i), covector.get(j)));
                terms.add(i == j ? term : graph.multiple(BigFraction.TWO, term));
            }
        }
        return graph.sum(terms);
    }

    @Override
    public Node determinant() {
        return determinant;
    }
}
