package io.github.gammawright.graph;

import java.util.function.ToDoubleFunction;

/** Runs a program step by step in double arithmetic, the same to the last bit on every machine. */
public final class ProgramInterpreter {

    private ProgramInterpreter() {}

    /** The values of all instructions of a program, given those of its symbols. */
    public static double[] run(StraightLineProgram program, ToDoubleFunction<Symbol> symbols) {
        double[] values = new double[program.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = value(program.instruction(i), values, symbols);
        }
        return values;
    }

    private static double value(Instruction instruction, double[] values, ToDoubleFunction<Symbol> symbols) {
        if (instruction instanceof Instruction.Load load) {
            return symbols.applyAsDouble(load.symbol());
        }
        if (instruction instanceof Instruction.Constant constant) {
            return constant.value().doubleValue();
        }
        if (instruction instanceof Instruction.Pi) {
            return Math.PI;
        }
        if (instruction instanceof Instruction.Negation negation) {
            return -values[negation.operand()];
        }
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            double a = values[arithmetic.left()];
            double b = values[arithmetic.right()];
            return switch (arithmetic.operator()) {
                case ADD -> a + b;
                case SUBTRACT -> a - b;
                case MULTIPLY -> a * b;
                case DIVIDE -> a / b;
            };
        }
        if (instruction instanceof Instruction.MultiplyAdd fused) {
            return Math.fma(values[fused.left()], values[fused.right()], values[fused.addend()]);
        }
        Instruction.Call call = (Instruction.Call) instruction;
        double[] arguments = new double[call.operands().size()];
        for (int i = 0; i < arguments.length; i++) {
            arguments[i] = values[call.operands().get(i)];
        }
        return RealFunctions.value(call.function(), arguments);
    }
}
