package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.PrimeField;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.Arrays;

/**
 * Values and how each of them is computed from others at present, made for being rewired many thousand times a second.
 *
 * <p>A value stands for a function up to its sign, named by its residues in the prime field; every function is there
 * once. Values that nobody uses stay known and can come back. The network never has a cycle.
 */
final class Network {

    /** Depends on parameters alone: costs nothing. */
    static final byte FREE = 0;
    /** A coordinate or another given value, or a function call. */
    static final byte ATOM = 1;

    static final byte ADD = 2;
    static final byte MULTIPLY = 3;
    static final byte DIVIDE = 4;

    private static final CostModel COSTS = CostModel.standard();
    static final int COST_ADD = COSTS.of(Instruction.Operator.ADD);
    static final int COST_MULTIPLY = COSTS.of(Instruction.Operator.MULTIPLY);
    static final int COST_DIVIDE = COSTS.of(Instruction.Operator.DIVIDE);

    static final int POINTS = 3;
    private static final PrimeField P = PrimeField.VALUES;

    final StraightLineProgram program;
    int size;
    byte[] operation = new byte[64];
    int[] left = new int[64];
    int[] right = new int[64];

    /** For a sum whether the left operand is subtracted; for a product or quotient whether its negative is meant. */
    boolean[] leftMinus = new boolean[64];

    /** For a sum whether the right operand is subtracted. */
    boolean[] rightMinus = new boolean[64];

    int[] uses = new int[64];
    long[][] residues = new long[POINTS][64];
    long[] inverse = new long[64];

    /** For a free value that is no instruction of the source program: how it comes from its operands. */
    byte[] freeOperation = new byte[64];

    /** The instruction of the source program that a free value or atom was made from, or −1. */
    int[] origin = new int[64];

    /** The values that the call of an atom takes, empty for symbols; null for other values. */
    int[][] arguments = new int[64][];

    /** Whether a value may be divided by: it vanishes only where the source program divides by zero too. */
    boolean[] divisor = new boolean[64];

    final int[] outputs;
    final boolean[] outputMinus;

    /** For each instruction of the source program its value. */
    final int[] valueOf;

    /** For each instruction of the source program whether the negative of its value is meant. */
    final boolean[] minusOf;

    private final ValueTable table = new ValueTable();

    Network(LoweredProgram lowered) {
        program = lowered.program();
        valueOf = new int[program.size()];
        minusOf = new boolean[program.size()];
        Arrays.fill(valueOf, -1);
        boolean[] needed = neededInstructions();
        for (int i = 0; i < program.size(); i++) {
            if (needed[i]) {
                load(i, lowered);
            }
        }
        Divisors.mark(this);
        outputs = new int[program.outputs().size()];
        outputMinus = new boolean[outputs.length];
        for (int i = 0; i < outputs.length; i++) {
            int instruction = program.outputs().get(i);
            outputs[i] = valueOf[instruction];
            outputMinus[i] = minusOf[instruction];
            acquire(outputs[i]);
        }
    }

    private boolean[] neededInstructions() {
        boolean[] needed = new boolean[program.size()];
        program.outputs().forEach(output -> needed[output] = true);
        for (int i = 0; i < needed.length; i++) {
            needed[i] |= program.isParameterOnly(i);
        }
        for (int i = program.size() - 1; i >= 0; i--) {
            if (needed[i]) {
                program.instruction(i).operands().forEach(operand -> needed[operand] = true);
            }
        }
        return needed;
    }

    private void load(int i, LoweredProgram lowered) {
        Instruction instruction = program.instruction(i);
        if (instruction instanceof Instruction.Negation negation) {
            valueOf[i] = valueOf[negation.operand()];
            minusOf[i] = !minusOf[negation.operand()];
            return;
        }
        long[] value = new long[POINTS];
        if (instruction instanceof Instruction.Constant constant) {
            Arrays.fill(value, P.element(constant.value()));
        } else if (instruction instanceof Instruction.Arithmetic arithmetic) {
            for (int k = 0; k < POINTS; k++) {
                value[k] = apply(
                        arithmetic.operator(),
                        signedResidue(arithmetic.left(), k),
                        signedResidue(arithmetic.right(), k));
            }
        } else {
            value = lowered.atoms().get(i).clone();
        }
        boolean minus = isMinus(value[0]);
        if (minus) {
            negate(value);
        }
        minusOf[i] = minus;
        int known = find(value);
        valueOf[i] = known >= 0 ? known : append(i, instruction, minus, value);
    }

