package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/** The square root of a value that is positive in the whole domain. */
final class PositiveRoot {

    private PositiveRoot() {}

    /** Even powers are halved; what remains is under one root. */
    static Node of(ExpressionGraph graph, Node value) {
        List<Node> halved = new ArrayList<>();
        List<Node> rest = new ArrayList<>();
        collect(graph, value, halved, rest);
        halved.add(graph.sqrt(graph.product(rest)));
        return graph.product(halved);
    }

    private static void collect(ExpressionGraph graph, Node value, List<Node> halved, List<Node> rest) {
        if (value instanceof Node.Multiple multiple) {
            rest.add(graph.constant(multiple.coefficient()));
            collect(graph, multiple.node(), halved, rest);
        } else if (value instanceof Node.Product product) {
            product.operands().forEach(factor -> collect(graph, factor, halved, rest));
        } else if (value instanceof Node.Power power && isEven(power.exponent())) {
            Node base = graph.call(RealFunction.ABS, power.base());
            halved.add(graph.power(base, power.exponent().divide(BigFraction.TWO)));
        } else {
            rest.add(value);
        }
    }

    private static boolean isEven(BigFraction exponent) {
        return exponent.getDenominator().equals(BigInteger.ONE)
                && !exponent.getNumerator().testBit(0);
    }
}
