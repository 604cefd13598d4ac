package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;

/**
 * The inverse of a symmetric matrix of nodes, block by block: by cofactors up to four rows, beyond that by eliminating
 * one row at a time, the pivots chosen where they keep away from zero at the sample points.
 */
final class MatrixInverse {

    private static final int LARGEST_BY_COFACTORS = 4;

    private final ExpressionGraph graph;
    private final Node[][] inverse;
    private Node determinant;

    private MatrixInverse(ExpressionGraph graph, Node[][] matrix) {
        this.graph = graph;
        this.inverse = new Node[matrix.length][matrix.length];
        for (Node[] row : inverse) {
            java.util.Arrays.fill(row, graph.zero());
        }
        this.determinant = graph.one();
        for (List<Integer> block : Blocks.of(matrix)) {
            if (block.size() <= LARGEST_BY_COFACTORS) {
                byCofactors(matrix, block);
            } else {
                byElimination(matrix, block);
            }
        }
    }

    static MatrixInverse of(ExpressionGraph graph, Node[][] matrix) {
        return new MatrixInverse(graph, matrix);
    }

    Node[][] components() {
        return inverse;
    }

    Node determinant() {
        return determinant;
    }

    private void byCofactors(Node[][] matrix, List<Integer> block) {
        int m = block.size();
        Node[][] cofactors = new Node[m][m];
        Minors minors = new Minors(graph, matrix, block);
        int all = (1 << m) - 1;
        Node det = minors.minor(all, all);
        if (det.isZero()) {
            throw new DegenerateMetricException();
        }
        graph.keep(det);
        determinant = graph.multiply(determinant, det);
        Node reciprocal = graph.reciprocal(det);
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                Node minor = minors.minor(all & ~(1 << i), all & ~(1 << j));
                cofactors[i][j] = (i + j) % 2 == 0 ? minor : graph.negate(minor);
                Node entry = graph.multiply(cofactors[i][j], reciprocal);
                graph.keep(entry);
                set(block.get(i), block.get(j), entry);
            }
        }
    }

    private void set(int i, int j, Node entry) {
        inverse[i][j] = entry;
        inverse[j][i] = entry;
    }

    /** A⁻¹ from A = L D Lᵀ, its rows taken in the order of the pivots. */
    private void byElimination(Node[][] matrix, List<Integer> block) {
        List<Integer> order = PivotOrder.choose(graph, matrix, block);
        int m = order.size();
        Node[][] lower = new Node[m][m];
        Node[] reciprocals = new Node[m];
        Node[][] rest = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j < m; j++) {
                rest[i][j] = matrix[order.get(i)][order.get(j)];
            }
        }
        for (int k = 0; k < m; k++) {
            if (rest[k][k].isZero()) {
                throw new DegenerateMetricException();
            }
            determinant = graph.multiply(determinant, rest[k][k]);
            reciprocals[k] = graph.reciprocal(rest[k][k]);
            for (int i = k + 1; i < m; i++) {
                lower[i][k] = kept(graph.multiply(rest[i][k], reciprocals[k]));
            }
            for (int i = k + 1; i < m; i++) {
                for (int j = k + 1; j <= i; j++) {
                    rest[i][j] = kept(graph.subtract(rest[i][j], graph.multiply(lower[i][k], rest[j][k])));
                    rest[j][i] = rest[i][j];
                }
            }
        }
        Node[][] lowerInverse = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j < i; j++) {
                List<Node> terms = new ArrayList<>(List.of(lower[i][j]));
                for (int k = j + 1; k < i; k++) {
                    terms.add(graph.multiply(lower[i][k], lowerInverse[k][j]));
                }
                lowerInverse[i][j] = kept(graph.negate(graph.sum(terms)));
            }
            lowerInverse[i][i] = graph.one();
        }
        Node[][] scaled = new Node[m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                scaled[i][j] = kept(graph.multiply(lowerInverse[i][j], reciprocals[i]));
            }
        }
        for (int i = 0; i < m; i++) {
            for (int j = 0; j <= i; j++) {
                List<Node> terms = new ArrayList<>();
                for (int k = i; k < m; k++) {
                    terms.add(graph.multiply(scaled[k][i], lowerInverse[k][j]));
                }
                set(order.get(i), order.get(j), kept(graph.sum(terms)));
            }
        }
    }

    private Node kept(Node node) {
        graph.keep(node);
        return node;
    }
}
