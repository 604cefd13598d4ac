package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import org.hipparchus.fraction.BigFraction;

/** √|det g| from a determinant. */
public final class VolumeElement {

    private VolumeElement() {}

    /** The root of the absolute value, taken factor by factor, so that squares lose their root. */
    public static Node of(ExpressionGraph graph, Node determinant) {
        if (determinant instanceof Node.Multiple multiple) {
            return graph.multiply(
                    graph.sqrt(graph.constant(multiple.coefficient().abs())), of(graph, multiple.node()));
        }
        if (determinant instanceof Node.Product product) {
            return graph.product(
                    product.operands().stream().map(factor -> of(graph, factor)).toList());
        }
        if (determinant instanceof Node.Power power) {
            return graph.power(
                    graph.call(RealFunction.ABS, power.base()), power.exponent().divide(BigFraction.TWO));
        }
        return graph.sqrt(graph.call(RealFunction.ABS, determinant));
    }
}
