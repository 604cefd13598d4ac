package io.github.gammawright.geometry;

import java.util.ArrayList;
import java.util.List;

/**
 * The index structure of a quantity in n dimensions: how many values each index takes, and whether the last two are
 * symmetric.
 *
 * @param extents the number of values of each index, outermost first; empty for a scalar
 * @param first the smallest value that a caller gives for the indices: 0, or 1 where the time index is left out
 * @param symmetricPair whether exchanging the last two indices leaves the value as it is
 */
public record Shape(List<Integer> extents, int first, boolean symmetricPair) {

    public Shape {
        extents = List.copyOf(extents);
        if (symmetricPair && extents.size() < 2) {
            throw new IllegalArgumentException("a symmetric pair needs two indices, not " + extents.size());
        }
    }

    /** The number of indices. */
    public int rank() {
        return extents.size();
    }

    /** The number of entries in row-major order over all indices. */
    public int fullLength() {
        int length = 1;
        for (int extent : extents) {
            length = Math.multiplyExact(length, extent);
        }
        return length;
    }

    /** The number of entries with each symmetric pair stored once. */
    public int packedLength() {
        if (!symmetricPair) {
            return fullLength();
        }
        int n = extents.get(rank() - 1);
        return fullLength() / (n * n) * (n * (n + 1) / 2);
    }

    /** The number of entries in the layout; for {@link Layout#NON_ZERO} the most there can be. */
    public int length(Layout layout) {
        return layout == Layout.FULL ? fullLength() : packedLength();
    }

    /** The position of a component in row-major order; indices count from 0. */
    public int fullIndex(int... indices) {
        int index = 0;
        for (int i = 0; i < indices.length; i++) {
            index = index * extents.get(i) + indices[i];
        }
        return index;
    }

    /** The position of a component in the packed layout; indices count from 0. */
    public int packedIndex(int... indices) {
        if (!symmetricPair) {
            return fullIndex(indices);
        }
        int index = 0;
        for (int i = 0; i < rank() - 2; i++) {
            index = index * extents.get(i) + indices[i];
        }
        int n = extents.get(rank() - 1);
        int i = Math.max(indices[rank() - 2], indices[rank() - 1]);
        int j = Math.min(indices[rank() - 2], indices[rank() - 1]);
        return index * (n * (n + 1) / 2) + i * (i + 1) / 2 + j;
    }

    /** All index tuples in row-major order; indices count from 0. */
    public List<int[]> tuples() {
        List<int[]> all = new ArrayList<>();
        collect(new int[rank()], 0, all);
        return all;
    }

    /** The tuples whose last two indices are i ≥ j, one for each independent component, in packed order. */
    public List<int[]> independentTuples() {
        if (!symmetricPair) {
            return tuples();
        }
        List<int[]> independent = new ArrayList<>();
        for (int[] tuple : tuples()) {
            if (tuple[rank() - 2] >= tuple[rank() - 1]) {
                independent.add(tuple);
            }
        }
        return independent;
    }

    private void collect(int[] tuple, int position, List<int[]> all) {
        if (position == tuple.length) {
            all.add(tuple.clone());
            return;
        }
        for (int i = 0; i < extents.get(position); i++) {
            tuple[position] = i;
            collect(tuple, position + 1, all);
        }
    }
}
