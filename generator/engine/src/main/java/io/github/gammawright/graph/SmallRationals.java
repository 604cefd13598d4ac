package io.github.gammawright.graph;

import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/** Finds the small fraction that an element of the prime field stands for. */
final class SmallRationals {

    private static final long LARGEST = 1 << 14;

    private SmallRationals() {}

    /** The fraction with numerator and denominator of at most 14 bits that equals the element, if there is one. */
    static Optional<BigFraction> reconstruct(long element) {
        long prime = PrimeField.VALUES.prime();
        long r0 = prime;
        long r1 = element;
        long t0 = 0;
        long t1 = 1;
        while (r1 > LARGEST) {
            long quotient = r0 / r1;
            long r2 = r0 - quotient * r1;
            r0 = r1;
            r1 = r2;
            long t2 = t0 - quotient * t1;
            t0 = t1;
            t1 = t2;
            if (Math.abs(t1) > LARGEST) {
                return Optional.empty();
            }
        }
        return t1 == 0 || Math.abs(t1) > LARGEST ? Optional.empty() : Optional.of(new BigFraction(r1, t1));
    }
}