    private int append(int i, Instruction instruction, boolean minus, long[] value) {
        if (program.isParameterOnly(i)) {
            return append(FREE, -1, -1, minus, false, value, i);
        }
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            boolean a = minusOf[arithmetic.left()];
            boolean b = minusOf[arithmetic.right()];
            int x = valueOf[arithmetic.left()];
            int y = valueOf[arithmetic.right()];
            return switch (arithmetic.operator()) {
                case ADD -> append(ADD, x, y, a ^ minus, b ^ minus, value, i);
                case SUBTRACT -> append(ADD, x, y, a ^ minus, !b ^ minus, value, i);
                case MULTIPLY -> append(MULTIPLY, x, y, a ^ b ^ minus, false, value, i);
                case DIVIDE -> append(DIVIDE, x, y, a ^ b ^ minus, false, value, i);
            };
        }
        int v = append(ATOM, -1, -1, minus, false, value, i);
        arguments[v] = instruction.operands().stream()
                .mapToInt(operand -> valueOf[operand])
                .toArray();
        return v;
    }

    private long signedResidue(int instruction, int k) {
        long residue = residues[k][valueOf[instruction]];
        return minusOf[instruction] ? P.negate(residue) : residue;
    }

    private static long apply(Instruction.Operator operator, long a, long b) {
        return switch (operator) {
            case ADD -> P.add(a, b);
            case SUBTRACT -> P.subtract(a, b);
            case MULTIPLY -> P.multiply(a, b);
            case DIVIDE -> P.multiply(a, P.inverse(b));
        };
    }

    static boolean isMinus(long residue) {
        return residue > P.prime() / 2;
    }

    static long unsigned(long residue) {
        return isMinus(residue) ? P.negate(residue) : residue;
    }

    static void negate(long[] value) {
        for (int k = 0; k < value.length; k++) {
            value[k] = P.negate(value[k]);
        }
    }

    /** The known value with the given residues, whose first must be unsigned; −1 if there is none. */
    int find(long[] value) {
        int v = table.find(value[0]);
        if (v < 0) {
            return -1;
        }
        for (int k = 1; k < POINTS; k++) {
            if (residues[k][v] != value[k]) {
                return -1;
            }
        }
        return v;
    }

    /** The known value with the given unsigned residue at the first point, or −1. */
    int find(long unsignedResidue) {
        return table.find(unsignedResidue);
    }

    /** Adds a value that is not known yet; nobody uses it at first. */
    int append(byte op, int a, int b, boolean minusA, boolean minusB, long[] value, int from) {
        if (size == operation.length) {
            grow();
        }
        int v = size++;
        operation[v] = op;
        left[v] = a;
        right[v] = b;
        leftMinus[v] = minusA;
        rightMinus[v] = minusB;
        uses[v] = 0;
        origin[v] = from;
        for (int k = 0; k < POINTS; k++) {
            residues[k][v] = value[k];
        }
        inverse[v] = value[0] == 0 ? 0 : P.inverse(value[0]);
        table.put(value[0], v);
        return v;
    }

    private void grow() {
        int capacity = 2 * size;
        operation = Arrays.copyOf(operation, capacity);
        left = Arrays.copyOf(left, capacity);
        right = Arrays.copyOf(right, capacity);
        leftMinus = Arrays.copyOf(leftMinus, capacity);
        rightMinus = Arrays.copyOf(rightMinus, capacity);
        uses = Arrays.copyOf(uses, capacity);
        inverse = Arrays.copyOf(inverse, capacity);
        freeOperation = Arrays.copyOf(freeOperation, capacity);
        origin = Arrays.copyOf(origin, capacity);
        divisor = Arrays.copyOf(divisor, capacity);
        arguments = Arrays.copyOf(arguments, capacity);
        for (int k = 0; k < POINTS; k++) {
            residues[k] = Arrays.copyOf(residues[k], capacity);
        }
    }

    int cost(int v) {
        return switch (operation[v]) {
            case ADD -> COST_ADD;
            case MULTIPLY -> COST_MULTIPLY;
            case DIVIDE -> COST_DIVIDE;
            case ATOM -> callCost(v);
            default -> 0;
        };
    }

    private int callCost(int v) {
        if (program.instruction(origin[v]) instanceof Instruction.Call call) {
            return COSTS.of(call.function());
        }
        return 0;
    }

    /** Adds a use of a value and tells what becomes needed by that. */
    int acquire(int v) {
        if (uses[v]++ > 0) {
            return 0;
        }
        return cost(v) + acquireOperands(v);
    }

    int acquireOperands(int v) {
        if (operation[v] >= ADD) {
            return acquire(left[v]) + acquire(right[v]);
        }
        int total = 0;
        if (operation[v] == ATOM) {
            for (int argument : arguments[v]) {
                total += acquire(argument);
            }
        }
        return total;
    }

    /** Takes a use of a value away and tells what is no longer needed. */
    int release(int v) {
        if (--uses[v] > 0) {
            return 0;
        }
        return cost(v) + releaseOperands(v);
    }

    int releaseOperands(int v) {
        if (operation[v] >= ADD) {
            return release(left[v]) + release(right[v]);
        }
        int total = 0;
        if (operation[v] == ATOM) {
            for (int argument : arguments[v]) {
                total += release(argument);
            }
        }
        return total;
    }

    int totalCost() {
        int total = 0;
        for (int v = 0; v < size; v++) {
            if (uses[v] > 0) {
                total += cost(v);
            }
        }
        return total;
    }

    /** The operations that are counted: binary arithmetic on what is no parameter. */
    int operations() {
        int total = 0;
        for (int v = 0; v < size; v++) {
            if (uses[v] > 0 && operation[v] >= ADD) {
                total++;
            }
        }
        return total;
    }
}
