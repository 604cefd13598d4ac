package io.github.gammawright.runtime;

/** Says that no velocity of the wanted kind has the given components. */
public final class NormalizationException extends IllegalArgumentException {

    private static final long serialVersionUID = 1L;

    /** Takes the text that says where, and what is wrong. */
    public NormalizationException(String message) {
        super(message);
    }
}
