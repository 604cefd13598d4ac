package io.github.gammawright.generation;

import io.github.gammawright.definition.Expressions;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.geometry.DegenerateMetricException;
import io.github.gammawright.geometry.NoFrameException;
import io.github.gammawright.geometry.UndefinedValueException;
import java.util.function.Supplier;

/** Reports what is wrong with a definition and shows only when its metric is built. */
final class MetricMistakes {

    private MetricMistakes() {}

    /** Does the work, and turns what its metric does not allow into a message that points into the definition. */
    static <T> T reported(MetricDefinition definition, Supplier<T> work) {
        Diagnostics diagnostics = new Diagnostics(definition.source());
        try {
            return work.get();
        } catch (UndefinedValueException e) {
            diagnostics.report(DiagnosticCode.DIVISION_BY_ZERO, e.position());
        } catch (DegenerateMetricException e) {
            diagnostics.report(
                    DiagnosticCode.METRIC_DEGENERATE, position(definition.form()), "the determinant of the metric");
        } catch (NoFrameException e) {
            diagnostics.report(DiagnosticCode.METRIC_WITHOUT_FRAME, position(definition.form()));
        }
        diagnostics.throwIfAny();
        throw new IllegalStateException("a mistake without a message");
    }

    /** Where the metric is written. */
    static SourcePosition position(MetricForm form) {
        if (form instanceof MetricForm.LineElement lineElement) {
            return Expressions.start(lineElement.expression());
        }
        if (form instanceof MetricForm.Matrix matrix) {
            return Expressions.start(matrix.rows().get(0).get(0));
        }
        if (form instanceof MetricForm.ThreePlusOne split) {
            return Expressions.start(split.spatialLineElement());
        }
        return Expressions.start(((MetricForm.Coframe) form).oneForms().get(0));
    }
}
