package io.github.gammawright.diagnostic;

import java.util.List;
import java.util.stream.Collectors;

/** A definition can't be used; carries everything that was found wrong with it. The message is for its author. */
public final class DefinitionException extends RuntimeException {

    private final transient List<Diagnostic> diagnostics;

    /**
     * Says what is wrong.
     *
     * @param diagnostics at least one, in the order in which they are to be shown
     * @throws IllegalArgumentException if there is none
     */
    public DefinitionException(List<Diagnostic> diagnostics) {
        super(diagnostics.stream().map(Diagnostic::render).collect(Collectors.joining("\n")));
        if (diagnostics.isEmpty()) {
            throw new IllegalArgumentException("an exception without a diagnostic says nothing");
        }
        this.diagnostics = List.copyOf(diagnostics);
    }

    /** One mistake alone. */
    public DefinitionException(Diagnostic diagnostic) {
        this(List.of(diagnostic));
    }

    /** What is wrong, in the order in which it is to be shown; never empty. */
    public List<Diagnostic> diagnostics() {
        return diagnostics;
    }
}
