package io.github.gammawright.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Claims;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferencePoint;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.math.BigDecimal;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** What the definitions claim of themselves holds in 50 digits at points of their domains. */
class ClaimsTest {

    private static final int POINTS = 3;

    /** What counts as zero: far above the reference's error, far below any curvature of these metrics. */
    private static final double NOTHING = 1e-30;

    private final List<MetricDefinition> definitions = Stream.concat(
                    Definitions.builtIn().stream(), Definitions.difficult().stream())
            .toList();

    @Test
    void thereAreClaimsOfEveryKind() {
        assertThat(definitions.stream().filter(d -> d.claims().vacuum().orElse(false)))
                .hasSizeGreaterThanOrEqualTo(20);
        assertThat(definitions.stream().filter(d -> d.claims().signature().isPresent()))
                .hasSizeGreaterThanOrEqualTo(60);
        assertThat(definitions.stream().filter(d -> d.claims().conformallyFlat().orElse(false)))
                .hasSizeGreaterThanOrEqualTo(10);
        assertThat(definitions.stream()
                        .filter(d -> d.claims().einsteinConstant().isPresent()))
                .hasSizeGreaterThanOrEqualTo(5);
        assertThat(definitions.stream().filter(d -> !d.claims().killing().isEmpty()))
                .hasSizeGreaterThanOrEqualTo(8);
    }

    @TestFactory
    Stream<DynamicTest> claimsHold() {
        return definitions.stream()
                .map(definition -> DynamicTest.dynamicTest(
                        definition.name(),
                        () -> SamplePoints.visit(definition, POINTS, point -> check(definition, point))));
    }

    private static void check(MetricDefinition definition, ReferencePoint point) {
        Claims claims = definition.claims();
        int n = definition.dimension();
        claims.signature()
                .ifPresent(signature -> assertThat(signature(point, n)).isEqualTo(sorted(signature)));
        claims.independentOf().ifPresent(coordinates -> {
            for (String coordinate : coordinates) {
                int k = definition.coordinates().indexOf(coordinate);
                List<Real> derivative = point.values(ReferenceQuantity.METRIC_DERIVATIVE);
                assertThat(largest(derivative.subList(k * n * n, (k + 1) * n * n)))
                        .as("derivative by %s", coordinate)
                        .isZero();
            }
        });
        claims.vacuum().ifPresent(vacuum -> {
            double ricci = largest(point.values(ReferenceQuantity.RICCI));
            assertThat(ricci < NOTHING).as("Ricci tensor of size %s", ricci).isEqualTo(vacuum);
        });
        claims.conformallyFlat().filter(flat -> n > 3).ifPresent(flat -> {
            double weyl = largest(point.values(ReferenceQuantity.WEYL));
            assertThat(weyl < NOTHING).as("Weyl tensor of size %s", weyl).isEqualTo(flat);
        });
    }

    @TestFactory
    Stream<DynamicTest> einsteinConstantsAreRight() {
        return definitions.stream()
                .filter(definition -> definition.claims().einsteinConstant().isPresent())
                .map(definition -> DynamicTest.dynamicTest(definition.name(), () -> checkEinstein(definition)));
    }

    /** R_ij = Λ g_ij. */
    private static void checkEinstein(MetricDefinition definition) {
        int n = definition.dimension();
        Expression constant = definition.claims().einsteinConstant().orElseThrow();
        MetricDefinition constants = DiagonalDefinition.of(definition, Collections.nCopies(n, constant));
        SamplePoints.visitBoth(definition, constants, POINTS, (point, constantPoint) -> {
            BigDecimal lambda =
                    exact(constantPoint.values(ReferenceQuantity.METRIC).get(0));
            List<Real> ricci = point.values(ReferenceQuantity.RICCI);
            List<Real> metric = point.values(ReferenceQuantity.METRIC);
            for (int i = 0; i < n * n; i++) {
                BigDecimal expected = lambda.multiply(exact(metric.get(i)));
                assertThat(exact(ricci.get(i)).subtract(expected).abs().doubleValue())
                        .isLessThan(NOTHING * Math.max(1, expected.abs().doubleValue()));
            }
        });
    }

    @TestFactory
    Stream<DynamicTest> killingVectorsAreRight() {
        return definitions.stream()
                .flatMap(definition -> definition.claims().killing().stream()
                        .map(field -> DynamicTest.dynamicTest(
                                definition.name() + " " + field, () -> checkKilling(definition, field))));
    }

    /** ξ^k ∂_k g_ij + g_kj ∂_i ξ^k + g_ik ∂_j ξ^k = 0. */
    private static void checkKilling(MetricDefinition definition, List<Expression> field) {
        int n = definition.dimension();
        SamplePoints.visitBoth(definition, DiagonalDefinition.of(definition, field), POINTS, (point, fieldPoint) -> {
            List<Real> metric = point.values(ReferenceQuantity.METRIC);
            List<Real> metricDerivative = point.values(ReferenceQuantity.METRIC_DERIVATIVE);
            List<Real> vector = fieldPoint.values(ReferenceQuantity.METRIC);
            List<Real> vectorDerivative = fieldPoint.values(ReferenceQuantity.METRIC_DERIVATIVE);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    BigDecimal sum = BigDecimal.ZERO;
                    for (int k = 0; k < n; k++) {
                        int diagonal = k * n + k;
                        sum = sum.add(exact(vector.get(diagonal))
                                        .multiply(exact(metricDerivative.get((k * n + i) * n + j))))
                                .add(exact(metric.get(k * n + j))
                                        .multiply(exact(vectorDerivative.get(i * n * n + diagonal))))
                                .add(exact(metric.get(i * n + k))
                                        .multiply(exact(vectorDerivative.get(j * n * n + diagonal))));
                    }
                    assertThat(sum.abs().doubleValue()).isLessThan(NOTHING);
                }
            }
        });
    }

    private static BigDecimal exact(Real value) {
        return value.toBigDecimal(45);
    }

    /** The largest size of a component, as a double. */
    private static double largest(List<Real> components) {
        return components.stream()
                .mapToDouble(component -> Math.abs(component.toDouble()))
                .max()
                .orElse(0);
    }

    /** The signs of the metric's eigenvalues, minus first. */
    private static String signature(ReferencePoint point, int n) {
        List<Real> metric = point.values(ReferenceQuantity.METRIC);
        Array2DRowRealMatrix matrix = new Array2DRowRealMatrix(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                // scaled to a diagonal of size 1, which keeps the signs and helps coordinates of different units
                double scale = Math.sqrt(Math.abs(diagonal(metric, n, i) * diagonal(metric, n, j)));
                matrix.setEntry(i, j, metric.get(i * n + j).toDouble() / scale);
            }
        }
        StringBuilder signs = new StringBuilder();
        for (double eigenvalue : new EigenDecompositionSymmetric(matrix).getEigenvalues()) {
            signs.append(eigenvalue < 0 ? '-' : '+');
        }
        return sorted(signs.toString());
    }

    private static double diagonal(List<Real> metric, int n, int i) {
        double entry = metric.get(i * n + i).toDouble();
        return entry == 0 ? 1 : entry;
    }

    private static String sorted(String signature) {
        return signature
                .chars()
                .mapToObj(sign -> String.valueOf((char) sign))
                .sorted((a, b) -> b.compareTo(a))
                .collect(Collectors.joining());
    }
}
