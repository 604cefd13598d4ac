package io.github.gammawright.emission;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.graph.Instruction;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/**
 * Refuses kernels that no class file can hold: its constant pool has at most 65,535 entries, its methods at most 255
 * words of arguments (Lindholm et al., The Java Virtual Machine Specification, Java SE 17, section 4.11).
 */
final class ClassFileLimits {

    private static final int MOST_CONSTANTS = 60_000;
    private static final int MOST_ARGUMENT_WORDS = 250;
    /** Name, descriptor, and the two entries by which a method or field is referred to. */
    private static final int MEMBER = 4;
    /** Numbers beyond this are constants of their own. */
    private static final int LARGEST_SHORT = Short.MAX_VALUE;

    private final EmissionContext context;

    ClassFileLimits(EmissionContext context) {
        this.context = context;
    }

    /**
     * Checks a class after all its methods are written.
     *
     * @throws DefinitionException if it is too large
     */
    void check() {
        int parameters = context.names().parameters().size();
        if (2 * parameters > MOST_ARGUMENT_WORDS) {
            throw refusal(parameters + " parameters", "Give constants of the metric names in [abbreviations] instead.");
        }
        int constants = constants();
        if (constants > MOST_CONSTANTS) {
            throw refusal(
                    "about " + constants + " constants",
                    "Ask for a smaller quantity (" + smaller() + "), or for the layout non-zero.");
        }
    }

    private int constants() {
        Set<BigFraction> numbers = new HashSet<>();
        for (Instruction instruction : context.program().instructions()) {
            if (instruction instanceof Instruction.Constant constant) {
                numbers.add(constant.value());
            }
        }
        int constants = 500 + 2 * numbers.size();
        constants += MEMBER * (context.privateMethods().size() + context.kept().cardinality() + 2 * parameters());
        constants += Math.min(context.program().size(), PartMethods.MOST_NAMES);
        constants += context.program().names().size();
        for (int r = 0; r < context.model().results().size(); r++) {
            constants += Math.max(0, context.length(r) - LARGEST_SHORT);
        }
        return constants;
    }

    private int parameters() {
        return context.names().parameters().size();
    }

    /** What costs less than what was asked for. */
    private String smaller() {
        List<String> smaller = new ArrayList<>(List.of("christoffel", "geodesic-acceleration", "hamiltonian-flow"));
        for (KernelModel.Result result : context.model().results()) {
            String symbol = result.quantity().symbol();
            smaller.remove(symbol);
            if (symbol.equals("riemann") || symbol.equals("weyl")) {
                smaller.addAll(0, List.of("geodesic-deviation", "ricci", "kretschmann"));
            }
        }
        return String.join(", ", smaller.stream().distinct().toList());
    }

    private DefinitionException refusal(String what, String remedy) {
        DiagnosticCode code = DiagnosticCode.KERNEL_TOO_LARGE;
        return new DefinitionException(new Diagnostic(
                code,
                context.model().definition().source(),
                SourcePosition.START,
                code.message(context.model().className(), what),
                remedy));
    }
}
