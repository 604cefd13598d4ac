package io.github.gammawright.geometry;

import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;

/** The blocks into which a symmetric matrix falls when its indices are grouped by its non-zero entries. */
final class Blocks {

    private Blocks() {}

    /** The index groups, each in rising order, ordered by their first index. */
    static List<List<Integer>> of(Node[][] matrix) {
        int n = matrix.length;
        boolean[] seen = new boolean[n];
        List<List<Integer>> blocks = new ArrayList<>();
        for (int start = 0; start < n; start++) {
            if (seen[start]) {
                continue;
            }
            List<Integer> block = new ArrayList<>(List.of(start));
            seen[start] = true;
            for (int at = 0; at < block.size(); at++) {
                for (int j = 0; j < n; j++) {
                    if (!seen[j] && !matrix[block.get(at)][j].isZero()) {
                        seen[j] = true;
                        block.add(j);
                    }
                }
            }
            block.sort(null);
            blocks.add(block);
        }
        return blocks;
    }
}
