package io.github.gammawright.definition;

import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.dfp.DfpMath;

/** Evaluates an expression without names in a given number of decimal digits. */
final class PreciseEvaluator {

    private static final int DIGITS_OF_RADIX = 4;
    private static final int GUARD = 30;

    private final DfpField field;
    private boolean needsMoreDigits;
    private int largestExponent = Integer.MIN_VALUE;

    PreciseEvaluator(int digits) {
        field = new DfpField(digits);
    }

    /** The value; NaN where there is no real one. */
    Dfp value(Expression expression) {
        Dfp value = compute(expression);
        if (!value.isNaN() && !value.isInfinite() && !value.isZero()) {
            largestExponent = Math.max(largestExponent, value.intLog10());
        }
        return value;
    }

    /** By how many digits the result is smaller than the largest value on the way; cancellation costs no more. */
    int digitsLost(Dfp result) {
        if (result.isNaN() || result.isInfinite()) {
            return 0;
        }
        return result.isZero() ? Integer.MAX_VALUE : largestExponent - result.intLog10();
    }

    /** Whether the argument of a periodic function was too large to be reduced in this many digits. */
    boolean needsMoreDigits() {
        return needsMoreDigits;
    }

    private Dfp compute(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return field.newDfp(number.value().getNumerator().toString())
                    .divide(field.newDfp(number.value().getDenominator().toString()));
        }
        if (expression instanceof Expression.Pi) {
            return field.getPi();
        }
        if (expression instanceof Expression.Negation negation) {
            return value(negation.operand()).negate();
        }
        if (expression instanceof Expression.Binary binary) {
            Dfp left = value(binary.left());
            Dfp right = value(binary.right());
            return switch (binary.operator()) {
                case ADD -> left.add(right);
                case SUBTRACT -> left.subtract(right);
                case MULTIPLY -> left.multiply(right);
                case DIVIDE -> left.divide(right);
                case POWER -> power(left, right);
            };
        }
        if (expression instanceof Expression.Call call) {
            return call(call);
        }
        throw new IllegalArgumentException("a name in a constant: " + ExpressionPrinter.print(expression));
    }

    private static Dfp power(Dfp base, Dfp exponent) {
        boolean whole =
                !exponent.isNaN() && !exponent.isInfinite() && exponent.rint().equals(exponent);
        boolean small = Math.abs(exponent.toDouble()) <= Limits.DEFAULT.exponent();
        if (whole && small) {
            Dfp power = DfpMath.pow(base, (int) Math.abs(exponent.toDouble()));
            return exponent.toDouble() < 0 ? base.getOne().divide(power) : power;
        }
        if (base.isNaN() || exponent.isNaN() || base.isZero()) {
            return base.isZero() && exponent.toDouble() > 0 ? base.getZero() : notANumber(base);
        }
        // As with Math.pow, a negative base has powers to whole exponents only.
        return base.lessThan(base.getZero())
                ? notANumber(base)
                : DfpMath.exp(DfpMath.log(base).multiply(exponent));
    }

    private static Dfp notANumber(Dfp any) {
        return any.getField().newDfp((byte) 1, Dfp.QNAN);
    }

    private Dfp call(Expression.Call call) {
        Dfp x = value(call.arguments().get(0));
        if (x.isNaN()) {
            return x;
        }
        boolean periodic = call.function() == ElementaryFunction.SIN
                || call.function() == ElementaryFunction.COS
                || call.function() == ElementaryFunction.TAN;
        if (periodic
                && !x.isZero()
                && (x.isInfinite() || x.intLog10() > field.getRadixDigits() * DIGITS_OF_RADIX - GUARD)) {
            needsMoreDigits = true;
            return notANumber(x);
        }
        return switch (call.function()) {
            case SIN -> x.sin();
            case COS -> x.cos();
            case TAN -> x.tan();
            case ASIN -> x.asin();
            case ACOS -> x.acos();
            case ATAN -> x.atan();
            case ATAN2 -> atan2(x, value(call.arguments().get(1)));
            case SINH -> x.sinh();
            case COSH -> x.cosh();
            case TANH -> x.tanh();
            case ASINH -> x.asinh();
            case ACOSH -> x.acosh();
            case ATANH -> x.atanh();
            case EXP -> x.exp();
            case LOG -> x.log();
            case SQRT -> x.sqrt();
            case ABS -> x.abs();
        };
    }

    /** The library's own falls back to double precision on the axes. */
    private static Dfp atan2(Dfp y, Dfp x) {
        Dfp pi = y.getField().getPi();
        if (x.isNaN() || (x.isZero() && y.isZero())) {
            return x.isNaN() ? x : notANumber(x);
        }
        boolean below = y.lessThan(y.getZero());
        if (x.isZero()) {
            return below ? pi.divide(2).negate() : pi.divide(2);
        }
        Dfp angle = y.divide(x).atan();
        if (x.greaterThan(x.getZero())) {
            return angle;
        }
        return below ? angle.subtract(pi) : angle.add(pi);
    }
}
