package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import org.hipparchus.fraction.BigFraction;

/** The square root of a value that is positive in the whole domain. */
final class PositiveRoot {

    private final ExpressionGraph graph;
    private final Predicate<Node> notNegative;
    private final List<Node> halved = new ArrayList<>();
    private final List<Node> rest = new ArrayList<>();

    private PositiveRoot(ExpressionGraph graph, Predicate<Node> notNegative) {
        this.graph = graph;
        this.notNegative = notNegative;
    }

    /**
     * Even powers are halved; what remains is under one root.
     *
     * @param notNegative tells of values that they are certainly not negative
     */
    static Node of(ExpressionGraph graph, Node value, Predicate<Node> notNegative) {
        PositiveRoot root = new PositiveRoot(graph, notNegative);
        root.collect(value);
        root.halved.add(graph.sqrt(graph.product(root.rest)));
        return graph.product(root.halved);
    }

    private void collect(Node value) {
        if (value instanceof Node.Multiple multiple) {
            rest.add(graph.constant(multiple.coefficient()));
            collect(multiple.node());
        } else if (value instanceof Node.Product product) {
            product.operands().forEach(this::collect);
        } else if (value instanceof Node.Power power && isEven(power.exponent())) {
            Node base = notNegative.test(power.base()) ? power.base() : graph.call(RealFunction.ABS, power.base());
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
