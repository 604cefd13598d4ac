package io.github.gammawright.emission;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import org.hipparchus.fraction.BigFraction;

/** Rounds exact numbers to doubles and writes doubles as Java literals. */
final class DoubleLiteral {

    /** More than the digits of any point half-way between two doubles. */
    private static final MathContext ENOUGH = new MathContext(1200);

    private DoubleLiteral() {}

    /** The double nearest to a rational number, ties to even. */
    static double nearest(BigFraction value) {
        BigInteger numerator = value.getNumerator();
        BigInteger denominator = value.getDenominator();
        if (numerator.bitLength() <= 53 && denominator.bitLength() <= 53) {
            // both exact, so that the one rounding is the division's
            return numerator.doubleValue() / denominator.doubleValue();
        }
        return new BigDecimal(numerator)
                .divide(new BigDecimal(denominator), ENOUGH)
                .doubleValue();
    }

    /**
     * The shortest literal that denotes the value. {@code Double.toString} is not used, since what it gives differs
     * between versions of Java.
     */
    static String of(double value) {
        if (Double.isNaN(value)) {
            return "Double.NaN";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "Double.POSITIVE_INFINITY" : "Double.NEGATIVE_INFINITY";
        }
        if (value == 0) {
            return 1 / value < 0 ? "-0.0" : "0.0";
        }
        BigDecimal exact = new BigDecimal(value);
        for (int digits = 1; ; digits++) {
            BigDecimal rounded = exact.round(new MathContext(digits));
            if (rounded.doubleValue() == value) {
                return text(rounded.stripTrailingZeros());
            }
        }
    }

    private static String text(BigDecimal value) {
        int exponent = value.precision() - value.scale() - 1;
        if (exponent >= -3 && exponent < 10) {
            return value.scale() <= 0 ? value.toBigIntegerExact() + ".0" : value.toPlainString();
        }
        String digits = value.unscaledValue().abs().toString();
        String fraction = digits.length() > 1 ? digits.substring(1) : "0";
        return (value.signum() < 0 ? "-" : "") + digits.charAt(0) + "." + fraction + "e" + exponent;
    }
}
