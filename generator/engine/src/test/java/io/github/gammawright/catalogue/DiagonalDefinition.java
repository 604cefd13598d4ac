package io.github.gammawright.catalogue;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * A way to have expressions of a definition evaluated by the reference, which evaluates metrics only: as the diagonal of a
 * metric with the same names.
 */
final class DiagonalDefinition {

    private DiagonalDefinition() {}

    /** The definition with the metric diag(expressions), as many as there are coordinates. */
    static MetricDefinition of(MetricDefinition definition, List<Expression> expressions) {
        Expression zero = new Expression.Number(BigFraction.ZERO, SourcePosition.START);
        List<List<Expression>> rows = new ArrayList<>();
        for (int i = 0; i < definition.dimension(); i++) {
            List<Expression> row = new ArrayList<>();
            for (int j = 0; j < i; j++) {
                row.add(zero);
            }
            row.add(expressions.get(i));
            rows.add(row);
        }
        return new MetricDefinition(
                definition.name(),
                definition.title(),
                definition.reference(),
                definition.coordinates(),
                definition.parameters(),
                definition.abbreviations(),
                definition.functions(),
                new MetricForm.Matrix(rows),
                definition.domain(),
                definition.claims(),
                definition.kernels(),
                definition.source());
    }
}
