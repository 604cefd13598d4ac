package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.LongRange;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** The fields are checked against {@link BigInteger}, a general-purpose reference. */
class PrimeFieldTest {

    private static final long P = (1L << 61) - 636_873;
    private static final long Q = (1L << 60) - 318_437;

    @Test
    void theModuliAreASafePrimeAndItsHalf() {
        assertThat(PrimeField.VALUES.prime()).isEqualTo(P).isEqualTo(2 * Q + 1);
        assertThat(PrimeField.EXPONENTS.prime()).isEqualTo(Q);
        assertThat(BigInteger.valueOf(P).isProbablePrime(100)).isTrue();
        assertThat(BigInteger.valueOf(Q).isProbablePrime(100)).isTrue();
        assertThat(P % 4).isEqualTo(3);
    }

    @Test
    void smallPrimesAreSquares() {
        for (long prime : new long[] {2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37}) {
            assertThat(PrimeField.VALUES.isSquare(prime)).as("%d", prime).isTrue();
        }
    }

    @Property
    void arithmeticIsThatOfBigInteger(
            @ForAll @LongRange(min = 0, max = P - 1) long a, @ForAll @LongRange(min = 0, max = P - 1) long b) {
        BigInteger p = BigInteger.valueOf(P);
        BigInteger x = BigInteger.valueOf(a);
        BigInteger y = BigInteger.valueOf(b);
        PrimeField field = PrimeField.VALUES;
        assertThat(field.add(a, b)).isEqualTo(x.add(y).mod(p).longValueExact());
        assertThat(field.subtract(a, b)).isEqualTo(x.subtract(y).mod(p).longValueExact());
        assertThat(field.multiply(a, b)).isEqualTo(x.multiply(y).mod(p).longValueExact());
        assertThat(field.negate(a)).isEqualTo(x.negate().mod(p).longValueExact());
        assertThat(field.power(a, b)).isEqualTo(x.modPow(y, p).longValueExact());
        if (a != 0) {
            assertThat(field.inverse(a)).isEqualTo(x.modInverse(p).longValueExact());
        }
    }

    @Property
    void theSmallerFieldTooIsThatOfBigInteger(
            @ForAll @LongRange(min = 0, max = Q - 1) long a, @ForAll @LongRange(min = 0, max = Q - 1) long b) {
        BigInteger q = BigInteger.valueOf(Q);
        BigInteger product = BigInteger.valueOf(a).multiply(BigInteger.valueOf(b));
        assertThat(PrimeField.EXPONENTS.multiply(a, b)).isEqualTo(product.mod(q).longValueExact());
    }

    @Property
    void smallFractionsComeBack(
            @ForAll @LongRange(min = -9999, max = 9999) long numerator,
            @ForAll @LongRange(min = 1, max = 9999) long denominator) {
        BigFraction fraction = new BigFraction(numerator, denominator);
        assertThat(SmallRationals.reconstruct(PrimeField.VALUES.element(fraction)))
                .contains(fraction);
    }

    @Property
    void squaresAreToldApart(@ForAll @LongRange(min = 1, max = P - 1) long a) {
        PrimeField field = PrimeField.VALUES;
        assertThat(field.isSquare(field.multiply(a, a))).isTrue();
        assertThat(field.isSquare(field.negate(field.multiply(a, a)))).isFalse();
    }
}
