package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.TestDefinition;
import io.github.gammawright.verification.TestMetrics;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Conditioning limits against central differences of values, and the digits that values hold. */
class ConditioningTest {

    private static final double[] PARAMETERS = {1.125, 0.5};
    private static final double[] POINT = {0.5, 4, 1.5, 2};

    @ParameterizedTest
    @EnumSource
    void limitsAreThoseOfDifferences(ReferenceQuantity quantity) {
        ReferenceEvaluator evaluator = new ReferenceEvaluator(TestMetrics.named("kerr-schild"), 60);
        double[][] inputs = quantity.inputLengths(4).stream()
                .map(length -> Arrays.copyOf(new double[] {1.25, 0.5, -0.125, 0.25}, length))
                .toArray(double[][]::new);
        ReferencePoint.Conditioned conditioned = evaluator.at(PARAMETERS, POINT).conditioned(quantity, inputs);
        List<Real> values = evaluator.at(PARAMETERS, POINT).values(quantity, inputs);
        double[] sums = new double[values.size()];
        for (int i = 0; i < sums.length; i++) {
            Reals.assertClose(conditioned.values().get(i), values.get(i), 55, 1e-3, "value " + i);
            sums[i] = Math.abs(values.get(i).toDouble());
        }
        addSlopes(sums, PARAMETERS, p -> evaluator.at(p, POINT).values(quantity, inputs));
        addSlopes(sums, POINT, x -> evaluator.at(PARAMETERS, x).values(quantity, inputs));
        for (int k = 0; k < inputs.length; k++) {
            int which = k;
            addSlopes(sums, inputs[k], v -> {
                double[][] changed = inputs.clone();
                changed[which] = v;
                return evaluator.at(PARAMETERS, POINT).values(quantity, changed);
            });
        }
        for (int i = 0; i < sums.length; i++) {
            assertThat(conditioned.limits().get(i).toDouble() * 0x1p53)
                    .as("%s component %d", quantity, i)
                    .isCloseTo(sums[i], offset(1e-8 * (1e-3 + Math.abs(sums[i]))));
        }
    }

    /** Adds |x_m ∂f/∂x_m| for each entry of an input. */
    private static void addSlopes(double[] sums, double[] input, Function<double[], List<Real>> function) {
        RealArithmetic arithmetic = RealArithmetic.ofDigits(60);
        for (int m = 0; m < input.length; m++) {
            double step = 0x1p-20;
            double[] above = input.clone();
            double[] below = input.clone();
            above[m] += step;
            below[m] -= step;
            List<Real> high = function.apply(above);
            List<Real> low = function.apply(below);
            for (int i = 0; i < sums.length; i++) {
                double slope = arithmetic.subtract(high.get(i), low.get(i)).toDouble() / (2 * step);
                sums[i] += Math.abs(input[m] * slope);
            }
        }
    }

    /** Close to a horizon values lose digits to cancellation; the guard digits must cover it. */
    @Test
    void statedDigitsHoldCloseToTheHorizonAndTheAxis() {
        double horizon = 1 + Math.sqrt(0.75);
        double[][] points = {{0, horizon * (1 + 1e-12), 1, 0}, {0, 3, 1e-10, 0}, {0, 1e6, 0.5, 0}};
        for (double[] point : points) {
            for (ReferenceQuantity quantity :
                    List.of(ReferenceQuantity.CHRISTOFFEL, ReferenceQuantity.RIEMANN, ReferenceQuantity.KRETSCHMANN)) {
                List<Real> fifty = new ReferenceEvaluator(TestMetrics.kerr(), 50)
                        .at(new double[] {1, 0.5}, point)
                        .values(quantity);
                List<Real> many = new ReferenceEvaluator(TestMetrics.kerr(), 150)
                        .at(new double[] {1, 0.5}, point)
                        .values(quantity);
                double largest = many.stream()
                        .mapToDouble(x -> Math.abs(x.toDouble()))
                        .max()
                        .orElseThrow();
                for (int i = 0; i < fifty.size(); i++) {
                    Reals.assertClose(fifty.get(i), many.get(i), 50, largest * 1e-3, quantity + " " + i);
                }
            }
        }
    }

    @Test
    void undefinedValuesAreReported() {
        ReferenceEvaluator schwarzschild = new ReferenceEvaluator(TestMetrics.schwarzschild());
        ReferencePoint horizon = schwarzschild.at(new double[] {1}, new double[] {0, 2, 1, 0});
        assertThat(horizon.values(ReferenceQuantity.METRIC).get(5).isUndefined())
                .isTrue();
        // Γ^r_rr
        assertThat(horizon.values(ReferenceQuantity.CHRISTOFFEL).get(21).isUndefined())
                .isTrue();
        assertThat(horizon.conditioned(ReferenceQuantity.CHRISTOFFEL)
                        .limits()
                        .get(21)
                        .isUndefined())
                .isTrue();
        MetricDefinition root = TestDefinition.of("root", "x", "y").lineElement("dx^2 + sqrt(x)*dy^2");
        ReferencePoint outside = new ReferenceEvaluator(root).at(new double[0], new double[] {-1, 0});
        assertThat(outside.values(ReferenceQuantity.METRIC).get(3).isUndefined())
                .isTrue();
        ReferencePoint edge = new ReferenceEvaluator(root).at(new double[0], new double[] {0, 0});
        // √x is 0 at 0, its derivative by x is not defined, its derivative by y is 0.
        assertThat(edge.values(ReferenceQuantity.METRIC).get(3).isZero()).isTrue();
        List<Real> slopes = edge.values(ReferenceQuantity.METRIC_DERIVATIVE);
        assertThat(slopes.get(3).isUndefined()).isTrue();
        assertThat(slopes.get(7).isZero()).isTrue();
        assertThat(schwarzschild
                        .at(new double[] {Double.NaN}, new double[] {0, 4, 1, 0})
                        .values(ReferenceQuantity.METRIC)
                        .get(0)
                        .isUndefined())
                .isTrue();
    }

    /** Inside a light-like surface of constant time the lapse is imaginary: undefined. */
    @Test
    void lapseNeedsSpacelikeSlices() {
        ReferencePoint inside =
                new ReferenceEvaluator(TestMetrics.schwarzschild()).at(new double[] {1}, new double[] {0, 1.5, 1, 0});
        assertThat(inside.values(ReferenceQuantity.LAPSE).get(0).isUndefined()).isTrue();
    }
}
