package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.RealFunction;

/**
 * Finds the values that may be divided by. A value that the source program divides by, a factor of one, and a product of
 * such may; any other might vanish somewhere in the domain, as a parameter does that may be zero, and is left alone.
 */
final class Divisors {

    private Divisors() {}

    /** Marks the divisors among the values that a network was loaded with. */
    static void mark(Network network) {
        for (int i = 0; i < network.program.size(); i++) {
            Instruction instruction = network.program.instruction(i);
            int v = network.valueOf[i];
            if (v < 0) {
                continue;
            }
            if (instruction instanceof Instruction.Constant constant) {
                network.divisor[v] |= constant.value().signum() != 0;
            } else if (instruction instanceof Instruction.Pi) {
                network.divisor[v] = true;
            } else if (instruction instanceof Instruction.Arithmetic arithmetic
                    && arithmetic.operator() == Instruction.Operator.DIVIDE) {
                network.divisor[network.valueOf[arithmetic.right()]] = true;
            }
        }
        // what a divisor is made of comes earlier in the program than the divisor itself
        for (int i = network.program.size() - 1; i >= 0; i--) {
            if (network.valueOf[i] >= 0 && network.divisor[network.valueOf[i]]) {
                markFactors(network, network.program.instruction(i));
            }
        }
        for (int i = 0; i < network.program.size(); i++) {
            if (network.valueOf[i] >= 0
                    && network.program.instruction(i) instanceof Instruction.Arithmetic arithmetic) {
                boolean quotient = arithmetic.operator() == Instruction.Operator.MULTIPLY
                        || arithmetic.operator() == Instruction.Operator.DIVIDE;
                network.divisor[network.valueOf[i]] |= quotient
                        && network.divisor[network.valueOf[arithmetic.left()]]
                        && network.divisor[network.valueOf[arithmetic.right()]];
            }
        }
    }

    private static void markFactors(Network network, Instruction instruction) {
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            if (arithmetic.operator() == Instruction.Operator.MULTIPLY) {
                network.divisor[network.valueOf[arithmetic.left()]] = true;
                network.divisor[network.valueOf[arithmetic.right()]] = true;
            } else if (arithmetic.operator() == Instruction.Operator.DIVIDE) {
                network.divisor[network.valueOf[arithmetic.left()]] = true;
            }
        } else if (instruction instanceof Instruction.Call call
                && (call.function() == RealFunction.SQRT
                        || call.function() == RealFunction.CBRT
                        || call.function() == RealFunction.ABS)) {
            network.divisor[network.valueOf[call.operands().get(0)]] = true;
        }
    }

    /** Whether the result of an operation may be divided by. */
    static boolean isDivisor(Network network, int kind, int u, int v) {
        return kind != PairTable.SUM && kind != PairTable.DIFFERENCE && network.divisor[u] && network.divisor[v];
    }
}
