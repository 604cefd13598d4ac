package io.github.gammawright.geometry;

import io.github.gammawright.definition.ElementaryFunction;
import io.github.gammawright.definition.Expression;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import java.util.HashMap;
import java.util.Map;

/** Builds the value of a syntax tree in a graph; names stand for the nodes that they were given. */
final class ExpressionTranslator {

    private final ExpressionGraph graph;
    private final Map<String, Node> names = new HashMap<>();

    ExpressionTranslator(ExpressionGraph graph) {
        this.graph = graph;
    }

    void define(String name, Node node) {
        names.put(name, node);
    }

    boolean defines(String name) {
        return names.containsKey(name);
    }

    /**
     * The value of an expression.
     *
     * @throws UndefinedValueException where something is divided by what is identically zero, or a root is taken of a
     *     negative number
     */
    Node translate(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return graph.constant(number.value());
        }
        if (expression instanceof Expression.Pi) {
            return graph.pi();
        }
        if (expression instanceof Expression.Name name) {
            Node node = names.get(name.name());
            if (node == null) {
                throw new IllegalArgumentException("no value for " + name.name());
            }
            return node;
        }
        if (expression instanceof Expression.Negation negation) {
            return graph.negate(translate(negation.operand()));
        }
        if (expression instanceof Expression.Binary binary) {
            return combine(binary.operator(), translate(binary.left()), translate(binary.right()), binary.position());
        }
        Expression.Call call = (Expression.Call) expression;
        Node[] arguments = call.arguments().stream().map(this::translate).toArray(Node[]::new);
        try {
            return graph.call(function(call.function()), arguments);
        } catch (ArithmeticException e) {
            throw new UndefinedValueException(e.getMessage(), call.position(), e);
        }
    }

    Node combine(Expression.Operator operator, Node left, Node right, SourcePosition position) {
        try {
            return switch (operator) {
                case ADD -> graph.add(left, right);
                case SUBTRACT -> graph.subtract(left, right);
                case MULTIPLY -> graph.multiply(left, right);
                case DIVIDE -> graph.divide(left, right);
                case POWER -> graph.power(left, right);
            };
        } catch (ArithmeticException e) {
            throw new UndefinedValueException(e.getMessage(), position, e);
        }
    }

    private static RealFunction function(ElementaryFunction function) {
        return switch (function) {
            case SIN -> RealFunction.SIN;
            case COS -> RealFunction.COS;
            case TAN -> RealFunction.TAN;
            case ASIN -> RealFunction.ASIN;
            case ACOS -> RealFunction.ACOS;
            case ATAN -> RealFunction.ATAN;
            case ATAN2 -> RealFunction.ATAN2;
            case SINH -> RealFunction.SINH;
            case COSH -> RealFunction.COSH;
            case TANH -> RealFunction.TANH;
            case ASINH -> RealFunction.ASINH;
            case ACOSH -> RealFunction.ACOSH;
            case ATANH -> RealFunction.ATANH;
            case EXP -> RealFunction.EXP;
            case LOG -> RealFunction.LOG;
            case SQRT -> RealFunction.SQRT;
            case ABS -> RealFunction.ABS;
        };
    }
}
