package io.github.gammawright.geometry;

/** The determinant of a metric vanishes identically, so that it has no inverse. */
public final class DegenerateMetricException extends ArithmeticException {

    private static final long serialVersionUID = 1L;

    DegenerateMetricException() {
        super("the determinant of the metric vanishes");
    }
}
