package io.github.gammawright.generation;

import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.math.BigInteger;
import java.util.List;
import java.util.StringJoiner;
import org.hipparchus.fraction.BigFraction;

/** Formulas for LaTeX's mathematics mode. */
final class LatexNotation implements Notation {

    /** What starts with a function's name must not run into what follows. */
    private static final String APPLIED = "\\left(";

    @Override
    public Piece number(BigInteger value) {
        return Piece.atom(value.toString());
    }

    @Override
    public Piece pi() {
        return Piece.atom("\\pi");
    }

    @Override
    public Piece symbol(Symbol symbol) {
        String name = LatexNames.of(symbol.name());
        return switch (symbol.kind()) {
            case PARAMETER, COORDINATE -> Piece.atom(name);
            case CALLER_FUNCTION -> callerFunction(symbol, name);
            case VELOCITY -> new Piece("u^{" + name + "}", Strength.POWER);
            case MOMENTUM -> Piece.atom("p_{" + name + "}");
            case VECTOR, COORDINATE_VELOCITY -> new Piece("v^{" + name + "}", Strength.POWER);
            case SEPARATION -> new Piece("\\xi^{" + name + "}", Strength.POWER);
        };
    }

    private static Piece callerFunction(Symbol symbol, String name) {
        int total = symbol.orders().stream().mapToInt(Integer::intValue).sum();
        if (total == 0) {
            return Piece.atom(name);
        }
        StringJoiner orders = new StringJoiner(",", "^{(", ")}");
        symbol.orders().forEach(order -> orders.add(order.toString()));
        return new Piece(name + orders, Strength.POWER);
    }

    @Override
    public Piece name(String name) {
        return Piece.atom(LatexNames.of(name));
    }

    @Override
    public Piece sum(List<Signed> terms) {
        StringBuilder text = new StringBuilder();
        for (Signed term : terms) {
            if (text.length() > 0) {
                text.append(term.negative() ? " - " : " + ");
            } else if (term.negative()) {
                text.append('-');
            }
            text.append(atLeast(term.piece(), Strength.PRODUCT));
        }
        return new Piece(text.toString(), Strength.SUM);
    }

    @Override
    public Piece fraction(List<Piece> numerator, List<Piece> denominator) {
        if (denominator.isEmpty()) {
            return numerator.size() == 1
                    ? numerator.get(0)
                    : new Piece(numerator.isEmpty() ? "1" : product(numerator), Strength.PRODUCT);
        }
        String top = numerator.isEmpty() ? "1" : product(numerator);
        return new Piece("\\frac{" + top + "}{" + product(denominator) + "}", Strength.PRODUCT);
    }

    private static String product(List<Piece> factors) {
        if (factors.size() == 1) {
            return factors.get(0).text();
        }
        StringJoiner product = new StringJoiner(" ");
        factors.forEach(factor -> product.add(atLeast(factor, Strength.POWER)));
        return product.toString();
    }

    @Override
    public Piece power(Piece base, BigFraction exponent) {
        BigInteger root = exponent.getDenominator();
        if (exponent.getNumerator().equals(BigInteger.ONE)) {
            return Piece.atom((root.equals(BigInteger.TWO) ? "\\sqrt{" : "\\sqrt[" + root + "]{") + base.text() + "}");
        }
        String text =
                root.equals(BigInteger.ONE) ? exponent.getNumerator().toString() : exponent.getNumerator() + "/" + root;
        return new Piece(atLeast(base, Strength.ATOM) + "^{" + text + "}", Strength.POWER);
    }

    @Override
    public Piece power(Piece base, Signed exponent) {
        return new Piece(atLeast(base, Strength.ATOM) + "^{" + formula(exponent) + "}", Strength.POWER);
    }

    @Override
    public Piece call(RealFunction function, List<Signed> arguments, BigInteger exponent) {
        Signed first = arguments.get(0);
        if (function == RealFunction.EXP) {
            Piece power = power(Piece.atom("\\mathrm{e}"), first);
            return exponent.equals(BigInteger.ONE) ? power : power(power, new BigFraction(exponent));
        }
        if (function == RealFunction.ABS) {
            Piece bars = Piece.atom("\\left|" + formula(first) + "\\right|");
            return exponent.equals(BigInteger.ONE) ? bars : power(bars, new BigFraction(exponent));
        }
        String name = exponent.equals(BigInteger.ONE) ? command(function) : command(function) + "^{" + exponent + "}";
        boolean bare =
                arguments.size() == 1 && !first.negative() && first.piece().strength() == Strength.ATOM;
        if (bare) {
            return new Piece(name + " " + first.piece().text(), Strength.POWER);
        }
        StringJoiner list = new StringJoiner(", ", APPLIED, "\\right)");
        arguments.forEach(argument -> list.add(formula(argument)));
        return new Piece(name + list, Strength.POWER);
    }

    private static String command(RealFunction function) {
        return switch (function) {
            case SIN -> "\\sin";
            case COS -> "\\cos";
            case TAN -> "\\tan";
            case ASIN -> "\\arcsin";
            case ACOS -> "\\arccos";
            case ATAN -> "\\arctan";
            case SINH -> "\\sinh";
            case COSH -> "\\cosh";
            case TANH -> "\\tanh";
            case LOG -> "\\ln";
            case ATAN2 -> "\\operatorname{atan2}";
            case ASINH -> "\\operatorname{arsinh}";
            case ACOSH -> "\\operatorname{arcosh}";
            case ATANH -> "\\operatorname{artanh}";
            case SIGNUM -> "\\operatorname{sgn}";
            case EXP -> "\\exp";
            case ABS, SQRT, CBRT, POW -> throw new IllegalStateException(function + " is written in a way of its own");
        };
    }

    @Override
    public String formula(Signed whole) {
        return whole.negative()
                ? "-" + atLeast(whole.piece(), Strength.PRODUCT)
                : whole.piece().text();
    }

    private static String atLeast(Piece piece, Strength strength) {
        return piece.strength().compareTo(strength) < 0 ? APPLIED + piece.text() + "\\right)" : piece.text();
    }
}
