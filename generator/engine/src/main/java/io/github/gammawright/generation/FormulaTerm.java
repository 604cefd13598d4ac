package io.github.gammawright.generation;

import io.github.gammawright.graph.Node;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Predicate;
import org.hipparchus.fraction.BigFraction;

/**
 * A product taken apart as it is to be written: coefficient · Π base^exponent.
 *
 * @param exponents in the order of the graph, none 0; no base is a constant, multiple, product or power
 */
record FormulaTerm(BigFraction coefficient, Map<Node, BigFraction> exponents) {

    /**
     * A value times a number.
     *
     * @param whole tells which values are not to be taken apart
     */
    static FormulaTerm of(Node node, BigFraction coefficient, Predicate<Node> whole) {
        Collector collector = new Collector(whole);
        collector.coefficient = coefficient;
        collector.multiplyBy(node, BigFraction.ONE, true);
        collector.exponents.values().removeIf(exponent -> exponent.signum() == 0);
        return new FormulaTerm(collector.coefficient, collector.exponents);
    }

    private static final class Collector {
        private final Predicate<Node> whole;
        private final Map<Node, BigFraction> exponents = new LinkedHashMap<>();
        private BigFraction coefficient;

        Collector(Predicate<Node> whole) {
            this.whole = whole;
        }

        void multiplyBy(Node node, BigFraction exponent, boolean top) {
            boolean integer = exponent.getDenominator().equals(java.math.BigInteger.ONE);
            if (!top && whole.test(node)) {
                exponents.merge(node, exponent, BigFraction::add);
            } else if (node instanceof Node.Constant constant && exponent.equals(BigFraction.ONE)) {
                coefficient = coefficient.multiply(constant.value());
            } else if (node instanceof Node.Multiple multiple && exponent.equals(BigFraction.ONE)) {
                coefficient = coefficient.multiply(multiple.coefficient());
                multiplyBy(multiple.node(), exponent, false);
            } else if (node instanceof Node.Product && integer) {
                node.operands().forEach(factor -> multiplyBy(factor, exponent, false));
            } else if (node instanceof Node.Power power && exponent.equals(BigFraction.ONE)) {
                multiplyBy(power.base(), power.exponent(), false);
            } else {
                exponents.merge(node, exponent, BigFraction::add);
            }
        }
    }
}
