package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.function.IntFunction;

/** Conditions as Java writes them, and what they need. */
final class Conditions {

    private final StraightLineProgram program;
    private final List<KernelModel.Condition> conditions;

    Conditions(StraightLineProgram program, List<KernelModel.Condition> conditions) {
        this.program = program;
        this.conditions = List.copyOf(conditions);
    }

    List<KernelModel.Condition> list() {
        return conditions;
    }

    /** The values that are compared, as often as they are. */
    List<Integer> operands() {
        List<Integer> operands = new ArrayList<>();
        for (KernelModel.Condition condition : conditions) {
            int last = condition.operands().size() - 1;
            for (int i = 0; i <= last; i++) {
                operands.add(condition.operands().get(i));
                if (i > 0 && i < last) {
                    operands.add(condition.operands().get(i));
                }
            }
        }
        return operands;
    }

    /** The variables that a condition needs, directly or through others. */
    BitSet variables(KernelModel.Condition condition, Inlining inlining) {
        BitSet reached = behind(condition, inlining.live());
        reached.and(inlining.variables());
        return reached;
    }

    /** The values that a condition depends on, those that are not live unopened. */
    private BitSet behind(KernelModel.Condition condition, BitSet live) {
        BitSet reached = new BitSet();
        condition.operands().forEach(reached::set);
        for (int i = reached.length() - 1; i >= 0; i--) {
            if (reached.get(i) && live.get(i)) {
                program.instruction(i).operands().forEach(reached::set);
            }
        }
        return reached;
    }

    /** A chain as Java has it, {@code a < b && b <= c}; false where an operand is NaN. */
    static String comparisons(KernelModel.Condition condition, IntFunction<String> operand) {
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < condition.comparisons().size(); i++) {
            parts.add(operand.apply(condition.operands().get(i)) + " "
                    + condition.comparisons().get(i).symbol() + " "
                    + operand.apply(condition.operands().get(i + 1)));
        }
        return String.join(" && ", parts);
    }

    /**
     * Throws where a condition on parameters does not hold, quoting it and the values behind it.
     *
     * @param operand the text of each value
     * @param parameter the name of each loaded value
     */
    CodeBlock requirement(KernelModel.Condition condition, IntFunction<String> operand, IntFunction<String> parameter) {
        BitSet all = new BitSet();
        all.set(0, program.size());
        List<CodeBlock> values = new ArrayList<>();
        BitSet behind = behind(condition, all);
        for (int i = behind.nextSetBit(0); i >= 0; i = behind.nextSetBit(i + 1)) {
            if (program.instruction(i) instanceof Instruction.Load load) {
                String separator = values.isEmpty() ? "" : ", ";
                values.add(CodeBlock.of(
                        "\n+ $L + $L",
                        StringLiteral.of(separator + load.symbol().name() + " = "),
                        parameter.apply(i)));
            }
        }
        String text = "the parameters do not meet the condition " + condition.text();
        CodeBlock.Builder code = CodeBlock.builder();
        code.add("if ($L) {\n", LineBreaks.wrap("!(" + comparisons(condition, operand) + ")"))
                .indent();
        code.add("throw new $T(", IllegalArgumentException.class).indent().indent();
        code.add("$L", StringLiteral.of(values.isEmpty() ? text : text + ": "));
        values.forEach(code::add);
        code.add(");\n").unindent().unindent().unindent();
        return code.add("}\n").build();
    }
}
