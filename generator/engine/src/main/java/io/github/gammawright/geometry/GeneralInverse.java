package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;

/**
 * The inverse of a matrix of nodes without symmetry, by eliminating one column at a time; pivots are rows whose entry
 * keeps away from zero at the sample points, sparse ones first.
 */
final class GeneralInverse {

    private final ExpressionGraph graph;
    private final int n;
    private final Node[][] rows;
    private final Node[][] inverse;

    private GeneralInverse(ExpressionGraph graph, Node[][] matrix) {
        this.graph = graph;
        this.n = matrix.length;
        this.rows = new Node[n][];
        this.inverse = new Node[n][n];
        for (int i = 0; i < n; i++) {
            rows[i] = matrix[i].clone();
            for (int j = 0; j < n; j++) {
                inverse[i][j] = i == j ? graph.one() : graph.zero();
            }
        }
    }

    /** The inverse, [column of the matrix][row of the matrix]. */
    static Node[][] of(ExpressionGraph graph, Node[][] matrix) {
        return new GeneralInverse(graph, matrix).eliminated();
    }

    private Node[][] eliminated() {
        boolean[] used = new boolean[n];
        Node[][] ordered = new Node[n][];
        List<Integer> columns = new ArrayList<>();
        for (int c = 0; c < n; c++) {
            columns.add(c);
        }
        while (!columns.isEmpty()) {
            int bestRow = -1;
            int bestColumn = -1;
            double bestQuality = 0;
            for (int c : columns) {
                for (int r = 0; r < n; r++) {
                    double quality = used[r] ? 0 : quality(r, c, columns, used);
                    if (quality > bestQuality) {
                        bestQuality = quality;
                        bestRow = r;
                        bestColumn = c;
                    }
                }
            }
            if (bestRow < 0) {
                throw new DegenerateMetricException();
            }
            used[bestRow] = true;
            columns.remove((Integer) bestColumn);
            pivot(bestRow, bestColumn);
            ordered[bestColumn] = inverse[bestRow];
        }
        return ordered;
    }

    /** Large where the entry is far from zero everywhere and few others are in its row and column. */
    private double quality(int r, int c, List<Integer> columns, boolean[] used) {
        if (rows[r][c].isZero()) {
            return 0;
        }
        int fill = 0;
        for (int j : columns) {
            fill += j != c && !rows[r][j].isZero() ? 1 : 0;
        }
        int fillDown = 0;
        for (int i = 0; i < n; i++) {
            fillDown += i != r && !used[i] && !rows[i][c].isZero() ? 1 : 0;
        }
        double smallest = 1;
        double[] pivots = graph.realValues(rows[r][c]);
        for (int p = 0; p < pivots.length; p++) {
            double largest = 0;
            for (int i = 0; i < n; i++) {
                if (!used[i]) {
                    largest = Math.max(largest, Math.abs(graph.realValues(rows[i][c])[p]));
                }
            }
            if (largest > 0) {
                smallest = Math.min(smallest, Math.abs(pivots[p]) / largest);
            }
        }
        return (smallest + 1e-9) / (1 + fill * (double) fillDown);
    }

    private void pivot(int r, int c) {
        Node reciprocal = kept(graph.reciprocal(rows[r][c]));
        for (int j = 0; j < n; j++) {
            rows[r][j] = kept(graph.multiply(reciprocal, rows[r][j]));
            inverse[r][j] = kept(graph.multiply(reciprocal, inverse[r][j]));
        }
        for (int i = 0; i < n; i++) {
            Node factor = rows[i][c];
            if (i == r || factor.isZero()) {
                continue;
            }
            for (int j = 0; j < n; j++) {
                rows[i][j] = kept(graph.subtract(rows[i][j], graph.multiply(factor, rows[r][j])));
                inverse[i][j] = kept(graph.subtract(inverse[i][j], graph.multiply(factor, inverse[r][j])));
            }
        }
    }

    private Node kept(Node node) {
        graph.keep(node);
        return node;
    }
}
