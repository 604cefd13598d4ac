package io.github.gammawright.verification;

import io.github.gammawright.verification.SlotMap.Entry;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferencePoint;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleSupplier;

/** Collects the errors of one quantity over all points and judges each. */
final class ErrorStatistics {

    private final String quantity;
    private final CheckSettings settings;
    private final int firstIndex;
    private final Samples ulps = new Samples();
    private final Samples limits = new Samples();

    private long compared;
    private long undefined;
    private long violations;
    private double worstZero;
    private Deviation worstUlps;
    private Deviation worstLimits;
    private Deviation worstViolation;
    private double worstExcess;

    ErrorStatistics(String quantity, CheckSettings settings, int firstIndex) {
        this.quantity = quantity;
        this.settings = settings;
        this.firstIndex = firstIndex;
    }

    /**
     * Takes in all components at one point.
     *
     * @param expected all components with their limits, row-major
     * @param result the kernel's array
     * @param noise the greatest error of a plain evaluation in doubles there; asked for when a zero came out as
     *     something else
     */
    void add(
            SlotMap map,
            ReferencePoint.Conditioned expected,
            double[] result,
            DoubleSupplier noise,
            SamplePoint point,
            List<List<Double>> inputs) {
        double largest = ReferenceTrio.largest(expected.values());
        Judge judge = new Judge(settings, largest, noise);
        for (Entry entry : map.entries()) {
            Real component = expected.values().get(entry.component());
            double value = component.toDouble();
            if (!Double.isFinite(value)) {
                undefined++;
                continue;
            }
            double actual = entry.slot() < 0 ? 0 : result[entry.slot()];
            double error = component.distanceTo(actual);
            double limit = expected.limits().get(entry.component()).toDouble();
            double excess = judge.excess(component.isZero(), Math.abs(value), actual, error, limit);
            compared++;
            if (component.isZero()) {
                worstZero = Math.max(worstZero, error == 0 ? 0 : error / largest);
            }
            note(entry, component.isZero(), value, actual, error, limit, excess, point, inputs);
        }
    }

    private void note(
            Entry entry,
            boolean zero,
            double value,
            double actual,
            double error,
            double limit,
            double excess,
            SamplePoint point,
            List<List<Double>> inputs) {
        double inUlps = error == 0 ? 0 : zero ? Double.POSITIVE_INFINITY : error / Math.ulp(value);
        double inLimits = error == 0 ? 0 : error / limit;
        boolean violation = !(excess <= 1);
        violations += violation ? 1 : 0;
        if (!zero) {
            ulps.add(inUlps);
            limits.add(inLimits);
        }
        boolean newUlps = !zero && (worstUlps == null || inUlps > worstUlps.ulps());
        boolean newLimits = !zero && (worstLimits == null || inLimits > worstLimits.limits());
        boolean newViolation = violation && (worstViolation == null || excess > worstExcess);
        if (newUlps || newLimits || newViolation) {
            List<Integer> indices =
                    entry.indices().stream().map(i -> i + firstIndex).toList();
            Deviation deviation = new Deviation(
                    indices, point.parameterList(), point.coordinateList(), inputs, value, actual, inUlps, inLimits);
            worstUlps = newUlps ? deviation : worstUlps;
            worstLimits = newLimits ? deviation : worstLimits;
            if (newViolation) {
                worstViolation = deviation;
                worstExcess = excess;
            }
        }
    }

    QuantityReport report() {
        return new QuantityReport(
                quantity,
                compared,
                undefined,
                ulps.median(),
                Optional.ofNullable(worstUlps),
                limits.median(),
                Optional.ofNullable(worstLimits),
                worstZero,
                violations,
                Optional.ofNullable(worstViolation));
    }

    /** Numbers of which the median is wanted. */
    private static final class Samples {

        private double[] values = new double[1024];
        private int size;

        void add(double value) {
            if (size == values.length) {
                values = Arrays.copyOf(values, 2 * size);
            }
            values[size++] = value;
        }

        double median() {
            if (size == 0) {
                return Double.NaN;
            }
            double[] sorted = Arrays.copyOf(values, size);
            Arrays.sort(sorted);
            return sorted[size / 2];
        }
    }
}
