package io.github.gammawright.generation;

/**
 * A class as it was emitted.
 *
 * @param specification what was asked for
 * @param source the whole text of the compilation unit, lines ended by a line feed
 * @param cost what the kernel costs, pass by pass
 */
public record GeneratedClass(KernelSpecification specification, String source, CostReport cost) {

    /** The path of the source file below a source root, with {@code /} between its parts. */
    public String path() {
        return specification.qualifiedName().replace('.', '/') + ".java";
    }
}
