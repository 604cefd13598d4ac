package io.github.gammawright.generation;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.ProgramBuilder;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/**
 * The acceleration −Γ^k_ij u^i u^j from a program for the Christoffel symbols that is already cheap: a start for the
 * optimiser that loses no digits to sweeps.
 */
final class ContractedSymbols {

    private final ProgramBuilder builder = new ProgramBuilder();
    private final Map<Integer, long[]> atoms = new HashMap<>();
    private final int n;

    private ContractedSymbols(int n) {
        this.n = n;
    }

    /**
     * The program for {@link Quantity#GEODESIC_ACCELERATION}.
     *
     * @param symbols a program for {@link Quantity#CHRISTOFFEL} in the full layout
     * @param zero which of its outputs, all n³ in index order, vanish identically
     * @param model another program for the acceleration, from which the velocities are taken
     */
    static LoweredProgram of(LoweredProgram symbols, List<Boolean> zero, LoweredProgram model, int n) {
        return new ContractedSymbols(n).contract(symbols, zero, model);
    }

    private LoweredProgram contract(LoweredProgram symbols, List<Boolean> zero, LoweredProgram model) {
        int[] number = new int[symbols.program().size()];
        for (int i = 0; i < number.length; i++) {
            number[i] = builder.append(renumbered(symbols.program().instruction(i), number));
            if (symbols.atoms().containsKey(i)) {
                atoms.put(number[i], symbols.atoms().get(i));
            }
        }
        int[] velocity = velocities(model);
        int[] twice = new int[n];
        int two = builder.constant(BigFraction.TWO);
        for (int i = 0; i < n; i++) {
            twice[i] = velocity[i] < 0 ? -1 : builder.multiply(two, velocity[i]);
        }
        List<Integer> outputs = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            List<Integer> terms = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                List<Integer> inner = new ArrayList<>();
                for (int j = 0; j <= i; j++) {
                    int component = (k * n + i) * n + j;
                    if (!zero.get(component)) {
                        int symbol = number[symbols.program().outputs().get(component)];
                        inner.add(builder.multiply(symbol, j == i ? velocity[i] : twice[j]));
                    }
                }
                if (!inner.isEmpty()) {
                    terms.add(builder.multiply(sum(inner), velocity[i]));
                }
            }
            outputs.add(terms.isEmpty() ? builder.constant(BigFraction.ZERO) : builder.negate(sum(terms)));
        }
        return new LoweredProgram(builder.build(outputs), atoms);
    }

    private int sum(List<Integer> terms) {
        int sum = terms.get(0);
        for (int term : terms.subList(1, terms.size())) {
            sum = builder.add(sum, term);
        }
        return sum;
    }

    /** The loads of the velocities, −1 where the acceleration doesn't depend on one. */
    private int[] velocities(LoweredProgram model) {
        int[] velocity = new int[n];
        java.util.Arrays.fill(velocity, -1);
        for (int i = 0; i < model.program().size(); i++) {
            if (model.program().instruction(i) instanceof Instruction.Load load
                    && load.symbol().kind() == Symbol.Kind.VELOCITY) {
                int place = builder.append(load);
                velocity[load.symbol().index()] = place;
                atoms.put(place, model.atoms().get(i));
            }
        }
        return velocity;
    }

    private static Instruction renumbered(Instruction instruction, int[] number) {
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            return new Instruction.Arithmetic(
                    arithmetic.operator(), number[arithmetic.left()], number[arithmetic.right()]);
        }
        if (instruction instanceof Instruction.Negation negation) {
            return new Instruction.Negation(number[negation.operand()]);
        }
        if (instruction instanceof Instruction.Call call) {
            return new Instruction.Call(
                    call.function(),
                    call.operands().stream().map(i -> number[i]).toList());
        }
        return instruction;
    }
}
