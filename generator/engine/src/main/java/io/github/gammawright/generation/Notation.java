package io.github.gammawright.generation;

import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.math.BigInteger;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/** How the parts of a formula are written down. */
interface Notation {

    /** How tightly a piece of text holds together, from the loosest to the tightest. */
    enum Strength {
        SUM,
        PRODUCT,
        POWER,
        ATOM
    }

    /** A piece of a formula, without its sign. */
    record Piece(String text, Strength strength) {
        static Piece atom(String text) {
            return new Piece(text, Strength.ATOM);
        }
    }

    /** A piece with its sign, as a term of a sum. */
    record Signed(boolean negative, Piece piece) {}

    /** A number that is not negative. */
    Piece number(BigInteger value);

    Piece pi();

    Piece symbol(Symbol symbol);

    /** A name that the author gave, or one for a part in common. */
    Piece name(String name);

    /** Terms in their order, at least two. */
    Piece sum(List<Signed> terms);

    /** Numerator and denominator, each a product; either may be empty. */
    Piece fraction(List<Piece> numerator, List<Piece> denominator);

    /** base^exponent for a positive exponent other than 1. */
    Piece power(Piece base, BigFraction exponent);

    /** base^exponent for an exponent that is a formula. */
    Piece power(Piece base, Signed exponent);

    /** function(arguments)^exponent for a whole positive exponent. */
    Piece call(RealFunction function, List<Signed> arguments, BigInteger exponent);

    /** A whole formula. */
    String formula(Signed whole);
}
