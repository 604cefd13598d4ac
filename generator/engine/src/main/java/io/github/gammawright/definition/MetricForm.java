package io.github.gammawright.definition;

import java.util.List;

/** The form in which a definition gives its metric. */
public sealed interface MetricForm {

    /** A quadratic form in the differentials {@code d} + coordinate. */
    record LineElement(Expression expression) implements MetricForm {}

    /** The components g_ij; {@code rows.get(i)} holds the entries j = 0 … i of the lower triangle. */
    record Matrix(List<List<Expression>> rows) implements MetricForm {

        public Matrix {
            rows = rows.stream().map(List::copyOf).toList();
        }
    }

    /**
     * ds² = −α²dt² + γ_ij (dx^i + β^i dt)(dx^j + β^j dt), t the first coordinate.
     *
     * @param lapse α
     * @param shift the contravariant β^i, one for each coordinate but the first
     * @param spatialLineElement γ as a quadratic form in the differentials of the coordinates but the first
     */
    record ThreePlusOne(Expression lapse, List<Expression> shift, Expression spatialLineElement) implements MetricForm {

        public ThreePlusOne {
            shift = List.copyOf(shift);
        }
    }

    /**
     * One-forms, linear in the differentials, whose signed squares add up to the metric.
     *
     * @param oneForms as many as there are coordinates
     * @param signs +1 or −1 for each of them
     */
    record Coframe(List<Expression> oneForms, List<Integer> signs) implements MetricForm {

        public Coframe {
            oneForms = List.copyOf(oneForms);
            signs = List.copyOf(signs);
        }
    }
}
