package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.Map;
import java.util.TreeMap;

/**
 * A polynomial of degree 2 at most in the differentials: scalar, one-form and quadratic form in one.
 *
 * @param terms coefficients by the differentials that they stand with: no number, one, or two in rising order
 */
record Form(Map<Differentials, Node> terms) {

    /** The differentials of a term by coordinate number; −1 for none. */
    record Differentials(int first, int second) implements Comparable<Differentials> {

        static final Differentials NONE = new Differentials(-1, -1);

        int degree() {
            return first < 0 ? 0 : second < 0 ? 1 : 2;
        }

        Differentials times(Differentials other) {
            if (degree() == 0) {
                return other;
            }
            if (other.degree() == 0) {
                return this;
            }
            if (degree() + other.degree() > 2) {
                throw new IllegalArgumentException("more than two differentials in a term");
            }
            return new Differentials(Math.min(first, other.first), Math.max(first, other.first));
        }

        @Override
        public int compareTo(Differentials other) {
            return first != other.first ? Integer.compare(first, other.first) : Integer.compare(second, other.second);
        }
    }

    static Form scalar(Node value) {
        return new Form(Map.of(Differentials.NONE, value));
    }

    static Form differential(int coordinate, Node coefficient) {
        return new Form(Map.of(new Differentials(coordinate, -1), coefficient));
    }

    boolean isScalar() {
        return terms.keySet().stream().allMatch(d -> d.degree() == 0);
    }

    Node scalarPart(ExpressionGraph graph) {
        return terms.getOrDefault(Differentials.NONE, graph.zero());
    }

    /** The coefficient of one differential. */
    Node linear(ExpressionGraph graph, int coordinate) {
        return terms.getOrDefault(new Differentials(coordinate, -1), graph.zero());
    }

    /** The coefficient of a product of two differentials, whichever comes first. */
    Node quadratic(ExpressionGraph graph, int i, int j) {
        return terms.getOrDefault(new Differentials(Math.min(i, j), Math.max(i, j)), graph.zero());
    }

    Form plus(ExpressionGraph graph, Form other) {
        Map<Differentials, Node> sum = new TreeMap<>(terms);
        other.terms.forEach((d, node) -> sum.merge(d, node, graph::add));
        return new Form(sum);
    }

    Form times(ExpressionGraph graph, Form other) {
        Map<Differentials, Node> product = new TreeMap<>();
        for (Map.Entry<Differentials, Node> a : new TreeMap<>(terms).entrySet()) {
            for (Map.Entry<Differentials, Node> b : new TreeMap<>(other.terms).entrySet()) {
                product.merge(a.getKey().times(b.getKey()), graph.multiply(a.getValue(), b.getValue()), graph::add);
            }
        }
        return new Form(product);
    }

    Form times(ExpressionGraph graph, Node factor) {
        Map<Differentials, Node> product = new TreeMap<>();
        terms.forEach((d, node) -> product.put(d, graph.multiply(node, factor)));
        return new Form(product);
    }
}
