package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import java.util.ArrayList;
import java.util.List;

/**
 * Compares the two halves of a matrix: first as they are written, then, where that says nothing, by their values at
 * random points of the domain. An entry is only refused for a difference that no rounding explains.
 */
final class SymmetryCheck {

    private static final int POINTS = 8;
    private static final int DRAWS = 2_000;
    private static final long MOST_NODES = 20_000_000;
    private static final long SEED = 20260101;

    private SymmetryCheck() {}

    /** Reports each entry that is surely not equal to the one across the diagonal. */
    static void check(List<Pair> pairs, MetricDefinition definition, Diagnostics diagnostics) {
        CanonicalForms forms = new CanonicalForms();
        List<Pair> open = new ArrayList<>();
        for (Pair pair : pairs) {
            if (forms.numberOf(pair.lower()) != forms.numberOf(pair.upper())) {
                open.add(pair);
            }
        }
        if (open.isEmpty()) {
            return;
        }
        EstimatingEvaluator evaluator = new EstimatingEvaluator(definition, SEED);
        long draws = Math.max(
                POINTS,
                Math.min(DRAWS, MOST_NODES / (1 + definition.source().text().length())));
        int points = 0;
        for (long i = 0; i < draws && points < POINTS && !open.isEmpty(); i++) {
            if (evaluator.draw()) {
                points++;
                open.removeIf(pair -> differs(pair, evaluator, diagnostics));
            }
        }
    }

    private static boolean differs(Pair pair, EstimatingEvaluator evaluator, Diagnostics diagnostics) {
        if (!evaluator.value(pair.lower()).surelyDiffersFrom(evaluator.value(pair.upper()))) {
            return false;
        }
        diagnostics.report(
                DiagnosticCode.MATRIX_ASYMMETRIC,
                Expressions.start(pair.lower()),
                pair.row(),
                pair.column(),
                Expressions.start(pair.upper()).line());
        return true;
    }

    /**
     * The two entries that should be equal.
     *
     * @param lower g_ij with i &gt; j
     * @param upper g_ji
     * @param row the coordinate of index i
     * @param column that of index j
     */
    record Pair(Expression lower, Expression upper, String row, String column) {}
}
