package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.RealFunction;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Sine and cosine of emitted classes against arithmetic of fifty digits (Hipparchus' Dfp) and against long fractions. */
class TrigonometryHelpersTest {

    /** The circle's constant to a hundred decimals; Abramowitz &amp; Stegun (1964), table 1.1, from memory. */
    private static final BigDecimal PI = new BigDecimal("3.14159265358979323846264338327950288419716939937510"
            + "58209749445923078164062862089986280348253421170679");

    private static final int LARGEST = 1 << 20;
    private static final double LARGEST_ERROR = 0.85;

    private final DfpField field = new DfpField(50);
    private final CompiledKernel kernel = kernel();
    private final DoubleUnaryOperator sine = helper("sin");
    private final DoubleUnaryOperator cosine = helper("cos");

    private static CompiledKernel kernel() {
        TestModel model = new TestModel();
        model.coordinates = List.of("x");
        int x = model.program.coordinate("x", 0);
        model.result(Quantity.METRIC, model.program.call(RealFunction.SIN, x));
        model.result(Quantity.INVERSE_METRIC, model.program.call(RealFunction.COS, x));
        return CompiledKernel.of(model.build().withSharedTrigonometry(true));
    }

    /** Directly, since hundreds of thousands of calls by reflection take too long. */
    private DoubleUnaryOperator helper(String name) {
        try {
            var handle = MethodHandles.privateLookupIn(kernel.type, MethodHandles.lookup())
                    .findStatic(kernel.type, name, MethodType.methodType(double.class, double.class));
            return x -> {
                try {
                    return (double) handle.invokeExact(x);
                } catch (Throwable e) {
                    throw new AssertionError(e);
                }
            };
        } catch (ReflectiveOperationException e) {
            throw new LinkageError(e.getMessage(), e);
        }
    }

    @Test
    void errorsAreBelowOneUnitInTheLastPlace() {
        SplittableRandom random = new SplittableRandom(1964);
        double worst = 0;
        for (int i = 0; i < 3_000; i++) {
            double x = switch (i % 3) {
                case 0 -> random.nextDouble(-7, 7);
                case 1 -> random.nextDouble(-LARGEST, LARGEST);
                default -> Math.scalb(random.nextDouble(-1, 1), random.nextInt(-32, 21));
            };
            Dfp exact = field.newDfp(x);
            worst = Math.max(worst, error(sine.applyAsDouble(x), exact.sin()));
            worst = Math.max(worst, error(cosine.applyAsDouble(x), exact.cos()));
        }
        assertThat(worst).isBetween(0.5, LARGEST_ERROR);
    }

    private double error(double value, Dfp exact) {
        return Math.abs(exact.subtract(field.newDfp(value)).toDouble()) / Math.ulp(exact.toDouble());
    }

    /** Where digits cancel: multiples of a right angle, the doubles next to them and some further ones. */
    @Test
    void nearRightAngles() {
        assertThat(nearRightAngles(31)).isEqualTo(3 * 21_534);
    }

    @Test
    @Tag("campaign")
    void nearEveryRightAngle() {
        assertThat(nearRightAngles(1)).isEqualTo(3 * 667_544);
    }

    private int nearRightAngles(int step) {
        BigDecimal rightAngle = PI.divide(BigDecimal.valueOf(2));
        int count = 0;
        double worst = 0;
        for (int n = 1; n * (Math.PI / 2) < LARGEST; n += step) {
            BigDecimal angle = rightAngle.multiply(BigDecimal.valueOf(n));
            double nearest = angle.doubleValue();
            for (double x : List.of(nearest, Math.nextUp(nearest), nearest - 3e-9)) {
                // sin and cos of x, up to sign, by the series for what remains
                BigDecimal rest = new BigDecimal(x).subtract(angle);
                BigDecimal square = rest.multiply(rest, MathContext.DECIMAL64);
                BigDecimal small =
                        rest.subtract(square.multiply(rest).divide(BigDecimal.valueOf(6), MathContext.DECIMAL64));
                BigDecimal large = BigDecimal.ONE.subtract(square.divide(BigDecimal.valueOf(2)));
                boolean odd = (n & 1) != 0;
                double sin = sine.applyAsDouble(x);
                double cos = cosine.applyAsDouble(x);
                boolean minusSin = (n & 2) != 0;
                boolean minusCos = ((n + 1) & 2) != 0;
                worst = Math.max(worst, error(minusSin ? -sin : sin, odd ? large : small));
                worst = Math.max(worst, error(minusCos ? -cos : cos, odd ? small : large));
                count++;
            }
        }
        assertThat(worst).isLessThan(LARGEST_ERROR);
        return count;
    }

    private static double error(double value, BigDecimal exact) {
        return Math.abs(exact.subtract(new BigDecimal(value)).doubleValue()) / Math.ulp(exact.doubleValue());
    }

    @Test
    void specialArguments() {
        assertThat(1 / sine.applyAsDouble(0.0)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(1 / sine.applyAsDouble(-0.0)).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(cosine.applyAsDouble(-0.0)).isEqualTo(1);
        for (double x : new double[] {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY}) {
            assertThat(sine.applyAsDouble(x)).isNaN();
            assertThat(cosine.applyAsDouble(x)).isNaN();
        }
        assertThat(sine.applyAsDouble(Double.MIN_VALUE)).isEqualTo(Double.MIN_VALUE);
        assertThat(sine.applyAsDouble(-1e-300)).isEqualTo(-1e-300);
    }

    /** Payne &amp; Hanek (1983) reduce such arguments; the library does it. */
    @Test
    void beyondTwoToTheTwentiethTheLibraryDecides() {
        for (double x : new double[] {Math.nextUp((double) LARGEST), -3e7, 1e22, -Double.MAX_VALUE}) {
            assertThat(sine.applyAsDouble(x)).isEqualTo(StrictMath.sin(x));
            assertThat(cosine.applyAsDouble(x)).isEqualTo(StrictMath.cos(x));
        }
        assertThat(error(sine.applyAsDouble(LARGEST), field.newDfp(LARGEST).sin()))
                .isLessThan(LARGEST_ERROR);
    }

    /** sin 1 = 0.84147 09848 07896 50665 and cos 1 = 0.54030 23058 68139 71740; Abramowitz &amp; Stegun (1964), from memory. */
    @Test
    void handbookValues() {
        assertThat(sine.applyAsDouble(1)).isEqualTo(Double.parseDouble("0.84147098480789650665"));
        assertThat(cosine.applyAsDouble(1)).isEqualTo(Double.parseDouble("0.54030230586813971740"));
        assertThat(sine.applyAsDouble(Math.PI)).isEqualTo(1.2246467991473532e-16);
    }

    @Test
    void nothingButJavaLangIsUsedAndMathsOwnFunctionsAreNot() {
        assertThat(kernel.source)
                .doesNotContain(" Math.sin(")
                .doesNotContain(" Math.cos(")
                .contains("= sin(x)");
        assertThat(kernel.source.lines().filter(line -> line.startsWith("import")))
                .allMatch(l -> l.contains(" java."));
        assertThat(kernel.source).contains("sincos 1");
    }
}
