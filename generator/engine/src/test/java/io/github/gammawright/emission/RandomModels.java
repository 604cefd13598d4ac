package io.github.gammawright.emission;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/** Kernel models with random programs: any operation on any earlier values, results drawn from all of them. */
final class RandomModels {

    private static final List<RealFunction> FUNCTIONS = List.of(
            RealFunction.SIN,
            RealFunction.COS,
            RealFunction.TANH,
            RealFunction.ATAN,
            RealFunction.CBRT,
            RealFunction.ABS,
            RealFunction.SIGNUM);

    private RandomModels() {}

    /**
     * A model.
     *
     * @param operations how many
     * @param recent operands are drawn from so many of the last values, so that programs get deep; 0 for all
     */
    static TestModel model(
            long seed, int dimension, int operations, int recent, Layout layout, Quantity... quantities) {
        Random random = new Random(seed);
        TestModel model = new TestModel();
        model.className = "Random" + Math.abs(seed);
        model.layout = layout;
        model.coordinates = new ArrayList<>();
        List<Integer> values = new ArrayList<>();
        for (int i = 0; i < dimension; i++) {
            model.coordinates.add("x" + i);
            values.add(model.program.coordinate("x" + i, i));
        }
        for (int i = 0; i < 2; i++) {
            model.parameter("p" + i, TestModel.number("0.75"));
            values.add(model.program.parameter("p" + i, i));
        }
        for (Quantity quantity : quantities) {
            for (String input : quantity.furtherInputs()) {
                Symbol.Kind kind = KernelInput.kind(input);
                int length = kind == Symbol.Kind.COORDINATE_VELOCITY ? dimension - 1 : dimension;
                for (int i = 0; i < length; i++) {
                    values.add(model.program.load(kind, "x" + i, i));
                }
            }
        }
        values.add(model.program.constant(3));
        values.add(model.program.constant(1, 3));
        values.add(model.program.constant(-5, 2));
        values.add(model.program.pi());
        for (int i = 0; i < operations; i++) {
            int value = operation(model.program, values, recent, random);
            values.add(value);
            if (random.nextInt(12) == 0) {
                model.program.named("Σ" + i, value);
            }
        }
        for (Quantity quantity : quantities) {
            model.result(quantity, components(quantity.shape(dimension), values, random));
        }
        return model;
    }

    private static int operation(TestProgram program, List<Integer> values, int recent, Random random) {
        int a = pick(values, recent, random);
        int b = pick(values, random.nextBoolean() ? 0 : recent, random);
        // factors, divisors and exponents are kept in bounds, so that deep programs stay finite
        int factor = random.nextBoolean() ? program.call(RealFunction.SIN, b) : values.get(random.nextInt(6));
        return switch (random.nextInt(20)) {
            case 0, 1 -> program.negate(a);
            case 2, 3, 4 -> program.call(FUNCTIONS.get(random.nextInt(FUNCTIONS.size())), a);
            case 5 -> program.call(RealFunction.SQRT, program.call(RealFunction.ABS, a));
            case 6 -> program.call(RealFunction.EXP, factor);
            case 7 -> program.call(RealFunction.ATAN2, a, b);
            case 8 -> program.call(RealFunction.POW, program.call(RealFunction.ABS, a), program.constant(1, 5));
            case 9, 10 -> program.divide(a, program.add(program.constant(5), factor));
            case 11 -> program.divide(a, b);
            case 12, 13 -> program.multiply(a, factor);
            case 14 -> program.append(new Instruction.MultiplyAdd(factor, program.call(RealFunction.TANH, a), b));
            case 15 -> program.arithmetic(Operator.MULTIPLY, factor, a);
            case 16, 17 -> program.subtract(a, b);
            default -> program.add(a, b);
        };
    }

    private static int pick(List<Integer> values, int recent, Random random) {
        int range = recent == 0 ? values.size() : Math.min(recent, values.size());
        return values.get(values.size() - 1 - random.nextInt(range));
    }

    private static int[] components(Shape shape, List<Integer> values, Random random) {
        int[] components = new int[shape.fullLength()];
        for (int[] tuple : shape.tuples()) {
            int value = random.nextInt(4) == 0 ? -1 : values.get(random.nextInt(values.size()));
            components[shape.fullIndex(tuple)] = value;
            if (shape.symmetricPair()) {
                int[] other = tuple.clone();
                other[tuple.length - 1] = tuple[tuple.length - 2];
                other[tuple.length - 2] = tuple[tuple.length - 1];
                components[shape.fullIndex(other)] = value;
            }
        }
        return components;
    }

    /** The values of the model's program at inputs that are drawn with the seed. */
    static double input(Symbol symbol, long seed) {
        return new Random(seed * 31 + symbol.kind().ordinal() * 1000L + symbol.index()).nextDouble() * 4 - 1;
    }
}
