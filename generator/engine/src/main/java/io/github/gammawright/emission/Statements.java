package io.github.gammawright.emission;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Puts the computation of results into an order of statements: each value is stored as soon as it is known. */
final class Statements {

    private Statements() {}

    /**
     * The statements of a body.
     *
     * @param slots for each array the value behind each entry, −1 for zero
     */
    static List<Statement> of(Inlining inlining, List<List<Integer>> slots) {
        List<Statement> statements = new ArrayList<>();
        Map<Integer, List<Statement>> stores = new TreeMap<>();
        for (int array = 0; array < slots.size(); array++) {
            List<Integer> values = slots.get(array);
            for (int slot = 0; slot < values.size(); slot++) {
                if (values.get(slot) >= 0) {
                    stores.computeIfAbsent(values.get(slot), v -> new ArrayList<>())
                            .add(new Statement.Store(array, slot, values.get(slot)));
                } else {
                    int end = slot + 1;
                    while (end < values.size() && values.get(end) < 0) {
                        end++;
                    }
                    statements.add(new Statement.Zero(array, slot, end));
                    slot = end - 1;
                }
            }
        }
        BitSet live = inlining.live();
        stores.forEach((value, list) -> {
            if (!live.get(value)) {
                statements.addAll(list);
            }
        });
        for (int i = live.nextSetBit(0); i >= 0; i = live.nextSetBit(i + 1)) {
            if (inlining.variables().get(i)) {
                statements.add(new Statement.Define(i));
            }
            statements.addAll(stores.getOrDefault(i, List.of()));
        }
        return statements;
    }
}
