package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * A computation that is to be written as one or several private methods.
 *
 * @param program what is computed
 * @param inlining which values are variables
 * @param values their names
 * @param statements in order
 * @param arrays what the statements write to; a statement's array number refers to this list
 */
record Body(
        StraightLineProgram program,
        Inlining inlining,
        ValueNames values,
        List<Statement> statements,
        List<ArrayTarget> arrays) {

    Body {
        statements = List.copyOf(statements);
        arrays = List.copyOf(arrays);
    }

    boolean isVariable(int value) {
        return inlining.variables().get(value);
    }

    /** Whether a value is among the inputs of the body, which its methods get as arguments. */
    boolean isInput(int value) {
        return program.instruction(value) instanceof Instruction.Load load
                && !load.symbol().isParameter();
    }

    /** The value of a statement, −1 for one without. */
    static int valueOf(Statement statement) {
        if (statement instanceof Statement.Define define) {
            return define.value();
        }
        return statement instanceof Statement.Store store ? store.value() : -1;
    }

    /** The variables and inputs that a statement reads, each once. */
    List<Integer> reads(Statement statement) {
        Set<Integer> reads = new LinkedHashSet<>();
        int value = valueOf(statement);
        if (statement instanceof Statement.Define) {
            program.instruction(value).operands().forEach(operand -> collect(operand, reads));
        } else if (value >= 0) {
            collect(value, reads);
        }
        return List.copyOf(reads);
    }

    private void collect(int value, Set<Integer> reads) {
        if (isVariable(value) || isInput(value)) {
            reads.add(value);
        } else if (!values.isGiven(value)) {
            program.instruction(value).operands().forEach(operand -> collect(operand, reads));
        }
    }

    /** The same with the zeros at the end, so that their entries may serve as memory before. */
    Body withZerosLast() {
        List<Statement> sorted = new ArrayList<>();
        statements.stream().filter(s -> !(s instanceof Statement.Zero)).forEach(sorted::add);
        statements.stream().filter(s -> s instanceof Statement.Zero).forEach(sorted::add);
        return new Body(program, inlining, values, sorted, arrays);
    }

    /**
     * The same with each variable written into one entry only, and copied from there into the others at the end: a
     * little more work, and more entries that may serve as memory before.
     */
    Body withCopiesLast() {
        List<Statement> first = new ArrayList<>();
        List<Statement> last = new ArrayList<>();
        Map<Integer, Statement.Store> stored = new HashMap<>();
        for (Statement statement : statements) {
            if (statement instanceof Statement.Store store && isVariable(store.value())) {
                Statement.Store origin = stored.putIfAbsent(store.value(), store);
                if (origin == null) {
                    first.add(store);
                } else {
                    last.add(new Statement.Copy(store.array(), store.slot(), origin.array(), origin.slot()));
                }
            } else {
                first.add(statement);
            }
        }
        first.addAll(last);
        return new Body(program, inlining, values, first, arrays).withZerosLast();
    }
}
