package io.github.gammawright.verification.reference;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * A real number m · 2^e with an integer m of any length, or {@linkplain #UNDEFINED undefined}. Immutable. The operations
 * in this class are exact; those that round are in {@link RealArithmetic}.
 */
public final class Real {

    /** What an operation gives that has no real value, such as a division by zero; it spreads like NaN. */
    public static final Real UNDEFINED = new Real(BigInteger.ZERO, 0);

    /** 0. */
    public static final Real ZERO = new Real(BigInteger.ZERO, 0);

    /** 1. */
    public static final Real ONE = new Real(BigInteger.ONE, 0);

    /** Beyond 2 to this power a number counts as undefined, below its reciprocal as zero. */
    private static final long LARGEST_MAGNITUDE = 1L << 48;

    private final BigInteger mantissa;
    private final long exponent;

    private Real(BigInteger mantissa, long exponent) {
        this.mantissa = mantissa;
        this.exponent = exponent;
    }

    /** The number mantissa · 2^exponent. */
    static Real of(BigInteger mantissa, long exponent) {
        if (mantissa.signum() == 0) {
            return ZERO;
        }
        long magnitude = exponent + mantissa.bitLength();
        if (magnitude > LARGEST_MAGNITUDE) {
            return UNDEFINED;
        }
        return magnitude < -LARGEST_MAGNITUDE ? ZERO : new Real(mantissa, exponent);
    }

    /** The integer as it is. */
    public static Real of(long value) {
        return of(BigInteger.valueOf(value), 0);
    }

    /** The exact value of a double; undefined for NaN and the infinities. */
    public static Real of(double value) {
        if (!Double.isFinite(value)) {
            return UNDEFINED;
        }
        if (value == 0) {
            return ZERO;
        }
        long bits = Double.doubleToLongBits(value);
        int biased = (int) ((bits >> 52) & 0x7ff);
        long fraction = bits & 0xfffffffffffffL;
        long significand = biased == 0 ? fraction : fraction | 0x10000000000000L;
        int trailing = Long.numberOfTrailingZeros(significand);
        long shortened = significand >> trailing;
        return of(BigInteger.valueOf(bits < 0 ? -shortened : shortened), Math.max(biased, 1) - 1075L + trailing);
    }

    /** m in m · 2^e. */
    BigInteger mantissa() {
        return mantissa;
    }

    /** e in m · 2^e. */
    long exponent() {
        return exponent;
    }

    /** The number of bits before the binary point: 2^(magnitude − 1) ≤ |x| &lt; 2^magnitude or, below 0, = 2^magnitude. */
    long magnitude() {
        return exponent + mantissa.bitLength();
    }

    /** Whether there is no value. */
    public boolean isUndefined() {
        return this == UNDEFINED;
    }

    /** Whether there is a value and it is exactly 0. */
    public boolean isZero() {
        return mantissa.signum() == 0 && this != UNDEFINED;
    }

    /** −1, 0 or 1; 0 for an undefined number too. */
    public int signum() {
        return mantissa.signum();
    }

    /** Whether the value is an integer. */
    boolean isInteger() {
        return this != UNDEFINED
                && (exponent >= 0 || mantissa.signum() == 0 || mantissa.getLowestSetBit() >= -exponent);
    }

    /** The value of an integer; only for those of moderate size. */
    BigInteger toBigInteger() {
        return exponent >= 0 ? mantissa.shiftLeft((int) exponent) : mantissa.shiftRight((int) -exponent);
    }

    /** −x. */
    public Real negate() {
        return mantissa.signum() == 0 ? this : new Real(mantissa.negate(), exponent);
    }

    /** |x|. */
    public Real abs() {
        return mantissa.signum() < 0 ? negate() : this;
    }

    /** x · 2^power. */
    Real scaled(long power) {
        return mantissa.signum() == 0 ? this : of(mantissa, exponent + power);
    }

    /** x rounded to a mantissa of the given number of bits. */
    Real rounded(int bits) {
        int excess = mantissa.bitLength() - bits;
        if (excess <= 0) {
            return this;
        }
        BigInteger shifted = mantissa.shiftRight(excess);
        // Bits of a negative BigInteger are those of its two's complement, for which this rounds correctly too.
        return new Real(mantissa.testBit(excess - 1) ? shifted.add(BigInteger.ONE) : shifted, exponent + excess);
    }

    /** The largest integer k with k ≤ x · 2^fractionBits: x in fixed point. */
    BigInteger toFixedPoint(long fractionBits) {
        return mantissa.shiftLeft(Math.toIntExact(exponent + fractionBits));
    }

    /** Whether this is less than the other; false when one of them is undefined. */
    public boolean isLessThan(Real other) {
        return this != UNDEFINED && other != UNDEFINED && compare(other) < 0;
    }

    /** Whether this is less than or equal to the other; false when one of them is undefined. */
    public boolean isAtMost(Real other) {
        return this != UNDEFINED && other != UNDEFINED && compare(other) <= 0;
    }

    private int compare(Real other) {
        int sign = mantissa.signum();
        if (sign != other.mantissa.signum() || sign == 0) {
            return Integer.compare(sign, other.mantissa.signum());
        }
        long gap = exponent - other.exponent;
        // bitLength is one less for negative powers of two: two bits of slack decide by magnitude alone.
        if (Math.abs(magnitude() - other.magnitude()) > 2) {
            return magnitude() > other.magnitude() ? sign : -sign;
        }
        return gap >= 0
                ? mantissa.shiftLeft((int) gap).compareTo(other.mantissa)
                : mantissa.compareTo(other.mantissa.shiftLeft((int) -gap));
    }

    /** |x − value| to the precision of a double; NaN when one of them is undefined. */
    public double distanceTo(double value) {
        Real other = of(value);
        if (this == UNDEFINED || other == UNDEFINED) {
            return Double.NaN;
        }
        if (mantissa.signum() == 0 || magnitude() < -5000) {
            return Math.abs(value);
        }
        if (other.mantissa.signum() == 0 || magnitude() > 5000) {
            return abs().toDouble();
        }
        int shift = Math.toIntExact(exponent - other.exponent);
        BigInteger difference = shift >= 0
                ? mantissa.shiftLeft(shift).subtract(other.mantissa)
                : mantissa.subtract(other.mantissa.shiftLeft(-shift));
        return of(difference.abs(), Math.min(exponent, other.exponent)).toDouble();
    }

    /** The nearest double, ties to even; NaN when undefined, an infinity beyond the range of doubles. */
    public double toDouble() {
        if (this == UNDEFINED) {
            return Double.NaN;
        }
        if (mantissa.signum() == 0) {
            return 0;
        }
        if (magnitude() > 1100) {
            return mantissa.signum() * Double.POSITIVE_INFINITY;
        }
        if (magnitude() < -1100) {
            return mantissa.signum() * 0.0;
        }
        BigInteger size = mantissa.abs();
        int drop = Math.toIntExact(Math.max(size.bitLength() - 53L, -1074 - exponent));
        if (drop > 0) {
            BigInteger kept = size.shiftRight(drop);
            boolean half = size.testBit(drop - 1);
            boolean more = size.getLowestSetBit() < drop - 1;
            size = half && (more || kept.testBit(0)) ? kept.add(BigInteger.ONE) : kept;
        } else {
            drop = 0;
        }
        return mantissa.signum() * Math.scalb((double) size.longValueExact(), Math.toIntExact(exponent + drop));
    }

    /** The value to the given number of significant decimal digits; not for an undefined number. */
    public BigDecimal toBigDecimal(int digits) {
        if (this == UNDEFINED) {
            throw new ArithmeticException("an undefined number has no digits");
        }
        MathContext context = new MathContext(digits, RoundingMode.HALF_EVEN);
        if (exponent >= 0) {
            return new BigDecimal(mantissa.shiftLeft(Math.toIntExact(exponent))).round(context);
        }
        BigDecimal power = BigDecimal.valueOf(2).pow(Math.toIntExact(-exponent));
        return new BigDecimal(mantissa).divide(power, context);
    }

    /** 30 significant digits, or {@code undefined}. */
    @Override
    public String toString() {
        return this == UNDEFINED ? "undefined" : toBigDecimal(30).toString();
    }
}
