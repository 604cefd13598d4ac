package io.github.gammawright.definition;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/** Turns decimal numbers into the rationals that they spell. */
final class NumberLiteral {

    private static final int LONGEST_EXPONENT = 9;

    private NumberLiteral() {}

    /**
     * The exact value of a number such as {@code 2}, {@code .5}, {@code 2.} or {@code -1.0E-20}; nothing if it has more
     * digits, or an exponent larger, than allowed.
     *
     * @throws NumberFormatException if the text is no number
     */
    static Optional<BigFraction> value(String literal, int mostDigits) {
        int exponentMark = Math.max(literal.indexOf('e'), literal.indexOf('E'));
        String mantissa = exponentMark < 0 ? literal : literal.substring(0, exponentMark);
        if (mantissa.length() > mostDigits) {
            return Optional.empty();
        }
        if (exponentMark >= 0) {
            String exponent = literal.substring(exponentMark + 1).replaceFirst("^([+-]?)0+(?=\\d)", "$1");
            if (exponent.length() > LONGEST_EXPONENT || Math.abs(Integer.parseInt(exponent)) > mostDigits) {
                return Optional.empty();
            }
        }
        return Optional.of(exact(new BigDecimal(literal)));
    }

    /** The decimal as a fraction in lowest terms. */
    static BigFraction exact(BigDecimal decimal) {
        BigInteger unscaled = decimal.unscaledValue();
        return decimal.scale() >= 0
                ? new BigFraction(unscaled, BigInteger.TEN.pow(decimal.scale()))
                : new BigFraction(unscaled.multiply(BigInteger.TEN.pow(-decimal.scale())));
    }
}
