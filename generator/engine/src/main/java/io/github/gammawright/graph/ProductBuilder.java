package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/** Collects the factors of a product as powers of bases. */
final class ProductBuilder {

    private final ExpressionGraph graph;
    private final Map<Node, BigFraction> exponents = new LinkedHashMap<>();
    private BigFraction coefficient = BigFraction.ONE;

    ProductBuilder(ExpressionGraph graph) {
        this.graph = graph;
    }

    void multiplyBy(Node factor) {
        if (factor instanceof Node.Constant constant) {
            coefficient = coefficient.multiply(constant.value());
        } else if (factor instanceof Node.Multiple multiple) {
            coefficient = coefficient.multiply(multiple.coefficient());
            multiplyBy(multiple.node());
        } else if (factor instanceof Node.Product && !graph.isKept(factor)) {
            factor.operands().forEach(this::multiplyBy);
        } else if (factor instanceof Node.Power power && !graph.isKept(factor)) {
            exponents.merge(power.base(), power.exponent(), BigFraction::add);
        } else {
            exponents.merge(factor, BigFraction.ONE, BigFraction::add);
        }
    }

    Node build() {
        if (coefficient.signum() == 0) {
            return graph.zero();
        }
        List<Node> factors = new ArrayList<>();
        boolean again = false;
        for (Map.Entry<Node, BigFraction> entry : exponents.entrySet()) {
            if (entry.getValue().signum() == 0) {
                continue;
            }
            Node power = graph.power(entry.getKey(), entry.getValue());
            // a power can turn out to be another known value, which is then taken apart in turn
            boolean plain = power == entry.getKey()
                    || (power instanceof Node.Power p
                            && p.base() == entry.getKey()
                            && p.exponent().equals(entry.getValue()));
            again |= !plain;
            factors.add(power);
        }
        if (!again) {
            return graph.multiple(coefficient, graph.primitiveProduct(factors));
        }
        ProductBuilder flat = new ProductBuilder(graph);
        factors.forEach(flat::multiplyBy);
        return graph.multiple(coefficient.multiply(flat.coefficient), graph.primitiveProduct(flat.factorsOnce()));
    }

    /** The factors without looking again at what their powers became, so that the building ends. */
    private List<Node> factorsOnce() {
        List<Node> factors = new ArrayList<>();
        for (Map.Entry<Node, BigFraction> entry : exponents.entrySet()) {
            if (entry.getValue().signum() != 0) {
                Node power = graph.power(entry.getKey(), entry.getValue());
                if (power instanceof Node.Constant constant) {
                    coefficient = coefficient.multiply(constant.value());
                } else if (power instanceof Node.Multiple multiple) {
                    coefficient = coefficient.multiply(multiple.coefficient());
                    factors.add(multiple.node());
                } else {
                    factors.add(power);
                }
            }
        }
        return factors;
    }
}
