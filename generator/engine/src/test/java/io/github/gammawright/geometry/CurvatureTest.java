package io.github.gammawright.geometry;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Identities of curvature, decided exactly on the graph (Misner, Thorne &amp; Wheeler 1973, sections 13.5 and 15.1). */
class CurvatureTest {

    private static MetricDefinition definition(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    private static List<String> metrics(Predicate<MetricDefinition> predicate) {
        return Catalogue.standard().names().stream()
                .filter(name -> !name.equals("dense-eight"))
                .filter(name -> predicate.test(definition(name)))
                .toList();
    }

    static List<String> all() {
        return metrics(definition -> true);
    }

    static List<String> vacuum() {
        return metrics(definition -> definition.claims().vacuum().orElse(false));
    }

    static List<String> conformallyFlat() {
        return metrics(definition -> definition.claims().conformallyFlat().orElse(false));
    }

    private static Geometry geometry(String name, Route.Second second) {
        return new Geometry(
                MetricGraphBuilder.build(definition(name)),
                new Route(Route.Inversion.BLOCKS, Route.Flow.COMPONENTS, second));
    }

    @ParameterizedTest
    @MethodSource("vacuum")
    void ricciVanishesWhereTheAuthorClaimsVacuum(String name) {
        for (Route.Second second : Route.Second.values()) {
            Geometry geometry = geometry(name, second);
            assertThat(geometry.components(Quantity.RICCI)).allMatch(Node::isZero);
            assertThat(geometry.components(Quantity.EINSTEIN)).allMatch(Node::isZero);
            assertThat(geometry.entries(Quantity.WEYL, Layout.PACKED))
                    .isEqualTo(geometry.entries(Quantity.RIEMANN, Layout.PACKED));
        }
    }

    @ParameterizedTest
    @MethodSource("conformallyFlat")
    void weylVanishesWhereTheAuthorClaimsConformalFlatness(String name) {
        Geometry geometry = geometry(name, Route.Second.METRIC);
        assertThat(geometry.components(Quantity.WEYL)).hasSize(256).allMatch(Node::isZero);
    }

    @Test
    void manyMetricsAreCovered() {
        assertThat(vacuum()).hasSizeGreaterThanOrEqualTo(15);
        assertThat(conformallyFlat()).hasSizeGreaterThanOrEqualTo(8);
    }

    @ParameterizedTest
    @MethodSource("all")
    void bothWaysGiveTheSameCurvature(String name) {
        Geometry geometry = geometry(name, Route.Second.METRIC);
        Curvature byConnection = new Curvature(new Geometry(
                geometry.metric(), new Route(Route.Inversion.BLOCKS, Route.Flow.COMPONENTS, Route.Second.CONNECTION)));
        assertThat(byConnection.mixed(byConnection.riemann())).isEqualTo(geometry.components(Quantity.RIEMANN));
        assertThat(byConnection.ricci()).isDeepEqualTo(geometry.curvature().ricci());
    }

    @ParameterizedTest
    @ValueSource(strings = {"kerr", "ellis-wormhole", "godel", "flrw-closed", "static-star"})
    void weylHasNoTrace(String name) {
        Geometry geometry = geometry(name, Route.Second.METRIC);
        List<Node> weyl = geometry.components(Quantity.WEYL);
        for (int l = 0; l < 4; l++) {
            for (int j = 0; j < 4; j++) {
                List<Node> trace = new ArrayList<>();
                for (int k = 0; k < 4; k++) {
                    trace.add(weyl.get(((k * 4 + l) * 4 + k) * 4 + j));
                }
                assertThat(geometry.metric().graph().sum(trace).isZero()).isTrue();
            }
        }
    }

    /** ∇_k (R^k_j − ½ δ^k_j R) = 0, the second Bianchi identity contracted twice. */
    @ParameterizedTest
    @ValueSource(strings = {"flrw-closed", "static-star", "ellis-wormhole", "godel", "torus", "reissner-nordstrom"})
    void einsteinHasNoDivergence(String name) {
        Geometry geometry = geometry(name, Route.Second.METRIC);
        ExpressionGraph graph = geometry.metric().graph();
        int n = geometry.metric().dimension();
        Node[][] einstein = geometry.curvature().einstein();
        Node[][][] gamma = geometry.christoffel();
        Node[][] mixed = new Node[n][n];
        for (int j = 0; j < n; j++) {
            List<Node> column = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                column.add(einstein[i][j]);
            }
            List<Node> raised = geometry.inverse().raise(column);
            for (int k = 0; k < n; k++) {
                mixed[k][j] = raised.get(k);
            }
        }
        for (int j = 0; j < n; j++) {
            List<Node> terms = new ArrayList<>();
            for (int k = 0; k < n; k++) {
                terms.add(geometry.differentiation()
                        .derivative(mixed[k][j], geometry.metric().coordinates().get(k)));
                for (int m = 0; m < n; m++) {
                    terms.add(graph.multiply(gamma[k][m][k], mixed[m][j]));
                    terms.add(graph.negate(graph.multiply(gamma[m][k][j], mixed[k][m])));
                }
            }
            assertThat(graph.sum(terms).isZero()).isTrue();
        }
    }

