package io.github.gammawright.algebra;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * coefficient · Π factor^exponent, to be built in any graph.
 *
 * @param factors formulas in the generators and, after these, the abbreviations
 */
record FactoredForm(
        BigFraction coefficient, List<Factor> factors, Generators generators, List<Abbreviation> abbreviations) {

    /** formula^exponent. */
    record Factor(Formula formula, int exponent) {}

    FactoredForm {
        factors = List.copyOf(factors);
    }

    /** How many operations the form takes, abbreviations taken as known. */
    int cost() {
        int cost = Formula.cost(factors.stream().map(Factor::formula).toList());
        for (Factor factor : factors) {
            cost += Integer.bitCount(Math.abs(factor.exponent()))
                    + 31
                    - Integer.numberOfLeadingZeros(Math.abs(factor.exponent()));
        }
        return cost;
    }

    /** The value in the target of a transfer from the graph that the generators belong to. */
    Node build(Transfer transfer) {
        ExpressionGraph graph = transfer.target();
        List<Node> powers = new ArrayList<>();
        for (Factor factor : factors) {
            powers.add(power(factor.formula(), factor.exponent(), transfer));
        }
        return graph.multiple(coefficient, graph.product(powers));
    }

    private Node power(Formula formula, int exponent, Transfer transfer) {
        if (formula instanceof Formula.Monomial monomial) {
            return monomial(monomial, exponent, transfer);
        }
        return transfer.target().power(node(formula, transfer), exponent);
    }

    private Node node(Formula formula, Transfer transfer) {
        ExpressionGraph graph = transfer.target();
        if (formula instanceof Formula.Monomial monomial) {
            return monomial(monomial, 1, transfer);
        }
        List<Node> parts = new ArrayList<>();
        for (Formula part : formula instanceof Formula.Sum sum ? sum.terms() : ((Formula.Product) formula).factors()) {
            parts.add(node(part, transfer));
        }
        return formula instanceof Formula.Sum ? graph.sum(parts) : graph.product(parts);
    }

    private Node monomial(Formula.Monomial monomial, int exponent, Transfer transfer) {
        ExpressionGraph graph = transfer.target();
        List<Node> powers = new ArrayList<>();
        for (int i = 0; i < monomial.exponents().length(); i++) {
            long e = monomial.exponents().getVal(i) * exponent;
            if (e != 0) {
                powers.add(
                        i < generators.size()
                                ? generators.all().get(i).build(transfer, e)
                                : graph.power(
                                        transfer.copy(abbreviations
                                                .get(i - generators.size())
                                                .node()),
                                        (int) e));
            }
        }
        Node coefficient = graph.power(graph.constant(new BigFraction(monomial.coefficient())), exponent);
        return graph.multiply(coefficient, graph.product(powers));
    }
}
