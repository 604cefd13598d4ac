package io.github.gammawright.verification;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.List;

/**
 * Where each component of a quantity is in a result array, by the rules that users read, not by the code that emission
 * uses: row-major for {@code full}; each symmetric pair once at i(i+1)/2 + j for {@code packed}; what the class itself
 * says for {@code non-zero}.
 *
 * @param length how long the result array must be
 * @param entries each component once, the symmetric ones with i ≥ j only, except in {@code full}
 */
record SlotMap(int length, List<Entry> entries) {

    SlotMap {
        entries = List.copyOf(entries);
    }

    /**
     * A component.
     *
     * @param indices its indices, counted from 0
     * @param component its number in row-major order
     * @param slot its place in the result array, −1 where the class says that it vanishes identically
     */
    record Entry(List<Integer> indices, int component, int slot) {

        Entry {
            indices = List.copyOf(indices);
        }
    }

    /** What a class says of the place of a component, indices counted as its users count them. */
    @FunctionalInterface
    interface ClassIndex {
        int of(int... indices);
    }

    /**
     * The map of a layout.
     *
     * @param n the dimension
     * @param classLength the class's own length, which counts for {@code non-zero} only
     * @param classIndex the class's own index method, which counts for {@code non-zero} only
     * @param first what users call the first value of an index
     */
    static SlotMap of(
            ReferenceQuantity quantity, int n, Layout layout, int classLength, ClassIndex classIndex, int first) {
        List<Integer> extents = quantity.extents(n);
        boolean symmetric = quantity.isSymmetricInLastPair();
        int rank = extents.size();
        int components = extents.stream().reduce(1, Math::multiplyExact);
        List<Entry> entries = new ArrayList<>();
        if (quantity.isCurvature() && layout != Layout.FULL) {
            return curvature(n, layout, classLength, classIndex);
        }
        int packed = 0;
        for (int component = 0; component < components; component++) {
            int[] indices = indices(component, extents);
            boolean upper = symmetric && indices[rank - 2] < indices[rank - 1];
            if (layout == Layout.FULL) {
                entries.add(new Entry(boxed(indices), component, component));
            } else if (!upper) {
                int slot = layout == Layout.PACKED
                        ? packed(indices, extents, symmetric)
                        : askClass(classIndex, indices, first);
                entries.add(new Entry(boxed(indices), component, slot));
                packed++;
            }
        }
        int length = switch (layout) {
            case FULL -> components;
            case PACKED -> packed;
            case NON_ZERO -> classLength;
        };
        return new SlotMap(length, entries);
    }

    /** Pairs A = k(k−1)/2 + l, k &gt; l, and B alike, at A(A+1)/2 + B for A ≥ B. */
    private static SlotMap curvature(int n, Layout layout, int classLength, ClassIndex classIndex) {
        List<Entry> entries = new ArrayList<>();
        for (int k = 1; k < n; k++) {
            for (int l = 0; l < k; l++) {
                int a = k * (k - 1) / 2 + l;
                for (int i = 1; i <= k; i++) {
                    for (int j = 0; j < i; j++) {
                        int b = i * (i - 1) / 2 + j;
                        if (b <= a) {
                            int slot = layout == Layout.PACKED ? a * (a + 1) / 2 + b : classIndex.of(k, l, i, j);
                            entries.add(new Entry(List.of(k, l, i, j), ((k * n + l) * n + i) * n + j, slot));
                        }
                    }
                }
            }
        }
        return new SlotMap(layout == Layout.PACKED ? entries.size() : classLength, entries);
    }

    private static int packed(int[] indices, List<Integer> extents, boolean symmetric) {
        int rank = indices.length;
        int outer = 0;
        int last = symmetric ? rank - 2 : rank;
        for (int position = 0; position < last; position++) {
            outer = outer * extents.get(position) + indices[position];
        }
        if (!symmetric) {
            return outer;
        }
        int n = extents.get(rank - 1);
        int i = indices[rank - 2];
        int j = indices[rank - 1];
        return outer * (n * (n + 1) / 2) + i * (i + 1) / 2 + j;
    }

    private static int askClass(ClassIndex classIndex, int[] indices, int first) {
        int[] counted = new int[indices.length];
        for (int i = 0; i < indices.length; i++) {
            counted[i] = indices[i] + first;
        }
        return classIndex.of(counted);
    }

    private static int[] indices(int component, List<Integer> extents) {
        int[] indices = new int[extents.size()];
        int rest = component;
        for (int i = extents.size() - 1; i >= 0; i--) {
            indices[i] = rest % extents.get(i);
            rest /= extents.get(i);
        }
        return indices;
    }

    private static List<Integer> boxed(int[] indices) {
        List<Integer> boxed = new ArrayList<>();
        for (int index : indices) {
            boxed.add(index);
        }
        return boxed;
    }
}
