package io.github.gammawright.geometry;

import io.github.gammawright.geometry.MetricGraph.WeightedSquare;
import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/**
 * The 3+1 split of a metric by its first coordinate t: ds² = −α²dt² + γ_ij (dx^i + β^i dt)(dx^j + β^j dt) (Arnowitt,
 * Deser &amp; Misner 1962). Indices run over the other coordinates. Where the metric was given by lapse and shift, these
 * are used as they are.
 */
final class Slicing {

    private final MetricGraph metric;
    private final Route route;
    private final Geometry spacetime;
    private final ExpressionGraph graph;
    private final Differentiation differentiation;
    private final MetricGraph spatialMetric;
    private final Geometry spatial;
    private final int m;
    private Node lapse;
    private List<Node> shift;

    Slicing(MetricGraph metric, Route route, Geometry spacetime) {
        this.metric = metric;
        this.route = route;
        this.spacetime = spacetime;
        this.graph = metric.graph();
        this.differentiation = new Differentiation(graph);
        this.spatialMetric = metric.spatial();
        this.spatial = new Geometry(spatialMetric, route);
        this.m = spatialMetric.dimension();
    }

    /** All components of a quantity of the split, row-major over all its indices. */
    List<Node> components(Quantity quantity) {
        return switch (quantity) {
            case LAPSE -> List.of(lapse());
            case SHIFT -> shift();
            case SPATIAL_METRIC -> spatial.components(Quantity.METRIC);
            case INVERSE_SPATIAL_METRIC -> spatial.components(Quantity.INVERSE_METRIC);
            case SPATIAL_VOLUME_ELEMENT -> List.of(PositiveRoot.of(graph, determinant(), metric.notNegative()));
            case SPATIAL_CHRISTOFFEL -> spatial.components(Quantity.CHRISTOFFEL);
            case SPATIAL_METRIC_DERIVATIVE -> spatial.components(Quantity.METRIC_DERIVATIVE);
            case LAPSE_DERIVATIVE -> derivatives(List.of(lapse()));
            case SHIFT_DERIVATIVE -> derivatives(shift());
            case EXTRINSIC_CURVATURE -> flat(extrinsicCurvature());
            case MEAN_CURVATURE -> List.of(meanCurvature());
            default -> throw new IllegalArgumentException(quantity + " is not of the 3+1 split");
        };
    }

    private Node lapse() {
        if (lapse == null) {
            lapse = metric.split().isPresent()
                    ? positive(metric.split().get().lapse())
                    : PositiveRoot.of(graph, lapseSquared(), metric.notNegative());
            graph.keep(lapse);
        }
        return lapse;
    }

    /** α², where the author gives no α. */
    Optional<Node> lapseSquare() {
        return metric.split().isPresent() ? Optional.empty() : Optional.of(lapseSquared());
    }

    /** det γ. */
    Node determinant() {
        return spatial.determinant();
    }

    private Node positive(Node authors) {
        for (double value : graph.realValues(authors)) {
            if (!(value > 0)) {
                return graph.call(RealFunction.ABS, authors);
            }
        }
        return authors;
    }

    /** −1/g^tt, or β^i g_ti − g_tt where the inverse of the whole metric comes from its components. */
    private Node lapseSquared() {
        Node squared;
        if (route.inversion() == Route.Inversion.RANK_ONE) {
            squared = graph.negate(graph.reciprocal(spacetime.inverse().components()[0][0]));
        } else {
            List<Node> terms = new ArrayList<>(List.of(graph.negate(metric.components()[0][0])));
            for (int i = 0; i < m; i++) {
                terms.add(graph.multiply(shift().get(i), metric.components()[0][i + 1]));
            }
            squared = graph.sum(terms);
        }
        graph.keep(squared);
        return squared;
    }

    private List<Node> shift() {
        if (shift == null) {
            shift = metric.split().map(MetricGraph.Split::shift).orElseGet(this::shiftOfMetric);
            shift.forEach(graph::keep);
        }
        return shift;
    }

    private List<Node> shiftOfMetric() {
        if (route.inversion() == Route.Inversion.RANK_ONE) {
            Node[] row = spacetime.inverse().components()[0];
            Node factor = graph.negate(graph.reciprocal(row[0]));
            graph.keep(factor);
            List<Node> raised = new ArrayList<>();
            for (int i = 0; i < m; i++) {
                raised.add(graph.multiply(factor, row[i + 1]));
            }
            return raised;
        }
        return spatial.inverse().raise(List.of(metric.components()[0]).subList(1, m + 1));
    }

    /** The derivatives by each spatial coordinate, the coordinate outermost. */
    private List<Node> derivatives(List<Node> values) {
        List<Node> derivatives = new ArrayList<>();
        for (Symbol coordinate : spatialMetric.coordinates()) {
            for (Node value : values) {
                Node derivative = differentiation.derivative(value, coordinate);
                graph.keep(derivative);
                derivatives.add(derivative);
            }
        }
        return derivatives;
    }

