package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import java.util.function.Predicate;
import org.hipparchus.fraction.BigFraction;

/** √|det g| from a determinant. */
public final class VolumeElement {

    private final ExpressionGraph graph;
    private final Predicate<Node> notNegative;

    private VolumeElement(ExpressionGraph graph, Predicate<Node> notNegative) {
        this.graph = graph;
        this.notNegative = notNegative;
    }

    /**
     * The root of the absolute value, taken factor by factor, so that squares lose their root, and what has a certain
     * sign its bars.
     */
    public static Node of(ExpressionGraph graph, Node determinant, DomainSigns signs) {
        return of(graph, determinant, signs::isNotNegative);
    }

    static Node of(ExpressionGraph graph, Node determinant, Predicate<Node> notNegative) {
        return new VolumeElement(graph, notNegative).root(determinant);
    }

    /** The same with nothing known of the domain. */
    public static Node of(ExpressionGraph graph, Node determinant) {
        return new VolumeElement(graph, node -> false).root(determinant);
    }

    private Node root(Node determinant) {
        if (determinant instanceof Node.Multiple multiple) {
            return graph.multiply(
                    graph.sqrt(graph.constant(multiple.coefficient().abs())), root(multiple.node()));
        }
        if (determinant instanceof Node.Product product) {
            return graph.product(product.operands().stream().map(this::root).toList());
        }
        if (determinant instanceof Node.Power power) {
            return graph.power(magnitude(power.base()), power.exponent().divide(BigFraction.TWO));
        }
        return graph.sqrt(magnitude(determinant));
    }

    private Node magnitude(Node value) {
        return notNegative.test(value) ? value : graph.call(RealFunction.ABS, value);
    }
}
