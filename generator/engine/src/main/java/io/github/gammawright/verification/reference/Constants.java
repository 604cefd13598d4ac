package io.github.gammawright.verification.reference;

import java.math.BigInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.IntFunction;

/** π and ln 2 in fixed point, kept at the greatest precision asked for so far. */
final class Constants {

    private final AtomicReference<FixedPoint> pi = new AtomicReference<>(new FixedPoint(BigInteger.ZERO, -1));
    private final AtomicReference<FixedPoint> logOfTwo = new AtomicReference<>(new FixedPoint(BigInteger.ZERO, -1));

    /** π · 2^bits, off by less than 2. */
    BigInteger pi(int bits) {
        return atLeast(pi, bits, Constants::computePi);
    }

    /** ln 2 · 2^bits, off by less than 2. */
    BigInteger logOfTwo(int bits) {
        return atLeast(logOfTwo, bits, Constants::computeLogOfTwo);
    }

    private static BigInteger atLeast(AtomicReference<FixedPoint> cache, int bits, IntFunction<BigInteger> compute) {
        FixedPoint known = cache.get();
        if (known.bits < bits) {
            int generous = bits + bits / 2 + 64;
            known = new FixedPoint(compute.apply(generous), generous);
            cache.set(known);
        }
        return known.value.shiftRight(known.bits - bits);
    }

    /** Machin (1706): π/4 = 4 arctan(1/5) − arctan(1/239). */
    private static BigInteger computePi(int bits) {
        int working = bits + 32;
        BigInteger quarter = inverseTangentOfReciprocal(5, working, -1)
                .shiftLeft(2)
                .subtract(inverseTangentOfReciprocal(239, working, -1));
        return quarter.shiftLeft(2).shiftRight(32);
    }

    /** ln 2 = 2 artanh(1/3). */
    private static BigInteger computeLogOfTwo(int bits) {
        int working = bits + 32;
        return inverseTangentOfReciprocal(3, working, 1).shiftLeft(1).shiftRight(32);
    }

    /** Σ sign^k / ((2k + 1) q^(2k+1)): arctan(1/q) for sign −1, artanh(1/q) for sign 1. */
    private static BigInteger inverseTangentOfReciprocal(long q, int bits, int sign) {
        BigInteger square = BigInteger.valueOf(q * q);
        BigInteger power = BigInteger.ONE.shiftLeft(bits).divide(BigInteger.valueOf(q));
        BigInteger sum = BigInteger.ZERO;
        for (long k = 0; power.signum() != 0; k++) {
            BigInteger term = power.divide(BigInteger.valueOf(2 * k + 1));
            sum = sign < 0 && (k & 1) != 0 ? sum.subtract(term) : sum.add(term);
            power = power.divide(square);
        }
        return sum;
    }

    private record FixedPoint(BigInteger value, int bits) {}
}
