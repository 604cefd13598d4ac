package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.PriorityQueue;
import java.util.Set;

/**
 * Orders the instructions of a program so that few values are alive at a time and what takes long starts early. The values
 * stay what they are to the last bit.
 *
 * <p>First what the rest waits for: calls of functions and what these need. Then results one after the other, those first
 * that need least beyond what is there and set most free (common practice after Sethi &amp; Ullman, 1970, whose numbers
 * decide which operand of an operation comes first). What nothing needs is left out.
 */
public final class Schedule {

    /** Up to so many values alive at once, their number does not matter. */
    private static final int REGISTERS = 16;

    /** Larger programs stay as they are; they are split into methods, for each of which the compiler finds an order. */
    private static final long MOST_WORK = 100_000_000;

    private final StraightLineProgram program;
    private final int[] label;
    private final int[] pendingUses;
    private final BitSet done = new BitSet();
    private final List<Integer> order = new ArrayList<>();

    private Schedule(StraightLineProgram program) {
        this.program = program;
        this.pendingUses = new int[program.size()];
        this.label = new int[program.size()];
        BitSet needed = needed();
        for (int i = needed.nextSetBit(0); i >= 0; i = needed.nextSetBit(i + 1)) {
            for (int operand : operands(i)) {
                pendingUses[operand]++;
            }
            label[i] = registers(i);
        }
    }

    /** The same computation in a better order; instructions that no result needs are gone. */
    public static StraightLineProgram of(StraightLineProgram program) {
        long outputs = program.outputs().stream().distinct().count();
        if (outputs * outputs * program.size() > MOST_WORK) {
            return program;
        }
        Schedule schedule = new Schedule(program);
        schedule.functions();
        schedule.results();
        StraightLineProgram ordered = schedule.write();
        return pressure(ordered) <= Math.max(REGISTERS, pressure(program)) ? ordered : program;
    }

    /** How many values are alive at once at most, those on parameters alone and constants aside, which are kept in memory. */
    static int pressure(StraightLineProgram program) {
        int[] last = new int[program.size()];
        for (int i = 0; i < last.length; i++) {
            for (int operand : program.instruction(i).operands()) {
                last[operand] = i;
            }
        }
        int alive = 0;
        int most = 0;
        for (int i = 0; i < last.length; i++) {
            if (program.isParameterOnly(i)) {
                continue;
            }
            alive++;
            most = Math.max(most, alive);
            for (int operand : Set.copyOf(program.instruction(i).operands())) {
                if (last[operand] == i && !program.isParameterOnly(operand)) {
                    alive--;
                }
            }
            if (last[i] == 0) {
                alive--;
            }
        }
        return most;
    }

    private BitSet needed() {
        BitSet needed = new BitSet();
        program.outputs().forEach(needed::set);
        for (int i = program.size() - 1; i >= 0; i--) {
            if (needed.get(i)) {
                program.instruction(i).operands().forEach(needed::set);
            }
        }
        return needed;
    }

    private int[] operands(int number) {
        return program.instruction(number).operands().stream()
                .mapToInt(i -> i)
                .distinct()
                .toArray();
    }

    /** Sethi and Ullman's number of a value as if it were a tree. */
    private int registers(int number) {
        if (program.isParameterOnly(number)) {
            return 0;
        }
        int[] labels =
                Arrays.stream(operands(number)).map(o -> label[o]).sorted().toArray();
        int most = 1;
        for (int k = 0; k < labels.length; k++) {
            most = Math.max(most, labels[k] + labels.length - 1 - k);
        }
        return Math.min(most, 1000);
    }

    /** Calls and what they need, so that their latency is hidden by what follows. */
    private void functions() {
        for (int i = 0; i < program.size(); i++) {
            boolean wanted = pendingUses[i] > 0 || program.outputs().contains(i);
            if (wanted && program.instruction(i) instanceof Instruction.Call call && isCalled(call.function())) {
                emit(i);
            }
        }
    }

    /** Whether a function is a call at run time, before which all that is alive goes to memory. */
    private static boolean isCalled(RealFunction function) {
        return switch (function) {
            case SQRT, ABS, SIGNUM -> false;
            default -> true;
        };
    }

    private void results() {
        List<Integer> waiting =
                new ArrayList<>(program.outputs().stream().distinct().toList());
        Map<Integer, Integer> work = new HashMap<>();
        PriorityQueue<Integer> queue = new PriorityQueue<>(
                Comparator.comparingInt((Integer o) -> work.get(o)).thenComparingInt(o -> o));
        while (!waiting.isEmpty()) {
            queue.clear();
            for (int output : waiting) {
                work.put(output, missing(output));
                queue.add(output);
            }
            int next = queue.remove();
            emit(next);
            waiting.remove(Integer.valueOf(next));
        }
    }

    /** How many values a result needs that are not there, less those that it uses for the last time. */
    private int missing(int output) {
        BitSet seen = new BitSet();
        List<Integer> stack = new ArrayList<>(List.of(output));
        Map<Integer, Integer> uses = new HashMap<>();
        int count = 0;
        while (!stack.isEmpty()) {
            int top = stack.remove(stack.size() - 1);
            if (seen.get(top) || done.get(top)) {
                continue;
            }
            seen.set(top);
            count += program.isParameterOnly(top) ? 0 : 2;
            for (int operand : operands(top)) {
                uses.merge(operand, 1, Integer::sum);
                stack.add(operand);
            }
        }
        for (Map.Entry<Integer, Integer> use : uses.entrySet()) {
            if (use.getValue() == pendingUses[use.getKey()] && !program.isParameterOnly(use.getKey())) {
                count--;
            }
        }
        return count;
    }

    /** Emits a value after what it needs, of its operands first the one that needs more. */
    private void emit(int root) {
        List<Integer> stack = new ArrayList<>(List.of(root));
        while (!stack.isEmpty()) {
            int top = stack.get(stack.size() - 1);
            if (done.get(top)) {
                stack.remove(stack.size() - 1);
                continue;
            }
            List<Integer> missing = Arrays.stream(operands(top))
                    .filter(o -> !done.get(o))
                    .boxed()
                    .sorted(Comparator.comparingInt((Integer o) -> label[o]).thenComparingInt(o -> -o))
                    .toList();
            if (missing.isEmpty()) {
                stack.remove(stack.size() - 1);
                done.set(top);
                order.add(top);
                for (int operand : operands(top)) {
                    pendingUses[operand]--;
                }
            } else {
                stack.addAll(missing);
            }
        }
    }

    private StraightLineProgram write() {
        Map<Integer, Integer> numbers = new HashMap<>();
        List<Instruction> instructions = new ArrayList<>();
        for (int old : order) {
            numbers.put(old, instructions.size());
            instructions.add(program.instruction(old).renumbered(numbers::get));
        }
        Map<Integer, String> names = new HashMap<>();
        program.names().forEach((number, name) -> {
            if (numbers.containsKey(number)) {
                names.put(numbers.get(number), name);
            }
        });
        return new StraightLineProgram(
                instructions,
                names,
                program.outputs().stream().map(numbers::get).toList());
    }
}
