package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.PrimeField;
import io.github.gammawright.graph.ProgramBuilder;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Writes what a network computes at present as a program, the signs of its values chosen so that few are negated. */
final class NetworkWriter {

    private static final int MOST_FLIPPED = 1500;

    private final Network network;
    private final StraightLineProgram source;
    private final int[] order;
    private final boolean[] flipped;
    private final boolean[] negative;

    private NetworkWriter(Network network) {
        this.network = network;
        this.source = network.program;
        this.flipped = new boolean[network.size];
        this.negative = new boolean[network.size];
        List<Integer> sorted = new ArrayList<>();
        boolean[] seen = new boolean[network.size];
        for (int output : network.outputs) {
            visit(output, seen, sorted);
        }
        this.order = sorted.stream().mapToInt(v -> v).toArray();
    }

    static LoweredProgram write(Network network) {
        NetworkWriter writer = new NetworkWriter(network);
        writer.placeSigns();
        return writer.emit();
    }

    private void visit(int v, boolean[] seen, List<Integer> sorted) {
        if (seen[v]) {
            return;
        }
        seen[v] = true;
        if (network.operation[v] >= Network.ADD || (network.operation[v] == Network.FREE && network.origin[v] < 0)) {
            visit(network.left[v], seen, sorted);
            visit(network.right[v], seen, sorted);
        } else if (network.operation[v] == Network.ATOM) {
            for (int argument : network.arguments[v]) {
                visit(argument, seen, sorted);
            }
        }
        sorted.add(v);
    }

    /** Flips differences, one at a time, as long as fewer negations remain. */
    private void placeSigns() {
        int negations = negations();
        if (order.length > MOST_FLIPPED) {
            return;
        }
        boolean better = true;
        while (better && negations > 0) {
            better = false;
            for (int v : order) {
                if (network.operation[v] == Network.ADD) {
                    flipped[v] ^= true;
                    int fewer = negations();
                    if (fewer < negations) {
                        negations = fewer;
                        better = true;
                    } else {
                        flipped[v] ^= true;
                    }
                }
            }
        }
        negations();
    }

    /** Computes the signs of all values and counts outputs and arguments that need a negation. */
    private int negations() {
        int count = 0;
        for (int v : order) {
            negative[v] = signOf(v);
            if (network.operation[v] == Network.ATOM) {
                for (int i = 0; i < network.arguments[v].length; i++) {
                    count += argumentMinus(v, i) ? 1 : 0;
                }
            }
        }
        for (int o = 0; o < network.outputs.length; o++) {
            count += negative[network.outputs[o]] ^ network.outputMinus[o] ? 1 : 0;
        }
        return count;
    }

    private boolean argumentMinus(int v, int i) {
        int operand = source.instruction(network.origin[v]).operands().get(i);
        return negative[network.arguments[v][i]] ^ network.minusOf[operand];
    }

    /** Whether the instruction that is emitted for a value gives its negative. */
    private boolean signOf(int v) {
        byte kind = network.operation[v];
        if (kind == Network.ATOM || (kind == Network.FREE && network.origin[v] >= 0)) {
            // the source instruction is the value's negative where the value was turned round to be unsigned
            return network.leftMinus[v];
        }
        kind = kind == Network.FREE ? network.freeOperation[v] : kind;
        boolean a = network.leftMinus[v] ^ negative[network.left[v]];
        boolean b = network.rightMinus[v] ^ negative[network.right[v]];
        if (kind != Network.ADD) {
            return a ^ negative[network.right[v]];
        }
        return a == b ? a : flipped[v];
    }

    private LoweredProgram emit() {
        ProgramBuilder builder = new ProgramBuilder();
        Map<Integer, long[]> atoms = new HashMap<>();
        int[] number = new int[network.size];
        Map<Integer, Integer> copies = new HashMap<>();
        Map<Integer, String> names = namesOfValues();
        for (int v : order) {
            number[v] = emit(v, number, builder, atoms, copies);
            String name = names.get(v);
            if (name != null) {
                builder.name(number[v], name);
            }
        }
        List<Integer> outputs = new ArrayList<>();
        for (int o = 0; o < network.outputs.length; o++) {
            int v = network.outputs[o];
            outputs.add(negative[v] ^ network.outputMinus[o] ? builder.negate(number[v]) : number[v]);
        }
        return new LoweredProgram(builder.build(outputs), atoms);
    }

