package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/** Builds programs by hand, one instruction at a time; equal instructions are shared. */
final class TestProgram {

    final List<Instruction> instructions = new ArrayList<>();
    private final Map<Instruction, Integer> known = new HashMap<>();
    private final Map<Integer, String> names = new HashMap<>();

    int append(Instruction instruction) {
        return known.computeIfAbsent(instruction, i -> {
            instructions.add(i);
            return instructions.size() - 1;
        });
    }

    int coordinate(String name, int index) {
        return load(Symbol.Kind.COORDINATE, name, index);
    }

    int parameter(String name, int index) {
        return load(Symbol.Kind.PARAMETER, name, index);
    }

    int load(Symbol.Kind kind, String name, int index) {
        return append(new Instruction.Load(Symbol.of(kind, name, index)));
    }

    int function(String name, int index, Integer... orders) {
        return append(new Instruction.Load(new Symbol(Symbol.Kind.CALLER_FUNCTION, name, index, List.of(orders))));
    }

    int constant(long numerator, long denominator) {
        return append(new Instruction.Constant(new BigFraction(numerator, denominator)));
    }

    int constant(long value) {
        return constant(value, 1);
    }

    int pi() {
        return append(new Instruction.Pi());
    }

    int add(int a, int b) {
        return arithmetic(Operator.ADD, a, b);
    }

    int subtract(int a, int b) {
        return arithmetic(Operator.SUBTRACT, a, b);
    }

    int multiply(int a, int b) {
        return arithmetic(Operator.MULTIPLY, a, b);
    }

    int divide(int a, int b) {
        return arithmetic(Operator.DIVIDE, a, b);
    }

    int arithmetic(Operator operator, int a, int b) {
        return append(new Instruction.Arithmetic(operator, a, b));
    }

    int negate(int a) {
        return append(new Instruction.Negation(a));
    }

    int call(RealFunction function, Integer... arguments) {
        return append(new Instruction.Call(function, List.of(arguments)));
    }

    int named(String name, int number) {
        names.put(number, name);
        return number;
    }

    StraightLineProgram build() {
        return new StraightLineProgram(instructions, names, List.of());
    }
}
