package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/**
 * Appends instructions one by one; an instruction that is there already is not repeated, and numbers are combined exactly.
 */
public final class ProgramBuilder {

    /** Rational numbers of more bits than this are combined at run time. */
    private static final int LARGEST_FOLDED = 2_000;

    private final List<Instruction> instructions = new ArrayList<>();
    private final Map<Instruction, Integer> known = new HashMap<>();
    private final Map<Integer, String> names = new LinkedHashMap<>();

    /** The number of an instruction, which is appended if it is not there yet. */
    public int append(Instruction instruction) {
        Integer number = known.get(instruction);
        if (number == null) {
            number = instructions.size();
            instructions.add(instruction);
            known.put(instruction, number);
        }
        return number;
    }

    /** The instruction with the given number. */
    Instruction instruction(int number) {
        return instructions.get(number);
    }

    /** A rational number. */
    public int constant(BigFraction value) {
        return append(new Instruction.Constant(value));
    }

    /** a + b. */
    public int add(int a, int b) {
        return arithmetic(Instruction.Operator.ADD, Math.min(a, b), Math.max(a, b));
    }

    /** a − b. */
    public int subtract(int a, int b) {
        return arithmetic(Instruction.Operator.SUBTRACT, a, b);
    }

    /** a · b. */
    public int multiply(int a, int b) {
        // a number comes first, as one writes it
        boolean swap = instructions.get(b) instanceof Instruction.Constant
                || (!(instructions.get(a) instanceof Instruction.Constant) && b < a);
        return arithmetic(Instruction.Operator.MULTIPLY, swap ? b : a, swap ? a : b);
    }

    /** a / b. */
    public int divide(int a, int b) {
        return arithmetic(Instruction.Operator.DIVIDE, a, b);
    }

    /** The number of the negative of a value. */
    public int negate(int a) {
        return instructions.get(a) instanceof Instruction.Negation negation
                ? negation.operand()
                : append(new Instruction.Negation(a));
    }

    private int arithmetic(Instruction.Operator operator, int a, int b) {
        if (instructions.get(a) instanceof Instruction.Constant x
                && instructions.get(b) instanceof Instruction.Constant y
                && isFoldable(operator, x.value(), y.value())) {
            return constant(fold(operator, x.value(), y.value()));
        }
        if (operator == Instruction.Operator.MULTIPLY && isOne(a)) {
            return b;
        }
        if ((operator == Instruction.Operator.MULTIPLY || operator == Instruction.Operator.DIVIDE) && isOne(b)) {
            return a;
        }
        return append(new Instruction.Arithmetic(operator, a, b));
    }

    private boolean isOne(int number) {
        return instructions.get(number) instanceof Instruction.Constant constant
                && constant.value().equals(BigFraction.ONE);
    }

    private static boolean isFoldable(Instruction.Operator operator, BigFraction a, BigFraction b) {
        boolean divisionByZero = operator == Instruction.Operator.DIVIDE && b.signum() == 0;
        return !divisionByZero && bits(a) + bits(b) <= LARGEST_FOLDED;
    }

    private static int bits(BigFraction value) {
        return value.getNumerator().bitLength() + value.getDenominator().bitLength();
    }

    private static BigFraction fold(Instruction.Operator operator, BigFraction a, BigFraction b) {
        return switch (operator) {
            case ADD -> a.add(b);
            case SUBTRACT -> a.subtract(b);
            case MULTIPLY -> a.multiply(b);
            case DIVIDE -> a.divide(b);
        };
    }

    /** Gives a value a name, unless it has one. */
    public void name(int number, String name) {
        names.putIfAbsent(number, name);
    }

    /** The program with the given outputs. */
    public StraightLineProgram build(List<Integer> outputs) {
        return new StraightLineProgram(instructions, names, outputs);
    }
}
