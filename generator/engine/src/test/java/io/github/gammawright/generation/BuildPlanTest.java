package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.KernelEntry;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.GenerationOptions.Effort;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class BuildPlanTest {

    private static final String TEXT = """
            name = "lantern-star"
            [[kernel]]
            class = "Orbit"
            quantities = ["metric", "christofel"]
            layout = "pakced"
            effort = 'brisk'
            """;

    private static final BuildSettings NOTHING_ASKED =
            BuildSettings.of(Precedence.SETTINGS, List.of(Quantity.CHRISTOFFEL));

    @Test
    void withoutTablesAndWishesThereAreTheDefaults() {
        assertThat(kernels(NOTHING_ASKED, definition("lantern-star")))
                .containsExactly(new KernelSpecification(
                        "kernels",
                        "LanternStarChristoffel",
                        List.of(Quantity.CHRISTOFFEL),
                        Layout.FULL,
                        GenerationOptions.DEFAULT));
    }

    @Test
    void eachQuantityAskedForHasAClass() {
        assertThat(kernels(asking(Quantity.METRIC, Quantity.GEODESIC_ACCELERATION), definition("kerr-3d")))
                .extracting(KernelSpecification::className)
                .containsExactly("Kerr3dMetric", "Kerr3dGeodesicAcceleration");
    }

    @Test
    void oneNamedClassHasAllQuantities() {
        BuildSettings settings = settings(
                Precedence.SETTINGS,
                Optional.of("Both"),
                List.of(Quantity.METRIC, Quantity.CHRISTOFFEL),
                Optional.empty());

        assertThat(kernels(settings, definition("kerr", table(Optional.of("Orbit"), "metric"))))
                .singleElement()
                .satisfies(kernel -> {
                    assertThat(kernel.qualifiedName()).isEqualTo("kernels.Both");
                    assertThat(kernel.quantities()).containsExactly(Quantity.METRIC, Quantity.CHRISTOFFEL);
                });
    }

    @Test
    void tablesDecideWhenNothingWasAskedFor() {
        MetricDefinition definition = definition(
                "lantern-star",
                new KernelEntry(
                        Optional.of("Orbit"),
                        List.of("metric", "christoffel"),
                        Optional.of("non-zero"),
                        Optional.of("observatory"),
                        Optional.of("thorough"),
                        Optional.of("math"),
                        Optional.of(false),
                        Optional.of("accuracy"),
                        new SourcePosition(2, 1, 10)),
                table(Optional.empty(), "volume-element", "metric"));

        assertThat(kernels(NOTHING_ASKED, definition))
                .containsExactly(
                        new KernelSpecification(
                                "observatory",
                                "Orbit",
                                List.of(Quantity.METRIC, Quantity.CHRISTOFFEL),
                                Layout.NON_ZERO,
                                new GenerationOptions(
                                        Effort.THOROUGH,
                                        GenerationOptions.Trigonometry.MATH,
                                        false,
                                        GenerationOptions.Preference.ACCURACY)),
                        standard("LanternStarVolumeElement", Quantity.VOLUME_ELEMENT),
                        standard("LanternStarMetric", Quantity.METRIC));
    }

    @Test
    void precedenceSaysWhoseWordCounts() {
        MetricDefinition definition = definition("kerr", tableWithLayout("non-zero"));

        assertThat(kernels(settings(Precedence.SETTINGS, Optional.of(Layout.PACKED)), definition))
                .extracting(KernelSpecification::layout)
                .containsExactly(Layout.PACKED);
        assertThat(kernels(settings(Precedence.TABLES, Optional.of(Layout.PACKED)), definition))
                .extracting(KernelSpecification::layout)
                .containsExactly(Layout.NON_ZERO);
        BuildSettings project =
                settings(Precedence.TABLES, Optional.empty(), List.of(Quantity.VOLUME_ELEMENT), Optional.empty());
        assertThat(kernels(project, definition))
                .extracting(KernelSpecification::className)
                .containsExactly("KerrMetric");
    }

    @Test
    void everyUnknownWordIsReportedWhereItStands() {
        MetricDefinition definition = definition(
                "lantern-star",
                new KernelEntry(
                        Optional.of("Orbit"),
                        List.of("metric", "christofel"),
                        Optional.of("pakced"),
                        Optional.empty(),
                        Optional.of("brisk"),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty(),
                        new SourcePosition(2, 1, 10)));

        assertThat(mistakes(NOTHING_ASKED, definition))
                .extracting(Diagnostic::render)
                .containsExactly("""
                        lantern-star.metric.toml:4:26: unknown quantity 'christofel'
                        quantities = ["metric", "christofel"]
                                                 ^
                        Did you mean 'christoffel'?""", """
                        lantern-star.metric.toml:5:11: unknown layout 'pakced'
                        layout = "pakced"
                                  ^
                        Did you mean 'packed'?""", """
                        lantern-star.metric.toml:6:11: unknown effort 'brisk'
                        effort = 'brisk'
                                  ^
                        Known are quick, normal, thorough.""");
    }

    @Test
    void noTwoClassesHaveOneName() {
        assertThat(mistakes(NOTHING_ASKED, definition("lantern-star"), definition("kerr"), definition("lantern-star")))
                .singleElement()
                .satisfies(mistake -> assertThat(mistake.render())
                        .startsWith("lantern-star.metric.toml:1:9: the class kernels.LanternStarChristoffel is already"
                                + " made by lantern-star.metric.toml"));
        assertThat(mistakes(
                        NOTHING_ASKED,
                        definition(
                                "kerr", table(Optional.of("Orbit"), "metric"), table(Optional.of("ORBIT"), "metric"))))
                .singleElement()
                .satisfies(mistake -> assertThat(mistake.message())
                        .contains("kernels.ORBIT differs only in case from kernels.Orbit"));
    }

    @Test
    void aQuantityIsGivenOnce() {
        assertThat(mistakes(NOTHING_ASKED, definition("kerr", table(Optional.of("A"), "metric", "metric"))))
                .singleElement()
                .satisfies(mistake -> assertThat(mistake.message()).isEqualTo("the quantity 'metric' is given twice"));
        assertThat(asking(Quantity.METRIC, Quantity.METRIC).complaints())
                .containsExactly("the quantity 'metric' is given twice");
    }

    @Test
    void settingsNeedJavaNames() {
        for (String name : List.of("", "2nd", "a b", "class", "record", "../Star", "a.B", "A\u200b", "A".repeat(300))) {
            assertThat(settings(Precedence.SETTINGS, Optional.of(name), List.of(), Optional.empty())
                            .complaints())
                    .as(name)
                    .hasSize(1);
        }
        for (String name : List.of("Star", "Σταρ", "_2", "Record")) {
            assertThat(settings(Precedence.SETTINGS, Optional.of(name), List.of(), Optional.empty())
                            .complaints())
                    .as(name)
                    .isEmpty();
        }
        Map<String, Integer> packages = Map.of(
                "", 0, "a.b.c", 0, "a..b", 1, ".a", 1, "a.", 1, "a.int", 1, "a/b", 1, "java.util", 1, "record", 0);
        packages.forEach((name, complaints) ->
                assertThat(inPackage(name).complaints()).as(name).hasSize(complaints));
    }

    private static List<KernelSpecification> kernels(BuildSettings settings, MetricDefinition... definitions) {
        return BuildPlan.of(List.of(definitions), settings).parts().stream()
                .flatMap(part -> part.kernels().stream())
                .toList();
    }

    private static List<Diagnostic> mistakes(BuildSettings settings, MetricDefinition... definitions) {
        return catchThrowableOfType(DefinitionException.class, () -> BuildPlan.of(List.of(definitions), settings))
                .diagnostics();
    }

    private static BuildSettings asking(Quantity... quantities) {
        return settings(Precedence.SETTINGS, Optional.empty(), List.of(quantities), Optional.empty());
    }

    private static BuildSettings settings(Precedence precedence, Optional<Layout> layout) {
        return settings(precedence, Optional.empty(), List.of(), layout);
    }

    private static BuildSettings settings(
            Precedence precedence, Optional<String> className, List<Quantity> quantities, Optional<Layout> layout) {
        return new BuildSettings(
                precedence,
                Optional.empty(),
                className,
                quantities,
                List.of(Quantity.CHRISTOFFEL),
                layout,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
    }

    private static BuildSettings inPackage(String name) {
        return new BuildSettings(
                Precedence.SETTINGS,
                Optional.of(name),
                Optional.empty(),
                List.of(),
                List.of(Quantity.CHRISTOFFEL),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
    }

    private static KernelSpecification standard(String className, Quantity quantity) {
        return new KernelSpecification("kernels", className, List.of(quantity), Layout.FULL, GenerationOptions.DEFAULT);
    }

    private static KernelEntry table(Optional<String> className, String... quantities) {
        return table(className, Optional.empty(), quantities);
    }

    private static KernelEntry tableWithLayout(String layout) {
        return table(Optional.empty(), Optional.of(layout), "metric");
    }

    private static KernelEntry table(Optional<String> className, Optional<String> layout, String... quantities) {
        return new KernelEntry(
                className,
                List.of(quantities),
                layout,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                new SourcePosition(2, 1, 10));
    }

    private static MetricDefinition definition(String name, KernelEntry... tables) {
        Expression one = new Expression.Number(org.hipparchus.fraction.BigFraction.ONE, SourcePosition.START);
        return new MetricDefinition(
                name,
                "",
                "",
                List.of("x"),
                List.of(),
                List.of(),
                List.of(),
                new MetricForm.Matrix(List.of(List.of(one))),
                new MetricDefinition.Domain(List.of(), Map.of()),
                MetricDefinition.Claims.none(),
                List.of(tables),
                new SourceText(name + ".metric.toml", TEXT.replace("lantern-star", name)));
    }
}
