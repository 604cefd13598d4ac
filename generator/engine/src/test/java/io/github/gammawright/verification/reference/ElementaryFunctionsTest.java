package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.stream.Stream;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The elementary functions against published constants and against Hipparchus's decimal floating-point numbers. */
class ElementaryFunctionsTest {

    private static final RealFunctions FIFTY = new RealFunctions(RealArithmetic.ofDigits(50));
    private static final RealFunctions HUNDRED = new RealFunctions(RealArithmetic.ofDigits(100));

    /** Decimal digits in which the second library computes. */
    private static final DfpField FIELD = new DfpField(120);

    /**
     * Constants as tables give them (for instance Abramowitz &amp; Stegun 1964, table 1.1, to fewer digits; here from
     * memory), 50 digits.
     */
    @ParameterizedTest
    @CsvSource({
        "pi,    3.14159265358979323846264338327950288419716939937511",
        "e,     2.71828182845904523536028747135266249775724709369996",
        "ln2,   0.693147180559945309417232121458176568075500134360255",
        "ln10,  2.30258509299404568401799145468436420760110148862877",
        "sqrt2, 1.41421356237309504880168872420969807856967187537695",
        "sqrt3, 1.73205080756887729352744634150587236694280525381038"
    })
    void constants(String name, BigDecimal published) {
        Real value = switch (name) {
            case "pi" -> FIFTY.arithmetic().pi();
            case "e" -> FIFTY.exponential().exp(Real.ONE);
            case "ln2" -> FIFTY.exponential().log(Real.of(2));
            case "ln10" -> FIFTY.exponential().log(Real.of(10));
            case "sqrt2" -> FIFTY.arithmetic().sqrt(Real.of(2));
            default -> FIFTY.arithmetic().sqrt(Real.of(3));
        };
        Reals.assertClose(value, published, 49, name);
    }

    /**
     * The second library's inverse tangent holds only some 40 to 80 of its 120 digits, and its angle of a point only
     * those of a double; so its sine and cosine check ours.
     */
    @Test
    void inverseCircularFunctions() {
        CircularFunctions c = HUNDRED.circular();
        int compared = 0;
        for (double x : new double[] {3e-5, 0.1, -0.25, 0.5, 0.70703125, -0.9375, 0.999999}) {
            BigDecimal exact = new BigDecimal(x);
            Reals.assertClose(Real.of(x), number(theirs(c.asin(Real.of(x))).sin()), 95, "asin " + x);
            Reals.assertClose(Real.of(x), number(theirs(c.acos(Real.of(x))).cos()), 90, "acos " + x);
            assertThat(c.acos(Real.of(x)).signum()).isPositive();
            for (double scale : new double[] {1e-10, 1, 7, 1e15}) {
                Dfp angle = theirs(c.atan(Real.of(x * scale)));
                Dfp quotient = angle.sin().divide(angle.cos());
                Reals.assertClose(Real.of(x * scale), number(quotient), 75, "atan " + exact + " * " + scale);
                compared++;
            }
        }
        assertThat(compared).isEqualTo(28);
    }

    @Test
    void anglesOfPointsInAllQuadrants() {
        int compared = 0;
        for (double y : new double[] {-3, -1e-20, 0.25, 1e15}) {
            for (double x : new double[] {-2, -1e-10, 0.5, 1e10}) {
                Real angle = HUNDRED.circular().atan2(Real.of(y), Real.of(x));
                assertThat(angle.toDouble()).isEqualTo(Math.atan2(y, x), offset(1e-15));
                Dfp radius = FIELD.newDfp(x)
                        .multiply(x)
                        .add(FIELD.newDfp(y).multiply(y))
                        .sqrt();
                BigDecimal scale = number(radius);
                Reals.assertClose(
                        Real.of(x), number(radius.multiply(theirs(angle).cos())), 95, scale, "x " + y + x);
                Reals.assertClose(
                        Real.of(y), number(radius.multiply(theirs(angle).sin())), 95, scale, "y " + y + x);
                compared++;
            }
        }
        assertThat(compared).isEqualTo(16);
    }

    private static Dfp theirs(Real x) {
        return FIELD.newDfp(x.toBigDecimal(118).toString());
    }

    private static BigDecimal number(Dfp x) {
        return new BigDecimal(x.toString());
    }

    private record Candidate(String name, Function<Real, Real> ours, Function<Dfp, Dfp> theirs, double... arguments) {}

