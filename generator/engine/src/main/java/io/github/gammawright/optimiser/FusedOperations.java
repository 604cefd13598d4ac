package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Contracts products that serve one sum into fused operations. One rounding less is mostly better, but can spoil what
 * would have cancelled; such contractions are left out, found by halving.
 */
public final class FusedOperations {

    /** What outputs may reach in multiples of the conditioning limit, wherever they were before. */
    private static final double TOLERANCE = 3.25;

    private final StraightLineProgram program;
    private final ExactOutputs exact;
    private final double allowed;
    private final BitSet accepted = new BitSet();

    private FusedOperations(StraightLineProgram program, SamplePoints points) {
        this.program = program;
        this.exact = new ExactOutputs(program, points);
        this.allowed = Math.max(TOLERANCE, worst(program));
    }

    /**
     * The program with as many fused operations as its accuracy allows.
     *
     * @param points where errors are measured
     */
    public static StraightLineProgram of(StraightLineProgram program, SamplePoints points) {
        List<Integer> sums = sums(program);
        if (sums.isEmpty()) {
            return program;
        }
        FusedOperations fused = new FusedOperations(program, points);
        fused.accept(sums);
        return contracted(program, fused.accepted);
    }

    /** Those sums in which a product can be taken up, that is one that nothing else uses. */
    private static List<Integer> sums(StraightLineProgram program) {
        int[] uses = uses(program);
        List<Integer> sums = new ArrayList<>();
        for (int i = 0; i < program.size(); i++) {
            if (uses[i] > 0 && !program.isParameterOnly(i) && productIn(program, i, uses) >= 0) {
                sums.add(i);
            }
        }
        return sums;
    }

    private static int[] uses(StraightLineProgram program) {
        int[] uses = new int[program.size()];
        program.outputs().forEach(output -> uses[output]++);
        for (int i = uses.length - 1; i >= 0; i--) {
            if (uses[i] > 0) {
                program.instruction(i).operands().forEach(operand -> uses[operand]++);
            }
        }
        return uses;
    }

    /** The operand of a sum or difference that is a product of its own, −1 if there is none. */
    private static int productIn(StraightLineProgram program, int number, int... uses) {
        if (program.instruction(number) instanceof Instruction.Arithmetic sum
                && (sum.operator() == Operator.ADD || sum.operator() == Operator.SUBTRACT)) {
            for (int operand : sum.operands()) {
                boolean product = program.instruction(operand) instanceof Instruction.Arithmetic factors
                        && factors.operator() == Operator.MULTIPLY;
                // a name of the author's stays that of a variable
                if (product
                        && uses[operand] == 1
                        && !program.isParameterOnly(operand)
                        && !program.names().containsKey(operand)) {
                    return operand;
                }
            }
        }
        return -1;
    }

    private void accept(List<Integer> sums) {
        BitSet trial = (BitSet) accepted.clone();
        sums.forEach(trial::set);
        if (worst(contracted(program, trial)) <= allowed) {
            sums.forEach(accepted::set);
        } else if (sums.size() > 1) {
            accept(sums.subList(0, sums.size() / 2));
            accept(sums.subList(sums.size() / 2, sums.size()));
        }
    }

    private double worst(StraightLineProgram trial) {
        return Arrays.stream(exact.errors(trial)).max().orElse(0);
    }

    private static StraightLineProgram contracted(StraightLineProgram program, BitSet sums) {
        int[] uses = uses(program);
        Map<Integer, Integer> numbers = new HashMap<>();
        Map<Integer, Integer> negatives = new HashMap<>();
        BitSet taken = new BitSet();
        sums.stream().forEach(sum -> taken.set(productIn(program, sum, uses)));
        List<Instruction> instructions = new ArrayList<>();
        for (int i = 0; i < program.size(); i++) {
            if (uses[i] == 0 || taken.get(i)) {
                continue;
            }
            Instruction instruction = program.instruction(i);
            if (sums.get(i)) {
                Instruction.Arithmetic sum = (Instruction.Arithmetic) instruction;
                int product = productIn(program, i, uses);
                Instruction.Arithmetic factors = (Instruction.Arithmetic) program.instruction(product);
                int left = numbers.get(factors.left());
                int other = numbers.get(sum.left() == product ? sum.right() : sum.left());
                if (sum.operator() == Operator.SUBTRACT) {
                    if (sum.left() == product) {
                        other = negative(other, instructions, negatives);
                    } else {
                        left = negative(left, instructions, negatives);
                    }
                }
                instruction = new Instruction.MultiplyAdd(left, numbers.get(factors.right()), other);
            } else {
                instruction = instruction.renumbered(numbers::get);
            }
            numbers.put(i, instructions.size());
            instructions.add(instruction);
        }
        Map<Integer, String> names = new HashMap<>();
        program.names().forEach((number, name) -> {
            if (numbers.containsKey(number)) {
                names.put(numbers.get(number), name);
            }
        });
        return new StraightLineProgram(
                instructions,
                names,
                program.outputs().stream().map(numbers::get).toList());
    }

    private static int negative(int number, List<Instruction> instructions, Map<Integer, Integer> negatives) {
        if (instructions.get(number) instanceof Instruction.Negation negation) {
            return negation.operand();
        }
        return negatives.computeIfAbsent(number, n -> {
            instructions.add(new Instruction.Negation(n));
            return instructions.size() - 1;
        });
    }
}
