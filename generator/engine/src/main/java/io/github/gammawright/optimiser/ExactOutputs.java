package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import org.hipparchus.analysis.differentiation.Gradient;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.fraction.BigFraction;

/**
 * What the outputs of a program are at some points, to twice the precision of a double, and how precisely they can be
 * computed at all from doubles: limit(f) = 2⁻⁵³ (|f| + Σ_m |x_m ∂f/∂x_m|).
 */
final class ExactOutputs {

    private static final int DIGITS = 42;

    /** The outputs rounded to doubles; output, point. */
    final double[][] high;

    /** What the rounding left; output, point. */
    final double[][] low;

    /** The conditioning limits; output, point. */
    final double[][] limit;

    ExactOutputs(StraightLineProgram program, SamplePoints points) {
        int outputs = program.outputs().size();
        high = new double[outputs][points.count()];
        low = new double[outputs][points.count()];
        limit = new double[outputs][points.count()];
        List<Symbol> symbols = program.symbols();
        DfpField field = new DfpField(DIGITS);
        for (int k = 0; k < points.count(); k++) {
            Dfp[] exact = exact(program, field, points, k);
            Gradient[] gradient = gradients(program, symbols, points, k);
            for (int o = 0; o < outputs; o++) {
                int instruction = program.outputs().get(o);
                high[o][k] = exact[instruction].toDouble();
                low[o][k] =
                        exact[instruction].subtract(field.newDfp(high[o][k])).toDouble();
                double sum = Math.abs(high[o][k]);
                for (int m = 0; m < symbols.size(); m++) {
                    double partial = gradient[instruction].getPartialDerivative(m);
                    sum += Math.abs(points.value(symbols.get(m), k) * partial);
                }
                limit[o][k] = 0x1p-53 * sum;
            }
        }
    }

    private static Dfp[] exact(StraightLineProgram program, DfpField field, SamplePoints points, int k) {
        Dfp[] values = new Dfp[program.size()];
        for (int i = 0; i < values.length; i++) {
            Instruction instruction = program.instruction(i);
            if (instruction instanceof Instruction.Load load) {
                values[i] = field.newDfp(points.value(load.symbol(), k));
            } else if (instruction instanceof Instruction.Constant constant) {
                values[i] = number(field, constant.value());
            } else if (instruction instanceof Instruction.Pi) {
                values[i] = field.getPi();
            } else if (instruction instanceof Instruction.Negation negation) {
                values[i] = values[negation.operand()].negate();
            } else if (instruction instanceof Instruction.Arithmetic arithmetic) {
                Dfp a = values[arithmetic.left()];
                Dfp b = values[arithmetic.right()];
                values[i] = switch (arithmetic.operator()) {
                    case ADD -> a.add(b);
                    case SUBTRACT -> a.subtract(b);
                    case MULTIPLY -> a.multiply(b);
                    case DIVIDE -> a.divide(b);
                };
            } else {
                Instruction.Call call = (Instruction.Call) instruction;
                Dfp x = values[call.operands().get(0)];
                Dfp y = call.operands().size() > 1 ? values[call.operands().get(1)] : null;
                values[i] = call(call.function(), x, y);
            }
        }
        return values;
    }

    private static Dfp number(DfpField field, BigFraction value) {
        return field.newDfp(value.getNumerator().toString())
                .divide(field.newDfp(value.getDenominator().toString()));
    }

    private static Dfp call(RealFunction function, Dfp x, Dfp y) {
        return switch (function) {
            case SQRT -> x.sqrt();
            case CBRT -> x.cbrt();
            case SIN -> x.sin();
            case COS -> x.cos();
            case TAN -> x.tan();
            case ASIN -> x.asin();
            case ACOS -> x.acos();
            case ATAN -> x.atan();
            case ATAN2 -> x.atan2(y);
            case SINH -> x.sinh();
            case COSH -> x.cosh();
            case TANH -> x.tanh();
            case ASINH -> x.asinh();
            case ACOSH -> x.acosh();
            case ATANH -> x.atanh();
            case EXP -> x.exp();
            case LOG -> x.log();
            case POW -> x.log().multiply(y).exp();
            case ABS -> x.abs();
            case SIGNUM -> x.sign();
        };
    }

    private static Gradient[] gradients(StraightLineProgram program, List<Symbol> symbols, SamplePoints points, int k) {
        int m = symbols.size();
        Gradient[] values = new Gradient[program.size()];
        for (int i = 0; i < values.length; i++) {
            Instruction instruction = program.instruction(i);
            if (instruction instanceof Instruction.Load load) {
                values[i] = Gradient.variable(m, symbols.indexOf(load.symbol()), points.value(load.symbol(), k));
            } else if (instruction instanceof Instruction.Constant constant) {
                values[i] = Gradient.constant(m, constant.value().doubleValue());
            } else if (instruction instanceof Instruction.Pi) {
                values[i] = Gradient.constant(m, Math.PI);
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
                Gradient y = call.operands().size() > 1 ? values[call.operands().get(1)] : null;
                values[i] = call(call.function(), x, y);
            }
        }
        return values;
    }

    private static Gradient call(RealFunction function, Gradient x, Gradient y) {
        return switch (function) {
            case SQRT -> x.sqrt();
            case CBRT -> x.cbrt();
            case SIN -> x.sin();
            case COS -> x.cos();
            case TAN -> x.tan();
            case ASIN -> x.asin();
            case ACOS -> x.acos();
            case ATAN -> x.atan();
            case ATAN2 -> x.atan2(y);
            case SINH -> x.sinh();
            case COSH -> x.cosh();
            case TANH -> x.tanh();
            case ASINH -> x.asinh();
            case ACOSH -> x.acosh();
            case ATANH -> x.atanh();
            case EXP -> x.exp();
            case LOG -> x.log();
            case POW -> x.log().multiply(y).exp();
            case ABS -> x.abs();
            case SIGNUM -> x.sign();
        };
    }
}
