package io.github.gammawright.graph;

/**
 * Arithmetic modulo a prime of the form 2^bits − offset, its elements in 0 … prime − 1.
 *
 * <p>Two fields are used together: {@link #VALUES} with the safe prime p = 2q + 1 for the values of functions, and
 * {@link #EXPONENTS} with q for exponents of squares modulo p (Gonnet 1984).
 */
public final class PrimeField {

    /**
     * p = 2^61 − 636873, the largest safe prime below 2^61 modulo which all primes up to 37 are squares: the roots of
     * most numbers that metrics contain, such as √2 and √3, have values there and satisfy all their relations. As any
     * safe prime it is ≡ 3 (mod 4).
     */
    public static final PrimeField VALUES = new PrimeField(61, 636_873);

    /** q = (p − 1)/2 = 2^60 − 318437, the order of the group of squares modulo p. */
    static final PrimeField EXPONENTS = new PrimeField(60, 318_437);

    private final int bits;
    private final long offset;
    private final long mask;
    private final long prime;

    private PrimeField(int bits, long offset) {
        this.bits = bits;
        this.offset = offset;
        this.mask = (1L << bits) - 1;
        this.prime = (1L << bits) - offset;
    }

    /** The prime itself. */
    public long prime() {
        return prime;
    }

    /** a + b. */
    public long add(long a, long b) {
        long sum = a + b;
        return sum >= prime ? sum - prime : sum;
    }

    /** a − b. */
    public long subtract(long a, long b) {
        long difference = a - b;
        return difference < 0 ? difference + prime : difference;
    }

    /** −a. */
    public long negate(long a) {
        return a == 0 ? 0 : prime - a;
    }

    /** a · b. */
    public long multiply(long a, long b) {
        long high = Math.multiplyHigh(a, b);
        long low = a * b;
        long top = (high << (64 - bits)) | (low >>> bits);
        long rest = low & mask;
        // 2^bits ≡ offset; after the second folding less than four primes remain
        long high2 = Math.multiplyHigh(top, offset);
        long low2 = top * offset;
        long top2 = (high2 << (64 - bits)) | (low2 >>> bits);
        long sum = rest + (low2 & mask) + top2 * offset;
        while (sum >= prime) {
            sum -= prime;
        }
        return sum;
    }

    /** a^exponent for a non-negative exponent. */
    public long power(long a, long exponent) {
        long result = 1;
        long square = a;
        for (long e = exponent; e != 0; e >>>= 1) {
            if ((e & 1) != 0) {
                result = multiply(result, square);
            }
            square = multiply(square, square);
        }
        return result;
    }

    /** The reciprocal of a, which must not be 0. */
    public long inverse(long a) {
        if (a == 0) {
            throw new ArithmeticException("reciprocal of zero");
        }
        long r0 = prime;
        long r1 = a;
        long t0 = 0;
        long t1 = 1;
        while (r1 != 0) {
            long quotient = r0 / r1;
            long r2 = r0 - quotient * r1;
            r0 = r1;
            r1 = r2;
            long t2 = t0 - quotient * t1;
            t0 = t1;
            t1 = t2;
        }
        return t0 < 0 ? t0 + prime : t0;
    }

    /** Whether a is 0 or a square. */
    boolean isSquare(long a) {
        return a == 0 || power(a, (prime - 1) / 2) == 1;
    }

    /** The element that a fraction stands for; its denominator must not be a multiple of the prime. */
    public long element(org.hipparchus.fraction.BigFraction fraction) {
        java.math.BigInteger modulus = java.math.BigInteger.valueOf(prime);
        long numerator = fraction.getNumerator().mod(modulus).longValueExact();
        long denominator = fraction.getDenominator().mod(modulus).longValueExact();
        return denominator == 1 ? numerator : multiply(numerator, inverse(denominator));
    }

    /** A pseudo-random element that depends on the bits of the argument alone. */
    long scramble(long seed) {
        long z = seed + 0x9E3779B97F4A7C15L;
        z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
        z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
        z = z ^ (z >>> 31);
        return Long.remainderUnsigned(z, prime);
    }
}
