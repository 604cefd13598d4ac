package io.github.gammawright.emission;

import io.github.gammawright.definition.CorrectRounding;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntFunction;

/**
 * Prints values as Java expressions whose value is the program's to the last bit: parentheses stand where Java would
 * group otherwise. Operands change places only where addition and multiplication commute, and a minus sign moves only
 * through operations that round symmetrically, both of which IEEE 754 arithmetic leaves exact.
 */
final class JavaExpressions {

    private final StraightLineProgram program;
    private final IntFunction<String> names;
    private final FunctionCalls functions;

    /**
     * A printer.
     *
     * @param names the text by which a value is at hand, null for those to be printed as expressions
     */
    JavaExpressions(StraightLineProgram program, IntFunction<String> names, FunctionCalls functions) {
        this.program = program;
        this.names = names;
        this.functions = functions;
    }

    /** How functions are called in the emitted class. */
    interface FunctionCalls {
        /** The text before the opening parenthesis. */
        String callee(RealFunction function);

        /** The product and sum in one rounding, up to the opening parenthesis. */
        String fma();

        /** The circle's constant. */
        String pi();
    }

    private enum Level {
        SUM,
        PRODUCT,
        SIGNED,
        ATOM
    }

    private record Text(String text, Level level) {
        boolean isNegative() {
            return text.startsWith("-") && level != Level.SUM;
        }

        String magnitude() {
            return isNegative() ? text.substring(1) : text;
        }

        String atLeast(Level lowest) {
            return level.compareTo(lowest) >= 0 ? text : "(" + text + ")";
        }

        Text unsigned() {
            if (!isNegative()) {
                return this;
            }
            return new Text(magnitude(), level == Level.SIGNED ? Level.ATOM : level);
        }
    }

    /** The value as an operand: its name where it has one. */
    String print(int number) {
        return operand(number).text();
    }

    /** The expression that computes the value, whether it has a name or not. */
    String definition(int number) {
        return expression(number).text();
    }

    private Text operand(int number) {
        String name = names.apply(number);
        return name != null ? new Text(name, Level.ATOM) : expression(number);
    }

    private Text expression(int number) {
        Instruction instruction = program.instruction(number);
        if (instruction instanceof Instruction.Constant constant) {
            String literal = DoubleLiteral.of(CorrectRounding.toDouble(constant.value()));
            return new Text(literal, literal.startsWith("-") ? Level.SIGNED : Level.ATOM);
        }
        if (instruction instanceof Instruction.Pi) {
            return new Text(functions.pi(), Level.ATOM);
        }
        if (instruction instanceof Instruction.Negation negation) {
            return negative(operand(negation.operand()));
        }
        if (instruction instanceof Instruction.Call call) {
            List<String> arguments = new ArrayList<>();
            for (int argument : call.operands()) {
                arguments.add(operand(argument).text());
            }
            return new Text(functions.callee(call.function()) + "(" + String.join(", ", arguments) + ")", Level.ATOM);
        }
        if (instruction instanceof Instruction.MultiplyAdd fused) {
            String product =
                    operand(fused.left()).text() + ", " + operand(fused.right()).text();
            return new Text(
                    functions.fma() + "(" + product + ", "
                            + operand(fused.addend()).text() + ")",
                    Level.ATOM);
        }
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            Text left = operand(arithmetic.left());
            Text right = operand(arithmetic.right());
            return switch (arithmetic.operator()) {
                case ADD -> sum(left, right);
                case SUBTRACT -> difference(left, right);
                case MULTIPLY, DIVIDE -> product(arithmetic.operator(), left, right);
            };
        }
        throw new IllegalStateException("a value that is loaded has no name: " + instruction);
    }

    private static Text negative(Text text) {
        if (text.level() == Level.SUM) {
            return new Text("-(" + text.text() + ")", Level.SIGNED);
        }
        if (text.isNegative()) {
            return text.unsigned();
        }
        return new Text("-" + text.text(), text.level() == Level.PRODUCT ? Level.PRODUCT : Level.SIGNED);
    }

    private static Text sum(Text left, Text right) {
        if (right.isNegative()) {
            return difference(left, right.unsigned());
        }
        if (left.isNegative() || (right.level() == Level.SUM && left.level() != Level.SUM)) {
            return left.isNegative() ? difference(right, left.unsigned()) : sum(right, left);
        }
        return new Text(left.text() + " + " + right.atLeast(Level.PRODUCT), Level.SUM);
    }

    private static Text difference(Text left, Text right) {
        if (right.isNegative()) {
            return sum(left, right.unsigned());
        }
        return new Text(left.text() + " - " + right.atLeast(Level.PRODUCT), Level.SUM);
    }

    private static Text product(Operator operator, Text left, Text right) {
        boolean negative = left.isNegative() != right.isNegative();
        Text first = left.unsigned();
        Text second = right.unsigned();
        if (operator == Operator.MULTIPLY && second.level() == Level.PRODUCT && first.level() != Level.PRODUCT) {
            Text swapped = first;
            first = second;
            second = swapped;
        }
        String text = first.atLeast(Level.PRODUCT) + " " + operator.symbol() + " " + second.atLeast(Level.SIGNED);
        return new Text(negative ? "-" + text : text, Level.PRODUCT);
    }
}
