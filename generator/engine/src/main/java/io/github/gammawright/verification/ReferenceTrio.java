package io.github.gammawright.verification;

import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferencePoint;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.List;

/**
 * The reference in three precisions: the one that is compared with; a finer one that tells small values from rounding
 * where they should be zero; and that of doubles, which tells how much noise a zero may have in a kernel. The last two
 * work only where they are needed.
 */
final class ReferenceTrio {

    private static final int MORE_DIGITS = 30;

    /** Rounding shrinks by 30 digits in the finer precision, a value does not shrink. */
    private static final double SHRINKS = 1e-10;

    private final ReferenceEvaluator evaluator;
    private final ReferenceEvaluator finer;
    private final ReferenceEvaluator plain;
    private ReferencePoint at;

    ReferenceTrio(ReferenceEvaluator evaluator) {
        this.evaluator = evaluator;
        this.finer = evaluator.finer(MORE_DIGITS);
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
        for (int i : suspects) {
            if (Math.abs(again.get(i).toDouble())
                    <= SHRINKS * Math.abs(values.get(i).toDouble())) {
                values.set(i, Real.ZERO);
                limits.set(i, Real.ZERO);
            }
        }
        return new ReferencePoint.Conditioned(List.copyOf(values), List.copyOf(limits));
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
