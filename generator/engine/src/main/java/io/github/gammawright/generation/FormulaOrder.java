package io.github.gammawright.generation;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.hipparchus.fraction.BigFraction;

/**
 * The order in which a reader expects factors and terms: numbers, parameters, coordinates, the author's abbreviations,
 * sums, functions; and of terms the one of highest degree in the coordinates first.
 */
final class FormulaOrder {

    private final ExpressionGraph graph;
    private final Map<Node, BigFraction> coordinateDegrees = new HashMap<>();
    private final Map<Node, BigFraction> parameterDegrees = new HashMap<>();

    FormulaOrder(ExpressionGraph graph) {
        this.graph = graph;
    }

    /** The order of the factors of a product. */
    Comparator<Node> factors() {
        return Comparator.comparingInt(this::rank)
                .thenComparingInt(FormulaOrder::position)
                .thenComparing(FormulaOrder::derivative)
                .thenComparingInt(Node::id);
    }

    /** The order of the terms of a sum. */
    Comparator<FormulaTerm> terms() {
        return Comparator.comparing((FormulaTerm term) -> degree(term, coordinateDegrees, Symbol.Kind.COORDINATE))
                .reversed()
                .thenComparing(term -> degree(term, parameterDegrees, Symbol.Kind.PARAMETER), Comparator.reverseOrder())
                .thenComparing(this::byFactors);
    }

    private int byFactors(FormulaTerm a, FormulaTerm b) {
        List<Node> left = a.exponents().keySet().stream().sorted(factors()).toList();
        List<Node> right = b.exponents().keySet().stream().sorted(factors()).toList();
        for (int i = 0; i < Math.min(left.size(), right.size()); i++) {
            int order = factors().compare(left.get(i), right.get(i));
            if (order == 0) {
                order = b.exponents().get(right.get(i)).compareTo(a.exponents().get(left.get(i)));
            }
            if (order != 0) {
                return order;
            }
        }
        return Integer.compare(left.size(), right.size());
    }

    private int rank(Node node) {
        if (graph.nameOf(node).isPresent()) {
            return 7;
        }
        if (node instanceof Node.Constant || node instanceof Node.Pi) {
            return 0;
        }
        if (node instanceof Node.Leaf leaf) {
            return switch (leaf.symbol().kind()) {
                case PARAMETER -> 1;
                case COORDINATE -> 2;
                case CALLER_FUNCTION -> 3;
                case VELOCITY, COORDINATE_VELOCITY, MOMENTUM -> 10;
                case VECTOR, SEPARATION -> 11;
            };
        }
        return node instanceof Node.Sum ? 8 : node instanceof Node.Call ? 9 : 6;
    }

    private static int position(Node node) {
        if (node instanceof Node.Leaf leaf) {
            return leaf.symbol().index();
        }
        // sines before cosines, whichever was built first
        return node instanceof Node.Call call ? call.function().ordinal() : 0;
    }

    private static String derivative(Node node) {
        return node instanceof Node.Leaf leaf ? leaf.symbol().orders().toString() : "";
    }

    private BigFraction degree(FormulaTerm term, Map<Node, BigFraction> known, Symbol.Kind kind) {
        BigFraction total = BigFraction.ZERO;
        for (Map.Entry<Node, BigFraction> factor : term.exponents().entrySet()) {
            total = total.add(degree(factor.getKey(), known, kind).multiply(factor.getValue()));
        }
        return total;
    }

    private BigFraction degree(Node node, Map<Node, BigFraction> known, Symbol.Kind kind) {
        if (!known.containsKey(node)) {
            // by rising number and not by recursion, since a graph may be deeper than the stack
            TreeSet<Node> unknown = new TreeSet<>(Comparator.comparingInt(Node::id));
            List<Node> pending = new ArrayList<>(List.of(node));
            while (!pending.isEmpty()) {
                Node next = pending.remove(pending.size() - 1);
                if (!known.containsKey(next) && unknown.add(next)) {
                    pending.addAll(next.operands());
                }
            }
            for (Node next : unknown) {
                known.put(next, degreeFromOperands(next, known, kind));
            }
        }
        return known.get(node);
    }

    /** The degree in the symbols of a kind, that of a sum being the largest among its terms. */
    private static BigFraction degreeFromOperands(Node node, Map<Node, BigFraction> known, Symbol.Kind kind) {
        if (node instanceof Node.Leaf leaf) {
            return leaf.symbol().kind() == kind ? BigFraction.ONE : BigFraction.ZERO;
        }
        if (node instanceof Node.Multiple multiple) {
            return known.get(multiple.node());
        }
        if (node instanceof Node.Product) {
            return node.operands().stream().map(known::get).reduce(BigFraction.ZERO, BigFraction::add);
        }
        if (node instanceof Node.Power power) {
            return known.get(power.base()).multiply(power.exponent());
        }
        if (node instanceof Node.Sum sum) {
            BigFraction largest = sum.operands().stream()
                    .map(known::get)
                    .max(Comparator.naturalOrder())
                    .orElseThrow();
            return sum.constant().signum() != 0 && largest.signum() < 0 ? BigFraction.ZERO : largest;
        }
        return BigFraction.ZERO;
    }
}
