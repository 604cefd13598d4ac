package io.github.gammawright.graph;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/** The rules by which powers are brought to their simplest form. */
final class Powers {

    private Powers() {}

    static Node power(ExpressionGraph graph, Node base, BigFraction exponent) {
        if (exponent.signum() == 0) {
            return graph.one();
        }
        if (exponent.equals(BigFraction.ONE)) {
            return base;
        }
        boolean whole = isWhole(exponent);
        if (base instanceof Node.Constant constant) {
            return constantPower(graph, constant, exponent);
        }
        if (base instanceof Node.Multiple multiple
                && (whole || multiple.coefficient().signum() > 0)) {
            Node factor = power(graph, graph.constant(multiple.coefficient()), exponent);
            return graph.multiply(factor, power(graph, multiple.node(), exponent));
        }
        if (base instanceof Node.Product && whole && !graph.isKept(base)) {
            List<Node> factors = new ArrayList<>();
            for (Node factor : base.operands()) {
                factors.add(power(graph, factor, exponent));
            }
            return graph.product(factors);
        }
        if (base instanceof Node.Power inner && !graph.isKept(base)) {
            boolean even = isWhole(inner.exponent())
                    && !inner.exponent().getNumerator().testBit(0);
            if (whole || !even) {
                return power(graph, inner.base(), inner.exponent().multiply(exponent));
            }
            return power(
                    graph,
                    graph.call(RealFunction.ABS, inner.base()),
                    inner.exponent().multiply(exponent));
        }
        if (base instanceof Node.Call call
                && call.function() == RealFunction.ABS
                && whole
                && !exponent.getNumerator().testBit(0)) {
            return power(graph, call.operands().get(0), exponent);
        }
        return graph.primitivePower(base, exponent);
    }

    private static Node constantPower(ExpressionGraph graph, Node.Constant constant, BigFraction exponent) {
        BigFraction value = constant.value();
        if (value.signum() == 0) {
            if (exponent.signum() < 0) {
                throw new ArithmeticException("division by zero");
            }
            return graph.zero();
        }
        if (value.equals(BigFraction.ONE)) {
            return graph.one();
        }
        BigInteger numerator = exponent.getNumerator();
        BigInteger denominator = exponent.getDenominator();
        if (numerator.bitLength() > 31 || denominator.bitLength() > 15) {
            return graph.primitivePower(constant, exponent);
        }
        int root = denominator.intValueExact();
        if (root > 1) {
            if (value.signum() < 0) {
                throw new ArithmeticException("root of a negative number");
            }
            BigInteger top = exactRoot(value.getNumerator(), root);
            BigInteger bottom = exactRoot(value.getDenominator(), root);
            if (top == null || bottom == null) {
                return graph.primitivePower(constant, exponent);
            }
            value = new BigFraction(top, bottom);
        }
        long bits = Math.max(
                        value.getNumerator().bitLength(), value.getDenominator().bitLength())
                * numerator.abs().longValue();
        if (bits > 20_000) {
            return graph.primitivePower(graph.constant(value), new BigFraction(numerator));
        }
        return graph.constant(value.pow(numerator.intValueExact()));
    }

    /** The exact root, or null where there is none. */
    private static BigInteger exactRoot(BigInteger value, int degree) {
        BigInteger root = degree == 2
                ? value.sqrt()
                : BigInteger.valueOf(Math.round(StrictMath.pow(value.doubleValue(), 1.0 / degree)));
        if (value.bitLength() > 900) {
            return null;
        }
        return root.pow(degree).equals(value) ? root : null;
    }

    static Node power(ExpressionGraph graph, Node base, Node exponent) {
        if (exponent instanceof Node.Constant constant) {
            return power(graph, base, constant.value());
        }
        if (base.isOne()) {
            return base;
        }
        if (!graph.isParameterOnly(exponent)) {
            return graph.call(RealFunction.EXP, graph.multiply(exponent, graph.call(RealFunction.LOG, base)));
        }
        // b^(e + q) = b^e · b^q, so that b^e is shared by all of them
        BigFraction rest = BigFraction.ZERO;
        Node symbolic = exponent;
        if (exponent instanceof Node.Sum sum && sum.constant().signum() != 0) {
            rest = sum.constant();
            symbolic = graph.subtract(exponent, graph.constant(rest));
        } else if (exponent instanceof Node.Multiple multiple && multiple.node() instanceof Node.Sum sum) {
            rest = sum.constant().multiply(multiple.coefficient());
            symbolic = graph.subtract(exponent, graph.constant(rest));
        }
        Node power = symbolicPower(graph, base, symbolic);
        return rest.signum() == 0 ? power : graph.multiply(power, power(graph, base, rest));
    }

    private static Node symbolicPower(ExpressionGraph graph, Node base, Node exponent) {
        if (base instanceof Node.Multiple multiple && multiple.coefficient().signum() > 0) {
            Node factor = graph.primitiveParameterPower(graph.constant(multiple.coefficient()), exponent);
            return graph.multiply(factor, symbolicPower(graph, multiple.node(), exponent));
        }
        if (base instanceof Node.Power inner) {
            boolean even = isWhole(inner.exponent())
                    && !inner.exponent().getNumerator().testBit(0);
            Node root = even ? graph.call(RealFunction.ABS, inner.base()) : inner.base();
            return power(graph, root, graph.multiple(inner.exponent(), exponent));
        }
        if (exponent instanceof Node.Multiple multiple && isWhole(multiple.coefficient())) {
            Node once = symbolicPower(graph, base, multiple.node());
            return power(graph, once, multiple.coefficient());
        }
        return graph.primitiveParameterPower(base, exponent);
    }

    private static boolean isWhole(BigFraction fraction) {
        return fraction.getDenominator().equals(BigInteger.ONE);
    }
}
