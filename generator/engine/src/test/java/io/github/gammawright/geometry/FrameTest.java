package io.github.gammawright.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Orthonormal frames and their connection, decided exactly on the graph. */
class FrameTest {

    /** All but the largest. */
    static List<String> metrics() {
        return Catalogue.standard().names().stream()
                .filter(name -> !name.equals("dense-eight"))
                .toList();
    }

    private static MetricDefinition definition(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    private static Geometry geometry(MetricDefinition definition, MetricGraph metric) {
        Route route =
                Route.candidates(metric, List.of(Quantity.ORTHONORMAL_FRAME)).get(0);
        Optional<FramePlan> plan =
                metric.coframe().isPresent() ? Optional.empty() : Optional.of(FramePlan.of(definition));
        return new Geometry(metric, route, plan);
    }

    /** g(e_a, e_b) = ±δ_ab, the definition (Misner, Thorne &amp; Wheeler 1973, from memory). */
    @ParameterizedTest
    @MethodSource("metrics")
    void legsAreOrthonormal(String name) {
        MetricGraph metric = MetricGraphBuilder.build(definition(name));
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        List<Node> frame = geometry(definition(name), metric).components(Quantity.ORTHONORMAL_FRAME);
        int negative = 0;
        for (int a = 0; a < n; a++) {
            for (int b = 0; b <= a; b++) {
                List<Node> terms = new ArrayList<>();
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        terms.add(graph.product(
                                List.of(metric.components()[i][j], frame.get(a * n + i), frame.get(b * n + j))));
                    }
                }
                Node product = graph.sum(terms);
                negative += product == graph.constant(-1) ? 1 : 0;
                assertThat(product)
                        .as("e_%d e_%d", a, b)
                        .isIn(a == b ? List.of(graph.one(), graph.constant(-1)) : List.of(graph.zero()));
            }
        }
        String signature =
                definition(name).claims().signature().map(Object::toString).orElse("");
        if (!signature.isEmpty()) {
            assertThat(negative)
                    .isEqualTo(signature.chars().filter(c -> c == '-').count());
        }
    }

    /** γ_abc = g_kl e_a^k e_c^i (∂_i e_b^l + Γ^l_ij e_b^j) (Chandrasekhar 1983, section 7, from memory). */
    @ParameterizedTest
    @MethodSource("metrics")
    void coefficientsAreTheCovariantDerivativesOfTheLegs(String name) {
        MetricGraph metric = MetricGraphBuilder.build(definition(name));
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        Geometry geometry = geometry(definition(name), metric);
        List<Node> frame = geometry.components(Quantity.ORTHONORMAL_FRAME);
        List<Node> coefficients = geometry.components(Quantity.ROTATION_COEFFICIENTS);
        List<Node> connection = geometry.components(Quantity.CHRISTOFFEL_FIRST_KIND);
        Differentiation differentiation = new Differentiation(graph);
        for (int a = 0; a < n; a++) {
            for (int b = 0; b < n; b++) {
                for (int c = 0; c < n; c++) {
                    List<Node> terms = new ArrayList<>();
                    for (int i = 0; i < n; i++) {
                        Symbol coordinate = metric.coordinates().get(i);
                        for (int k = 0; k < n; k++) {
                            Node legs = graph.multiply(frame.get(a * n + k), frame.get(c * n + i));
                            for (int l = 0; l < n; l++) {
                                Node slope = differentiation.derivative(frame.get(b * n + l), coordinate);
                                terms.add(graph.product(List.of(metric.components()[k][l], legs, slope)));
                                terms.add(graph.product(
                                        List.of(connection.get((k * n + i) * n + l), legs, frame.get(b * n + l))));
                            }
                        }
                    }
                    Node coefficient = coefficients.get((a * n + b) * n + c);
                    assertThat(coefficient).as("%d %d %d", a, b, c).isSameAs(graph.sum(terms));
                    assertThat(coefficients.get((b * n + a) * n + c)).isSameAs(graph.negate(coefficient));
                }
            }
        }
    }

    /**
     * The static frame of Schwarzschild: the observer at rest is accelerated outward by M/(r²√(1 − 2M/r)) (Misner, Thorne
     * &amp; Wheeler 1973, section 23 and box 14.5, from memory); legs on the sphere turn by √(1 − 2M/r)/r and cot θ/r.
     */
    @Test
    void staticObserversOfSchwarzschildAreAcceleratedOutward() {
        MetricGraph metric = MetricGraphBuilder.build(definition("schwarzschild"));
        List<Node> coefficients =
                geometry(definition("schwarzschild"), metric).components(Quantity.ROTATION_COEFFICIENTS);
        ExpressionGraph graph = metric.graph();
        int points = graph.samplePoints().count();
        for (int p = 0; p < points; p++) {
            double mass = graph.samplePoints().value(Symbol.of(Symbol.Kind.PARAMETER, "M", 0), p);
            double r = graph.samplePoints().value(metric.coordinates().get(1), p);
            double theta = graph.samplePoints().value(metric.coordinates().get(2), p);
            double root = Math.sqrt(1 - 2 * mass / r);
            double[][] expected = {
                {1, 0, 0, mass / (r * r * root)},
                {2, 1, 2, root / r},
                {3, 1, 3, root / r},
                {3, 2, 3, Math.cos(theta) / Math.sin(theta) / r}
            };
            double sum = 0;
            for (double[] row : expected) {
                int at = (int) ((row[0] * 4 + row[1]) * 4 + row[2]);
                assertThat(graph.realValues(coefficients.get(at))[p])
                        .isCloseTo(row[3], org.assertj.core.api.Assertions.within(1e-14));
                sum += 2 * Math.abs(row[3]);
            }
            double all = 0;
            for (Node coefficient : coefficients) {
                all += Math.abs(graph.realValues(coefficient)[p]);
            }
            assertThat(all).isCloseTo(sum, org.assertj.core.api.Assertions.within(1e-13));
        }
        assertThat(points).isGreaterThan(2);
    }

    /** The legs of the catalogue's coframe are dual to it (Carter 1968, from memory). */
    @Test
    void theAuthorsCoframeIsUsed() {
        MetricGraph metric = MetricGraphBuilder.build(definition("kerr-carter-frame"));
        ExpressionGraph graph = metric.graph();
        List<Node> frame = geometry(definition("kerr-carter-frame"), metric).components(Quantity.ORTHONORMAL_FRAME);
        List<List<Node>> forms = metric.coframe().orElseThrow().oneForms();
        for (int a = 0; a < 4; a++) {
            for (int b = 0; b < 4; b++) {
                List<Node> terms = new ArrayList<>();
                for (int i = 0; i < 4; i++) {
                    terms.add(graph.multiply(forms.get(a).get(i), frame.get(b * 4 + i)));
                }
                assertThat(graph.sum(terms)).isSameAs(a == b ? graph.one() : graph.zero());
            }
        }
    }

    /** Eddington-Finkelstein: ∂_r is null, so that v and r make a pair; it serves on both sides of the horizon. */
    @Test
    void nullDirectionsMakeAPair() {
        assertThat(FramePlan.of(definition("eddington-finkelstein")).steps())
                .containsExactly(new FramePlan.Single(3, 1), new FramePlan.Single(2, 1), new FramePlan.NullPair(0, 1));
    }

    /** Both squares of this metric change their sign within the box, so that no constant direction serves. */
    @Test
    void aMetricWithoutAFrameIsRefused() {
        MetricDefinition turning = DefinitionReader.read(new SourceText("mill-wheel.metric.toml", """
                name = "mill-wheel"
                coordinates = ["x", "y"]
                line-element = "cos(x)*(dx^2 - dy^2) + 2*sin(x)*dx*dy"
                [domain.sample]
                x = [-6.0, 6.0]
                """));
        assertThatThrownBy(() -> FramePlan.of(turning)).isInstanceOf(NoFrameException.class);
    }
}
