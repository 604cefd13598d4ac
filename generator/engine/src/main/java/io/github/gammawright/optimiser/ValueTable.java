package io.github.gammawright.optimiser;

import java.util.Arrays;

/** A hash table from non-negative residues to small numbers, open-addressed for speed. */
final class ValueTable {

    /** An odd number near 2⁶⁴ divided by the golden ratio: products with it differ in their leading bits. */
    static final long SPREAD = 0x9E3779B97F4A7C15L;

    private long[] keys = new long[256];
    private int[] values = new int[256];
    private int count;

    /** A bit for each hash of a key that is there, eight times as many as places. */
    private long[] filter = new long[32];

    private int filterShift = Long.SIZE - 11;

    ValueTable() {
        Arrays.fill(values, -1);
    }

    int find(long key) {
        long bit = (key * SPREAD) >>> filterShift;
        if ((filter[(int) (bit >>> 6)] & (1L << bit)) == 0) {
            return -1;
        }
        int mask = keys.length - 1;
        for (int i = slot(key, mask); values[i] >= 0; i = (i + 1) & mask) {
            if (keys[i] == key) {
                return values[i];
            }
        }
        return -1;
    }

    /** Enters a value; of two with one key the first stays. */
    void put(long key, int value) {
        if (2 * (count + 1) > keys.length) {
            grow();
        }
        int mask = keys.length - 1;
        int i = slot(key, mask);
        while (values[i] >= 0) {
            if (keys[i] == key) {
                return;
            }
            i = (i + 1) & mask;
        }
        keys[i] = key;
        values[i] = value;
        count++;
        long bit = (key * SPREAD) >>> filterShift;
        filter[(int) (bit >>> 6)] |= 1L << bit;
    }

    private void grow() {
        long[] oldKeys = keys;
        int[] oldValues = values;
        keys = new long[2 * oldKeys.length];
        values = new int[keys.length];
        Arrays.fill(values, -1);
        count = 0;
        filter = new long[keys.length / 8];
        filterShift--;
        for (int i = 0; i < oldKeys.length; i++) {
            if (oldValues[i] >= 0) {
                put(oldKeys[i], oldValues[i]);
            }
        }
    }

    static int slot(long key, int mask) {
        long h = key * SPREAD;
        return (int) (h >>> 32) & mask;
    }
}
