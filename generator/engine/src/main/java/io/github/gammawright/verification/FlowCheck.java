package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition.Range;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.IdentityReport.Residual;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;

/**
 * Follows short geodesics by the classes of the acceleration and of the metric and watches what must not change along
 * them: g_ij u^i u^j, and u_k for every coordinate of which the metric is free. Each is followed in 16 and in 32 steps of
 * the classical Runge–Kutta method; an error of the method shrinks from one to the other, a wrong class's does not.
 */
final class FlowCheck {

    private static final int STEPS = 16;
    private static final int TRIES = 4;

    /** What rounding may change, in parts of the terms' size. */
    private static final double ROUNDING = 1e-9;

    private final CheckedKernel metric;
    private final CheckedKernel acceleration;
    private final SampleBox box;
    private final List<Integer> cyclic;
    private final List<String> coordinates;
    private final int n;

    private FlowCheck(
            CheckedKernel metric, CheckedKernel acceleration, ReferenceEvaluator evaluator, List<Integer> cyclic) {
        this.metric = metric;
        this.acceleration = acceleration;
        this.box = new SampleBox(evaluator);
        this.cyclic = cyclic;
        this.coordinates = evaluator.definition().coordinates();
        this.n = coordinates.size();
    }

    /** A check by the classes of the metric and of the acceleration; empty if one of them is missing. */
    static Optional<FlowCheck> of(
            Map<Quantity, CheckedKernel> kernels, ReferenceEvaluator evaluator, List<Integer> cyclic) {
        CheckedKernel metric = kernels.get(Quantity.METRIC);
        CheckedKernel acceleration = kernels.get(Quantity.GEODESIC_ACCELERATION);
        return metric == null || acceleration == null
                ? Optional.empty()
                : Optional.of(new FlowCheck(metric, acceleration, evaluator, cyclic));
    }

    /** The reports: on the square of the velocity, then on each conserved component of the momentum. */
    List<IdentityReport> reports(List<SamplePoint> points) {
        List<Tally> tallies = new ArrayList<>();
        tallies.add(new Tally("conservation of g(u,u)", "g_ij u^i u^j along a geodesic, end − start"));
        for (int k : cyclic) {
            String name = coordinates.get(k);
            tallies.add(new Tally("conservation of u_" + name, "g_kj u^j along a geodesic, end − start, k = " + name));
        }
        for (int p = 0; p < points.size(); p++) {
            if (!points.get(p).isAtEdge()) {
                follow(points.get(p), new Random(7L * p + 1).doubles(n, -1, 1).toArray(), tallies);
            }
        }
        return tallies.stream().map(Tally::report).toList();
    }

    private void follow(SamplePoint point, double[] velocity, List<Tally> tallies) {
        try {
            Object metricObject = metric.construct(point.parameters());
            Object accelerationObject = acceleration.construct(point.parameters());
            double[] start = concat(point.coordinates(), velocity);
            double length = firstLength(start, accelerationObject);
            for (int attempt = 0; attempt < TRIES; attempt++, length /= 4) {
                double[] coarse = integrate(accelerationObject, start, length, STEPS);
                double[] fine = integrate(accelerationObject, start, length, 2 * STEPS);
                if (coarse == null || fine == null) {
                    continue;
                }
                double[][] before = conserved(metricObject, start);
                double[][] middle = conserved(metricObject, coarse);
                double[][] after = conserved(metricObject, fine);
                boolean lastTry = attempt == TRIES - 1;
                if (lastTry || isSettled(before, middle, after)) {
                    for (int c = 0; c < tallies.size(); c++) {
                        tallies.get(c).add(point, before, middle, after, c);
                    }
                    return;
                }
            }
        } catch (Defect defect) {
            // The report of the class itself has it.
            return;
        }
    }

    private static boolean isSettled(double[][] before, double[][] middle, double[][] after) {
        for (int c = 0; c < before[0].length; c++) {
            if (!(Math.abs(after[0][c] - before[0][c]) <= allowed(before, middle, after, c))) {
                return false;
            }
        }
        return true;
    }

