package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.HashMap;
import java.util.Map;
import java.util.function.IntFunction;

/** The names of a program's values in the emitted class: one for each value, whatever method it occurs in. */
final class ValueNames {

    private final StraightLineProgram program;
    private final KernelNames kernel;
    private final Map<Integer, String> variables = new HashMap<>();
    private final Map<Integer, String> given = new HashMap<>();
    private final TemporaryNames temporaries;

    /**
     * Names what is loaded.
     *
     * @param components names of values that are components of the result
     */
    ValueNames(StraightLineProgram program, KernelNames kernel, Map<Integer, String> components) {
        this.program = program;
        this.kernel = kernel;
        this.temporaries = new TemporaryNames(program, kernel.allocator(), this::known, components);
        Map<Symbol, String> derivatives = new HashMap<>();
        for (int i = 0; i < program.size(); i++) {
            if (program.instruction(i) instanceof Instruction.Load load) {
                Symbol symbol = load.symbol();
                String name = kernel.symbol(symbol);
                if (name == null) {
                    name = derivatives.computeIfAbsent(
                            symbol, s -> kernel.allocator().allocate(kernel.wantedDerivative(s)));
                }
                given.put(i, name);
            }
        }
    }

    /** Says by what text a value is at hand in every method. */
    void give(int number, String text) {
        given.put(number, text);
    }

    /** The name of a value that is loaded or kept, null for all others. */
    String given(int number) {
        return given.get(number);
    }

    boolean isGiven(int number) {
        return given.containsKey(number);
    }

    /** The name of a value as a variable; the first call chooses it. */
    String variable(int number) {
        String name = variables.get(number);
        if (name == null) {
            name = temporaries.allocate(number);
            variables.put(number, name);
        }
        return name;
    }

    private String known(int number) {
        String name = given.get(number);
        return name != null ? name : variables.get(number);
    }

    /**
     * Names for the variables of one method alone: the author's as ever, all others counted anew. A class keeps a
     * constant for each name of a variable, so that large ones cannot afford a name for each value.
     */
    IntFunction<String> ofOneMethod() {
        NameAllocator allocator = kernel.allocator().copy();
        Map<Integer, String> names = new HashMap<>();
        return number -> program.names().containsKey(number)
                ? variable(number)
                : names.computeIfAbsent(number, n -> allocator.next("t"));
    }

    /** A printer for a body with the given variables. */
    JavaExpressions printer(Inlining inlining, JavaExpressions.FunctionCalls functions) {
        return printer(inlining, this::variable, functions);
    }

    /** A printer for a body with the given variables, which have names of their own. */
    JavaExpressions printer(Inlining inlining, IntFunction<String> variables, JavaExpressions.FunctionCalls functions) {
        IntFunction<String> names =
                i -> isGiven(i) ? given(i) : inlining.variables().get(i) ? variables.apply(i) : null;
        return new JavaExpressions(program, names, functions);
    }
}
