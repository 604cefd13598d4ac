package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Every component of curvature and of motion in curved space against the reference: an error is at most 1e-10 times the
 * component and a thousandth of the largest one, and no method comes near the size that HotSpot refuses to compile.
 */
class CurvatureAccuracyTest {

    private static final int LARGEST_METHOD = 7000;

    private static final List<Quantity> QUANTITIES = List.of(
            Quantity.CHRISTOFFEL_DERIVATIVE,
            Quantity.GEODESIC_ACCELERATION_BY_TIME,
            Quantity.HAMILTONIAN_FLOW_BY_TIME,
            Quantity.PARALLEL_TRANSPORT,
            Quantity.GEODESIC_DEVIATION,
            Quantity.RIEMANN,
            Quantity.WEYL,
            Quantity.RICCI,
            Quantity.RICCI_SCALAR,
            Quantity.EINSTEIN,
            Quantity.KRETSCHMANN);

    /** The three layouts take turns. */
    private static Layout layout(Quantity quantity) {
        return Layout.values()[quantity.ordinal() % Layout.values().length];
    }

    @ParameterizedTest
    @ValueSource(strings = {"kerr", "static-star", "flrw-closed", "torus", "kerr-schild"})
    void someKernelsAreRight(String name) {
        check(name, GenerationOptions.Effort.QUICK, 12);
    }

    static List<String> catalogue() {
        return Catalogue.standard().names();
    }

    @Tag("campaign")
    @ParameterizedTest
    @MethodSource("catalogue")
    void allKernelsAreRight(String name) {
        check(name, GenerationOptions.Effort.NORMAL, name.equals("dense-eight") ? 2 : 100);
    }

    private static void check(String name, GenerationOptions.Effort effort, int points) {
        MetricDefinition definition =
                DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
        KernelCheck check =
                new KernelCheck(definition, new CheckSettings(points, points / 4, 1, 50, 1e-10, Double.MAX_VALUE));
        for (Quantity quantity : QUANTITIES) {
            KernelSpecification specification = new KernelSpecification(
                    "trial",
                    "Trial",
                    List.of(quantity),
                    layout(quantity),
                    new GenerationOptions(
                            effort, GenerationOptions.Trigonometry.MATH, false, GenerationOptions.Preference.SPEED));
            KernelReport report = check.check(
                    new KernelGenerator().generate(definition, specification).underTest());
            assertThat(report.verdict())
                    .as(() -> quantity.symbol() + " of " + name + ": " + report)
                    .isEqualTo(KernelReport.Verdict.PASSED);
            assertThat(report.points()).isGreaterThanOrEqualTo(points);
            assertThat(report.largestMethod().orElseThrow().bytecodes()).isLessThanOrEqualTo(LARGEST_METHOD);
        }
    }

    /** The quantities of a code for bundles of light, in one class. */
    @ParameterizedTest
    @ValueSource(strings = {"kerr", "morris-thorne-wormhole"})
    void quantitiesShareTheirWork(String name) {
        MetricDefinition definition =
                DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
        List<Quantity> bundle =
                List.of(Quantity.GEODESIC_ACCELERATION, Quantity.GEODESIC_DEVIATION, Quantity.PARALLEL_TRANSPORT);
        int apart = 0;
        for (Quantity quantity : bundle) {
            apart += made(definition, List.of(quantity)).cost().emitted().operations();
        }
        GeneratedClass together = made(definition, bundle);
        assertThat(together.cost().emitted().operations()).isLessThan(apart);
        KernelReport report = new KernelCheck(definition, new CheckSettings(12, 4, 1, 50, 1e-10, Double.MAX_VALUE))
                .check(together.underTest());
        assertThat(report.verdict()).as(report::toString).isEqualTo(KernelReport.Verdict.PASSED);
    }

    private static GeneratedClass made(MetricDefinition definition, List<Quantity> quantities) {
        return new KernelGenerator()
                .generate(
                        definition,
                        new KernelSpecification("trial", "Trial", quantities, Layout.FULL, GenerationOptions.DEFAULT));
    }
}
