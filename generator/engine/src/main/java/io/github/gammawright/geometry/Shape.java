package io.github.gammawright.geometry;

import java.util.ArrayList;
import java.util.List;

/**
 * The index structure of a quantity in n dimensions: how many values each index takes, and which components follow from
 * others by symmetry.
 *
 * @param extents the number of values of each index, outermost first; empty for a scalar
 * @param first the smallest value that a caller gives for the indices: 0, or 1 where the time index is left out
 * @param symmetry which exchanges of indices leave the value as it is but for its sign
 */
public record Shape(List<Integer> extents, int first, Symmetry symmetry) {

    /** Which exchanges of indices leave a component as it is but for its sign. */
    public enum Symmetry {
        /** None. */
        NONE,
        /** That of the last two. */
        LAST_PAIR,
        /**
         * Those of R_klij: antisymmetric in k and l and in i and j, symmetric when the pairs are exchanged. They hold
         * for the components with all indices below, which the layouts other than the full one store.
         */
        CURVATURE
    }

    public Shape {
        extents = List.copyOf(extents);
        if (symmetry == Symmetry.LAST_PAIR && extents.size() < 2) {
            throw new IllegalArgumentException("a symmetric pair needs two indices, not " + extents.size());
        }
        if (symmetry == Symmetry.CURVATURE && extents.size() != 4) {
            throw new IllegalArgumentException("a curvature tensor has four indices, not " + extents.size());
        }
    }

    /** A shape in which the last two indices may be symmetric. */
    public Shape(List<Integer> extents, int first, boolean symmetricPair) {
        this(extents, first, symmetricPair ? Symmetry.LAST_PAIR : Symmetry.NONE);
    }

    /** Whether exchanging the last two indices leaves the value as it is. */
    public boolean symmetricPair() {
        return symmetry == Symmetry.LAST_PAIR;
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

    /** The number of entries with symmetric components stored once. */
    public int packedLength() {
        return switch (symmetry) {
            case NONE -> fullLength();
            case LAST_PAIR -> {
                int n = extents.get(rank() - 1);
                yield fullLength() / (n * n) * triangle(n);
            }
            case CURVATURE -> triangle(triangle(extents.get(0) - 1));
        };
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

    /**
     * The position in the packed layout of a component or of the one that it follows from; indices count from 0. For
     * {@link Symmetry#CURVATURE} neither the first two indices nor the last two may be equal.
     */
    public int packedIndex(int... indices) {
        return switch (symmetry) {
            case NONE -> fullIndex(indices);
            case LAST_PAIR -> {
                int index = 0;
                for (int i = 0; i < rank() - 2; i++) {
                    index = index * extents.get(i) + indices[i];
                }
                int n = extents.get(rank() - 1);
                yield index * triangle(n) + symmetricIndex(indices[rank() - 2], indices[rank() - 1]);
            }
            case CURVATURE -> symmetricIndex(pairIndex(indices[0], indices[1]), pairIndex(indices[2], indices[3]));
        };
    }

    /** n(n + 1)/2. */
    private static int triangle(int n) {
        return n * (n + 1) / 2;
    }

    private static int symmetricIndex(int i, int j) {
        return triangle(Math.max(i, j)) + Math.min(i, j);
    }

    /** The number of a pair of different indices. */
    private static int pairIndex(int i, int j) {
        return triangle(Math.max(i, j) - 1) + Math.min(i, j);
    }

    /** All index tuples in row-major order; indices count from 0. */
    public List<int[]> tuples() {
        List<int[]> all = new ArrayList<>();
        collect(new int[rank()], 0, all);
        return all;
    }

    /** The index tuples of the entries that a layout stores, if none of them vanishes, in its order. */
    public List<int[]> tuples(Layout layout) {
        return layout == Layout.FULL ? tuples() : independentTuples();
    }

    /**
     * One tuple for each independent component, in packed order: those whose last two indices are i ≥ j, or for a
     * curvature tensor k &gt; l and i &gt; j with the first pair not before the second.
     */
    public List<int[]> independentTuples() {
        if (symmetry == Symmetry.NONE) {
            return tuples();
        }
        if (symmetry == Symmetry.CURVATURE) {
            return curvatureTuples();
        }
        List<int[]> independent = new ArrayList<>();
        for (int[] tuple : tuples()) {
            if (tuple[rank() - 2] >= tuple[rank() - 1]) {
                independent.add(tuple);
            }
        }
        return independent;
    }

    private List<int[]> curvatureTuples() {
        List<int[]> pairs = new ArrayList<>();
        for (int k = 1; k < extents.get(0); k++) {
            for (int l = 0; l < k; l++) {
                pairs.add(new int[] {k, l});
            }
        }
        List<int[]> tuples = new ArrayList<>();
        for (int a = 0; a < pairs.size(); a++) {
            for (int b = 0; b <= a; b++) {
                tuples.add(new int[] {pairs.get(a)[0], pairs.get(a)[1], pairs.get(b)[0], pairs.get(b)[1]});
            }
        }
        return tuples;
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