    /** The author's names, where the emitted sign is the one that is named. */
    private Map<Integer, String> namesOfValues() {
        Map<Integer, String> names = new HashMap<>();
        source.names().forEach((instruction, name) -> {
            int v = network.valueOf[instruction];
            if (v >= 0 && network.minusOf[instruction] == negative[v]) {
                names.putIfAbsent(v, name);
            }
        });
        return names;
    }

    private int emit(
            int v, int[] number, ProgramBuilder builder, Map<Integer, long[]> atoms, Map<Integer, Integer> copies) {
        byte kind = network.operation[v];
        if (kind == Network.FREE && network.origin[v] >= 0) {
            return copy(network.origin[v], builder, atoms, copies);
        }
        if (kind == Network.ATOM) {
            Instruction instruction = source.instruction(network.origin[v]);
            if (instruction instanceof Instruction.Call call) {
                List<Integer> arguments = new ArrayList<>();
                for (int i = 0; i < network.arguments[v].length; i++) {
                    int argument = number[network.arguments[v][i]];
                    arguments.add(argumentMinus(v, i) ? builder.negate(argument) : argument);
                }
                instruction = new Instruction.Call(call.function(), arguments);
            }
            int result = builder.append(instruction);
            atoms.put(result, sourceResidues(v));
            return result;
        }
        int a = number[network.left[v]];
        int b = number[network.right[v]];
        kind = kind == Network.FREE ? network.freeOperation[v] : kind;
        if (kind == Network.MULTIPLY) {
            return builder.multiply(a, b);
        }
        if (kind == Network.DIVIDE) {
            return builder.divide(a, b);
        }
        boolean minusA = network.leftMinus[v] ^ negative[network.left[v]];
        boolean minusB = network.rightMinus[v] ^ negative[network.right[v]];
        if (minusA == minusB) {
            return builder.add(a, b);
        }
        return minusB ^ negative[v] ? builder.subtract(a, b) : builder.subtract(b, a);
    }

    /** The residues of the source instruction itself, whose sign may be the other one. */
    private long[] sourceResidues(int v) {
        long[] residues = new long[Network.POINTS];
        for (int k = 0; k < residues.length; k++) {
            long residue = network.residues[k][v];
            residues[k] = network.leftMinus[v] ? PrimeField.VALUES.negate(residue) : residue;
        }
        return residues;
    }

    private int copy(int i, ProgramBuilder builder, Map<Integer, long[]> atoms, Map<Integer, Integer> copies) {
        Integer known = copies.get(i);
        if (known != null) {
            return known;
        }
        Instruction instruction = source.instruction(i);
        List<Integer> operands = new ArrayList<>();
        for (int operand : instruction.operands()) {
            operands.add(copy(operand, builder, atoms, copies));
        }
        int result;
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            int a = operands.get(0);
            int b = operands.get(1);
            result = switch (arithmetic.operator()) {
                case ADD -> builder.add(a, b);
                case SUBTRACT -> builder.subtract(a, b);
                case MULTIPLY -> builder.multiply(a, b);
                case DIVIDE -> builder.divide(a, b);
            };
        } else if (instruction instanceof Instruction.Negation) {
            result = builder.negate(operands.get(0));
        } else if (instruction instanceof Instruction.Call call) {
            result = builder.append(new Instruction.Call(call.function(), operands));
        } else {
            result = builder.append(instruction);
        }
        if (!(instruction instanceof Instruction.Arithmetic
                || instruction instanceof Instruction.Negation
                || instruction instanceof Instruction.Constant)) {
            long[] residues = new long[Network.POINTS];
            for (int k = 0; k < residues.length; k++) {
                long residue = network.residues[k][network.valueOf[i]];
                residues[k] = network.minusOf[i] ? PrimeField.VALUES.negate(residue) : residue;
            }
            atoms.put(result, residues);
        }
        copies.put(i, result);
        return result;
    }
}
