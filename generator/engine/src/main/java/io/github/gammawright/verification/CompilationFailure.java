package io.github.gammawright.verification;

import java.util.List;

/** A generated source text could not be compiled: there is no compiler, or the text is wrong, which is our own fault. */
public final class CompilationFailure extends RuntimeException {

    private final List<String> errors;

    CompilationFailure(String message, List<String> errors) {
        super(errors.isEmpty() ? message : message + ": " + errors.get(0));
        this.errors = List.copyOf(errors);
    }

    /** All that the compiler said, with line numbers; empty when there is no compiler. */
    public List<String> errors() {
        return errors;
    }
}
