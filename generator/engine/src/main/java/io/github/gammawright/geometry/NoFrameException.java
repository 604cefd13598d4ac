package io.github.gammawright.geometry;

/** No orthonormal frame was found that serves the whole domain of a metric. */
public final class NoFrameException extends ArithmeticException {

    private static final long serialVersionUID = 1L;

    NoFrameException() {
        super("every direction is null somewhere");
    }
}
