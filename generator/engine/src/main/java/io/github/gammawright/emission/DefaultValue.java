package io.github.gammawright.emission;

import io.github.gammawright.definition.Expression;
import java.math.BigDecimal;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.dfp.DfpMath;

/** The value of a parameter's default: computed in a hundred digits and rounded once. */
final class DefaultValue {

    private final DfpField field = new DfpField(100);

    private DefaultValue() {}

    /** The double nearest to the value of an expression without names; NaN where it has none. */
    static double of(Expression expression) {
        Dfp value = new DefaultValue().value(expression);
        if (value.isNaN()) {
            return Double.NaN;
        }
        return value.isInfinite() ? value.toDouble() : new BigDecimal(value.toString()).doubleValue();
    }

    private Dfp value(Expression expression) {
        if (expression instanceof Expression.Number number) {
            Dfp numerator = field.newDfp(number.value().getNumerator().toString());
            return numerator.divide(field.newDfp(number.value().getDenominator().toString()));
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
        throw new IllegalArgumentException("a default that uses a name: " + expression);
    }

    private static Dfp power(Dfp base, Dfp exponent) {
        boolean small = exponent.rint().equals(exponent) && Math.abs(exponent.toDouble()) < 1e6;
        return small ? DfpMath.pow(base, (int) exponent.toDouble()) : DfpMath.pow(base, exponent);
    }

    private Dfp call(Expression.Call call) {
        Dfp x = value(call.arguments().get(0));
        return switch (call.function()) {
            case SIN -> x.sin();
            case COS -> x.cos();
            case TAN -> x.tan();
            case ASIN -> x.asin();
            case ACOS -> x.acos();
            case ATAN -> x.atan();
            case ATAN2 -> x.atan2(value(call.arguments().get(1)));
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
}
