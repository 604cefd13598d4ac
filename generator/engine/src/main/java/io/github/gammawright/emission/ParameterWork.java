package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.BitSet;
import java.util.List;

/** Finds what depends on parameters alone and is needed at every evaluation: the values that a kernel keeps. */
final class ParameterWork {

    /** Arithmetic on literals up to this size is left in place: the Java compiler does it. */
    private static final int LARGEST_LITERAL = 3;

    private final StraightLineProgram program;
    private final BitSet kept = new BitSet();
    /** Operators in expressions of literals, −1 for values that are none. */
    private final int[] literal;

    private ParameterWork(StraightLineProgram program) {
        this.program = program;
        this.literal = literals(program);
    }

    /**
     * The values to keep.
     *
     * @param roots what evaluations want: results, and operands of the conditions on coordinates
     */
    static BitSet kept(StraightLineProgram program, List<Integer> roots) {
        ParameterWork work = new ParameterWork(program);
        BitSet pending = new BitSet();
        roots.stream().filter(root -> root >= 0).forEach(pending::set);
        for (int i = program.size() - 1; i >= 0; i--) {
            if (pending.get(i)) {
                work.visit(i, pending);
            }
        }
        return work.kept;
    }

    private void visit(int number, BitSet pending) {
        Instruction instruction = program.instruction(number);
        boolean sign = instruction instanceof Instruction.Negation;
        if (!program.isParameterOnly(number) || sign) {
            instruction.operands().forEach(pending::set);
        } else if (!(instruction instanceof Instruction.Load) && literal[number] < 0) {
            kept.set(number);
        }
    }

    private static int[] literals(StraightLineProgram program) {
        int[] literal = new int[program.size()];
        for (int i = 0; i < literal.length; i++) {
            Instruction instruction = program.instruction(i);
            boolean leaf = instruction instanceof Instruction.Constant || instruction instanceof Instruction.Pi;
            boolean arithmetic =
                    instruction instanceof Instruction.Arithmetic || instruction instanceof Instruction.Negation;
            literal[i] = leaf ? 0 : -1;
            if (arithmetic && instruction.operands().stream().allMatch(o -> literal[o] >= 0)) {
                int operators = 1;
                for (int operand : instruction.operands()) {
                    operators += literal[operand];
                }
                literal[i] = operators <= LARGEST_LITERAL ? operators : -1;
            }
        }
        return literal;
    }
}
