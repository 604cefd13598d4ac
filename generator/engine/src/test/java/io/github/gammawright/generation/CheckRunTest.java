package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.KernelReport.Verdict;
import io.github.gammawright.verification.ReportTable;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Kernels whose functions come from the caller are checked with the samples that the definition gives. */
class CheckRunTest {

    private static final Path DIFFICULT = Path.of("src/test/resources/definitions/held-out-style");

    @Test
    void thereAreDefinitionsWithFunctions() {
        assertThat(withFunctions()).hasSizeGreaterThanOrEqualTo(9);
    }

    @TestFactory
    Stream<DynamicTest> callerFunctionsAreServed() {
        List<Quantity> quantities = List.of(Quantity.CHRISTOFFEL, Quantity.HAMILTONIAN_FLOW);
        return withFunctions().stream().flatMap(definition -> tests(definition, quantities, 8));
    }

    @Tag("campaign")
    @TestFactory
    Stream<DynamicTest> callerFunctionsAreServedToAllQuantities() {
        return withFunctions().stream()
                .flatMap(definition -> tests(definition, Applicability.quantities(definition), 200));
    }

    @Test
    void aFunctionServesSeveralQuantitiesOfOneClass() {
        MetricDefinition definition = definition("lens", "n = { of = [\"x\", \"y\"], sample = \"1 + x^2*y/4\" }");

        KernelReport report =
                check(definition, List.of(Quantity.METRIC, Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION), 20);

        assertThat(report.verdict()).as(ReportTable.of(List.of(report))).isEqualTo(Verdict.PASSED);
        assertThat(report.quantities())
                .hasSize(3)
                .allSatisfy(quantity -> assertThat(quantity.compared()).isGreaterThanOrEqualTo(20));
    }

    @Test
    void aFunctionWithoutSampleIsNotChecked() {
        KernelReport report =
                check(definition("lens", "n = { of = [\"x\", \"y\"] }"), List.of(Quantity.CHRISTOFFEL), 5);

        assertThat(report.verdict()).isEqualTo(Verdict.NOT_CHECKED);
        assertThat(report.notChecked())
                .hasValueSatisfying(reason -> assertThat(reason).contains("the function n has no sample"));
    }

    private static MetricDefinition definition(String name, String function) {
        return DefinitionReader.read(new SourceText(name + ".metric.toml", """
                name = "%s"
                coordinates = ["x", "y"]
                line-element = "n^2*(dx^2 + dy^2)"
                [functions]
                %s
                """.formatted(name, function)));
    }

    private static Stream<DynamicTest> tests(MetricDefinition definition, List<Quantity> quantities, int points) {
        return quantities.stream()
                .map(quantity -> DynamicTest.dynamicTest(
                        definition.name() + " " + quantity.symbol(), () -> passes(definition, quantity, points)));
    }

    private static void passes(MetricDefinition definition, Quantity quantity, int points) {
        KernelReport report = check(definition, List.of(quantity), points);
        assertThat(report.verdict()).as(ReportTable.of(List.of(report))).isEqualTo(Verdict.PASSED);
        assertThat(report.points()).isGreaterThanOrEqualTo(points);
    }

    private static KernelReport check(MetricDefinition definition, List<Quantity> quantities, int points) {
        GenerationOptions standard = GenerationOptions.DEFAULT;
        GenerationOptions quick = new GenerationOptions(
                GenerationOptions.Effort.QUICK, standard.trigonometry(), standard.fma(), standard.prefer());
        return new CheckRun(definition, CheckSettings.DEFAULT.withPoints(points))
                .check(new KernelSpecification("trial", "Trial", quantities, Layout.FULL, quick));
    }

    private static List<MetricDefinition> withFunctions() {
        try (Stream<Path> files = Files.list(DIFFICULT)) {
            Stream<MetricDefinition> builtIn = Catalogue.standard().names().stream()
                    .map(name -> DefinitionReader.read(
                            Catalogue.standard().find(name).orElseThrow()));
            return Stream.concat(builtIn, files.sorted().map(DefinitionReader::read))
                    .filter(definition -> !definition.functions().isEmpty())
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
