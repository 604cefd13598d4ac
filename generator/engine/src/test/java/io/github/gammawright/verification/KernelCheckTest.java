package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelReport.Verdict;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class KernelCheckTest {

    private static final CheckSettings SETTINGS = CheckSettings.DEFAULT.withPoints(50);

    private static KernelReport check(MetricDefinition definition, KernelUnderTest kernel) {
        return new KernelCheck(definition, SETTINGS).check(kernel);
    }

    @Test
    void closedFormsPass() {
        KernelReport report = check(TestMetrics.schwarzschild(), HandWrittenKernels.schwarzschild());
        assertThat(report.verdict()).isEqualTo(Verdict.PASSED);
        assertThat(report.defects()).isEmpty();
        assertThat(report.points()).isGreaterThan(90);
        assertThat(report.edgePoints()).isGreaterThan(40);
        QuantityReport symbols = report.quantities().get(0);
        assertThat(symbols.compared()).isEqualTo(64L * report.points());
        assertThat(symbols.worstZero()).isZero();
        assertThat(symbols.worstLimits().orElseThrow().limits()).isBetween(0.01, 2.0);
        assertThat(symbols.medianUlps()).isBetween(0.0, 1.0);
        assertThat(report.largestMethod().orElseThrow().method()).isEqualTo("evaluate");
    }

    @Test
    void severalPackedQuantitiesWithAnInput() {
        KernelReport report = check(TestMetrics.named("sphere"), HandWrittenKernels.sphere());
        assertThat(report.verdict()).isEqualTo(Verdict.PASSED);
        assertThat(report.quantities())
                .extracting(QuantityReport::quantity)
                .containsExactly("metric", "christoffel", "geodesic-acceleration");
        assertThat(report.quantities().get(2).worstLimits().orElseThrow().inputs())
                .hasSize(1);
    }

    @Test
    void nonZeroLayoutByTheClassesOwnIndex() {
        KernelReport report = check(TestMetrics.named("sphere"), HandWrittenKernels.sphereNonZero());
        assertThat(report.verdict()).isEqualTo(Verdict.PASSED);
        assertThat(report.quantities().get(0).compared()).isEqualTo(6L * report.points());
    }

    /** Kernels made wrong on purpose: signs, indices, factors, dropped terms, constants in the 12th digit. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-M / (r * d)|M / (r * d)",
                "-s * c|s * c",
                "set(result, 0, 0, 1,|set(result, 0, 0, 2,",
                "set(result, 3, 1, 3, 1 / r)|set(result, 3, 1, 3, 2 / r)",
                "M * d / (r * r * r)|M * d / (r * r)",
                "-d * s * s|-d * s",
                "r - 2 * M|r - 2.00000000001 * M",
                "c / s|c / s * 1.000000000005",
                "set(result, 2, 1, 2, 1 / r);|",
                "result[index(k, j, i)] = value;|",
                "Math.sin(point[2])|Math.sin(point[3])",
                "double d = r - 2 * M;|double d = r;",
                "fill(result, 0)|fill(result, 1e-9)",
                "set(result, 1, 1, 1, -M / (r * d))|set(result, 1, 1, 1, 0.0 / 0.0)"
            })
    void wrongKernelsFail(String from, String to) {
        KernelUnderTest wrong =
                HandWrittenKernels.changed(HandWrittenKernels.schwarzschild(), from, to == null ? "" : to);
        KernelReport report = check(TestMetrics.schwarzschild(), wrong);
        assertThat(report.verdict()).isEqualTo(Verdict.FAILED);
        assertThat(report.quantities().get(0).violations()).isPositive();
        assertThat(report.quantities().get(0).worstViolation()).isPresent();
    }

    /** The shape that all classes promise, broken on purpose. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "LENGTH = 64|LENGTH = 63|the length of christoffel is 63, but the layout full has 64 entries",
                "LENGTH = 64|SIZE = 64|there is no constant LENGTH",
                "int index(int k, int i, int j)|int index(int k, int i, int j, int l)|there is no method index",
                "java.util.Arrays.fill(result, 0);|point[0] = 7; java.util.Arrays.fill(result, 0);|changes its inputs",
                "public boolean inDomain|boolean inDomain|inDomain cannot be called",
                "point[1] > 2 * M|point[1] > 4 * M|inDomain is false at",
                "evaluate(double[] point, double[] result)|evaluate(double[] point, float[] result)|must take 2 arrays",
                "public void evaluate|public void evaluate() {} public void evaluate|there must be one method evaluate",
                "!(M > 0)|M > 0|the constructor refuses [1.0]",
                "public Schwarzschild(double M)|public Schwarzschild(double M, double a)|no constructor of 1 arguments",
                "double r = point[1];|double r = point[9];|evaluate fails"
            })
    void brokenPromisesAreDefects(String from, String to, String message) {
        KernelUnderTest wrong = HandWrittenKernels.changed(HandWrittenKernels.schwarzschild(), from, to);
        if (to.contains("float")) {
            wrong = HandWrittenKernels.changed(wrong, "java.util.Arrays.fill(result, 0);", "double[] copy = null;");
            wrong = HandWrittenKernels.changed(wrong, "set(result, ", "set(copy, ");
        }
        if (to.contains("int l")) {
            wrong = HandWrittenKernels.changed(wrong, "index(k, i, j)]", "index(k, i, j, 0)]");
            wrong = HandWrittenKernels.changed(wrong, "index(k, j, i)]", "index(k, j, i, 0)]");
        }
        KernelReport report = check(TestMetrics.schwarzschild(), wrong);
        assertThat(report.verdict()).isEqualTo(Verdict.FAILED);
        assertThat(report.defects()).singleElement().asString().contains(message);
    }

    @Test
    void aWrongIndexIsFound() {
        KernelUnderTest swapped = HandWrittenKernels.changed(
                HandWrittenKernels.sphereNonZero(), "k == 1 && i + j == 1", "k == 1 && i == j");
        assertThat(check(TestMetrics.named("sphere"), swapped).verdict()).isEqualTo(Verdict.FAILED);
        KernelUnderTest beyond = HandWrittenKernels.changed(HandWrittenKernels.sphereNonZero(), "? 1 : -1", "? 2 : -1");
        assertThat(check(TestMetrics.named("sphere"), beyond).defects())
                .singleElement()
                .asString()
                .contains("beyond");
        KernelUnderTest dropped =
                HandWrittenKernels.changed(HandWrittenKernels.sphereNonZero(), "? 1 : -1", "? 0 : -1");
        assertThat(check(TestMetrics.named("sphere"), dropped).defects())
                .singleElement()
                .asString()
                .contains("entry 1 of christoffel is no component's");
    }

    /**
     * The determinant of a metric of the Kerr-Schild form is −1 (Kerr &amp; Schild 1965): the trace is zero, which a kernel
     * that does not know it finds up to rounding.
     */
    @Test
    void zeroMayComeOutAsRoundingNoise() {
        assertThat(check(TestMetrics.named("kerr-schild"), constantTrace("3e-16"))
                        .verdict())
                .isEqualTo(Verdict.PASSED);
        KernelReport wrong = check(TestMetrics.named("kerr-schild"), constantTrace("1e-9"));
        assertThat(wrong.verdict()).isEqualTo(Verdict.FAILED);
        assertThat(wrong.quantities().get(0).violations()).isEqualTo(200);
        assertThat(wrong.quantities().get(0).medianUlps()).isNaN();
    }

    private static KernelUnderTest constantTrace(String value) {
        return new KernelUnderTest(
                "trial.Trace", """
                package trial;
                public final class Trace {
                    public static final int LENGTH = 4;
                    public Trace(double m, double a) {}
                    public static int index(int k) { return k; }
                    public boolean inDomain(double[] point) { return true; }
                    public void evaluate(double[] point, double[] result) {
                        java.util.Arrays.fill(result, VALUE);
                    }
                }
                """.replace("VALUE", value), List.of(Quantity.CHRISTOFFEL_TRACE), Layout.FULL);
    }

    @Test
    void nothingToCompareIsNoPass() {
        MetricDefinition empty = TestDefinition.of("empty", "theta", "phi")
                .condition("theta > 5")
                .lineElement("dtheta^2 + sin(theta)^2*dphi^2");
        KernelReport report = check(empty, HandWrittenKernels.sphereNonZero());
        assertThat(report.verdict()).isEqualTo(Verdict.NOT_CHECKED);
        assertThat(report.notChecked().orElseThrow()).contains("theta > 5").contains("[domain.sample]");
    }

    @Test
    void whatIsNowhereDefinedDoesNotPass() {
        MetricDefinition nowhere =
                TestDefinition.of("nowhere", "theta", "phi").lineElement("dtheta^2 + log(-1 - theta^2)*dphi^2");
        KernelUnderTest metric = new KernelUnderTest("trial.Nowhere", """
                package trial;
                public final class Nowhere {
                    public static final int LENGTH = 3;
                    public static int index(int i, int j) { return 0; }
                    public boolean inDomain(double[] point) { return true; }
                    public void evaluate(double[] point, double[] result) {
                        result[0] = 1;
                        result[1] = 0;
                        result[2] = 5;
                    }
                }
                """, List.of(Quantity.METRIC), Layout.PACKED);
        QuantityReport report = check(nowhere, metric).quantities().get(0);
        assertThat(report.undefined()).isEqualTo(50);
        assertThat(report.compared()).isEqualTo(100);
        assertThat(report.passed()).isTrue();
    }

    @Test
    void textThatIsNotJavaSaysWhere() {
        KernelUnderTest wrong =
                HandWrittenKernels.changed(HandWrittenKernels.schwarzschild(), "double d =", "double double =");
        assertThatThrownBy(() -> check(TestMetrics.schwarzschild(), wrong))
                .isInstanceOf(CompilationFailure.class)
                .hasMessageContaining("trial.Schwarzschild does not compile: line 28: not a statement");
    }

    @Test
    void sameSeedSameReport() {
        KernelReport first = check(TestMetrics.schwarzschild(), HandWrittenKernels.schwarzschild());
        KernelReport second = check(TestMetrics.schwarzschild(), HandWrittenKernels.schwarzschild());
        assertThat(second).isEqualTo(first);
        KernelReport other = new KernelCheck(TestMetrics.schwarzschild(), SETTINGS.withSeed(2))
                .check(HandWrittenKernels.schwarzschild());
        assertThat(other.quantities()).isNotEqualTo(first.quantities());
    }
}
