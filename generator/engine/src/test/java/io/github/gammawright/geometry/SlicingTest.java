package io.github.gammawright.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.Symbol;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class SlicingTest {

    /** Every metric of the catalogue that can be split, but the largest. */
    static List<String> metrics() {
        return Catalogue.standard().names().stream()
                .filter(name -> !name.equals("dense-eight"))
                .filter(name -> SplitCheck.of(definition(name)).isEmpty())
                .toList();
    }

    private static MetricDefinition definition(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    private static List<Route> routes(String name) {
        return Route.candidates(
                MetricGraphBuilder.build(definition(name)),
                List.of(Quantity.EXTRINSIC_CURVATURE, Quantity.MEAN_CURVATURE));
    }

    @Test
    void mostOfTheCatalogueCanBeSplit() {
        assertThat(metrics()).hasSize(28).contains("static-star", "kerr", "painleve-gullstrand");
    }

    /** ds² = −α²dt² + γ_ij (dx^i + β^i dt)(dx^j + β^j dt): Arnowitt, Deser &amp; Misner (1962), from memory. */
    @ParameterizedTest
    @MethodSource("metrics")
    void theSplitGivesTheMetricBack(String name) {
        for (Route route : routes(name)) {
            MetricGraph metric = MetricGraphBuilder.build(definition(name));
            ExpressionGraph graph = metric.graph();
            Geometry geometry = new Geometry(metric, route);
            int m = metric.dimension() - 1;
            Node lapse = geometry.components(Quantity.LAPSE).get(0);
            List<Node> shift = geometry.components(Quantity.SHIFT);
            List<Node> spatial = geometry.components(Quantity.SPATIAL_METRIC);
            List<Node> time = new ArrayList<>(List.of(graph.negate(graph.power(lapse, 2))));
            for (int i = 0; i < m; i++) {
                List<Node> mixed = new ArrayList<>();
                for (int j = 0; j < m; j++) {
                    mixed.add(graph.multiply(spatial.get(i * m + j), shift.get(j)));
                }
                assertThat(graph.sum(mixed)).isSameAs(metric.components()[0][i + 1]);
                time.add(graph.multiply(metric.components()[0][i + 1], shift.get(i)));
            }
            assertThat(graph.sum(time)).isSameAs(metric.components()[0][0]);
        }
    }

    /**
     * K_ij = (D_i β_j + D_j β_i − ∂_t γ_ij)/2α with the connection of γ, whichever way it was computed, and K its trace:
     * York (1979), Alcubierre (2008) ch. 2, from memory.
     */
    @ParameterizedTest
    @MethodSource("metrics")
    void extrinsicCurvatureIsTheCovariantDerivativeOfTheShift(String name) {
        for (Route route : routes(name)) {
            MetricGraph metric = MetricGraphBuilder.build(definition(name));
            ExpressionGraph graph = metric.graph();
            Geometry geometry = new Geometry(metric, route);
            Differentiation differentiation = new Differentiation(graph);
            int m = metric.dimension() - 1;
            Node twiceLapse = graph.multiply(
                    graph.constant(2), geometry.components(Quantity.LAPSE).get(0));
            List<Node> curvature = geometry.components(Quantity.EXTRINSIC_CURVATURE);
            List<Node> connection = geometry.components(Quantity.SPATIAL_CHRISTOFFEL);
            List<Node> inverse = geometry.components(Quantity.INVERSE_SPATIAL_METRIC);
            List<Node> trace = new ArrayList<>();
            for (int i = 0; i < m; i++) {
                for (int j = 0; j < m; j++) {
                    List<Node> terms = new ArrayList<>();
                    for (int[] pair : List.of(new int[] {i, j}, new int[] {j, i})) {
                        Node lowered = metric.components()[0][pair[1] + 1];
                        terms.add(differentiation.derivative(
                                lowered, metric.coordinates().get(pair[0] + 1)));
                    }
                    for (int k = 0; k < m; k++) {
                        Node term = graph.multiply(connection.get((k * m + i) * m + j), metric.components()[0][k + 1]);
                        terms.add(graph.multiply(graph.constant(-2), term));
                    }
                    Node spatial = metric.components()[i + 1][j + 1];
                    terms.add(graph.negate(differentiation.derivative(
                            spatial, metric.coordinates().get(0))));
                    assertThat(graph.multiply(twiceLapse, curvature.get(i * m + j)))
                            .isSameAs(graph.sum(terms));
                    trace.add(graph.multiply(inverse.get(i * m + j), curvature.get(i * m + j)));
                }
            }
            assertThat(geometry.components(Quantity.MEAN_CURVATURE).get(0)).isSameAs(graph.sum(trace));
        }
    }

    /** Each row of the table of published slices, along every route; sources stand beside the rows. */
    @Test
    void agreesWithPublishedSlices() throws IOException {
        int compared = 0;
        for (String line : published()) {
            String[] fields = line.split("\t", -1);
            Quantity quantity = Quantity.named(fields[4]).orElse(Quantity.METRIC);
            if (!quantity.isOfSplit() || !definition(fields[1]).functions().isEmpty()) {
                continue;
            }
            for (Route route : Route.candidates(MetricGraphBuilder.build(definition(fields[1])), List.of(quantity))) {
                double value = value(fields[1], quantity, route, numbers(fields[2]), numbers(fields[3]), fields[5]);
                double expected = Double.parseDouble(fields[6]);
                assertThat(value)
                        .as(fields[0] + " " + route)
                        .isCloseTo(expected, within(1e-12 * Math.max(1, Math.abs(expected))));
                compared++;
            }
        }
        assertThat(compared).isEqualTo(276);
    }

    private static double value(
            String name, Quantity quantity, Route route, double[] parameters, double[] point, String component) {
        MetricGraph metric = MetricGraphBuilder.build(definition(name));
        int[] indices = Arrays.stream(numbers(component)).mapToInt(i -> (int) i).toArray();
        Node node = new Geometry(metric, route)
                .components(quantity)
                .get(quantity.shape(metric.dimension()).fullIndex(indices));
        var program = Lowering.lower(metric.graph(), List.of(node));
        double[] values = ProgramInterpreter.run(
                program,
                symbol -> symbol.kind() == Symbol.Kind.PARAMETER ? parameters[symbol.index()] : point[symbol.index()]);
        return values[program.outputs().get(0)];
    }

    private static List<String> published() throws IOException {
        try (InputStream in =
                SlicingTest.class.getResourceAsStream("/io/github/gammawright/catalogue/published-values.tsv")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .toList();
        }
    }

    private static double[] numbers(String text) {
        return text.isBlank()
                ? new double[0]
                : Arrays.stream(text.strip().split(" "))
                        .mapToDouble(Double::parseDouble)
                        .toArray();
    }

    @ParameterizedTest
    @CsvSource({
        "sphere, NO_TIME",
        "eddington-finkelstein, SLICES_NOT_SPACELIKE",
        "godel, SLICES_NOT_SPACELIKE",
        "plane-wave, SLICES_NOT_SPACELIKE"
    })
    void otherMetricsSayWhatStandsAgainstIt(String name, SplitCheck.Obstacle obstacle) {
        assertThat(SplitCheck.of(definition(name))).isEqualTo(Optional.of(obstacle));
    }
}
