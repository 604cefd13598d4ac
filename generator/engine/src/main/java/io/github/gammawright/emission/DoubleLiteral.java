package io.github.gammawright.emission;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;

/** Writes doubles as Java literals. */
final class DoubleLiteral {

    private DoubleLiteral() {}

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
            // at powers of two the nearest decimal may miss where one that is rounded away does not
            for (RoundingMode rounding : List.of(RoundingMode.HALF_EVEN, RoundingMode.UP, RoundingMode.DOWN)) {
                BigDecimal rounded = exact.round(new MathContext(digits, rounding));
                if (rounded.doubleValue() == value) {
                    return text(rounded.stripTrailingZeros());
                }
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
