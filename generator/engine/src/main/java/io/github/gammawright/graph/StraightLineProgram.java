package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * A computation as a list of instructions, each using only earlier ones: what a graph becomes before it is emitted.
 * The order of the list is the order of evaluation.
 */
public final class StraightLineProgram {

    private final List<Instruction> instructions;
    private final Map<Integer, String> names;
    private final List<Integer> outputs;
    private final boolean[] parameterOnly;

    /**
     * A program.
     *
     * @param instructions in order of evaluation
     * @param names the author's names for the values of some instructions, by instruction number
     * @param outputs the numbers of the instructions whose values are the results
     * @throws IllegalArgumentException if an operand or output does not refer to an earlier instruction
     */
    public StraightLineProgram(List<Instruction> instructions, Map<Integer, String> names, List<Integer> outputs) {
        this.instructions = List.copyOf(instructions);
        this.names = java.util.Collections.unmodifiableMap(new TreeMap<>(names));
        this.outputs = List.copyOf(outputs);
        this.parameterOnly = new boolean[instructions.size()];
        for (int i = 0; i < instructions.size(); i++) {
            Instruction instruction = instructions.get(i);
            boolean fixed = !(instruction instanceof Instruction.Load load)
                    || load.symbol().isParameter();
            for (int operand : instruction.operands()) {
                if (operand < 0 || operand >= i) {
                    throw new IllegalArgumentException("instruction " + i + " uses instruction " + operand);
                }
                fixed &= parameterOnly[operand];
            }
            parameterOnly[i] = fixed;
        }
        for (int output : outputs) {
            if (output < 0 || output >= instructions.size()) {
                throw new IllegalArgumentException("output " + output + " of " + instructions.size());
            }
        }
    }

    /** The number of instructions. */
    public int size() {
        return instructions.size();
    }

    /** The instruction with the given number. */
    public Instruction instruction(int number) {
        return instructions.get(number);
    }

    /** All instructions in order of evaluation. */
    public List<Instruction> instructions() {
        return instructions;
    }

    /** The author's names for values, by instruction number. */
    public Map<Integer, String> names() {
        return names;
    }

    /** The numbers of the instructions whose values are the results. */
    public List<Integer> outputs() {
        return outputs;
    }

    /** Whether a value depends on nothing but parameters, so that a constructor can compute it. */
    public boolean isParameterOnly(int number) {
        return parameterOnly[number];
    }

    /** The symbols that are loaded, in order of first use. */
    public List<Symbol> symbols() {
        List<Symbol> symbols = new ArrayList<>();
        for (Instruction instruction : instructions) {
            if (instruction instanceof Instruction.Load load && !symbols.contains(load.symbol())) {
                symbols.add(load.symbol());
            }
        }
        return symbols;
    }

    /** What one evaluation costs; work on parameters alone is not counted. */
    public OperationCount count() {
        int additions = 0;
        int multiplications = 0;
        int divisions = 0;
        Map<String, Integer> functions = new TreeMap<>();
        for (int i = 0; i < instructions.size(); i++) {
            if (parameterOnly[i]) {
                continue;
            }
            Instruction instruction = instructions.get(i);
            if (instruction instanceof Instruction.Arithmetic arithmetic) {
                switch (arithmetic.operator()) {
                    case ADD, SUBTRACT -> additions++;
                    case MULTIPLY -> multiplications++;
                    case DIVIDE -> divisions++;
                }
            } else if (instruction instanceof Instruction.MultiplyAdd) {
                additions++;
                multiplications++;
            } else if (instruction instanceof Instruction.Call call) {
                functions.merge(call.function().symbol(), 1, Integer::sum);
            }
        }
        return new OperationCount(additions, multiplications, divisions, functions);
    }

    /** The same where sine and cosine are computed together: the two of one argument, or either, are one {@code sincos}. */
    public OperationCount countWithSharedTrigonometry() {
        Set<Integer> angles = new HashSet<>();
        for (int i = 0; i < instructions.size(); i++) {
            if (!parameterOnly[i] && instructions.get(i) instanceof Instruction.Call call && call.isCircular()) {
                angles.add(call.operands().get(0));
            }
        }
        OperationCount count = count();
        Map<String, Integer> functions = new TreeMap<>(count.functions());
        if (!angles.isEmpty()) {
            functions.remove(RealFunction.SIN.symbol());
            functions.remove(RealFunction.COS.symbol());
            functions.put(OperationCount.SINCOS, angles.size());
        }
        return new OperationCount(count.additions(), count.multiplications(), count.divisions(), functions);
    }
}