    /** The whole second Bianchi identity, ∇_m R^k_lij + ∇_i R^k_ljm + ∇_j R^k_lmi = 0. */
    @Test
    void theSecondBianchiIdentityHolds() {
        Geometry geometry = geometry("kerr", Route.Second.METRIC);
        ExpressionGraph graph = geometry.metric().graph();
        int n = 4;
        List<Node> riemann = geometry.components(Quantity.RIEMANN);
        Node[][][] gamma = geometry.christoffel();
        for (int l = 0; l < n; l++) {
            for (int k = 0; k < n; k++) {
                List<Node> terms = new ArrayList<>();
                int[][] cyclic = {{1, 2, 3}, {2, 3, 1}, {3, 1, 2}};
                for (int[] mij : cyclic) {
                    Node component = riemann.get(((k * n + l) * n + mij[1]) * n + mij[2]);
                    terms.add(geometry.differentiation()
                            .derivative(
                                    component, geometry.metric().coordinates().get(mij[0])));
                    // the Γ of the indices i, j, m cancel in the cyclic sum
                    for (int p = 0; p < n; p++) {
                        Node up = riemann.get(((p * n + l) * n + mij[1]) * n + mij[2]);
                        Node down = riemann.get(((k * n + p) * n + mij[1]) * n + mij[2]);
                        terms.add(graph.multiply(gamma[k][p][mij[0]], up));
                        terms.add(graph.negate(graph.multiply(gamma[p][l][mij[0]], down)));
                    }
                }
                assertThat(graph.sum(terms).isZero()).isTrue();
            }
        }
    }

    /** n²(n² − 1)/12 components that are independent (Misner, Thorne &amp; Wheeler 1973, exercise 13.9). */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4})
    void aGeneralMetricHasAsManyIndependentComponentsAsItMay(int n) {
        List<List<String>> rows = new ArrayList<>();
        String[] names = {"x", "y", "z", "w"};
        for (int i = 0; i < n; i++) {
            List<String> row = new ArrayList<>();
            for (int j = 0; j <= i; j++) {
                StringBuilder sum = new StringBuilder(i == j ? "4" : "0");
                for (int k = 0; k < n; k++) {
                    for (int m = 0; m <= k; m++) {
                        int seed = 1 + (17 * i + 5 * j + 3 * k + 11 * m + i * j * (k + 2) * (m + 3)) % 23;
                        sum.append(" + ")
                                .append(names[k])
                                .append('*')
                                .append(names[m])
                                .append('*')
                                .append(seed);
                    }
                }
                row.add("\"" + sum + "\"");
            }
            rows.add(row);
        }
        String text = "name = \"general\"\ncoordinates = ["
                + String.join(
                        ", ",
                        java.util.Arrays.stream(names)
                                .limit(n)
                                .map(s -> "\"" + s + "\"")
                                .toList())
                + "]\nmetric = " + rows + "\n";
        MetricGraph metric = MetricGraphBuilder.build(
                DefinitionReader.read(new io.github.gammawright.diagnostic.SourceText("general.metric.toml", text)));
        Geometry geometry = new Geometry(metric, new Route(Route.Inversion.BLOCKS, Route.Flow.COMPONENTS));
        List<Node> entries = geometry.entries(Quantity.RIEMANN, Layout.PACKED);
        int pairs = n * (n - 1) / 2;
        assertThat(entries).hasSize(pairs * (pairs + 1) / 2).noneMatch(Node::isZero);
        Set<Node> different = new HashSet<>(entries);
        // the cyclic identity makes one of 21 in four dimensions the sum of two others
        assertThat(different.size() - (n == 4 ? 1 : 0)).isEqualTo(n * n * (n * n - 1) / 12);
        if (n == 4) {
            Curvature curvature = geometry.curvature();
            Node sum = metric.graph()
                    .sum(List.of(
                            curvature.riemann().at(3, 2, 1, 0),
                            curvature.riemann().at(3, 1, 0, 2),
                            curvature.riemann().at(3, 0, 2, 1)));
            assertThat(sum.isZero()).isTrue();
        }
    }

    /** Gauss's theorema egregium in the form R_1212 = K det g (do Carmo 1976, section 4-3). */
    @Test
    void surfacesHaveTheCurvatureOfGauss() {
        for (String name : List.of("sphere", "torus", "ellipsoid-of-revolution", "hyperbolic-plane")) {
            Geometry geometry = geometry(name, Route.Second.METRIC);
            ExpressionGraph graph = geometry.metric().graph();
            Node riemann = geometry.curvature().riemann().at(0, 0);
            Node half =
                    graph.multiple(BigFraction.ONE_HALF, geometry.curvature().scalar());
            assertThat(graph.subtract(riemann, graph.multiply(half, geometry.determinant()))
                            .isZero())
                    .isTrue();
        }
    }
}
