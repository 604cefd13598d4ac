package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.Expression.Binary;
import io.github.gammawright.definition.Expression.Negation;
import io.github.gammawright.definition.Expression.Number;
import java.math.BigInteger;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/** Tells which exponents are exact rational numbers. */
final class RationalConstants {

    /** Numbers of more bits are not worth an exact value. */
    private static final int LARGEST = 4096;

    /** An exponent is a short expression; deeper ones are evaluated as any other. */
    private static final int DEEPEST = 64;

    private RationalConstants() {}

    /** The value of an expression of numbers under + − * / and small integer powers. */
    static Optional<BigFraction> valueOf(Expression expression) {
        return valueOf(expression, 0);
    }

    private static Optional<BigFraction> valueOf(Expression expression, int depth) {
        if (depth > DEEPEST) {
            return Optional.empty();
        }
        if (expression instanceof Number number) {
            return Optional.of(number.value());
        }
        if (expression instanceof Negation negation) {
            return valueOf(negation.operand(), depth + 1).map(BigFraction::negate);
        }
        if (expression instanceof Binary binary) {
            Optional<BigFraction> left = valueOf(binary.left(), depth + 1);
            Optional<BigFraction> right = valueOf(binary.right(), depth + 1);
            return left.isPresent() && right.isPresent()
                    ? apply(binary, left.get(), right.get()).filter(RationalConstants::isSmall)
                    : Optional.empty();
        }
        return Optional.empty();
    }

    private static Optional<BigFraction> apply(Binary binary, BigFraction left, BigFraction right) {
        return switch (binary.operator()) {
            case ADD -> Optional.of(left.add(right));
            case SUBTRACT -> Optional.of(left.subtract(right));
            case MULTIPLY -> Optional.of(left.multiply(right));
            case DIVIDE -> right.signum() == 0 ? Optional.empty() : Optional.of(left.divide(right));
            case POWER -> power(left, right);
        };
    }

    private static Optional<BigFraction> power(BigFraction base, BigFraction exponent) {
        boolean small = exponent.getDenominator().equals(BigInteger.ONE)
                && exponent.getNumerator().abs().compareTo(BigInteger.valueOf(64)) <= 0;
        boolean possible = small && (base.signum() != 0 || exponent.signum() >= 0);
        return possible ? Optional.of(base.pow(exponent.getNumerator().intValue())) : Optional.empty();
    }

    private static boolean isSmall(BigFraction value) {
        return value.getNumerator().bitLength() <= LARGEST
                && value.getDenominator().bitLength() <= LARGEST;
    }
}
