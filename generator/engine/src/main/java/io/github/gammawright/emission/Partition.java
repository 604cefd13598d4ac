package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Cuts the statements of a body into runs that fit into methods. A body that fits into one method stays whole; else
 * each cut is made where few values are alive, so that the parts follow the data flow.
 */
final class Partition {

    /** Sizes at which a split costs little, and the compiler of the virtual machine is at its best. */
    private static final int MOST_OPERATIONS = 400;

    private static final int LEAST_OPERATIONS = 200;
    private static final int LARGEST_PART = 5_200;

    private final Body body;
    private final BytecodeSize size;
    private final int[] lastUse;
    private final BitSet stored = new BitSet();

    private Partition(Body body, BytecodeSize size) {
        this.body = body;
        this.size = size;
        this.lastUse = new int[body.program().size()];
        for (int s = 0; s < body.statements().size(); s++) {
            int position = s;
            body.reads(body.statements().get(s)).forEach(value -> lastUse[value] = position);
            if (body.statements().get(s) instanceof Statement.Store store) {
                stored.set(store.value());
            }
        }
    }

    /** The parts in order. */
    static List<List<Statement>> of(Body body, BytecodeSize size) {
        int bytes = 0;
        int locals = 64;
        for (Statement statement : body.statements()) {
            locals += statement instanceof Statement.Define ? 2 : 0;
            bytes += size.of(statement, locals);
        }
        if (bytes <= BytecodeSize.LARGEST_METHOD) {
            return List.of(body.statements());
        }
        return new Partition(body, size).cut();
    }

    private List<List<Statement>> cut() {
        List<Statement> statements = body.statements();
        List<List<Statement>> parts = new ArrayList<>();
        int from = 0;
        while (from < statements.size()) {
            int to = end(from);
            parts.add(statements.subList(from, to));
            from = to;
        }
        return parts;
    }

    /** Where the part that starts at a statement ends. */
    private int end(int from) {
        List<Statement> statements = body.statements();
        Set<Integer> defined = new HashSet<>();
        Set<Integer> loaded = new HashSet<>();
        int bytes = 0;
        int operations = 0;
        int locals = 64;
        int best = from + 1;
        int fewest = Integer.MAX_VALUE;
        for (int s = from; s < statements.size(); s++) {
            Statement statement = statements.get(s);
            int moves = 0;
            for (int read : body.reads(statement)) {
                boolean elsewhere = body.isVariable(read) && !defined.contains(read);
                moves += elsewhere && loaded.add(read) ? 1 : 0;
            }
            locals += 2 * moves;
            if (statement instanceof Statement.Define define) {
                locals += 2;
                defined.add(define.value());
                // it may have to be written for a later part
                moves += stored.get(define.value()) ? 0 : 1;
            }
            bytes += size.of(statement, locals) + moves * BytecodeSize.move(locals);
            operations += operations(statement);
            if (s > from && (bytes > LARGEST_PART || operations > MOST_OPERATIONS)) {
                return best;
            }
            if (s + 1 == statements.size()) {
                return s + 1;
            }
            int alive = cost(defined, s + 1);
            boolean large = operations >= LEAST_OPERATIONS || bytes >= LARGEST_PART / 2;
            if (mayCutBefore(s + 1) && (alive <= fewest || !large)) {
                best = s + 1;
                fewest = large ? alive : Integer.MAX_VALUE;
            }
        }
        return statements.size();
    }

    /** What it takes to carry values of this part over a cut; one that is a result already needs no writing. */
    private int cost(Set<Integer> defined, int cut) {
        int cost = 0;
        for (int value : defined) {
            if (lastUse[value] >= cut) {
                cost += stored.get(value) ? 1 : 2;
            }
        }
        return cost;
    }

    /** The first store of a variable stays with its definition, so that later parts find it in the result. */
    private boolean mayCutBefore(int s) {
        return !(body.statements().get(s) instanceof Statement.Store store
                && body.statements().get(s - 1) instanceof Statement.Define define
                && define.value() == store.value());
    }

    private int operations(Statement statement) {
        int value = Body.valueOf(statement);
        if (value < 0 || (statement instanceof Statement.Store && body.isVariable(value))) {
            return 0;
        }
        return operations(value);
    }

    private int operations(int value) {
        Instruction instruction = body.program().instruction(value);
        int operations =
                instruction instanceof Instruction.Arithmetic || instruction instanceof Instruction.Call ? 1 : 0;
        for (int operand : instruction.operands()) {
            boolean inlined = !body.isVariable(operand) && !body.values().isGiven(operand);
            operations += inlined ? operations(operand) : 0;
        }
        return operations;
    }
}
