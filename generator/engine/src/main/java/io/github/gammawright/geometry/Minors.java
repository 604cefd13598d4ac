package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The minors of a small symmetric matrix, each computed once. */
final class Minors {

    private final ExpressionGraph graph;
    private final Node[][] matrix;
    private final List<Integer> block;
    private final Map<Integer, Node> known = new HashMap<>();

    Minors(ExpressionGraph graph, Node[][] matrix, List<Integer> block) {
        this.graph = graph;
        this.matrix = matrix;
        this.block = block;
    }

    /** The determinant of the rows and columns whose bits are set; as many rows as columns. */
    Node minor(int rows, int columns) {
        if (rows == 0) {
            return graph.one();
        }
        // the matrix is symmetric: a minor and its transpose are the same value
        int key = Math.max(rows, columns) << 16 | Math.min(rows, columns);
        Node value = known.get(key);
        if (value == null) {
            value = expand(Math.max(rows, columns), Math.min(rows, columns));
            graph.keep(value);
            known.put(key, value);
        }
        return value;
    }

    private Node expand(int rows, int columns) {
        int first = Integer.numberOfTrailingZeros(rows);
        List<Node> terms = new ArrayList<>();
        int position = 0;
        for (int j = 0; j < block.size(); j++) {
            if ((columns & (1 << j)) == 0) {
                continue;
            }
            Node entry = matrix[block.get(first)][block.get(j)];
            if (!entry.isZero()) {
                Node term = graph.multiply(entry, minor(rows & ~(1 << first), columns & ~(1 << j)));
                terms.add(position % 2 == 0 ? term : graph.negate(term));
            }
            position++;
        }
        return graph.sum(terms);
    }
}