    /** What a conserved quantity may change by: rounding, or what a quarter of the coarser change leaves to the method. */
    private static double allowed(double[][] before, double[][] middle, double[][] after, int c) {
        double scale = Math.max(before[1][c], after[1][c]);
        return Math.max(ROUNDING * scale, Math.abs(middle[0][c] - before[0][c]) / 4);
    }

    /** A length along which neither the coordinates nor the velocity change by much. */
    private double firstLength(double[] start, Object object) throws Defect {
        double length = Double.POSITIVE_INFINITY;
        double[] slope = slope(object, start);
        double fastest = 0;
        double strongest = 0;
        for (int i = 0; i < n; i++) {
            Range range = box.coordinate(i);
            double width = Math.max(range.to() - range.from(), 1e-3 * Math.abs(start[i]));
            length = Math.min(length, 0.02 * width / Math.abs(start[n + i]));
            fastest = Math.max(fastest, Math.abs(start[n + i]));
            strongest = Math.max(strongest, Math.abs(slope[n + i]));
        }
        return strongest > 0 ? Math.min(length, 0.05 * fastest / strongest) : length;
    }

    /** The conserved quantities in the first row, the sizes of their terms in the second. */
    private double[][] conserved(Object object, double[] state) throws Defect {
        double[] g = metric.components(object, Arrays.copyOf(state, n));
        double[][] conserved = new double[2][1 + cyclic.size()];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double term = g[i * n + j] * state[n + i] * state[n + j];
                conserved[0][0] += term;
                conserved[1][0] += Math.abs(term);
            }
        }
        for (int c = 0; c < cyclic.size(); c++) {
            for (int j = 0; j < n; j++) {
                double term = g[cyclic.get(c) * n + j] * state[n + j];
                conserved[0][1 + c] += term;
                conserved[1][1 + c] += Math.abs(term);
            }
        }
        return conserved;
    }

    /** The state after a length; null if it leaves the domain on the way. */
    private double[] integrate(Object object, double[] start, double length, int steps) throws Defect {
        double[] y = start;
        double h = length / steps;
        for (int step = 0; step < steps; step++) {
            double[] k1 = slope(object, y);
            double[] k2 = slope(object, plus(y, h / 2, k1));
            double[] k3 = slope(object, plus(y, h / 2, k2));
            double[] k4 = slope(object, plus(y, h, k3));
            y = plus(plus(plus(plus(y, h / 6, k1), h / 3, k2), h / 3, k3), h / 6, k4);
            if (!acceleration.inDomain(object, Arrays.copyOf(y, n))
                    || !Arrays.stream(y).allMatch(Double::isFinite)) {
                return null;
            }
        }
        return y;
    }

    private double[] slope(Object object, double[] y) throws Defect {
        double[] velocity = Arrays.copyOfRange(y, n, 2 * n);
        return concat(velocity, acceleration.components(object, Arrays.copyOf(y, n), velocity));
    }

    private static double[] plus(double[] y, double h, double[] k) {
        double[] sum = y.clone();
        for (int i = 0; i < sum.length; i++) {
            sum[i] += h * k[i];
        }
        return sum;
    }

    private static double[] concat(double[] a, double[] b) {
        double[] both = Arrays.copyOf(a, a.length + b.length);
        System.arraycopy(b, 0, both, a.length, b.length);
        return both;
    }

    private static final class Tally {

        private final String name;
        private final String formula;
        private int points;
        private long violations;
        private double worst;
        private Residual worstViolation;

        Tally(String name, String formula) {
            this.name = name;
            this.formula = formula;
        }

        void add(SamplePoint point, double[][] before, double[][] middle, double[][] after, int c) {
            double change = after[0][c] - before[0][c];
            double allowed = allowed(before, middle, after, c);
            double excess = change == 0 ? 0 : Math.abs(change) / Math.max(allowed, Double.MIN_NORMAL);
            boolean violation = !(excess <= 1);
            points++;
            violations += violation ? 1 : 0;
            if (violation && (worstViolation == null || excess > worst)) {
                worstViolation =
                        new Residual(List.of(), point.parameterList(), point.coordinateList(), change, allowed);
            }
            worst = Math.max(worst, excess);
        }

        IdentityReport report() {
            return new IdentityReport(
                    name, formula, points, points, worst, violations, Optional.ofNullable(worstViolation));
        }
    }
}
