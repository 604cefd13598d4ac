package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.BigInteger;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;

/** The arithmetic of high-precision numbers against {@link BigDecimal}. */
class RealPropertiesTest {

    private static final int DIGITS = 50;
    private static final RealArithmetic ARITHMETIC = RealArithmetic.ofDigits(DIGITS);
    private static final ExponentialFunctions EXPONENTIAL = new ExponentialFunctions(ARITHMETIC);

    @Property
    void doublesGoInAndOutUnchanged(@ForAll double x) {
        assertThat(Real.of(x).toDouble()).isEqualTo(x);
    }

    @Property
    void toDoubleIsNearest(@ForAll BigInteger mantissa, @ForAll @IntRange(min = -1300, max = 1000) int exponent) {
        BigInteger wide = mantissa.multiply(mantissa).multiply(mantissa);
        Real x = Real.of(wide, exponent);
        BigDecimal exact = exponent >= 0
                ? new BigDecimal(wide.shiftLeft(exponent))
                : new BigDecimal(wide).divide(new BigDecimal(BigInteger.ONE.shiftLeft(-exponent)));
        assertThat(x.toDouble()).isEqualTo(Double.parseDouble(exact.toString()));
    }

    @Property
    void sumProductAndQuotient(@ForAll double a, @ForAll double b) {
        BigDecimal x = new BigDecimal(a);
        BigDecimal y = new BigDecimal(b);
        BigDecimal larger = x.abs().max(y.abs());
        Reals.assertClose(ARITHMETIC.add(Real.of(a), Real.of(b)), x.add(y), DIGITS, larger, "sum");
        Reals.assertClose(ARITHMETIC.multiply(Real.of(a), Real.of(b)), x.multiply(y), DIGITS, "product");
        if (b != 0) {
            Real quotient = ARITHMETIC.divide(Real.of(a), Real.of(b));
            Reals.assertClose(ARITHMETIC.multiply(quotient, Real.of(b)), x, DIGITS, "quotient");
        } else {
            assertThat(ARITHMETIC.divide(Real.of(a), Real.of(b)).isUndefined()).isTrue();
        }
    }

    @Property
    void distanceToADouble(@ForAll double a, @ForAll double b) {
        double expected = new BigDecimal(a).subtract(new BigDecimal(b)).abs().doubleValue();
        assertThat(Real.of(a).distanceTo(b)).isEqualTo(expected);
        assertThat(Real.of(a).distanceTo(Double.NaN)).isNaN();
        assertThat(Real.UNDEFINED.distanceTo(b)).isNaN();
    }

    @Property
    void orderIsThatOfDoubles(@ForAll double a, @ForAll double b) {
        assertThat(Real.of(a).isLessThan(Real.of(b))).isEqualTo(a < b);
        assertThat(Real.of(a).isAtMost(Real.of(b))).isEqualTo(a <= b);
    }

    @Property
    void undefinedIsInNoOrder(@ForAll double a) {
        assertThat(Real.of(a).isLessThan(Real.UNDEFINED)).isFalse();
        assertThat(Real.UNDEFINED.isAtMost(Real.of(a))).isFalse();
        assertThat(Real.UNDEFINED.isAtMost(Real.UNDEFINED)).isFalse();
    }

    @Property
    void squareOfRoot(@ForAll double a) {
        Real size = Real.of(Math.abs(a));
        Real root = ARITHMETIC.sqrt(size);
        Reals.assertClose(ARITHMETIC.multiply(root, root), size, DIGITS, 0, "square of root");
    }

    @Property
    void exponentialOfLogarithm(@ForAll double a) {
        Real size = Real.of(Math.abs(a));
        if (!size.isZero()) {
            Reals.assertClose(EXPONENTIAL.exp(EXPONENTIAL.log(size)), size, DIGITS, 0, "exp(log x)");
        }
    }
}
