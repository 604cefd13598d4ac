package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.Locale;
import java.util.Map;
import java.util.function.IntFunction;
import org.hipparchus.fraction.BigFraction;

/**
 * Names variables by what they hold: the author's name if there is one, {@code r2} for r², {@code sinTheta},
 * {@code inverseSigma}, the component where a value is one, a number otherwise.
 */
final class TemporaryNames {

    private static final int LONGEST = 40;

    private final StraightLineProgram program;
    private final NameAllocator allocator;
    private final IntFunction<String> names;
    private final Map<Integer, String> components;
    private final Power[] powers;

    /**
     * Suggests names.
     *
     * @param names the names given so far, null for values without
     * @param components names of values that are components of the result
     */
    TemporaryNames(
            StraightLineProgram program,
            NameAllocator allocator,
            IntFunction<String> names,
            Map<Integer, String> components) {
        this.program = program;
        this.allocator = allocator;
        this.names = names;
        this.components = components;
        this.powers = powers(program);
    }

    /** A name for a value, not given before. */
    String allocate(int number) {
        String authors = program.names().get(number);
        if (authors != null) {
            return allocator.allocate(authors);
        }
        String structural = structural(number);
        if (structural == null || structural.length() > LONGEST || !allocator.isFree(structural)) {
            structural = components.get(number);
        }
        if (structural == null || structural.length() > LONGEST || !allocator.isFree(structural)) {
            return allocator.next("t");
        }
        return allocator.allocate(structural);
    }

    private String structural(int number) {
        Instruction instruction = program.instruction(number);
        if (instruction instanceof Instruction.Call call && call.operands().size() == 1) {
            String argument = plainName(call.operands().get(0));
            return argument == null ? null : prefix(call.function()) + capitalised(argument);
        }
        if (!(instruction instanceof Instruction.Arithmetic arithmetic)) {
            return null;
        }
        if (arithmetic.operator() == Operator.DIVIDE && isOne(arithmetic.left())) {
            String divisor = plainName(arithmetic.right());
            return divisor == null ? null : "inverse" + capitalised(divisor);
        }
        if (arithmetic.operator() == Operator.MULTIPLY
                && program.instruction(arithmetic.left()) instanceof Instruction.Constant constant) {
            String multiple = multiple(constant.value());
            String factor = plainName(arithmetic.right());
            return multiple == null || factor == null ? null : multiple + capitalised(factor);
        }
        Power power = powers[number];
        String base = power.exponent() > 1 ? plainName(power.base()) : null;
        return base == null ? null : powerName(base, power.exponent());
    }

    /** A value as a power of another one. */
    private record Power(int base, int exponent) {}

    private static Power[] powers(StraightLineProgram program) {
        Power[] powers = new Power[program.size()];
        for (int i = 0; i < powers.length; i++) {
            powers[i] = new Power(i, 1);
            if (program.instruction(i) instanceof Instruction.Arithmetic arithmetic
                    && arithmetic.operator() == Operator.MULTIPLY) {
                Power left = powers[arithmetic.left()];
                Power right = powers[arithmetic.right()];
                if (left.base() == right.base()) {
                    powers[i] = new Power(left.base(), left.exponent() + right.exponent());
                }
            }
        }
        return powers;
    }

    /** {@code r2}, {@code r3}; names of some length and those that end in a digit take words. */
    private static String powerName(String base, int exponent) {
        if (base.length() <= 2 && !Character.isDigit(base.charAt(base.length() - 1))) {
            return base + exponent;
        }
        return switch (exponent) {
            case 2 -> base + "Squared";
            case 3 -> base + "Cubed";
            default -> base + "ToThe" + exponent;
        };
    }

    private static String prefix(RealFunction function) {
        return switch (function) {
            case SQRT -> "root";
            case CBRT -> "cubeRoot";
            default -> function.symbol();
        };
    }

    private static String multiple(BigFraction factor) {
        String[] words = {"two", "three", "four"};
        for (int i = 0; i < words.length; i++) {
            if (factor.equals(new BigFraction(i + 2))) {
                return words[i];
            }
        }
        return factor.equals(BigFraction.ONE_HALF) ? "half" : null;
    }

    /** The name of a value that has one, counted names such as {@code t7} excepted. */
    private String plainName(int number) {
        String name = names.apply(number);
        boolean plain = name != null && !name.matches("t[0-9]+") && Character.isJavaIdentifierStart(name.charAt(0));
        return plain && name.chars().allMatch(Character::isJavaIdentifierPart) ? name : null;
    }

    private boolean isOne(int number) {
        return program.instruction(number) instanceof Instruction.Constant constant
                && constant.value().equals(BigFraction.ONE);
    }

    private static String capitalised(String name) {
        int first = name.codePointAt(0);
        return name.substring(0, Character.charCount(first)).toUpperCase(Locale.ROOT)
                + name.substring(Character.charCount(first));
    }
}
