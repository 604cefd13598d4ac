package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourceText;
import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/**
 * Finds constants that would be too large to work with, before anyone works with them: {@code x^1000000000} and
 * {@code 9^9^9^9} are refused without being evaluated. Also finds divisions by zero that are plain to see.
 */
final class ConstantCheck {

    private static final Value UNKNOWN = new Value(null, 1);
    private static final int POWERS_OF_POWERS = 10;

    private final Limits limits;
    private final Diagnostics diagnostics;
    private final Map<String, Value> names = new HashMap<>();
    private boolean sound;

    ConstantCheck(Limits limits, Diagnostics diagnostics) {
        this.limits = limits;
        this.diagnostics = diagnostics;
    }

    /** What is known of an expression; nothing if something was wrong in it, which is then reported. */
    Optional<Value> check(Expression expression) {
        sound = true;
        Value value = value(expression);
        return sound ? Optional.of(value) : Optional.empty();
    }

    /** Whether the expression is a constant that is exactly zero. */
    boolean isZero(Expression expression) {
        return check(expression)
                .filter(Value::isConstant)
                .filter(value -> value.constant().isZero())
                .isPresent();
    }

    /** The exact value of an expression that is a rational constant of moderate size. */
    static Optional<BigFraction> rational(Expression expression) {
        Diagnostics ignored = new Diagnostics(new SourceText("", ""));
        return new ConstantCheck(Limits.DEFAULT, ignored)
                .check(expression)
                .filter(Value::isConstant)
                .map(Value::constant);
    }

    /** From now on the name stands for the expression, as an abbreviation does. */
    void define(String name, Expression expression) {
        names.put(name, check(expression).orElse(UNKNOWN));
    }

    private Value value(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return new Value(number.value(), 0);
        }
        if (expression instanceof Expression.Name name) {
            return names.getOrDefault(name.name(), UNKNOWN);
        }
        if (expression instanceof Expression.Negation negation) {
            Value operand = value(negation.operand());
            return new Value(operand.isConstant() ? operand.constant().negate() : null, operand.degree());
        }
        if (expression instanceof Expression.Call call) {
            call.arguments().forEach(this::value);
            return UNKNOWN;
        }
        if (expression instanceof Expression.Binary binary) {
            Value left = value(binary.left());
            Value right = value(binary.right());
            return bounded(binary, binary(binary, left, right));
        }
        return UNKNOWN;
    }

    private Value binary(Expression.Binary binary, Value left, Value right) {
        boolean constant = left.isConstant() && right.isConstant();
        double product = left.degree() + right.degree();
        return switch (binary.operator()) {
            case ADD ->
                new Value(
                        constant ? left.constant().add(right.constant()) : null,
                        Math.max(left.degree(), right.degree()));
            case SUBTRACT ->
                new Value(
                        constant ? left.constant().subtract(right.constant()) : null,
                        Math.max(left.degree(), right.degree()));
            case MULTIPLY -> new Value(constant ? left.constant().multiply(right.constant()) : null, product);
            case DIVIDE -> {
                if (right.isConstant() && right.constant().isZero()) {
                    yield wrong(DiagnosticCode.DIVISION_BY_ZERO, binary);
                }
                yield new Value(constant ? left.constant().divide(right.constant()) : null, product);
            }
            case POWER -> power(binary, left, right);
        };
    }

    private Value power(Expression.Binary binary, Value base, Value exponent) {
        if (!exponent.isConstant()) {
            return new Value(null, base.degree());
        }
        double size = Math.abs(exponent.constant().doubleValue());
        double degree = size * base.degree();
        if (!(size <= limits.exponent())) {
            sound = false;
            diagnostics.report(DiagnosticCode.EXPONENT_TOO_LARGE, Expressions.start(binary.right()), limits.exponent());
            return UNKNOWN;
        }
        if (!(degree <= (double) POWERS_OF_POWERS * limits.exponent())) {
            sound = false;
            diagnostics.report(
                    DiagnosticCode.EXPONENT_TOO_LARGE,
                    Expressions.start(binary.right()),
                    POWERS_OF_POWERS * limits.exponent());
            return UNKNOWN;
        }
        boolean whole = exponent.constant().getDenominator().equals(BigInteger.ONE);
        if (!base.isConstant() || !whole) {
            return new Value(null, degree);
        }
        int power = exponent.constant().getNumeratorAsInt();
        if (base.constant().isZero() && power < 0) {
            return wrong(DiagnosticCode.DIVISION_BY_ZERO, binary);
        }
        if ((double) bits(base.constant()) * Math.abs(power) > 2.0 * limits.constantBits()) {
            return tooLarge(binary);
        }
        return new Value(base.constant().pow(power), 0);
    }

    private Value bounded(Expression.Binary binary, Value value) {
        return value.isConstant() && bits(value.constant()) > limits.constantBits() ? tooLarge(binary) : value;
    }

    private Value tooLarge(Expression.Binary binary) {
        sound = false;
        diagnostics.report(DiagnosticCode.CONSTANT_TOO_LARGE, binary.position(), limits.constantBits());
        return UNKNOWN;
    }

    private Value wrong(DiagnosticCode code, Expression.Binary binary) {
        sound = false;
        diagnostics.report(code, binary.position());
        return UNKNOWN;
    }

    private static int bits(BigFraction value) {
        return Math.max(value.getNumerator().bitLength(), value.getDenominator().bitLength());
    }

    /**
     * What is known of an expression.
     *
     * @param constant its exact value; null if it has none or is not a rational
     * @param degree of the largest power in it, as if every name and function stood for itself; 0 of a constant
     */
    record Value(BigFraction constant, double degree) {

        boolean isConstant() {
            return constant != null;
        }
    }
}
