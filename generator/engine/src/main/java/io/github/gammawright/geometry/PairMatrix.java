package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/**
 * A tensor t_klij with the symmetries of the curvature tensor, all indices below, as a matrix over pairs A = k(k−1)/2 + l,
 * k &gt; l, and B of i and j alike.
 */
final class PairMatrix {

    private final ExpressionGraph graph;
    private final int n;
    private final Node[][] entries;

    /** A matrix that is still to be filled. */
    PairMatrix(ExpressionGraph graph, int n) {
        this.graph = graph;
        this.n = n;
        this.entries = new Node[n * (n - 1) / 2][n * (n - 1) / 2];
    }

    /** The matrix with each entry in another form, on another graph. */
    PairMatrix with(ExpressionGraph target, UnaryOperator<Node> form) {
        PairMatrix changed = new PairMatrix(target, n);
        for (int a = 0; a < pairs(); a++) {
            for (int b = 0; b <= a; b++) {
                changed.set(a, b, form.apply(entries[a][b]));
            }
        }
        return changed;
    }

    /** How many pairs there are. */
    int pairs() {
        return entries.length;
    }

    /** The greater index of a pair. */
    int greater(int pair) {
        int k = 1;
        while (k * (k + 1) / 2 <= pair) {
            k++;
        }
        return k;
    }

    /** The smaller index of a pair. */
    int smaller(int pair) {
        int k = greater(pair);
        return pair - k * (k - 1) / 2;
    }

    static int pair(int k, int l) {
        int greater = Math.max(k, l);
        return greater * (greater - 1) / 2 + Math.min(k, l);
    }

    /** t_klij by the numbers of its pairs. */
    Node at(int a, int b) {
        return entries[a][b];
    }

    /** Sets t_klij and what follows from it by exchange of the pairs. */
    void set(int a, int b, Node value) {
        graph.keep(value);
        entries[a][b] = value;
        entries[b][a] = value;
    }

    /** t_klij for any indices. */
    Node at(int k, int l, int i, int j) {
        if (k == l || i == j) {
            return graph.zero();
        }
        Node entry = entries[pair(k, l)][pair(i, j)];
        return (k > l) == (i > j) ? entry : graph.negate(entry);
    }

    /** The entries with A ≥ B, row by row. */
    static List<Node> packed(PairMatrix matrix) {
        List<Node> packed = new ArrayList<>();
        for (int a = 0; a < matrix.pairs(); a++) {
            for (int b = 0; b <= a; b++) {
                packed.add(matrix.at(a, b));
            }
        }
        return packed;
    }
}
