package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.OperationCount;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.List;

/**
 * All that is written into one kernel class.
 *
 * @param definition what the kernel was made from
 * @param packageName the Java package, empty for the unnamed one
 * @param className the simple name
 * @param layout how each result is laid out
 * @param results one for each quantity, in the order of the result arrays
 * @param program computes every component; {@link Result#slots} refers to its instructions
 * @param domain the definition's conditions
 * @param regenerate the command line that makes the class again
 * @param sharedTrigonometry whether the class computes sine and cosine by itself, both of an argument at once, instead of
 *     calling {@code Math}
 * @param remarks further paragraphs for the class's documentation, in plain text
 */
public record KernelModel(
        MetricDefinition definition,
        String packageName,
        String className,
        Layout layout,
        List<Result> results,
        StraightLineProgram program,
        Domain domain,
        String regenerate,
        boolean sharedTrigonometry,
        List<String> remarks) {

    public KernelModel {
        results = List.copyOf(results);
        remarks = List.copyOf(remarks);
    }

    /** A model that calls {@code Math}, without remarks. */
    public KernelModel(
            MetricDefinition definition,
            String packageName,
            String className,
            Layout layout,
            List<Result> results,
            StraightLineProgram program,
            Domain domain,
            String regenerate) {
        this(definition, packageName, className, layout, results, program, domain, regenerate, false, List.of());
    }

    /** The same with remarks. */
    public KernelModel withRemarks(List<String> remarks) {
        return new KernelModel(
                definition,
                packageName,
                className,
                layout,
                results,
                program,
                domain,
                regenerate,
                sharedTrigonometry,
                remarks);
    }

    /** The same with sine and cosine of its own, or with those of {@code Math}. */
    public KernelModel withSharedTrigonometry(boolean shared) {
        return new KernelModel(
                definition, packageName, className, layout, results, program, domain, regenerate, shared, remarks);
    }

    /** What an evaluation costs. */
    public OperationCount count() {
        return sharedTrigonometry ? program.countWithSharedTrigonometry() : program.count();
    }

    /**
     * One result array.
     *
     * @param quantity what it holds
     * @param shape its index structure in the definition's dimension
     * @param slots for each entry of the array the number of the instruction that gives its value, or −1 for an entry
     *     that is identically zero
     * @param components for each entry of the array its index tuple (of the independent component), counted from 0
     */
    public record Result(Quantity quantity, Shape shape, List<Integer> slots, List<List<Integer>> components) {

        public Result {
            slots = List.copyOf(slots);
            components = components.stream().map(List::copyOf).toList();
        }
    }

    /**
     * The conditions as a program and comparisons of its outputs.
     *
     * @param program loads parameters, coordinates and caller's functions only
     * @param conditions in the definition's order
     */
    public record Domain(StraightLineProgram program, List<Condition> conditions) {

        public Domain {
            conditions = List.copyOf(conditions);
        }
    }

    /**
     * A chain {@code operand0 < operand1 <= …}.
     *
     * @param operands instruction numbers in the domain's program
     * @param comparisons one fewer than the operands
     * @param text as the author wrote it
     */
    public record Condition(List<Integer> operands, List<MetricDefinition.Comparison> comparisons, String text) {

        public Condition {
            operands = List.copyOf(operands);
            comparisons = List.copyOf(comparisons);
        }
    }
}
