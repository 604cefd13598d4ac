package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.function.Predicate;

/**
 * A square root that all components of a quantity have in common: each is free of it when divided by root^exponent.
 *
 * @param radicand what it is the root of
 * @param positive whether that is positive in the whole domain; otherwise its absolute value counts
 * @param exponent 1 or −1
 */
public record CommonRoot(Node radicand, boolean positive, int exponent) {

    /**
     * root^exponent of a form of the radicand, perhaps in another graph.
     *
     * @param notNegative tells of values that they are certainly not negative
     */
    public Node power(ExpressionGraph graph, Node form, Predicate<Node> notNegative) {
        Node root = positive ? PositiveRoot.of(graph, form, notNegative) : VolumeElement.of(graph, form, notNegative);
        return graph.power(root, exponent);
    }
}
