package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;

/** Comparisons of high-precision numbers for tests. */
final class Reals {

    private Reals() {}

    /** Asserts |actual − expected| ≤ 10^−digits · max(|expected|, scale). */
    static void assertClose(Real actual, BigDecimal expected, int digits, BigDecimal scale, String what) {
        assertThat(actual.isUndefined()).as("%s is defined", what).isFalse();
        BigDecimal error = actual.toBigDecimal(digits + 60).subtract(expected).abs();
        BigDecimal bound = expected.abs().max(scale).scaleByPowerOfTen(-digits);
        assertThat(error)
                .as("%s: %s and %s", what, actual.toBigDecimal(digits + 5), expected.round(new MathContext(digits + 5)))
                .isLessThanOrEqualTo(bound);
    }

    /** The same relative to the expected value alone. */
    static void assertClose(Real actual, BigDecimal expected, int digits, String what) {
        assertClose(actual, expected, digits, BigDecimal.ZERO, what);
    }

    /** The same for two numbers of ours. */
    static void assertClose(Real actual, Real expected, int digits, double scale, String what) {
        assertThat(expected.isUndefined())
                .as("%s is expected to be defined", what)
                .isFalse();
        assertClose(actual, expected.toBigDecimal(digits + 60), digits, BigDecimal.valueOf(scale), what);
    }
}
