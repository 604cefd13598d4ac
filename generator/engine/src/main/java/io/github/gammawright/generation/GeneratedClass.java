package io.github.gammawright.generation;

import io.github.gammawright.emission.EmittedFunction;
import io.github.gammawright.verification.KernelUnderTest;
import java.util.List;

/**
 * A class as it was emitted.
 *
 * @param specification what was asked for
 * @param source the whole text of the compilation unit, lines ended by a line feed
 * @param functions how it asks for the caller's functions, in the definition's order
 * @param cost what the kernel costs, pass by pass
 */
public record GeneratedClass(
        KernelSpecification specification, String source, List<EmittedFunction> functions, CostReport cost) {

    public GeneratedClass {
        functions = List.copyOf(functions);
    }

    /** The class as a check takes it. */
    public KernelUnderTest underTest() {
        return new KernelUnderTest(
                specification.qualifiedName(),
                source,
                specification.quantities(),
                specification.layout(),
                functions.stream()
                        .map(function -> new KernelUnderTest.RequestedFunction(
                                function.name(), function.method(), function.orders()))
                        .toList());
    }

    /** The path of the source file below a source root, with {@code /} between its parts. */
    public String path() {
        return specification.qualifiedName().replace('.', '/') + ".java";
    }
}
