package io.github.gammawright.optimiser;

import io.github.gammawright.graph.PrimeField;
import java.util.Arrays;

/** All values that one operation on two known values gives, by their unsigned residue. */
final class PairTable {

    static final int SUM = 0;
    static final int DIFFERENCE = 1;
    static final int PRODUCT = 2;
    /** The first divided by the second. */
    static final int QUOTIENT = 3;
    /** The second divided by the first. */
    static final int INVERSE_QUOTIENT = 4;

    private static final int MOST_PER_KEY = 10;
    private static final PrimeField P = PrimeField.VALUES;

    private final Network network;
    private long[] keys;
    private int[] pairs;
    private byte[] kinds;
    private int mask;
    private int count;

    /** A bit for each hash of a key that is there, eight times as many as places: most questions end here, in the cache. */
    private long[] filter;

    /** The same for hashes that were entered more than once. */
    private long[] repeated;

    private int filterShift;
    private int[] members = new int[64];
    private int memberCount;

    PairTable(Network network) {
        this.network = network;
        allocate(1 << 12);
    }

    private void allocate(int capacity) {
        keys = new long[capacity];
        pairs = new int[capacity];
        kinds = new byte[capacity];
        Arrays.fill(pairs, -1);
        mask = capacity - 1;
        count = 0;
        filter = new long[capacity / 8];
        repeated = new long[capacity / 8];
        filterShift = Long.numberOfLeadingZeros(8L * capacity) + 1;
    }

    /** Enters a value: from now on its combinations with all that were entered before are found. */
    void add(int v) {
        if (memberCount == members.length) {
            members = Arrays.copyOf(members, 2 * memberCount);
        }
        members[memberCount++] = v;
        for (int i = 0; i < memberCount; i++) {
            combine(members[i], v);
        }
    }

    int members() {
        return memberCount;
    }

    int member(int i) {
        return members[i];
    }

    private void combine(int u, int v) {
        if (network.operation[u] == Network.FREE && network.operation[v] == Network.FREE) {
            return;
        }
        long a = network.residues[0][u];
        long b = network.residues[0][v];
        if (u != v) {
            put(P.add(a, b), u, v, SUM);
            put(P.subtract(a, b), u, v, DIFFERENCE);
            if (network.divisor[v]) {
                put(P.multiply(a, network.inverse[v]), u, v, QUOTIENT);
            }
            if (network.divisor[u]) {
                put(P.multiply(b, network.inverse[u]), u, v, INVERSE_QUOTIENT);
            }
        }
        put(P.multiply(a, b), u, v, PRODUCT);
    }

    private void put(long residue, int u, int v, int kind) {
        if (residue == 0) {
            return;
        }
        if (2 * (count + 1) > keys.length) {
            grow();
        }
        long key = Network.unsigned(residue);
        int same = 0;
        int i = ValueTable.slot(key, mask);
        while (pairs[i] >= 0) {
            if (keys[i] == key && ++same >= MOST_PER_KEY) {
                return;
            }
            i = (i + 1) & mask;
        }
        enter(key);
        keys[i] = key;
        pairs[i] = u << 15 | v;
        kinds[i] = (byte) kind;
        count++;
    }

    private void enter(long key) {
        long bit = (key * ValueTable.SPREAD) >>> filterShift;
        int word = (int) (bit >>> 6);
        repeated[word] |= filter[word] & (1L << bit);
        filter[word] |= 1L << bit;
    }

    private void grow() {
        long[] oldKeys = keys;
        int[] oldPairs = pairs;
        byte[] oldKinds = kinds;
        allocate(2 * oldKeys.length);
        for (int j = 0; j < oldKeys.length; j++) {
            if (oldPairs[j] >= 0) {
                int i = ValueTable.slot(oldKeys[j], mask);
                while (pairs[i] >= 0) {
                    i = (i + 1) & mask;
                }
                enter(oldKeys[j]);
                keys[i] = oldKeys[j];
                pairs[i] = oldPairs[j];
                kinds[i] = oldKinds[j];
                count++;
            }
        }
    }

    /**
     * The first place where a key stands, or −1; see {@link #next}.
     *
     * @param several whether a key that stands in one place only counts as not there
     */
    int first(long key, boolean several) {
        long bit = (key * ValueTable.SPREAD) >>> filterShift;
        long word = (several ? repeated : filter)[(int) (bit >>> 6)];
        return (word & (1L << bit)) == 0 ? -1 : find(key, ValueTable.slot(key, mask));
    }

    /** The next place of the same key, or −1. */
    int next(long key, int place) {
        return find(key, (place + 1) & mask);
    }

    private int find(long key, int start) {
        for (int i = start; pairs[i] >= 0; i = (i + 1) & mask) {
            if (keys[i] == key) {
                return i;
            }
        }
        return -1;
    }

    int firstOf(int place) {
        return pairs[place] >>> 15;
    }

    int secondOf(int place) {
        return pairs[place] & 0x7FFF;
    }

    int kind(int place) {
        return kinds[place];
    }
}
