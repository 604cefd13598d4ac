package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.function.IntPredicate;

/**
 * Decides which values of a body become variables. A value that is used once is written into the expression that uses
 * it, as long as that stays readable; a value that is used more often, or that the author named, gets a variable.
 */
final class Inlining {

    /** An expression that is longer than this is broken up. */
    private static final int MOST_OPERATORS = 5;

    private final StraightLineProgram program;
    private final BitSet live = new BitSet();
    private final BitSet variables = new BitSet();
    private final int[] uses;

    /**
     * Plans a body.
     *
     * @param roots the values that are wanted, as often as they are
     * @param atHand values that need no computation: inputs, fields, literals
     * @param forced values that must become variables
     */
    Inlining(StraightLineProgram program, List<Integer> roots, IntPredicate atHand, BitSet forced) {
        this.program = program;
        this.uses = new int[program.size()];
        for (int root : roots) {
            uses[root]++;
        }
        for (int i = program.size() - 1; i >= 0; i--) {
            if (uses[i] > 0 && !atHand.test(i)) {
                live.set(i);
                for (int operand : program.instruction(i).operands()) {
                    uses[operand]++;
                }
            }
        }
        int[] operators = new int[program.size()];
        for (int i = live.nextSetBit(0); i >= 0; i = live.nextSetBit(i + 1)) {
            operators[i] = operators(i, operators);
            boolean named = program.names().containsKey(i) && operators[i] > 0;
            if (forced.get(i) || named || (uses[i] > 1 && !isSignOfVariable(i))) {
                variables.set(i);
            }
        }
    }

    /** The operators in the expression of a value, after operands have become variables until they are few enough. */
    private int operators(int number, int[] operators) {
        Instruction instruction = program.instruction(number);
        int own = instruction instanceof Instruction.Negation
                        || instruction instanceof Instruction.Constant
                        || instruction instanceof Instruction.Pi
                ? 0
                : 1;
        List<Integer> inlined = new ArrayList<>();
        for (int operand : instruction.operands()) {
            if (live.get(operand) && !variables.get(operand)) {
                inlined.add(operand);
            }
        }
        int total = own;
        for (int operand : inlined) {
            total += operators[operand];
        }
        while (total > MOST_OPERATORS && !inlined.isEmpty()) {
            Integer heaviest = inlined.get(0);
            for (Integer operand : inlined) {
                heaviest = operators[operand] > operators[heaviest] ? operand : heaviest;
            }
            Integer removed = heaviest;
            if (operators[removed] == 0) {
                break;
            }
            variables.set(removed);
            inlined.removeIf(removed::equals);
            total = own;
            for (int operand : inlined) {
                total += operators[operand];
            }
        }
        return total;
    }

    /** The negative of something at hand is written anew wherever it is used. */
    private boolean isSignOfVariable(int number) {
        Instruction instruction = program.instruction(number);
        if (instruction instanceof Instruction.Constant || instruction instanceof Instruction.Pi) {
            return true;
        }
        return instruction instanceof Instruction.Negation negation
                && (!live.get(negation.operand()) || variables.get(negation.operand()));
    }

    /** The values that the body computes, in ascending order. */
    BitSet live() {
        return live;
    }

    /** Those of them that become variables. */
    BitSet variables() {
        return variables;
    }

    /** How often a value is used in the body. */
    int uses(int number) {
        return uses[number];
    }
}
