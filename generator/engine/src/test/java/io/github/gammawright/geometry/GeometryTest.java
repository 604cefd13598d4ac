package io.github.gammawright.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Identities that hold for every metric (common practice, no source), decided exactly on the graph. */
class GeometryTest {

    static List<String> metrics() {
        return Catalogue.standard().names().stream()
                .filter(name -> !name.equals("dense-eight"))
                .toList();
    }

    private static MetricDefinition definition(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    @ParameterizedTest
    @MethodSource("metrics")
    void metricTimesInverseIsOneAlongEveryRoute(String name) {
        MetricDefinition definition = definition(name);
        for (Route route : Route.candidates(MetricGraphBuilder.build(definition), List.of(Quantity.METRIC))) {
            MetricGraph metric = MetricGraphBuilder.build(definition);
            ExpressionGraph graph = metric.graph();
            int n = metric.dimension();
            List<Node> inverse = new Geometry(metric, route).components(Quantity.INVERSE_METRIC);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    List<Node> terms = new ArrayList<>();
                    for (int k = 0; k < n; k++) {
                        terms.add(graph.multiply(metric.components()[i][k], inverse.get(k * n + j)));
                    }
                    assertThat(graph.sum(terms)).isSameAs(i == j ? graph.one() : graph.zero());
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("metrics")
    void theMetricIsCompatibleWithItsConnection(String name) {
        MetricGraph metric = MetricGraphBuilder.build(definition(name));
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        Route route = Route.candidates(metric, List.of(Quantity.CHRISTOFFEL)).get(0);
        Geometry geometry = new Geometry(metric, route);
        List<Node> derivative = geometry.components(Quantity.METRIC_DERIVATIVE);
        List<Node> connection = geometry.components(Quantity.CHRISTOFFEL);
        // ∂_k g_ij = g_mj Γ^m_ki + g_im Γ^m_kj
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    List<Node> terms = new ArrayList<>();
                    terms.add(graph.negate(derivative.get((k * n + i) * n + j)));
                    for (int m = 0; m < n; m++) {
                        terms.add(graph.multiply(metric.components()[m][j], connection.get((m * n + k) * n + i)));
                        terms.add(graph.multiply(metric.components()[i][m], connection.get((m * n + k) * n + j)));
                    }
                    assertThat(graph.sum(terms)).isSameAs(graph.zero());
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("metrics")
    void theTraceIsTheDerivativeOfTheVolume(String name) {
        MetricGraph metric = MetricGraphBuilder.build(definition(name));
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        Geometry geometry = new Geometry(
                metric, Route.candidates(metric, List.of(Quantity.CHRISTOFFEL)).get(0));
        List<Node> connection = geometry.components(Quantity.CHRISTOFFEL);
        List<Node> trace = geometry.components(Quantity.CHRISTOFFEL_TRACE);
        for (int k = 0; k < n; k++) {
            List<Node> terms = new ArrayList<>();
            for (int m = 0; m < n; m++) {
                terms.add(connection.get((m * n + m) * n + k));
            }
            assertThat(graph.sum(terms)).isEqualTo(trace.get(k));
        }
    }

    @Test
    void aMetricWithoutInverseIsRefused() {
        MetricDefinition degenerate = DefinitionReader.read(new SourceText(
                "flat-fold.metric.toml",
                "name = \"flat-fold\"\ncoordinates = [\"x\", \"y\"]\nline-element = \"(dx + x*dy)^2\"\n"));
        MetricGraph metric = MetricGraphBuilder.build(degenerate);
        Geometry geometry = new Geometry(metric, new Route(Route.Inversion.BLOCKS, Route.Flow.COMPONENTS));
        assertThatThrownBy(() -> geometry.components(Quantity.CHRISTOFFEL))
                .isInstanceOf(DegenerateMetricException.class);
    }
}
