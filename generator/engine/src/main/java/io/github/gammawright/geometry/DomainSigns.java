package io.github.gammawright.geometry;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.Symbol;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/**
 * Signs that values certainly have in the whole domain of a definition, by intervals: from conditions that bound one
 * name by numbers, such as {@code 0 < theta < pi}, and from squares. What cannot be told so has no certain sign.
 */
public final class DomainSigns {

    private static final Interval ALL = new Interval(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    private static final Interval NOT_NEGATIVE = new Interval(0, Double.POSITIVE_INFINITY);
    private static final double QUARTER = 0.5 * Math.PI;

    private final Map<String, Interval> names = new HashMap<>();
    private final Map<Node, Interval> known = new HashMap<>();

    /** What holds in the domain of a definition. */
    public DomainSigns(MetricDefinition definition) {
        for (MetricDefinition.Condition condition : definition.domain().conditions()) {
            for (int i = 0; i < condition.comparisons().size(); i++) {
                Expression left = condition.operands().get(i);
                Expression right = condition.operands().get(i + 1);
                boolean rising = switch (condition.comparisons().get(i)) {
                    case LESS, LESS_OR_EQUAL -> true;
                    case GREATER, GREATER_OR_EQUAL -> false;
                };
                bound(rising ? left : right, rising ? right : left, definition);
            }
        }
    }

    private void bound(Expression low, Expression high, MetricDefinition definition) {
        if (high instanceof Expression.Name name && isSymbol(name, definition) && isNumber(low)) {
            narrow(name.name(), new Interval(number(low), Double.POSITIVE_INFINITY));
        }
        if (low instanceof Expression.Name name && isSymbol(name, definition) && isNumber(high)) {
            narrow(name.name(), new Interval(Double.NEGATIVE_INFINITY, number(high)));
        }
    }

    private void narrow(String name, Interval bounds) {
        names.merge(name, bounds, (a, b) -> new Interval(Math.max(a.low(), b.low()), Math.min(a.high(), b.high())));
    }

    private static boolean isSymbol(Expression.Name name, MetricDefinition definition) {
        return definition.coordinates().contains(name.name())
                || definition.parameters().stream().anyMatch(p -> p.name().equals(name.name()));
    }

    private static boolean isNumber(Expression expression) {
        if (expression instanceof Expression.Binary binary) {
            return isNumber(binary.left()) && isNumber(binary.right());
        }
        if (expression instanceof Expression.Negation negation) {
            return isNumber(negation.operand());
        }
        return expression instanceof Expression.Number || expression instanceof Expression.Pi;
    }

    /** The double that a condition compares with. */
    private static double number(Expression expression) {
        ExpressionGraph graph = new ExpressionGraph(SamplePoints.arbitrary(1));
        return graph.realValues(new ExpressionTranslator(graph).translate(expression))[0];
    }

    /** Whether a value is certainly nowhere negative in the domain. */
    public boolean isNotNegative(Node value) {
        return interval(value).low() >= 0;
    }

    private record Interval(double low, double high) {

        /** From two bounds of any order and widened against rounding; what is undefined bounds nothing. */
        static Interval widened(double low, double high) {
            return new Interval(
                    Double.isNaN(low) ? Double.NEGATIVE_INFINITY : low == 0 ? 0 : Math.nextDown(low),
                    Double.isNaN(high) ? Double.POSITIVE_INFINITY : high == 0 ? 0 : Math.nextUp(high));
        }

        Interval times(Interval other) {
            double a = product(low, other.low);
            double b = product(low, other.high);
            double c = product(high, other.low);
            double d = product(high, other.high);
            return widened(Math.min(Math.min(a, b), Math.min(c, d)), Math.max(Math.max(a, b), Math.max(c, d)));
        }

        /** 0 · ∞ is 0: the bound 0 holds however large the other factor is. */
        private static double product(double a, double b) {
            return a == 0 || b == 0 ? 0 : a * b;
        }

        Interval plus(Interval other) {
            return widened(low + other.low, high + other.high);
        }

        boolean isWithin(double from, double to) {
            return low >= from && high <= to;
        }
    }

    private static Interval of(BigFraction number) {
        double value = number.doubleValue();
        return Interval.widened(value, value);
    }

    private Interval interval(Node node) {
        Interval interval = known.get(node);
        if (interval == null) {
            interval = compute(node);
            known.put(node, interval);
        }
        return interval;
    }

    private Interval compute(Node node) {
        if (node instanceof Node.Constant constant) {
            return of(constant.value());
        }
        if (node instanceof Node.Pi) {
            return Interval.widened(Math.PI, Math.PI);
        }
        if (node instanceof Node.Leaf leaf) {
            boolean named = leaf.symbol().isParameter() || leaf.symbol().kind() == Symbol.Kind.COORDINATE;
            return named ? names.getOrDefault(leaf.symbol().name(), ALL) : ALL;
        }
        if (node instanceof Node.Multiple multiple) {
            return of(multiple.coefficient()).times(interval(multiple.node()));
        }
        if (node instanceof Node.Sum sum) {
            Interval total = of(sum.constant());
            for (int i = 0; i < sum.operands().size(); i++) {
                total = total.plus(of(sum.coefficients().get(i))
                        .times(interval(sum.operands().get(i))));
            }
            return total;
        }
        if (node instanceof Node.Product product) {
            Interval total = new Interval(1, 1);
            for (Node factor : product.operands()) {
                total = total.times(interval(factor));
            }
            return total;
        }
        if (node instanceof Node.Power power) {
            boolean even = power.exponent().getDenominator().equals(BigInteger.ONE)
                    && !power.exponent().getNumerator().testBit(0);
            boolean root = !power.exponent().getDenominator().equals(BigInteger.ONE);
            return even || root || isNotNegative(power.base()) ? NOT_NEGATIVE : ALL;
        }
        return node instanceof Node.Call call ? call(call.function(), call.operands()) : NOT_NEGATIVE;
    }

    private Interval call(RealFunction function, List<Node> arguments) {
        Interval x = interval(arguments.get(0));
        return switch (function) {
            case ABS, SQRT, ACOS -> NOT_NEGATIVE;
            case EXP -> NOT_NEGATIVE;
            case COSH -> new Interval(1, Double.POSITIVE_INFINITY);
            case SIN -> x.isWithin(0, Math.PI) ? new Interval(0, 1) : new Interval(-1, 1);
            case COS -> x.isWithin(-QUARTER, QUARTER) ? new Interval(0, 1) : new Interval(-1, 1);
            case SINH, TANH, ASINH, ATAN, CBRT, SIGNUM -> x.low() >= 0 ? NOT_NEGATIVE : ALL;
            default -> ALL;
        };
    }
}
