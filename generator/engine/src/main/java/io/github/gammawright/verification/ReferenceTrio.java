package io.github.gammawright.verification;

import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferencePoint;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.List;

/**
 * The reference in several precisions: the one that is compared with; two finer ones that tell small values from rounding
 * where they should be zero; and that of doubles, which tells how much noise a zero may have in a kernel. All but the
 * first work only where they are needed.
 */
final class ReferenceTrio {

    private static final int MORE_DIGITS = 30;

    /** Two precisions agree on a value to better than this part of it, and on rounding never. */
    private static final double AGREES = 0.1;

    private final ReferenceEvaluator evaluator;
    private final ReferenceEvaluator finer;
    private final ReferenceEvaluator finest;
    private final ReferenceEvaluator plain;
    private ReferencePoint at;

    ReferenceTrio(ReferenceEvaluator evaluator) {
        this.evaluator = evaluator;
        this.finer = evaluator.finer(MORE_DIGITS);
        this.finest = evaluator.finer(2 * MORE_DIGITS);
        this.plain = ReferenceEvaluator.inDoublePrecision(evaluator.definition());
    }

    /** Goes to another point. */
    void moveTo(SamplePoint point) {
        at = evaluator.at(point.parameters(), point.coordinates());
    }

    /** Values and limits at the current point, with zeros in place of what is but rounding. */
    ReferencePoint.Conditioned conditioned(ReferenceQuantity quantity, SamplePoint point, double[][] inputs) {
        ReferencePoint.Conditioned conditioned = at.conditioned(quantity, inputs);
        double small = Math.pow(10, -evaluator.digits() / 2.0) * Math.max(1, largest(conditioned.values()));
        List<Integer> suspects = new ArrayList<>();
        for (int i = 0; i < conditioned.values().size(); i++) {
            Real value = conditioned.values().get(i);
            if (value.signum() != 0 && Math.abs(value.toDouble()) < small) {
                suspects.add(i);
            }
        }
        if (suspects.isEmpty()) {
            return conditioned;
        }
        List<Real> again = finer.at(point.parameters(), point.coordinates()).values(quantity, inputs);
        List<Real> values = new ArrayList<>(conditioned.values());
        List<Real> limits = new ArrayList<>(conditioned.limits());
        List<Real> decisive = null;
        for (int i : suspects) {
            if (agree(values.get(i), again.get(i))) {
                continue;
            }
            // What is all rounding in one precision can still be a value in the next ones, or rounding again.
            if (decisive == null) {
                decisive = finest.at(point.parameters(), point.coordinates()).values(quantity, inputs);
            }
            if (agree(again.get(i), decisive.get(i))) {
                values.set(i, decisive.get(i));
            } else {
                values.set(i, Real.ZERO);
                limits.set(i, Real.ZERO);
            }
        }
        return new ReferencePoint.Conditioned(List.copyOf(values), List.copyOf(limits));
    }

    private static boolean agree(Real coarse, Real fine) {
        double value = coarse.toDouble();
        return Math.abs(fine.toDouble() - value) <= AGREES * Math.abs(value);
    }

    /** The greatest error that a plain evaluation in doubles makes in a component. */
    double noise(ReferenceQuantity quantity, SamplePoint point, double[][] inputs) {
        List<Real> plainly = plain.at(point.parameters(), point.coordinates()).values(quantity, inputs);
        List<Real> exactly = at.values(quantity, inputs);
        double noise = 0;
        for (int i = 0; i < plainly.size(); i++) {
            double error = exactly.get(i).distanceTo(plainly.get(i).toDouble());
            noise = Double.isFinite(error) ? Math.max(noise, error) : noise;
        }
        return noise;
    }

    /** The greatest absolute value that is a finite double. */
    static double largest(List<Real> values) {
        double largest = 0;
        for (Real value : values) {
            double size = Math.abs(value.toDouble());
            largest = Double.isFinite(size) ? Math.max(largest, size) : largest;
        }
        return largest;
    }
}