    private Node[][] extrinsicCurvature() {
        Node[][] twice = switch (route.bending()) {
            case CONNECTION -> byConnection();
            case LIE_DERIVATIVE -> byLieDerivative();
            case SQUARES -> bySquares(spatialMetric.squares().orElseThrow());
        };
        Node factor = graph.multiple(BigFraction.ONE_HALF, graph.reciprocal(lapse()));
        graph.keep(factor);
        Node[][] curvature = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                curvature[i][j] = graph.multiply(factor, twice[i][j]);
                curvature[j][i] = curvature[i][j];
            }
        }
        return curvature;
    }

    /** 2αK_ij = 2(Γ_tij − β^k Γ_kij), which is −2α² Γ^t_ij. */
    private Node[][] byConnection() {
        Node[][][] first = spacetime.firstKind();
        return symmetric((i, j) -> {
            List<Node> terms = new ArrayList<>(List.of(first[0][i + 1][j + 1]));
            for (int k = 0; k < m; k++) {
                terms.add(graph.negate(graph.multiply(shift().get(k), first[k + 1][i + 1][j + 1])));
            }
            return graph.multiple(BigFraction.TWO, graph.sum(terms));
        });
    }

    /** 2αK_ij = (β·∂ − ∂_t) γ_ij + γ_kj ∂_i β^k + γ_ik ∂_j β^k. */
    private Node[][] byLieDerivative() {
        Node[][] slopes = slopes();
        Node[][] lowered = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j < m; j++) {
                List<Node> terms = new ArrayList<>();
                for (int k = 0; k < m; k++) {
                    terms.add(graph.multiply(spatialMetric.components()[k][j], slopes[i][k]));
                }
                lowered[i][j] = kept(graph.sum(terms));
            }
        }
        return symmetric(
                (i, j) -> graph.sum(List.of(dragged(spatialMetric.components()[i][j]), lowered[i][j], lowered[j][i])));
    }

    /**
     * The same for γ_ij = Σ w l_i l_j: 2αK_ij = Σ (m_i l_j + l_i m_j), m_i = ½ w′ l_i + w (l_i′ + l_k ∂_i β^k), where ′
     * is β·∂ − ∂_t.
     */
    private Node[][] bySquares(List<WeightedSquare> squares) {
        Node[][] slopes = slopes();
        List<List<Node>> rates = new ArrayList<>();
        for (WeightedSquare square : squares) {
            Node half = kept(graph.multiple(BigFraction.ONE_HALF, dragged(square.weight())));
            List<Node> rate = new ArrayList<>();
            for (int i = 0; i < m; i++) {
                Node coefficient = square.coefficients().get(i);
                List<Node> terms = new ArrayList<>(List.of(dragged(coefficient)));
                for (int k = 0; k < m; k++) {
                    terms.add(graph.multiply(square.coefficients().get(k), slopes[i][k]));
                }
                rate.add(kept(graph.add(
                        graph.multiply(half, coefficient), graph.multiply(square.weight(), graph.sum(terms)))));
            }
            rates.add(rate);
        }
        return symmetric((i, j) -> {
            List<Node> terms = new ArrayList<>();
            for (int s = 0; s < squares.size(); s++) {
                List<Node> l = squares.get(s).coefficients();
                terms.add(graph.multiply(rates.get(s).get(i), l.get(j)));
                terms.add(graph.multiply(l.get(i), rates.get(s).get(j)));
            }
            return graph.sum(terms);
        });
    }

    /** ∂_i β^k; i, k. */
    private Node[][] slopes() {
        List<Node> derivatives = derivatives(shift());
        Node[][] slopes = new Node[m][];
        for (int i = 0; i < m; i++) {
            slopes[i] = derivatives.subList(i * m, (i + 1) * m).toArray(Node[]::new);
        }
        return slopes;
    }

    /** (β·∂ − ∂_t) of a scalar. */
    private Node dragged(Node scalar) {
        Map<Symbol, Node> along = new LinkedHashMap<>();
        along.put(metric.coordinates().get(0), graph.constant(-1));
        for (int i = 0; i < m; i++) {
            along.put(spatialMetric.coordinates().get(i), shift().get(i));
        }
        return differentiation.directional(scalar, along);
    }

    private Node meanCurvature() {
        return route.bending() == Route.Bending.CONNECTION ? trace() : divergence();
    }

    /** γ^ij K_ij. */
    private Node trace() {
        Node[][] inverse = spatial.inverse().components();
        Node[][] twice = byConnection();
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                Node term = graph.multiply(inverse[i][j], twice[i][j]);
                terms.add(i == j ? graph.multiple(BigFraction.ONE_HALF, term) : term);
            }
        }
        return graph.divide(graph.sum(terms), lapse());
    }

    /** −∇·n = ∂_i b^i − ∂_t a + (b·∂ − a ∂_t) ln √|g| with a = 1/α and b = β/α. */
    private Node divergence() {
        Node reciprocal = kept(graph.reciprocal(lapse()));
        Map<Symbol, Node> along = new LinkedHashMap<>();
        along.put(metric.coordinates().get(0), graph.negate(reciprocal));
        for (int i = 0; i < m; i++) {
            along.put(spatialMetric.coordinates().get(i), kept(graph.multiply(reciprocal, shift().get(i))));
        }
        List<Node> terms = new ArrayList<>();
        along.forEach((coordinate, rate) -> terms.add(differentiation.derivative(rate, coordinate)));
        Node determinant = spacetime.determinant();
        terms.add(graph.multiple(
                BigFraction.ONE_HALF, graph.divide(differentiation.directional(determinant, along), determinant)));
        return graph.sum(terms);
    }

    private interface Entry {
        Node at(int i, int j);
    }

    private Node[][] symmetric(Entry entry) {
        Node[][] matrix = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                matrix[i][j] = kept(entry.at(i, j));
                matrix[j][i] = matrix[i][j];
            }
        }
        return matrix;
    }

    private static List<Node> flat(Node[][] matrix) {
        List<Node> all = new ArrayList<>();
        for (Node[] row : matrix) {
            all.addAll(List.of(row));
        }
        return all;
    }

    private Node kept(Node node) {
        graph.keep(node);
        return node;
    }
}
