package io.github.gammawright.optimiser;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.SplittableRandom;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

/** The outside reference is {@link BigDecimal}. */
class DoubleDoubleTest {

    private static final MathContext DIGITS = new MathContext(60, RoundingMode.HALF_EVEN);

    /** Sixteen units of the last of the 106 bits. */
    private static final BigDecimal ALLOWED = new BigDecimal(Math.scalb(1.0, -102));

    private final SplittableRandom random = new SplittableRandom(8);

    private static BigDecimal exact(DoubleDouble value) {
        return new BigDecimal(value.high()).add(new BigDecimal(value.low()));
    }

    private static DoubleDouble number(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double high = (random.nextDouble() - 0.5) * Math.scalb(1.0, random.nextInt(-40, 40));
        return DoubleDouble.of(high).add(DoubleDouble.of(high * random.nextDouble() * 0x1p-53));
    }

    private static void isClose(DoubleDouble actual, BigDecimal expected, BigDecimal scale) {
        assertThat(exact(actual).subtract(expected).abs()).isLessThanOrEqualTo(ALLOWED.multiply(scale.abs()));
        assertThat(actual.high() + actual.low()).isEqualTo(actual.high());
    }

    @Property(tries = 300)
    void arithmeticIsGoodTo31Digits(@ForAll long first, @ForAll long second) {
        DoubleDouble a = number(first);
        DoubleDouble b = number(second);
        BigDecimal x = exact(a);
        BigDecimal y = exact(b);
        BigDecimal larger = x.abs().max(y.abs());
        isClose(a.add(b), x.add(y), larger);
        isClose(a.add(b.negate()), x.subtract(y), larger);
        isClose(a.multiply(b), x.multiply(y), x.multiply(y));
        isClose(a.divide(b), x.divide(y, DIGITS), x.divide(y, DIGITS));
        BigDecimal root = x.abs().sqrt(DIGITS);
        isClose(a.abs().sqrt(), root, root);
    }

    /** What a double loses to cancellation is there. */
    @Test
    void cancellationLeavesTheDigitsThatADoubleLoses() {
        double x = 1 + random.nextDouble();
        DoubleDouble third = DoubleDouble.of(x).divide(DoubleDouble.of(3));
        DoubleDouble rest = third.add(DoubleDouble.of(-third.high()));
        BigDecimal expected =
                new BigDecimal(x).divide(new BigDecimal(3), DIGITS).subtract(new BigDecimal(third.high()));
        assertThat(rest.high()).isNotZero();
        isClose(rest, expected, new BigDecimal(third.high()));
    }

    @Test
    void whatIsNotFiniteStaysSo() {
        assertThat(DoubleDouble.of(1).divide(DoubleDouble.of(0)).high()).matches(v -> !Double.isFinite(v));
        assertThat(DoubleDouble.of(-1).sqrt().high()).isNaN();
    }
}
