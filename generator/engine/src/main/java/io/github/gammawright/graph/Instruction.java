package io.github.gammawright.graph;

import java.util.List;
import java.util.function.IntUnaryOperator;
import org.hipparchus.fraction.BigFraction;

/** One step of a {@link StraightLineProgram}; operands are the numbers of earlier instructions. */
public sealed interface Instruction {

    /** The numbers of the instructions whose values this one uses, in their order. */
    List<Integer> operands();

    /**
     * The same step on other operands.
     *
     * @param numbers gives for each operand the one that takes its place
     */
    default Instruction renumbered(IntUnaryOperator numbers) {
        if (this instanceof Arithmetic a) {
            return new Arithmetic(a.operator(), numbers.applyAsInt(a.left()), numbers.applyAsInt(a.right()));
        }
        if (this instanceof MultiplyAdd m) {
            return new MultiplyAdd(
                    numbers.applyAsInt(m.left()), numbers.applyAsInt(m.right()), numbers.applyAsInt(m.addend()));
        }
        if (this instanceof Negation n) {
            return new Negation(numbers.applyAsInt(n.operand()));
        }
        if (this instanceof Call c) {
            return new Call(
                    c.function(), c.operands().stream().map(numbers::applyAsInt).toList());
        }
        return this;
    }

    /** A value given to the evaluation. */
    record Load(Symbol symbol) implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of();
        }
    }

    /** An exact rational number. */
    record Constant(BigFraction value) implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of();
        }
    }

    /** The circle's constant. */
    record Pi() implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of();
        }
    }

    /** A binary operation. */
    record Arithmetic(Operator operator, int left, int right) implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of(left, right);
        }
    }

    /** a · b + c, rounded once; it counts as two operations. */
    record MultiplyAdd(int left, int right, int addend) implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of(left, right, addend);
        }
    }

    /** The negative of a value; it counts as no operation. */
    record Negation(int operand) implements Instruction {
        @Override
        public List<Integer> operands() {
            return List.of(operand);
        }
    }

    /** A function applied to its arguments. */
    record Call(RealFunction function, List<Integer> operands) implements Instruction {
        public Call {
            operands = List.copyOf(operands);
        }

        /** Whether it is a sine or a cosine. */
        public boolean isCircular() {
            return function == RealFunction.SIN || function == RealFunction.COS;
        }
    }

    /** The binary operations. */
    enum Operator {
        ADD("+"),
        SUBTRACT("-"),
        MULTIPLY("*"),
        DIVIDE("/");

        private final String symbol;

        Operator(String symbol) {
            this.symbol = symbol;
        }

        /** The operator as Java writes it. */
        public String symbol() {
            return symbol;
        }
    }
}
