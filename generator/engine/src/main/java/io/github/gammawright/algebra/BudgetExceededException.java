package io.github.gammawright.algebra;

/** Thrown inside the package when a request has used up its budget; the entry points turn it into an empty answer. */
final class BudgetExceededException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    BudgetExceededException() {
        super("budget exceeded", null, false, false);
    }
}
