package io.github.gammawright.geometry;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.geometry.MetricGraph.WeightedSquare;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads line elements and one-forms: expressions in which some names are differentials. */
final class FormTranslator {

    private final ExpressionGraph graph;
    private final ExpressionTranslator scalars;
    private final int dimension;
    private final Map<String, Form> differentials = new HashMap<>();

    FormTranslator(ExpressionGraph graph, ExpressionTranslator scalars, int dimension) {
        this.graph = graph;
        this.scalars = scalars;
        this.dimension = dimension;
    }

    /** Lets a name stand for a one-form. */
    void define(String differential, Form form) {
        differentials.put(differential, form);
    }

    Form translate(Expression expression) {
        if (!mentionsDifferentials(expression)) {
            return Form.scalar(scalars.translate(expression));
        }
        if (expression instanceof Expression.Name name) {
            return differentials.get(name.name());
        }
        if (expression instanceof Expression.Negation negation) {
            return translate(negation.operand()).times(graph, graph.constant(-1));
        }
        if (expression instanceof Expression.Binary binary) {
            Form left = translate(binary.left());
            return switch (binary.operator()) {
                case ADD -> left.plus(graph, translate(binary.right()));
                case SUBTRACT -> left.plus(graph, translate(binary.right()).times(graph, graph.constant(-1)));
                case MULTIPLY -> left.times(graph, translate(binary.right()));
                case DIVIDE ->
                    left.times(
                            graph,
                            scalars.combine(
                                    Expression.Operator.DIVIDE,
                                    graph.one(),
                                    scalars.translate(binary.right()),
                                    binary.position()));
                case POWER -> power(left, binary.right());
            };
        }
        throw new IllegalArgumentException("a differential inside a function");
    }

    private Form power(Form base, Expression exponent) {
        Node value = scalars.translate(exponent);
        if (value.isOne()) {
            return base;
        }
        if (value.isZero()) {
            return Form.scalar(graph.one());
        }
        if (value.equals(graph.constant(2))) {
            return base.times(graph, base);
        }
        throw new IllegalArgumentException("a power of differentials that is not their square");
    }

    /** The expression as a sum of weighted squares of one-forms, if its author wrote it as one. */
    Optional<List<WeightedSquare>> squares(Expression expression) {
        List<WeightedSquare> squares = new ArrayList<>();
        return collect(expression, graph.one(), squares) ? Optional.of(squares) : Optional.empty();
    }

    private boolean collect(Expression expression, Node weight, List<WeightedSquare> squares) {
        if (expression instanceof Expression.Negation negation) {
            return collect(negation.operand(), graph.negate(weight), squares);
        }
        if (!(expression instanceof Expression.Binary binary)) {
            return false;
        }
        switch (binary.operator()) {
            case ADD, SUBTRACT -> {
                Node right = binary.operator() == Expression.Operator.ADD ? weight : graph.negate(weight);
                return collect(binary.left(), weight, squares) && collect(binary.right(), right, squares);
            }
            case MULTIPLY -> {
                if (!mentionsDifferentials(binary.left())) {
                    return collect(binary.right(), graph.multiply(weight, scalars.translate(binary.left())), squares);
                }
                if (!mentionsDifferentials(binary.right())) {
                    return collect(binary.left(), graph.multiply(weight, scalars.translate(binary.right())), squares);
                }
                return false;
            }
            case DIVIDE -> {
                return collect(binary.left(), graph.divide(weight, scalars.translate(binary.right())), squares);
            }
            case POWER -> {
                Form base = translate(binary.left());
                boolean oneForm = base.terms().keySet().stream().allMatch(d -> d.degree() == 1);
                if (!oneForm || !scalars.translate(binary.right()).equals(graph.constant(2))) {
                    return false;
                }
                squares.add(square(weight, base));
                return true;
            }
        }
        return false;
    }

    WeightedSquare square(Node weight, Form oneForm) {
        List<Node> coefficients = new ArrayList<>();
        for (int i = 0; i < dimension; i++) {
            coefficients.add(oneForm.linear(graph, i));
        }
        return new WeightedSquare(weight, coefficients);
    }

    private boolean mentionsDifferentials(Expression expression) {
        if (expression instanceof Expression.Name name) {
            return differentials.containsKey(name.name()) && !scalars.defines(name.name());
        }
        if (expression instanceof Expression.Negation negation) {
            return mentionsDifferentials(negation.operand());
        }
        if (expression instanceof Expression.Binary binary) {
            return mentionsDifferentials(binary.left()) || mentionsDifferentials(binary.right());
        }
        if (expression instanceof Expression.Call call) {
            return call.arguments().stream().anyMatch(this::mentionsDifferentials);
        }
        return false;
    }
}
