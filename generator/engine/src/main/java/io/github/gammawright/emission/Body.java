package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.BitSet;
import java.util.List;

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

    /** The variables and inputs that a statement reads. */
    BitSet reads(Statement statement) {
        BitSet reads = new BitSet();
        int value = valueOf(statement);
        if (statement instanceof Statement.Define) {
            program.instruction(value).operands().forEach(operand -> collect(operand, reads));
        } else if (value >= 0) {
            collect(value, reads);
        }
        return reads;
    }

    private void collect(int value, BitSet reads) {
        if (isVariable(value) || isInput(value)) {
            reads.set(value);
        } else if (!values.isGiven(value)) {
            program.instruction(value).operands().forEach(operand -> collect(operand, reads));
        }
    }
}
