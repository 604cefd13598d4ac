package io.github.gammawright.generation;

import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.math.BigInteger;
import java.util.List;
import java.util.Locale;
import java.util.StringJoiner;
import org.hipparchus.fraction.BigFraction;

/** Formulas as a definition would hold them, so that they can be read again. */
final class TextNotation implements Notation {

    @Override
    public Piece number(BigInteger value) {
        return Piece.atom(value.toString());
    }

    @Override
    public Piece pi() {
        return Piece.atom("pi");
    }

    @Override
    public Piece symbol(Symbol symbol) {
        return switch (symbol.kind()) {
            case PARAMETER, COORDINATE -> Piece.atom(symbol.name());
            case CALLER_FUNCTION -> callerFunction(symbol);
            case VELOCITY -> Piece.atom("u_" + symbol.name());
            case MOMENTUM -> Piece.atom("p_" + symbol.name());
            case VECTOR, COORDINATE_VELOCITY -> Piece.atom("v_" + symbol.name());
            case SEPARATION -> Piece.atom("xi_" + symbol.name());
        };
    }

    /** The orders of differentiation by each argument, as in nu[0,2]; a definition has no way to write a derivative. */
    private static Piece callerFunction(Symbol symbol) {
        if (symbol.orders().stream().allMatch(order -> order == 0)) {
            return Piece.atom(symbol.name());
        }
        StringJoiner orders = new StringJoiner(",", symbol.name() + "[", "]");
        symbol.orders().forEach(order -> orders.add(order.toString()));
        return Piece.atom(orders.toString());
    }

    @Override
    public Piece name(String name) {
        return Piece.atom(name);
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
        if (denominator.isEmpty() && numerator.size() == 1) {
            return numerator.get(0);
        }
        String top = numerator.isEmpty() ? "1" : product(numerator);
        if (denominator.isEmpty()) {
            return new Piece(top, Strength.PRODUCT);
        }
        String bottom = product(denominator);
        return new Piece(top + "/" + (denominator.size() == 1 ? bottom : "(" + bottom + ")"), Strength.PRODUCT);
    }

    private static String product(List<Piece> factors) {
        StringJoiner product = new StringJoiner("*");
        factors.forEach(factor -> product.add(atLeast(factor, Strength.POWER)));
        return product.toString();
    }

    @Override
    public Piece power(Piece base, BigFraction exponent) {
        if (exponent.equals(BigFraction.ONE_HALF)) {
            return Piece.atom("sqrt(" + base.text() + ")");
        }
        boolean whole = exponent.getDenominator().equals(BigInteger.ONE);
        String text = whole
                ? exponent.getNumerator().toString()
                : "(" + exponent.getNumerator() + "/" + exponent.getDenominator() + ")";
        return new Piece(atLeast(base, Strength.ATOM) + "^" + text, Strength.POWER);
    }

    @Override
    public Piece power(Piece base, Signed exponent) {
        String text = exponent.negative() || exponent.piece().strength() != Strength.ATOM
                ? "(" + formula(exponent) + ")"
                : exponent.piece().text();
        return new Piece(atLeast(base, Strength.ATOM) + "^" + text, Strength.POWER);
    }

    @Override
    public Piece call(RealFunction function, List<Signed> arguments, BigInteger exponent) {
        StringJoiner list = new StringJoiner(", ", "(", ")");
        arguments.forEach(argument -> list.add(formula(argument)));
        Piece call = Piece.atom(function.name().toLowerCase(Locale.ROOT) + list);
        if (function == RealFunction.SIGNUM) {
            // a definition knows no sign function
            String argument = formula(arguments.get(0));
            call = new Piece("(" + argument + ")/abs(" + argument + ")", Strength.PRODUCT);
        }
        return exponent.equals(BigInteger.ONE) ? call : power(call, new BigFraction(exponent));
    }

    @Override
    public String formula(Signed whole) {
        return whole.negative()
                ? "-" + atLeast(whole.piece(), Strength.PRODUCT)
                : whole.piece().text();
    }

    private static String atLeast(Piece piece, Strength strength) {
        return piece.strength().compareTo(strength) < 0 ? "(" + piece.text() + ")" : piece.text();
    }
}
