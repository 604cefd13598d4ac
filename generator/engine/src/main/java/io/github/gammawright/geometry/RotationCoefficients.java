package io.github.gammawright.geometry;

import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * Ricci's rotation coefficients of a frame, γ_abc = g(e_a, ∇_c e_b), antisymmetric in a and b: from the curls of its
 * covectors, λ_abc = (∂_j e_bi − ∂_i e_bj) e_a^i e_c^j, as γ_abc = ½ (λ_abc + λ_cab − λ_bca) (Chandrasekhar 1983, section
 * 7, from memory). No Christoffel symbol is needed.
 */
final class RotationCoefficients {

    private RotationCoefficients() {}

    /** The coefficients; a, b, c. */
    static List<Node> of(MetricGraph metric, Frame frame) {
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        Node[][][] lambda = new Node[n][][];
        for (int b = 0; b < n; b++) {
            lambda[b] = contracted(graph, curl(metric, frame.covectors()[b]), frame.vectors());
        }
        Node[][][] coefficients = new Node[n][n][n];
        for (int a = 0; a < n; a++) {
            for (int b = 0; b <= a; b++) {
                for (int c = 0; c < n; c++) {
                    Node sum = graph.sum(List.of(lambda[b][a][c], lambda[a][c][b], graph.negate(lambda[c][b][a])));
                    Node half = a == b ? graph.zero() : graph.multiple(BigFraction.ONE_HALF, sum);
                    coefficients[a][b][c] = half;
                    coefficients[b][a][c] = graph.negate(half);
                }
            }
        }
        List<Node> flat = new ArrayList<>();
        for (Node[][] matrix : coefficients) {
            for (Node[] row : matrix) {
                flat.addAll(List.of(row));
            }
        }
        return flat;
    }

    /** ∂_j e_i − ∂_i e_j; i, j. */
    private static Node[][] curl(MetricGraph metric, Node[] covector) {
        ExpressionGraph graph = metric.graph();
        Differentiation differentiation = new Differentiation(graph);
        int n = covector.length;
        Node[][] curl = new Node[n][n];
        for (int i = 0; i < n; i++) {
            curl[i][i] = graph.zero();
            for (int j = 0; j < i; j++) {
                curl[i][j] = graph.subtract(
                        differentiation.derivative(
                                covector[i], metric.coordinates().get(j)),
                        differentiation.derivative(
                                covector[j], metric.coordinates().get(i)));
                graph.keep(curl[i][j]);
                curl[j][i] = graph.negate(curl[i][j]);
            }
        }
        return curl;
    }

    /** F_ij e_a^i e_c^j; a, c. */
    private static Node[][] contracted(ExpressionGraph graph, Node[][] curl, Node[][] vectors) {
        int n = curl.length;
        Node[][] once = new Node[n][n];
        for (int a = 0; a < n; a++) {
            for (int j = 0; j < n; j++) {
                List<Node> terms = new ArrayList<>();
                for (int i = 0; i < n; i++) {
                    terms.add(graph.multiply(vectors[a][i], curl[i][j]));
                }
                once[a][j] = graph.sum(terms);
                graph.keep(once[a][j]);
            }
        }
        Node[][] twice = new Node[n][n];
        for (int a = 0; a < n; a++) {
            twice[a][a] = graph.zero();
            for (int c = 0; c < a; c++) {
                List<Node> terms = new ArrayList<>();
                for (int j = 0; j < n; j++) {
                    terms.add(graph.multiply(once[a][j], vectors[c][j]));
                }
                twice[a][c] = graph.sum(terms);
                graph.keep(twice[a][c]);
                twice[c][a] = graph.negate(twice[a][c]);
            }
        }
        return twice;
    }
}
