package io.github.gammawright.geometry;

import io.github.gammawright.diagnostic.SourcePosition;

/** An expression of a definition has no value anywhere, such as a quotient by what is identically zero. */
public final class UndefinedValueException extends ArithmeticException {

    private static final long serialVersionUID = 1L;

    private final transient SourcePosition position;

    UndefinedValueException(String message, SourcePosition position, ArithmeticException cause) {
        super(message);
        initCause(cause);
        this.position = position;
    }

    /** Where in the definition the value arises. */
    public SourcePosition position() {
        return position;
    }
}
