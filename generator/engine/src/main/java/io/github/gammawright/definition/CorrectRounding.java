package io.github.gammawright.definition;

import java.math.BigInteger;
import org.hipparchus.fraction.BigFraction;

/** Rounds exact rationals to doubles: to the nearest, of two equally near ones to the even (IEEE 754-2019, 4.3.1). */
public final class CorrectRounding {

    private static final int SIGNIFICAND_BITS = 53;
    private static final int QUOTIENT_BITS = SIGNIFICAND_BITS + 13;

    private CorrectRounding() {}

    /** The double nearest to the fraction; infinite if it is too large for a finite one. */
    public static double toDouble(BigFraction fraction) {
        BigInteger numerator = fraction.getNumerator();
        if (numerator.signum() == 0) {
            return 0;
        }
        double magnitude = nearest(numerator.abs(), fraction.getDenominator());
        return numerator.signum() < 0 ? -magnitude : magnitude;
    }

    private static double nearest(BigInteger numerator, BigInteger denominator) {
        int shift = QUOTIENT_BITS - (numerator.bitLength() - denominator.bitLength());
        BigInteger[] division =
                numerator.shiftLeft(Math.max(shift, 0)).divideAndRemainder(denominator.shiftLeft(Math.max(-shift, 0)));
        // The last bit stands for all that follow it: it is far below the one that is rounded.
        BigInteger quotient = division[1].signum() == 0 ? division[0] : division[0].setBit(0);
        int exponent = quotient.bitLength() - 1 - shift;
        int kept = SIGNIFICAND_BITS - Math.max(0, Double.MIN_EXPONENT - exponent);
        if (kept < 0) {
            return 0;
        }
        int dropped = quotient.bitLength() - kept;
        BigInteger significand = quotient.shiftRight(dropped);
        boolean half = quotient.testBit(dropped - 1);
        boolean more = quotient.getLowestSetBit() < dropped - 1;
        if (half && (more || significand.testBit(0))) {
            significand = significand.add(BigInteger.ONE);
        }
        return Math.scalb(significand.doubleValue(), dropped - shift);
    }
}
