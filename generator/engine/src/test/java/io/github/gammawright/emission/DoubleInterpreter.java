package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.function.ToDoubleFunction;

/** Runs a program in double arithmetic with the functions that emitted classes call. */
final class DoubleInterpreter {

    private DoubleInterpreter() {}

    static double[] run(StraightLineProgram program, ToDoubleFunction<Symbol> symbols) {
        double[] values = new double[program.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = value(program.instruction(i), values, symbols);
        }
        return values;
    }

    private static double value(Instruction instruction, double[] v, ToDoubleFunction<Symbol> symbols) {
        if (instruction instanceof Instruction.Load load) {
            return symbols.applyAsDouble(load.symbol());
        }
        if (instruction instanceof Instruction.Constant constant) {
            return new BigDecimal(constant.value().getNumerator())
                    .divide(new BigDecimal(constant.value().getDenominator()), new MathContext(800))
                    .doubleValue();
        }
        if (instruction instanceof Instruction.Pi) {
            return Math.PI;
        }
        if (instruction instanceof Instruction.Negation negation) {
            return -v[negation.operand()];
        }
        if (instruction instanceof Instruction.Arithmetic a) {
            return switch (a.operator()) {
                case ADD -> v[a.left()] + v[a.right()];
                case SUBTRACT -> v[a.left()] - v[a.right()];
                case MULTIPLY -> v[a.left()] * v[a.right()];
                case DIVIDE -> v[a.left()] / v[a.right()];
            };
        }
        if (instruction instanceof Instruction.MultiplyAdd m) {
            return Math.fma(v[m.left()], v[m.right()], v[m.addend()]);
        }
        Instruction.Call call = (Instruction.Call) instruction;
        double x = v[call.operands().get(0)];
        double y = call.operands().size() > 1 ? v[call.operands().get(1)] : 0;
        return call(call.function(), x, y);
    }

    private static double call(RealFunction function, double x, double y) {
        return switch (function) {
            case SQRT -> Math.sqrt(x);
            case CBRT -> Math.cbrt(x);
            case SIN -> Math.sin(x);
            case COS -> Math.cos(x);
            case TAN -> Math.tan(x);
            case ASIN -> Math.asin(x);
            case ACOS -> Math.acos(x);
            case ATAN -> Math.atan(x);
            case ATAN2 -> Math.atan2(x, y);
            case SINH -> Math.sinh(x);
            case COSH -> Math.cosh(x);
            case TANH -> Math.tanh(x);
            case EXP -> Math.exp(x);
            case LOG -> Math.log(x);
            case POW -> Math.pow(x, y);
            case ABS -> Math.abs(x);
            case SIGNUM -> Math.signum(x);
            case ASINH, ACOSH, ATANH -> throw new IllegalArgumentException("no java.lang.Math function: " + function);
        };
    }
}
