package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.BigInteger;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Scale;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ParameterDefaultsTest {

    private static double value(String text) {
        return ParameterDefaults.value(Parsing.parse(text));
    }

    @ParameterizedTest
    @CsvSource({
        "1, 1.0",
        "3/5, 0.6",
        "0.1 + 0.2, 0.3",
        "1/3, 0.3333333333333333",
        "-2^-2, -0.25",
        "1e-320, 1e-320",
        "2^-1000/2^74, 4.9e-324",
        "2^-1000/2^75, 0.0",
        "3*2^-1000/2^76, 4.9e-324",
        "1e309, Infinity",
        "1.7976931348623157e308, 1.7976931348623157e308",
        "9007199254740993, 9007199254740992",
        "9007199254740995, 9007199254740996",
        "9007199254740993 + 1e-900, 9007199254740994",
    })
    void rationalsAreRoundedToTheNearest(String expression, double expected) {
        assertThat(value(expression)).isEqualTo(expected);
    }

    /** Decimal expansions from memory: Abramowitz and Stegun (1964), table 1.1; each determines the double. */
    @ParameterizedTest
    @CsvSource({
        "pi, 3.14159265358979323846",
        "exp(1), 2.71828182845904523536",
        "sqrt(2), 1.41421356237309504880",
        "log(2), 0.69314718055994530942",
        "(1 + sqrt(5))/2, 1.61803398874989484820",
        "exp(pi), 23.14069263277926900573",
        "10^(1/3), 2.15443469003188372176",
        "atan(1)*4, 3.14159265358979323846",
        "'atan2(0, -1)', 3.14159265358979323846",
        "'atan2(-1, 0)', -1.57079632679489661923",
        "'atan2(-1, -1)', -2.35619449019234492885",
        "'atan2(2, 1) - atan(2)', 0",
    })
    void handbookValues(String expression, String expansion) {
        assertThat(value(expression)).isEqualTo(Double.parseDouble(expansion));
    }

    @Test
    void cancellationCostsNothing() {
        assertThat(value("exp(1e-200) - 1")).isEqualTo(1e-200);
        assertThat(value("sqrt(2)^2 - 2")).isZero();
        assertThat(value("sin(pi)")).isZero();
        assertThat(value("cos(1e-30) - 1 + 1e-60/2")).isEqualTo(1e-120 / 24);
        // sin(10^22), the classic test of argument reduction (Ng 1992).
        assertThat(value("sin(1e22)")).isEqualTo(-0.8522008497671888);
        assertThat(value("exp(-1e5)")).isZero();
    }

    @Test
    void whatHasNoFiniteValue() {
        assertThat(value("sqrt(-1)")).isNaN();
        assertThat(value("asin(2)")).isNaN();
        assertThat(value("(-8)^(1/3)")).isNaN();
        assertThat(value("exp(1000)")).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(Double.isFinite(value("log(0)"))).isFalse();
    }

    @Property
    void fractionsAreRoundedAsBigDecimalsAre(
            @ForAll long numerator,
            @ForAll @IntRange(min = 1) int denominator,
            @ForAll @IntRange(min = -1100, max = 1000) int two) {
        BigInteger scale = BigInteger.TWO.pow(Math.abs(two));
        BigFraction fraction = two >= 0
                ? new BigFraction(BigInteger.valueOf(numerator).multiply(scale), BigInteger.valueOf(denominator))
                : new BigFraction(
                        BigInteger.valueOf(numerator),
                        BigInteger.valueOf(denominator).multiply(scale));
        // Far more digits than any two neighbouring doubles, or their mean, could need to be told apart.
        double expected = new BigDecimal(fraction.getNumerator())
                .divide(new BigDecimal(fraction.getDenominator()), new java.math.MathContext(1_200))
                .doubleValue();
        assertThat(CorrectRounding.toDouble(fraction)).isEqualTo(expected == 0 ? 0 : expected);
    }

    @Property(tries = 60)
    void functionsAgreeWithAnotherLibrary(@ForAll @DoubleRange(min = 0.001, max = 30) @Scale(12) double x) {
        String text = new BigDecimal(x).toPlainString();
        Apfloat at = new Apfloat(new BigDecimal(x)).precision(60);
        assertThat(value("sin(" + text + ")")).isEqualTo(nearest(ApfloatMath.sin(at)));
        assertThat(value("cos(" + text + ")")).isEqualTo(nearest(ApfloatMath.cos(at)));
        assertThat(value("tan(" + text + ")")).isEqualTo(nearest(ApfloatMath.tan(at)));
        assertThat(value("atan(" + text + ")")).isEqualTo(nearest(ApfloatMath.atan(at)));
        assertThat(value("asin(1/(1 + " + text + "))"))
                .isEqualTo(nearest(ApfloatMath.asin(one().divide(one().add(at)))));
        assertThat(value("acos(1/(1 + " + text + "))"))
                .isEqualTo(nearest(ApfloatMath.acos(one().divide(one().add(at)))));
        assertThat(value("sinh(" + text + ")")).isEqualTo(nearest(ApfloatMath.sinh(at)));
        assertThat(value("cosh(" + text + ")")).isEqualTo(nearest(ApfloatMath.cosh(at)));
        assertThat(value("tanh(" + text + ")")).isEqualTo(nearest(ApfloatMath.tanh(at)));
        assertThat(value("asinh(-" + text + ")")).isEqualTo(nearest(ApfloatMath.asinh(at.negate())));
        assertThat(value("acosh(1 + " + text + ")")).isEqualTo(nearest(ApfloatMath.acosh(one().add(at))));
        assertThat(value("atanh(1/(1 + " + text + "))"))
                .isEqualTo(nearest(ApfloatMath.atanh(one().divide(one().add(at)))));
        assertThat(value("exp(-" + text + ")")).isEqualTo(nearest(ApfloatMath.exp(at.negate())));
        assertThat(value("log(" + text + ")")).isEqualTo(nearest(ApfloatMath.log(at)));
        assertThat(value("sqrt(" + text + ")")).isEqualTo(nearest(ApfloatMath.sqrt(at)));
        assertThat(value(text + "^(7/3)"))
                .isEqualTo(nearest(
                        ApfloatMath.pow(at, new Apfloat("7").precision(60).divide(new Apfloat("3").precision(60)))));
        assertThat(value("atan2(-" + text + ", -2)"))
                .isEqualTo(nearest(ApfloatMath.atan2(at.negate(), new Apfloat("-2").precision(60))));
        assertThat(value("abs(-" + text + ")")).isEqualTo(x);
    }

    private static Apfloat one() {
        return new Apfloat("1").precision(60);
    }

    private static double nearest(Apfloat value) {
        return new BigDecimal(value.toString(true)).doubleValue();
    }
}
