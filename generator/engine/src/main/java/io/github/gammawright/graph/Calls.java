package io.github.gammawright.graph;

import java.util.List;
import org.hipparchus.fraction.BigFraction;

/** The rules by which function calls are brought to their simplest form. */
final class Calls {

    /** Multiples of an angle up to this are reduced to the angle itself. */
    private static final int LARGEST_MULTIPLE_ANGLE = 4;

    private Calls() {}

    static Node call(ExpressionGraph graph, RealFunction function, Node... arguments) {
        if (arguments.length != function.arity()) {
            throw new IllegalArgumentException(
                    function.symbol() + " takes " + function.arity() + " arguments, not " + arguments.length);
        }
        Node x = arguments[0];
        return switch (function) {
            case SQRT -> graph.sqrt(x);
            case CBRT -> graph.power(x, new BigFraction(1, 3));
            case POW -> graph.power(x, arguments[1]);
            case TAN -> graph.divide(call(graph, RealFunction.SIN, x), call(graph, RealFunction.COS, x));
            case SIN, COS -> trigonometric(graph, function, x);
            case SINH, TANH, ASINH, ATANH, ASIN, ATAN -> odd(graph, function, x);
            case COSH -> x.isZero() ? graph.one() : graph.primitiveCall(function, List.of(unsigned(graph, x)));
            case EXP -> exponential(graph, x);
            case LOG -> logarithm(graph, x);
            case ABS -> absolute(graph, x);
            case SIGNUM -> sign(graph, x);
            case ACOS, ACOSH, ATAN2 -> graph.primitiveCall(function, List.of(arguments));
        };
    }

    private static Node logarithm(ExpressionGraph graph, Node x) {
        if (x.isOne()) {
            return graph.zero();
        }
        return isCall(x, RealFunction.EXP) ? x.operands().get(0) : graph.primitiveCall(RealFunction.LOG, List.of(x));
    }

    private static Node sign(ExpressionGraph graph, Node x) {
        if (x instanceof Node.Constant constant) {
            return graph.constant(constant.value().signum());
        }
        if (isNegative(x)) {
            return graph.negate(sign(graph, graph.negate(x)));
        }
        return graph.primitiveCall(
                RealFunction.SIGNUM, List.of(x instanceof Node.Multiple multiple ? multiple.node() : x));
    }

    private static Node exponential(ExpressionGraph graph, Node x) {
        if (x.isZero()) {
            return graph.one();
        }
        if (isCall(x, RealFunction.LOG)) {
            return x.operands().get(0);
        }
        if (x instanceof Node.Multiple multiple && isCall(multiple.node(), RealFunction.LOG)) {
            return graph.power(multiple.node().operands().get(0), multiple.coefficient());
        }
        // e^(−x) is a reciprocal, e^(nx) a power, so that one exponential serves them all
        if (x instanceof Node.Multiple multiple
                && multiple.coefficient().getDenominator().equals(java.math.BigInteger.ONE)
                && multiple.coefficient().getNumerator().bitLength() < 7) {
            return graph.power(call(graph, RealFunction.EXP, multiple.node()), multiple.coefficient());
        }
        return graph.primitiveCall(RealFunction.EXP, List.of(x));
    }

    private static Node absolute(ExpressionGraph graph, Node x) {
        if (x instanceof Node.Constant constant) {
            return graph.constant(constant.value().abs());
        }
        if (x instanceof Node.Multiple multiple) {
            return graph.multiple(multiple.coefficient().abs(), absolute(graph, multiple.node()));
        }
        boolean neverNegative = isCall(x, RealFunction.ABS)
                || isCall(x, RealFunction.EXP)
                || isCall(x, RealFunction.COSH)
                || x instanceof Node.ParameterPower
                || (x instanceof Node.Power power
                        && (!power.exponent().getDenominator().equals(java.math.BigInteger.ONE)
                                || !power.exponent().getNumerator().testBit(0)));
        return neverNegative ? x : graph.primitiveCall(RealFunction.ABS, List.of(x));
    }

    private static Node odd(ExpressionGraph graph, RealFunction function, Node x) {
        if (x.isZero()) {
            return x;
        }
        if (isNegative(x)) {
            return graph.negate(graph.primitiveCall(function, List.of(graph.negate(x))));
        }
        return graph.primitiveCall(function, List.of(x));
    }

    private static Node trigonometric(ExpressionGraph graph, RealFunction function, Node angle) {
        if (angle.isZero()) {
            return function == RealFunction.SIN ? angle : graph.one();
        }
        if (isNegative(angle)) {
            Node opposite = trigonometric(graph, function, graph.negate(angle));
            return function == RealFunction.SIN ? graph.negate(opposite) : opposite;
        }
        if (angle instanceof Node.Multiple multiple
                && multiple.coefficient().getDenominator().equals(java.math.BigInteger.ONE)
                && multiple.coefficient().intValue() <= LARGEST_MULTIPLE_ANGLE
                && !graph.isParameterOnly(angle)) {
            int n = multiple.coefficient().intValue();
            Node sin = trigonometric(graph, RealFunction.SIN, multiple.node());
            Node cos = trigonometric(graph, RealFunction.COS, multiple.node());
            return multipleAngle(graph, function, n, sin, cos);
        }
        return graph.primitiveCall(function, List.of(angle));
    }

    private static Node multipleAngle(ExpressionGraph graph, RealFunction function, int n, Node sin, Node cos) {
        Node twiceSin = graph.multiple(BigFraction.TWO, graph.multiply(sin, cos));
        Node twiceCos = graph.subtract(graph.one(), graph.multiple(BigFraction.TWO, graph.power(sin, 2)));
        if (n == 2) {
            return function == RealFunction.SIN ? twiceSin : twiceCos;
        }
        if (n == 3) {
            return function == RealFunction.SIN
                    ? graph.add(graph.multiply(twiceSin, cos), graph.multiply(twiceCos, sin))
                    : graph.subtract(graph.multiply(twiceCos, cos), graph.multiply(twiceSin, sin));
        }
        return multipleAngle(graph, function, 2, twiceSin, twiceCos);
    }

    private static boolean isCall(Node node, RealFunction function) {
        return node instanceof Node.Call call && call.function() == function;
    }

    private static boolean isNegative(Node node) {
        return node instanceof Node.Constant constant
                ? constant.value().signum() < 0
                : node instanceof Node.Multiple multiple
                        && multiple.coefficient().signum() < 0;
    }

    private static Node unsigned(ExpressionGraph graph, Node node) {
        return isNegative(node) ? graph.negate(node) : node;
    }
}
