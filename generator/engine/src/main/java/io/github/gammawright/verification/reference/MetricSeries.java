package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.Arrays;
import java.util.List;

/** Turns a definition at a point into the power series of its metric. */
final class MetricSeries {

    private final MetricDefinition definition;
    private final TaylorRing ring;
    private final ExpressionEvaluator evaluator;

    /**
     * Evaluates all that the definition names.
     *
     * @param coordinates the series of the coordinates, in index order
     * @param parameters the series of the parameters, in declared order
     */
    MetricSeries(MetricDefinition definition, TaylorRing ring, Taylor[] coordinates, Taylor[] parameters) {
        this.definition = definition;
        this.ring = ring;
        int n = definition.dimension();
        ExpressionEvaluator base = new ExpressionEvaluator(ring, n);
        for (int i = 0; i < n; i++) {
            base.define(definition.coordinates().get(i), coordinates[i]);
        }
        for (int i = 0; i < parameters.length; i++) {
            base.define(definition.parameters().get(i).name(), parameters[i]);
        }
        evaluator = base.copy();
        for (MetricDefinition.CallerFunction function : definition.functions()) {
            // Without a sample there is nothing to evaluate: undefined, and all that uses it.
            Taylor value = function.sample().map(base::scalar).orElseGet(ring::undefined);
            evaluator.define(function.name(), value);
        }
        for (int i = 0; i < n; i++) {
            evaluator.define("d" + definition.coordinates().get(i), DifferentialPolynomial.differential(n, i, ring));
        }
        for (MetricDefinition.Abbreviation abbreviation : definition.abbreviations()) {
            evaluator.define(abbreviation.name(), evaluator.evaluate(abbreviation.expression()));
        }
    }

    /** The series of an expression of the definition without differentials. */
    Taylor scalar(Expression expression) {
        return evaluator.scalar(expression);
    }

    /** The series of a caller's function. */
    Taylor function(String name) {
        return evaluator.scalar(new Expression.Name(name, SourcePosition.START));
    }

    /** g_ij. */
    Taylor[][] metric() {
        MetricForm form = definition.form();
        if (form instanceof MetricForm.LineElement lineElement) {
            return evaluator.evaluate(lineElement.expression()).asQuadraticForm();
        }
        if (form instanceof MetricForm.Matrix matrix) {
            return matrix(matrix.rows());
        }
        if (form instanceof MetricForm.ThreePlusOne threePlusOne) {
            return threePlusOne(threePlusOne);
        }
        return coframe((MetricForm.Coframe) form);
    }

    private Taylor[][] matrix(List<List<Expression>> rows) {
        int n = definition.dimension();
        Taylor[][] metric = new Taylor[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                metric[i][j] = scalar(rows.get(i).get(j));
                metric[j][i] = metric[i][j];
            }
        }
        return metric;
    }

    /** g_tt = −α² + γ_ij β^i β^j, g_ti = γ_ij β^j, g_ij = γ_ij (Arnowitt, Deser &amp; Misner 1962). */
    private Taylor[][] threePlusOne(MetricForm.ThreePlusOne form) {
        int n = definition.dimension();
        Taylor[][] metric = n == 1
                ? new Taylor[1][1]
                : evaluator.evaluate(form.spatialLineElement()).asQuadraticForm();
        Taylor lapse = scalar(form.lapse());
        Taylor[] shift = form.shift().stream().map(this::scalar).toArray(Taylor[]::new);
        metric[0][0] = lapse.times(lapse).negate();
        for (int i = 1; i < n; i++) {
            Taylor lowered = ring.zero();
            for (int j = 1; j < n; j++) {
                lowered = lowered.plus(metric[i][j].times(shift[j - 1]));
            }
            metric[0][i] = lowered;
            metric[i][0] = lowered;
            metric[0][0] = metric[0][0].plus(lowered.times(shift[i - 1]));
        }
        return metric;
    }

    /** ω^a_i; a, i. */
    Taylor[][] oneForms(MetricForm.Coframe form) {
        return form.oneForms().stream()
                .map(oneForm -> evaluator.evaluate(oneForm).asLinearForm())
                .toArray(Taylor[][]::new);
    }

    private Taylor[][] coframe(MetricForm.Coframe form) {
        int n = definition.dimension();
        Taylor[][] metric = new Taylor[n][n];
        for (Taylor[] row : metric) {
            Arrays.fill(row, ring.zero());
        }
        for (int a = 0; a < form.oneForms().size(); a++) {
            Taylor[] oneForm = evaluator.evaluate(form.oneForms().get(a)).asLinearForm();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    Taylor term = oneForm[i].times(oneForm[j]);
                    metric[i][j] = form.signs().get(a) < 0 ? metric[i][j].minus(term) : metric[i][j].plus(term);
                }
            }
        }
        return metric;
    }
}
