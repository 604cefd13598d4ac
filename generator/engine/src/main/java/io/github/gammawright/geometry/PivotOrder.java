package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;

/** In which order the rows of a symmetric matrix are eliminated. */
final class PivotOrder {

    private PivotOrder() {}

    /**
     * The order in which, at the sample points, the smallest pivot relative to its row is largest: a pivot that changes
     * its sign in the domain, as g_tt does at an ergosurface, comes last.
     */
    static List<Integer> choose(ExpressionGraph graph, Node[][] matrix, List<Integer> block) {
        int m = block.size();
        int points = graph.realValues(matrix[block.get(0)][block.get(0)]).length;
        double[][][] rest = new double[points][m][m];
        for (int i = 0; i < m; i++) {
            for (int j = 0; j < m; j++) {
                double[] values = graph.realValues(matrix[block.get(i)][block.get(j)]);
                for (int k = 0; k < points; k++) {
                    rest[k][i][j] = values[k];
                }
            }
        }
        List<Integer> order = new ArrayList<>();
        boolean[] done = new boolean[m];
        for (int step = 0; step < m; step++) {
            int best = -1;
            double bestQuality = -1;
            for (int i = 0; i < m; i++) {
                if (!done[i]) {
                    double quality = quality(rest, done, i);
                    if (best < 0 || quality > bestQuality) {
                        best = i;
                        bestQuality = quality;
                    }
                }
            }
            order.add(block.get(best));
            done[best] = true;
            for (double[][] a : rest) {
                eliminate(a, done, best);
            }
        }
        return order;
    }

    private static double quality(double[][][] rest, boolean[] done, int i) {
        double smallest = Double.POSITIVE_INFINITY;
        boolean positive = false;
        boolean negative = false;
        for (double[][] a : rest) {
            double row = 0;
            for (int j = 0; j < done.length; j++) {
                if (!done[j]) {
                    row = Math.max(row, Math.abs(a[i][j]));
                }
            }
            positive |= a[i][i] > 0;
            negative |= a[i][i] < 0;
            double relative = row > 0 ? Math.abs(a[i][i]) / row : 0;
            if (!Double.isNaN(relative)) {
                smallest = Math.min(smallest, relative);
            }
        }
        return positive && negative ? 0 : smallest;
    }

    private static void eliminate(double[][] a, boolean[] done, int pivot) {
        for (int i = 0; i < done.length; i++) {
            for (int j = 0; j < done.length; j++) {
                if (!done[i] && !done[j]) {
                    a[i][j] -= a[i][pivot] * a[pivot][j] / a[pivot][pivot];
                }
            }
        }
    }
}
