package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
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

    /** The outputs; output, point. */
    final DoubleDouble[][] value;

    /** The conditioning limits; output, point. */
    final double[][] limit;

    private final SamplePoints points;
    private final Map<Symbol, double[]> inputs = new HashMap<>();

    ExactOutputs(StraightLineProgram program, SamplePoints points) {
        this.points = points;
        int outputs = program.outputs().size();
        value = new DoubleDouble[outputs][points.count()];
        limit = new double[outputs][points.count()];
        List<Symbol> symbols = program.symbols();
        DfpField field = new DfpField(DIGITS);
        DoubleDouble[] constants = constants(program, field);
        for (int k = 0; k < points.count(); k++) {
            DoubleDouble[] exact = exact(program, field, constants, points, k);
            Gradient[] gradient = gradients(program, symbols, points, k);
            for (int o = 0; o < outputs; o++) {
                int instruction = program.outputs().get(o);
                value[o][k] = exact[instruction];
                double sum = Math.abs(exact[instruction].high());
                for (int m = 0; m < symbols.size(); m++) {
                    double partial = gradient[instruction].getPartialDerivative(m);
                    sum += Math.abs(points.value(symbols.get(m), k) * partial);
                }
                limit[o][k] = 0x1p-53 * sum;
            }
        }
    }

    /** The number of points. */
    int points() {
        return points.count();
    }

    /** The values of a symbol at all points; searches that run at the same time ask for them. */
    private synchronized double[] input(Symbol symbol) {
        return inputs.computeIfAbsent(
                symbol,
                s -> IntStream.range(0, points.count())
                        .mapToDouble(point -> points.value(s, point))
                        .toArray());
    }

    /** The values of a program for these outputs at a point, in double arithmetic. */
    double[] run(StraightLineProgram program, int point) {
        return ProgramInterpreter.run(program, symbol -> input(symbol)[point]);
    }

    /** The worst errors of a program for these outputs, for each point in multiples of the limit. */
    double[] errors(StraightLineProgram program) {
        double[] errors = new double[points.count()];
        for (int k = 0; k < errors.length; k++) {
            double[] values = run(program, k);
            for (int o = 0; o < value.length; o++) {
                double actual = values[program.outputs().get(o)];
                errors[k] = Math.max(errors[k], error(actual, value[o][k].high(), value[o][k].low(), limit[o][k]));
            }
        }
        return errors;
    }

    /** How far a double is from the truth, in multiples of the limit; 0 where there is no finite truth. */
    static double error(double actual, double high, double low, double limit) {
        if (!Double.isFinite(limit) || !Double.isFinite(high)) {
            return 0;
        }
        double difference = Math.abs(actual - high - low);
        if (difference == 0) {
            return 0;
        }
        return Double.isNaN(difference) ? Double.POSITIVE_INFINITY : difference / limit;
    }

    private static DoubleDouble[] constants(StraightLineProgram program, DfpField field) {
        DoubleDouble[] values = new DoubleDouble[program.size()];
        for (int i = 0; i < values.length; i++) {
            if (program.instruction(i) instanceof Instruction.Constant constant) {
                values[i] = DoubleDouble.of(number(field, constant.value()));
            } else if (program.instruction(i) instanceof Instruction.Pi) {
                values[i] = DoubleDouble.of(field.getPi());
            }
        }
        return values;
    }

    private static DoubleDouble[] exact(
            StraightLineProgram program, DfpField field, DoubleDouble[] constants, SamplePoints points, int k) {
        DoubleDouble[] values = constants.clone();
        for (int i = 0; i < values.length; i++) {
            Instruction instruction = program.instruction(i);
            if (values[i] != null) {
                continue;
            }
            if (instruction instanceof Instruction.Load load) {
                values[i] = DoubleDouble.of(points.value(load.symbol(), k));
            } else if (instruction instanceof Instruction.Negation negation) {
                values[i] = values[negation.operand()].negate();
            } else if (instruction instanceof Instruction.Arithmetic arithmetic) {
                DoubleDouble a = values[arithmetic.left()];
                DoubleDouble b = values[arithmetic.right()];
                values[i] = switch (arithmetic.operator()) {
                    case ADD -> a.add(b);
                    case SUBTRACT -> a.add(b.negate());
                    case MULTIPLY -> a.multiply(b);
                    case DIVIDE -> a.divide(b);
                };
            } else {
                values[i] = call((Instruction.Call) instruction, values, field);
            }
        }
        return values;
    }

    private static Dfp number(DfpField field, BigFraction value) {
        return field.newDfp(value.getNumerator().toString())
                .divide(field.newDfp(value.getDenominator().toString()));
    }

    private static DoubleDouble call(Instruction.Call call, DoubleDouble[] values, DfpField field) {
        DoubleDouble x = values[call.operands().get(0)];
        return switch (call.function()) {
            case SQRT -> x.sqrt();
            case ABS -> x.abs();
            case SIGNUM -> DoubleDouble.of(Math.signum(x.high()));
            default -> {
                Dfp y = call.operands().size() > 1 ? values[call.operands().get(1)].toDfp(field) : null;
                yield DoubleDouble.of(call(call.function(), x.toDfp(field), y));
            }
        };
    }

    private static Dfp call(RealFunction function, Dfp x, Dfp y) {
        return switch (function) {
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
            case SQRT, ABS, SIGNUM -> throw new IllegalArgumentException(function + " needs no decimal arithmetic");
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
