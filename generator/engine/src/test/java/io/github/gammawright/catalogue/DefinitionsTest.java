package io.github.gammawright.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.ElementaryFunction;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.verification.DomainSample;
import io.github.gammawright.verification.DomainSampler;
import io.github.gammawright.verification.SamplePoint;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every definition of the catalogue, and every difficult one among the tests, can be read and has points. */
class DefinitionsTest {

    private static final int POINTS = 20;

    private final List<MetricDefinition> builtIn = Definitions.builtIn();
    private final List<MetricDefinition> difficult = Definitions.difficult();

    @Test
    void thereAreEnough() {
        assertThat(builtIn).hasSize(38);
        assertThat(difficult).hasSize(29);
    }

    @Test
    void filesCarryTheNamesOfTheirDefinitions() {
        assertThat(Stream.concat(builtIn.stream(), difficult.stream()))
                .allSatisfy(definition ->
                        assertThat(Definitions.file(definition)).isEqualTo(definition.name() + Catalogue.FILE_SUFFIX));
    }

    @Test
    void builtInDefinitionsSayWhatTheyAreAndWhereTheyComeFrom() {
        assertThat(builtIn).allSatisfy(definition -> {
            assertThat(definition.title()).isNotBlank();
            assertThat(definition.reference())
                    .matches(reference -> reference.contains("from memory") || reference.contains("our own"));
            assertThat(definition.claims().signature()).isPresent();
            assertThat(definition.parameters()).allSatisfy(parameter -> {
                assertThat(parameter.defaultExpression()).isPresent();
                assertThat(parameter.description()).isNotBlank();
                assertThat(parameter.unit()).isNotBlank();
            });
            assertThat(definition.functions())
                    .allSatisfy(function -> assertThat(function.sample()).isPresent());
        });
    }

    @Test
    void everyFormIsRepresentedInBoth() {
        assertThat(forms(builtIn))
                .isEqualTo(forms(difficult))
                .containsExactlyInAnyOrder(
                        MetricForm.LineElement.class,
                        MetricForm.Matrix.class,
                        MetricForm.ThreePlusOne.class,
                        MetricForm.Coframe.class);
    }

    private static Set<Class<?>> forms(List<MetricDefinition> definitions) {
        return definitions.stream()
                .map(definition -> definition.form().getClass())
                .collect(Collectors.toSet());
    }

    @Test
    void oneDefinitionUsesEveryFunction() {
        String text = difficult.stream()
                .filter(definition -> definition.name().equals("every-function"))
                .findFirst()
                .orElseThrow()
                .source()
                .text();
        assertThat(Arrays.stream(ElementaryFunction.values()).map(function -> function.symbol() + "("))
                .allSatisfy(call -> assertThat(text).contains(call));
    }

    @TestFactory
    Stream<DynamicTest> everyDomainHasPointsAtWhichTheMetricIsDefined() {
        return Stream.concat(builtIn.stream(), difficult.stream())
                .map(definition -> DynamicTest.dynamicTest(definition.name(), () -> draw(definition)));
    }

    private static void draw(MetricDefinition definition) {
        ReferenceEvaluator evaluator = new ReferenceEvaluator(definition);
        DomainSample sample = new DomainSampler(evaluator, 1).draw(POINTS, 0);
        assertThat(sample.shortage()).isEmpty();
        assertThat(sample.points()).hasSize(POINTS);
        assertThat(sample.draws()).isLessThanOrEqualTo(10 * POINTS);
        for (SamplePoint point : sample.points()) {
            List<Real> inverse =
                    evaluator.at(point.parameters(), point.coordinates()).values(ReferenceQuantity.INVERSE_METRIC);
            assertThat(inverse).noneMatch(Real::isUndefined);
        }
    }
}
