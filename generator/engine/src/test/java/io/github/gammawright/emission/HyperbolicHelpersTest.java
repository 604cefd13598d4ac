package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.RealFunction;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.UnaryOperator;
import org.assertj.core.data.Offset;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.junit.jupiter.api.Test;

/** The inverse hyperbolic functions of emitted classes against arithmetic of fifty digits (Hipparchus' Dfp). */
class HyperbolicHelpersTest {

    private final CompiledKernel kernel = kernel();
    private final Object created = kernel.create();

    private static CompiledKernel kernel() {
        TestModel model = new TestModel();
        model.coordinates = List.of("x");
        int x = model.program.coordinate("x", 0);
        model.result(Quantity.METRIC, model.program.call(RealFunction.ASINH, x));
        model.result(Quantity.INVERSE_METRIC, model.program.call(RealFunction.ACOSH, x));
        model.result(Quantity.VOLUME_ELEMENT, model.program.call(RealFunction.ATANH, x));
        return CompiledKernel.of(model.build());
    }

    private double[] at(double x) {
        double[][] results = new double[3][1];
        kernel.call(created, "evaluate", new double[] {x}, results[0], results[1], results[2]);
        return new double[] {results[0][0], results[1][0], results[2][0]};
    }

    @Test
    void errorsAreBelowFourUnitsInTheLastPlace() {
        SplittableRandom random = new SplittableRandom(17);
        for (int i = 0; i < 2000; i++) {
            double magnitude = Math.scalb(1 + random.nextDouble(), random.nextInt(-60, 60));
            compare(at(magnitude)[0], magnitude, Dfp::asinh);
            compare(at(-magnitude)[0], -magnitude, Dfp::asinh);
            compare(at(1 + magnitude)[1], 1 + magnitude, Dfp::acosh);
            double fraction = i % 2 == 0 ? random.nextDouble() : Math.min(magnitude, 1 - 1 / (1 + magnitude));
            if (fraction < 1) {
                compare(at(-fraction)[2], -fraction, Dfp::atanh);
            }
        }
    }

    private static void compare(double value, double x, UnaryOperator<Dfp> function) {
        // the textbook forms of Dfp lose digits for small arguments, of which it has enough
        double expected = function.apply(new DfpField(120).newDfp(x)).toDouble();
        assertThat(Math.abs(value - expected))
                .as("at %s: %s instead of %s", x, value, expected)
                .isLessThanOrEqualTo(4 * Math.ulp(expected));
    }

    /** Abramowitz &amp; Stegun (1964), section 4.6, values from memory: asinh 1 = ln(1 + √2), acosh 2 = ln(2 + √3). */
    @Test
    void handbookValues() {
        assertThat(at(1)[0]).isCloseTo(0.881373587019543, Offset.offset(1.2e-16));
        assertThat(at(2)[1]).isCloseTo(1.3169578969248166, Offset.offset(2.3e-16));
        assertThat(at(0.5)[2]).isCloseTo(0.5493061443340548, Offset.offset(1.2e-16));
    }

    @Test
    void edgesOfTheDomain() {
        assertThat(at(0)).containsExactly(0.0, Double.NaN, 0.0);
        assertThat(1 / at(-0.0)[0]).isNegative();
        assertThat(1 / at(-0.0)[2]).isNegative();
        assertThat(at(1)[1]).isEqualTo(0.0);
        assertThat(at(1)[2]).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(at(-1)[2]).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(at(1.5)[2]).isNaN();
        assertThat(at(0.5)[1]).isNaN();
        assertThat(at(Double.NaN)).containsOnly(Double.NaN);
        assertThat(at(Double.NEGATIVE_INFINITY)[0]).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(at(Double.POSITIVE_INFINITY)[1]).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(at(Double.MAX_VALUE)[0]).isCloseTo(710.4758600739439, Offset.offset(1e-12));
    }
}
