package io.github.gammawright.runtime.chart;

/** Says that a point or a vector has no components in the other chart. */
public final class ChartException extends IllegalArgumentException {

    private static final long serialVersionUID = 1L;

    ChartException(String message) {
        super(message);
    }
}
