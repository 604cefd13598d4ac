package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.ElementaryFunction;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** Identities that truncated power series must satisfy in every coefficient. */
class SeriesPropertiesTest {

    private static final int DIGITS = 50;
    private static final int VARIABLES = 3;
    private static final RealFunctions FUNCTIONS = new RealFunctions(RealArithmetic.ofDigits(DIGITS));

    private static TaylorRing ring(int order) {
        return new TaylorRing(FUNCTIONS, new TaylorBasis(VARIABLES, order), VARIABLES);
    }

    /** A series with random coefficients of size up to 1 and the given value. */
    private static Taylor random(TaylorRing ring, double value, long seed) {
        Random random = new Random(seed);
        Real[] coefficients = new Real[ring.basis().count(ring.order())];
        for (int i = 0; i < coefficients.length; i++) {
            coefficients[i] = Real.of(2 * random.nextDouble() - 1);
        }
        coefficients[0] = Real.of(value);
        return new Taylor(ring, coefficients, ring.order());
    }

    private static void assertEqual(Taylor actual, Taylor expected, double scale) {
        assertThat(actual.order()).isEqualTo(expected.order());
        for (int i = 0; i < expected.ring().basis().count(expected.order()); i++) {
            Reals.assertClose(actual.coefficient(i), expected.coefficient(i), DIGITS, scale, "coefficient " + i);
        }
    }

    private static Taylor apply(ElementaryFunction function, Taylor argument) {
        return TaylorFunctions.apply(function, argument);
    }

    @Property
    void productRule(@ForAll long a, @ForAll long b, @ForAll @IntRange(min = 1, max = 4) int order) {
        TaylorRing ring = ring(order);
        Taylor u = random(ring, 0.5, a);
        Taylor v = random(ring, -0.75, b);
        for (int variable = 0; variable < VARIABLES; variable++) {
            Taylor whole = u.times(v).derivative(variable);
            Taylor parts = u.derivative(variable).times(v).plus(u.times(v.derivative(variable)));
            assertEqual(whole, parts, 1);
        }
    }

    @Property
    void quotientTimesDivisor(@ForAll long a, @ForAll long b, @ForAll @DoubleRange(min = 0.5, max = 4) double value) {
        TaylorRing ring = ring(4);
        Taylor u = random(ring, value, a);
        Taylor v = random(ring, -value, b);
        assertEqual(u.dividedBy(v).times(v), u, 1000);
    }

    @Property
    void exponentialOfLogarithm(@ForAll long seed, @ForAll @DoubleRange(min = 0.25, max = 4) double value) {
        Taylor u = random(ring(4), value, seed);
        assertEqual(apply(ElementaryFunction.EXP, apply(ElementaryFunction.LOG, u)), u, 1000);
    }

    @Property
    void circularAndHyperbolicPythagoras(@ForAll long seed, @ForAll @DoubleRange(min = -4, max = 4) double value) {
        TaylorRing ring = ring(4);
        Taylor u = random(ring, value, seed);
        Taylor sine = apply(ElementaryFunction.SIN, u);
        Taylor cosine = apply(ElementaryFunction.COS, u);
        assertEqual(sine.times(sine).plus(cosine.times(cosine)), ring.constant(Real.ONE), 100);
        Taylor sinh = apply(ElementaryFunction.SINH, u);
        Taylor cosh = apply(ElementaryFunction.COSH, u);
        assertEqual(cosh.times(cosh).minus(sinh.times(sinh)), ring.constant(Real.ONE), 1e6);
        assertEqual(apply(ElementaryFunction.TAN, u).times(cosine), sine, 1e6);
        assertEqual(apply(ElementaryFunction.TANH, u).times(cosh), sinh, 1e6);
    }

    @Property
    void inverseFunctions(@ForAll long seed, @ForAll @DoubleRange(min = -0.9, max = 0.9) double value) {
        Taylor u = random(ring(3), value, seed);
        ElementaryFunction[][] pairs = {
            {ElementaryFunction.SIN, ElementaryFunction.ASIN},
            {ElementaryFunction.COS, ElementaryFunction.ACOS},
            {ElementaryFunction.TAN, ElementaryFunction.ATAN},
            {ElementaryFunction.SINH, ElementaryFunction.ASINH},
            {ElementaryFunction.TANH, ElementaryFunction.ATANH}
        };
        for (ElementaryFunction[] pair : pairs) {
            assertEqual(apply(pair[0], apply(pair[1], u)), u, 1e6);
        }
        Taylor beyond = random(ring(3), 1.2 + Math.abs(value), seed);
        assertEqual(apply(ElementaryFunction.COSH, apply(ElementaryFunction.ACOSH, beyond)), beyond, 1e6);
    }

    @Property
    void anglesFollowRotations(
            @ForAll long a, @ForAll long b, @ForAll @DoubleRange(min = -3.1, max = 3.1) double angle) {
        TaylorRing ring = ring(3);
        Taylor radius = random(ring, 2, a);
        Taylor phase = random(ring, angle, b);
        Taylor x = radius.times(apply(ElementaryFunction.COS, phase));
        Taylor y = radius.times(apply(ElementaryFunction.SIN, phase));
        assertEqual(TaylorFunctions.atan2(y, x), phase, 1000);
    }

    @Property
    void powersAddTheirExponents(
            @ForAll long seed,
            @ForAll @DoubleRange(min = 0.25, max = 4) double value,
            @ForAll @DoubleRange(min = -3, max = 3) double exponent) {
        TaylorRing ring = ring(3);
        Taylor u = random(ring, value, seed);
        Taylor varying = random(ring, exponent, seed + 1);
        Taylor both = TaylorFunctions.power(u, varying).times(TaylorFunctions.power(u, Real.of(exponent)));
        assertEqual(both, TaylorFunctions.power(u, varying.plus(ring.constant(Real.of(exponent)))), 1e8);
        assertEqual(u.sqrt().times(u.sqrt()), u, 1);
    }

    @Property
    void integerPowersAreProducts(@ForAll long seed, @ForAll @DoubleRange(min = -2, max = 2) double value) {
        Taylor u = random(ring(4), value, seed);
        assertEqual(
                TaylorFunctions.power(u, Real.of(5)),
                u.times(u).times(u).times(u).times(u),
                1e4);
        Taylor atZero = random(ring(4), 0, seed);
        assertEqual(
                TaylorFunctions.power(atZero, Real.of(3)), atZero.times(atZero).times(atZero), 10);
    }

    @Property
    void metricTimesInverse(@ForAll long seed, @ForAll @IntRange(min = 1, max = 5) int n) {
        TaylorRing ring = ring(2);
        Taylor[][] metric = new Taylor[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                metric[i][j] = random(ring, (i == j ? (i == 0 ? -n : n) : 0.5), seed + 31L * i + j);
                metric[j][i] = metric[i][j];
            }
        }
        Taylor[][] inverse = TaylorMatrix.invert(metric, ring).inverse();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                Taylor sum = ring.zero();
                for (int k = 0; k < n; k++) {
                    sum = sum.plus(metric[i][k].times(inverse[k][j]));
                }
                assertEqual(sum, ring.constant(i == j ? Real.ONE : Real.ZERO), 1e4);
            }
        }
    }
}
