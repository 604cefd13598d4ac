package io.github.gammawright.graph;

import org.hipparchus.analysis.differentiation.Gradient;

/** Runs a program of the two coordinates in the library's automatic differentiation. */
final class GradientInterpreter {

    private GradientInterpreter() {}

    static Gradient[] run(StraightLineProgram program, double[] point) {
        Gradient[] values = new Gradient[program.size()];
        for (int i = 0; i < values.length; i++) {
            Instruction instruction = program.instruction(i);
            if (instruction instanceof Instruction.Load load) {
                int index = load.symbol().index();
                values[i] = Gradient.variable(point.length, index, point[index]);
            } else if (instruction instanceof Instruction.Constant constant) {
                values[i] = Gradient.constant(point.length, constant.value().doubleValue());
            } else if (instruction instanceof Instruction.Negation negation) {
                values[i] = values[negation.operand()].negate();
            } else if (instruction instanceof Instruction.Arithmetic arithmetic) {
                Gradient a = values[arithmetic.left()];
                Gradient b = values[arithmetic.right()];
                values[i] = switch (arithmetic.operator()) {
                    case ADD -> a.add(b);
                    case SUBTRACT -> a.subtract(b);
                    case MULTIPLY -> a.multiply(b);
                    case DIVIDE -> a.divide(b);
                };
            } else {
                Instruction.Call call = (Instruction.Call) instruction;
                Gradient x = values[call.operands().get(0)];
                values[i] = switch (call.function()) {
                    case SQRT -> x.sqrt();
                    case SIN -> x.sin();
                    case COS -> x.cos();
                    case EXP -> x.exp();
                    case TANH -> x.tanh();
                    case ATAN -> x.atan();
                    case ASINH -> x.asinh();
                    case COSH -> x.cosh();
                    case SINH -> x.sinh();
                    default -> throw new IllegalStateException(call.function().symbol());
                };
            }
        }
        return values;
    }
}
