package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;

/**
 * An upper estimate of the bytes that a compiler makes of a statement, by the instruction formats of Lindholm et al.,
 * The Java Virtual Machine Specification, Java SE 17 (2021), chapter 6.
 */
final class BytecodeSize {

    /** HotSpot compiles no method above 8,000; emitted ones stay below this estimate. */
    static final int LARGEST_METHOD = 6_000;

    /** Loading or storing a variable: one of the first 256 local words, or a later one. */
    private static final int NEAR = 2;

    private static final int FAR = 4;
    private static final int FIELD = 4;
    private static final int LITERAL = 3;
    private static final int CALL = 3;
    /** Array, offset, index, their sum, and the load or store. */
    static final int ELEMENT = 9;

    private final Body body;

    BytecodeSize(Body body) {
        this.body = body;
    }

    /**
     * The bytes of a statement.
     *
     * @param locals the words of local variables in use
     */
    int of(Statement statement, int locals) {
        int variable = locals < 250 ? NEAR : FAR;
        if (statement instanceof Statement.Zero zero) {
            return Math.min(zero.to() - zero.from(), JavaStatements.LONG_RUN + 1) * (ELEMENT + 1);
        }
        if (statement instanceof Statement.Copy) {
            return 2 * ELEMENT;
        }
        if (statement instanceof Statement.Define define) {
            return expression(define.value(), variable) + variable;
        }
        return operand(Body.valueOf(statement), variable) + ELEMENT;
    }

    /** The bytes of an expression whose variables are near. */
    int ofExpression(int value) {
        return operand(value, NEAR);
    }

    /** The bytes that move a value between an array and a variable. */
    static int move(int locals) {
        return ELEMENT + (locals < 250 ? NEAR : FAR);
    }

    private int operand(int value, int variable) {
        if (body.isVariable(value) || body.isInput(value)) {
            return variable;
        }
        String given = body.values().given(value);
        if (given == null) {
            return expression(value, variable);
        }
        return given.endsWith("]") ? ELEMENT : FIELD;
    }

    private int expression(int value, int variable) {
        Instruction instruction = body.program().instruction(value);
        if (instruction instanceof Instruction.Constant || instruction instanceof Instruction.Pi) {
            return LITERAL;
        }
        int size = instruction instanceof Instruction.Call || instruction instanceof Instruction.MultiplyAdd ? CALL : 1;
        for (int operand : instruction.operands()) {
            size += operand(operand, variable);
        }
        return size;
    }
}