    @TestFactory
    Stream<DynamicTest> agreeWithSecondLibrary() {
        ExponentialFunctions e = HUNDRED.exponential();
        CircularFunctions c = HUNDRED.circular();
        double[] all = {
            1e-30,
            -1e-12,
            3e-5,
            0.1,
            -0.25,
            0.5,
            0.70703125,
            1,
            -1.5,
            1.5707963267948966,
            2.5,
            3.141592653589793,
            -7,
            20.75
        };
        double[] positive = {1e-300, 1e-30, 1e-12, 0.1, 0.5, 0.99999, 1.0000001, 1.5, 2, 7, 1e10, 1e200};
        double[] beyondOne = {1.0000000001, 1.5, 2, 100, 1e20};
        return List.of(
                        new Candidate("exp", e::exp, Dfp::exp, all),
                        new Candidate("expm1", e::expm1, Dfp::expm1, 0.1, -0.25, 0.5, 1, -7),
                        new Candidate("log", e::log, Dfp::log, positive),
                        new Candidate("log1p", e::log1p, x -> x.add(1).log(), 0.1, -0.25, 0.5, -0.9375, 100),
                        new Candidate("sqrt", HUNDRED.arithmetic()::sqrt, Dfp::sqrt, positive),
                        new Candidate("sin", x -> c.sineAndCosine(x).sine(), Dfp::sin, all),
                        new Candidate("cos", x -> c.sineAndCosine(x).cosine(), Dfp::cos, all),
                        new Candidate("tan", c::tan, Dfp::tan, 3e-5, 0.1, -0.25, 0.5, 1, -1.5, 2.5, -7),
                        new Candidate("sinh", e::sinh, Dfp::sinh, 0.1, -0.25, 0.5, 1, -1.5, 20.75),
                        new Candidate("cosh", e::cosh, Dfp::cosh, all),
                        new Candidate("tanh", e::tanh, Dfp::tanh, 0.1, -0.25, 0.5, 1, -1.5, 20.75),
                        new Candidate("asinh", e::asinh, Dfp::asinh, 0.1, 0.25, 0.5, 1, 1.5, 1e20),
                        new Candidate("acosh", e::acosh, Dfp::acosh, beyondOne),
                        new Candidate("atanh", e::atanh, Dfp::atanh, 0.1, -0.25, 0.5, 0.70703125, -0.9375))
                .stream()
                .flatMap(f -> Arrays.stream(f.arguments)
                        .mapToObj(x -> DynamicTest.dynamicTest(f.name + " " + x, () -> compare(f, x))));
    }

    private static void compare(Candidate candidate, double x) {
        Dfp expected = candidate.theirs.apply(FIELD.newDfp(x));
        Reals.assertClose(
                candidate.ours.apply(Real.of(x)), new BigDecimal(expected.toString()), 95, candidate.name + " " + x);
    }

    @Test
    void powersOfAllKinds() {
        BiFunction<Double, Double, Real> ours = (b, e) -> HUNDRED.power(Real.of(b), Real.of(e));
        double[][] cases = {{2, 0.3}, {7.25, -2.75}, {1e-10, 3.1}, {1.5, 40}, {3, -17}, {1e20, 0.5}, {0.1, 2.5}};
        for (double[] pair : cases) {
            Dfp expected = FIELD.newDfp(pair[0]).pow(FIELD.newDfp(pair[1]));
            Reals.assertClose(
                    ours.apply(pair[0], pair[1]), new BigDecimal(expected.toString()), 95, pair[0] + "^" + pair[1]);
        }
        assertThat(ours.apply(-2.0, 3.0).toDouble()).isEqualTo(-8);
        assertThat(ours.apply(0.0, 0.0).toDouble()).isEqualTo(1);
        assertThat(ours.apply(0.0, 2.5).isZero()).isTrue();
        assertThat(ours.apply(-2.0, 0.5).isUndefined()).isTrue();
        assertThat(ours.apply(0.0, -1.0).isUndefined()).isTrue();
    }

    @Test
    void outsideTheRealDomainNothingIsDefined() {
        ExponentialFunctions e = FIFTY.exponential();
        CircularFunctions c = FIFTY.circular();
        assertThat(List.of(
                        e.log(Real.ZERO),
                        e.log(Real.of(-1)),
                        e.acosh(Real.of(0.5)),
                        e.atanh(Real.ONE),
                        e.atanh(Real.of(-2)),
                        e.log1p(Real.of(-1)),
                        c.asin(Real.of(1.5)),
                        c.acos(Real.of(-1.5)),
                        c.atan2(Real.ZERO, Real.ZERO),
                        FIFTY.arithmetic().sqrt(Real.of(-1)),
                        FIFTY.arithmetic().divide(Real.ONE, Real.ZERO),
                        e.exp(Real.UNDEFINED),
                        e.exp(Real.of(1e300))))
                .hasSize(13)
                .allMatch(Real::isUndefined);
        assertThat(e.exp(Real.of(-1e300)).isZero()).isTrue();
        assertThat(e.tanh(Real.of(-1e300)).toDouble()).isEqualTo(-1);
        assertThat(e.sinh(Real.of(-1000)).isUndefined()).isFalse();
    }
}
