package io.github.gammawright.verification.reference;

import java.math.BigInteger;
import org.hipparchus.fraction.BigFraction;

/**
 * Arithmetic on {@link Real} numbers that rounds every result to a fixed number of bits. Each operation is off by at most
 * one unit of the last bit; an undefined operand makes the result undefined.
 */
final class RealArithmetic {

    private static final double BITS_PER_DIGIT = Math.log(10) / Math.log(2);

    /**
     * Bits beyond the digits asked for. They cover the rounding of a long evaluation and cancellations that lose up to
     * some 15 digits.
     */
    private static final int GUARD_BITS = 64;

    private final int bits;
    private final Constants constants;

    RealArithmetic(int bits) {
        this(bits, new Constants());
    }

    private RealArithmetic(int bits, Constants constants) {
        this.bits = bits;
        this.constants = constants;
    }

    /** Arithmetic whose results hold the given number of decimal digits with room for rounding and cancellation. */
    static RealArithmetic ofDigits(int digits) {
        int needed = (int) Math.ceil(digits * BITS_PER_DIGIT) + GUARD_BITS;
        return new RealArithmetic((needed + 31) / 32 * 32);
    }

    /** The same with so many bits more. */
    RealArithmetic widened(int moreBits) {
        return new RealArithmetic(bits + moreBits, constants);
    }

    /** The bits to which results are rounded. */
    int bits() {
        return bits;
    }

    /** π and ln 2 in fixed point. */
    Constants constants() {
        return constants;
    }

    /** π. */
    Real pi() {
        return Real.of(constants.pi(bits + 8), -bits - 8).rounded(bits);
    }

    /** The number rounded to this precision. */
    Real round(Real a) {
        return a.rounded(bits);
    }

    Real of(BigFraction value) {
        return divide(Real.of(value.getNumerator(), 0), Real.of(value.getDenominator(), 0));
    }

    Real add(Real a, Real b) {
        if (a.isUndefined() || b.isUndefined()) {
            return Real.UNDEFINED;
        }
        if (a.isZero()) {
            return b.rounded(bits);
        }
        if (b.isZero()) {
            return a.rounded(bits);
        }
        long gap = a.magnitude() - b.magnitude();
        if (gap > bits + 2) {
            return a.rounded(bits);
        }
        if (gap < -bits - 2) {
            return b.rounded(bits);
        }
        long shift = a.exponent() - b.exponent();
        BigInteger sum = shift >= 0
                ? a.mantissa().shiftLeft((int) shift).add(b.mantissa())
                : a.mantissa().add(b.mantissa().shiftLeft((int) -shift));
        return Real.of(sum, Math.min(a.exponent(), b.exponent())).rounded(bits);
    }

    Real subtract(Real a, Real b) {
        return add(a, b.negate());
    }

    Real multiply(Real a, Real b) {
        if (a.isUndefined() || b.isUndefined()) {
            return Real.UNDEFINED;
        }
        return Real.of(a.mantissa().multiply(b.mantissa()), a.exponent() + b.exponent())
                .rounded(bits);
    }

    Real multiply(Real a, long b) {
        return multiply(a, Real.of(b));
    }

    /** a / b; undefined for b = 0. */
    Real divide(Real a, Real b) {
        if (a.isUndefined() || b.isUndefined() || b.isZero()) {
            return Real.UNDEFINED;
        }
        int wanted = bits + 2 + b.mantissa().bitLength() - a.mantissa().bitLength();
        int shift = Math.max(wanted, 0);
        BigInteger quotient = a.mantissa().shiftLeft(shift).divide(b.mantissa());
        return Real.of(quotient, a.exponent() - b.exponent() - shift).rounded(bits);
    }

    Real divide(Real a, long b) {
        return divide(a, Real.of(b));
    }

    /** √a; undefined for a &lt; 0. */
    Real sqrt(Real a) {
        if (a.isUndefined() || a.signum() < 0) {
            return Real.UNDEFINED;
        }
        if (a.isZero()) {
            return a;
        }
        long shift = Math.max(2L * (bits + 2) - a.mantissa().bitLength(), 0);
        if (((a.exponent() - shift) & 1) != 0) {
            shift++;
        }
        BigInteger root = a.mantissa().shiftLeft((int) shift).sqrt();
        return Real.of(root, (a.exponent() - shift) / 2).rounded(bits);
    }

    /** base^exponent by squarings; 1 for the exponent 0; undefined for 0 to a negative power. */
    Real power(Real base, long exponent) {
        if (base.isUndefined()) {
            return base;
        }
        if (exponent < 0) {
            return divide(Real.ONE, widened(8).power(base, -exponent));
        }
        // Each squaring doubles the relative error so far: as many bits more as there are squarings.
        RealArithmetic wider = widened(2 * (64 - Long.numberOfLeadingZeros(exponent)));
        Real result = Real.ONE;
        for (int bit = 63 - Long.numberOfLeadingZeros(exponent); bit >= 0; bit--) {
            result = wider.multiply(result, result);
            if ((exponent >> bit & 1) != 0) {
                result = wider.multiply(result, base);
            }
        }
        return round(result);
    }
}
