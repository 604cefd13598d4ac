package io.github.gammawright.verification;

import io.github.gammawright.verification.SlotMap.Entry;
import io.github.gammawright.verification.reference.Real;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Collects the errors of one quantity over all points and judges each. */
final class ErrorStatistics {

    /** A component counts from this part of the largest one on. */
    private static final double SMALL = 1e-3;

    /** What an identically vanishing component may come out as, in parts of the largest one. */
    private static final double NOISE = 1e-14;

    /** A relative bound does not hold against errors of so small a part of the multiple of the limit. */
    private static final double NATURE = 1e-2;

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
     * @param expected all components, row-major
     * @param bounds their conditioning limits
     * @param result the kernel's array
     */
    void add(
            SlotMap map,
            List<Real> expected,
            List<Real> bounds,
            double[] result,
            SamplePoint point,
            List<List<Double>> inputs) {
        double largest = 0;
        for (Real component : expected) {
            double size = Math.abs(component.toDouble());
            largest = Double.isFinite(size) ? Math.max(largest, size) : largest;
        }
        // What is this small beside the rest is zero but for the reference's own rounding.
        double nothing = largest * Math.pow(10, 10.0 - settings.digits());
        for (Entry entry : map.entries()) {
            Real component = expected.get(entry.component());
            double value = component.toDouble();
            if (!Double.isFinite(value)) {
                undefined++;
                continue;
            }
            compared++;
            double actual = entry.slot() < 0 ? 0 : result[entry.slot()];
            boolean zero = Math.abs(value) <= nothing;
            double error = zero ? Math.abs(actual) : component.distanceTo(actual);
            double limit = zero ? 0 : bounds.get(entry.component()).toDouble();
            judge(entry, zero ? 0 : value, actual, error, limit, largest, point, inputs);
        }
    }

    private void judge(
            Entry entry,
            double value,
            double actual,
            double error,
            double limit,
            double largest,
            SamplePoint point,
            List<List<Double>> inputs) {
        double inUlps = error == 0 ? 0 : value == 0 ? Double.POSITIVE_INFINITY : error / Math.ulp(value);
        double inLimits = error == 0 ? 0 : error / limit;
        double excess;
        if (!Double.isFinite(actual)) {
            excess = Double.POSITIVE_INFINITY;
        } else if (value == 0) {
            worstZero = Math.max(worstZero, error == 0 ? 0 : error / largest);
            excess = error == 0 ? 0 : error / (NOISE * largest);
        } else {
            excess = excess(error, Math.abs(value), limit, largest);
        }
        boolean violation = !(excess <= 1);
        violations += violation ? 1 : 0;
        if (value != 0) {
            ulps.add(inUlps);
            limits.add(inLimits);
        }
        boolean newUlps = value != 0 && (worstUlps == null || inUlps > worstUlps.ulps());
        boolean newLimits = value != 0 && (worstLimits == null || inLimits > worstLimits.limits());
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

    /** The error in units of what is allowed. */
    private double excess(double error, double size, double limit, double largest) {
        double allowedByLimit = settings.limitMultiple() * limit;
        double relative = settings.relativeBound() * (size + SMALL * largest);
        // Below the normal doubles nothing can be asked for.
        double allowed = Math.min(Math.max(relative, NATURE * allowedByLimit), allowedByLimit);
        return error / Math.max(allowed, Double.MIN_NORMAL);
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
