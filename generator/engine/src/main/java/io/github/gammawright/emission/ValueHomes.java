package io.github.gammawright.emission;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Finds a place for each value that is computed in one part of a body and used in later ones: the result that it is;
 * else an entry of a result that gets its final value only after the last use; else an entry of the workspace. A part
 * loads what it needs before it writes anything, so that an entry may change hands within a part.
 */
final class ValueHomes {

    /** An entry of an array; the workspace has the number after those of the body's arrays. */
    record Home(int array, int slot) {}

    private static final int BEFORE_ALL = -1;

    private final Map<Integer, Home> homes = new HashMap<>();
    private final BitSet written = new BitSet();
    private final int workspace;
    private int workspaceLength;

    private ValueHomes(int workspace, int workspaceLength) {
        this.workspace = workspace;
        this.workspaceLength = workspaceLength;
    }

    /**
     * Finds the places.
     *
     * @param inputs inputs of the body that are too many to be arguments
     * @param workspaceLength the entries of the workspace that are in other use
     */
    static ValueHomes of(Body body, List<List<Statement>> parts, BitSet inputs, int workspaceLength) {
        ValueHomes homes = new ValueHomes(body.arrays().size(), workspaceLength);
        homes.find(body, parts, inputs);
        return homes;
    }

    private void find(Body body, List<List<Statement>> parts, BitSet inputs) {
        Map<Integer, Integer> lastUse = new HashMap<>();
        Map<Home, Integer> lastWrite = new HashMap<>();
        for (int p = 0; p < parts.size(); p++) {
            for (Statement statement : parts.get(p)) {
                int part = p;
                body.reads(statement).forEach(value -> lastUse.put(value, part));
                if (statement instanceof Statement.Store store) {
                    lastWrite.put(new Home(store.array(), store.slot()), p);
                } else if (statement instanceof Statement.Copy copy) {
                    lastWrite.put(new Home(copy.array(), copy.slot()), p);
                } else if (statement instanceof Statement.Zero zero) {
                    for (int slot = zero.from(); slot < zero.to(); slot++) {
                        lastWrite.put(new Home(zero.array(), slot), p);
                    }
                }
            }
        }
        Pool pool = new Pool(lastWrite);
        for (int input = inputs.nextSetBit(0); input >= 0; input = inputs.nextSetBit(input + 1)) {
            place(input, lastUse.getOrDefault(input, BEFORE_ALL), pool);
        }
        for (int p = 0; p < parts.size(); p++) {
            pool.release(p);
            List<Statement> part = parts.get(p);
            for (int s = 0; s < part.size(); s++) {
                if (part.get(s) instanceof Statement.Define define && lastUse.getOrDefault(define.value(), p) > p) {
                    int value = define.value();
                    boolean result = s + 1 < part.size()
                            && part.get(s + 1) instanceof Statement.Store store
                            && store.value() == value;
                    if (result) {
                        Statement.Store store = (Statement.Store) part.get(s + 1);
                        homes.put(value, new Home(store.array(), store.slot()));
                    } else {
                        place(value, lastUse.get(value), pool);
                    }
                }
            }
        }
    }

    private void place(int value, int lastUse, Pool pool) {
        Home home = pool.take(lastUse);
        homes.put(value, home);
        written.set(value);
    }

    /** The entries that may hold a value for a while. */
    private final class Pool {

        /** Free entries by the part in which they get their final value. */
        private final TreeMap<Integer, Deque<Home>> free = new TreeMap<>();

        private final Map<Home, Integer> lastWrite;
        private final TreeMap<Integer, List<Home>> taken = new TreeMap<>();

        Pool(Map<Home, Integer> lastWrite) {
            this.lastWrite = lastWrite;
            lastWrite.entrySet().stream()
                    .sorted(Map.Entry.comparingByKey(
                            java.util.Comparator.comparingInt(Home::array).thenComparingInt(Home::slot)))
                    .forEach(entry -> give(entry.getKey()));
        }

        private void give(Home home) {
            int until = lastWrite.getOrDefault(home, Integer.MAX_VALUE);
            free.computeIfAbsent(until, u -> new ArrayDeque<>()).addLast(home);
        }

        /** Gives back what was last used in an earlier part, or is loaded at the beginning of this one. */
        void release(int part) {
            while (!taken.isEmpty() && taken.firstKey() <= part) {
                taken.pollFirstEntry().getValue().forEach(this::give);
            }
        }

        Home take(int lastUse) {
            Map.Entry<Integer, Deque<Home>> entry = free.ceilingEntry(lastUse);
            Home home;
            if (entry == null) {
                home = new Home(workspace, workspaceLength++);
            } else {
                home = entry.getValue().pollFirst();
                if (entry.getValue().isEmpty()) {
                    free.remove(entry.getKey());
                }
            }
            taken.computeIfAbsent(lastUse, u -> new ArrayList<>()).add(home);
            return home;
        }
    }

    /** Where later parts find a value. */
    Home home(int value) {
        return homes.get(value);
    }

    /** Whether a value must be written to its place, instead of being a result there. */
    boolean isWritten(int value) {
        return written.get(value);
    }

    /** How many entries the workspace needs. */
    int workspaceLength() {
        return workspaceLength;
    }
}
