package io.github.gammawright.runtime;

import java.util.Arrays;
import java.util.Locale;
import java.util.Objects;

/**
 * Makes velocities timelike, null or spacelike of unit length, g_ij u^i u^j = ∓1, 0 or ±1.
 *
 * <p>Give each thread its own, with a metric tensor of its own.
 */
public final class Normalization {

    private final MetricTensor metric;
    private final Signature signature;

    /**
     * Takes the metric and its sign convention.
     *
     * @param metric the metric, with the time as its first coordinate where {@link #solveTimeComponent} is used
     * @param signature which sign the square of a timelike velocity has in it
     */
    public Normalization(MetricTensor metric, Signature signature) {
        this.metric = Objects.requireNonNull(metric, "metric");
        this.signature = Objects.requireNonNull(signature, "signature");
    }

    /**
     * Finds the time component that goes with given components in space.
     *
     * @param point the coordinates; only read
     * @param velocity the components u^k; entry 0 is written and not read, the others are only read
     * @param causality what the velocity shall be
     * @param root which of the two solutions; where g_00 = 0 there is one, and both roots give it
     * @throws NormalizationException if no time component makes such a velocity; the velocity is then as it was
     * @throws IllegalArgumentException if an array has not one entry for each coordinate
     */
    public void solveTimeComponent(double[] point, double[] velocity, Causality causality, Root root) {
        metric.requireLength(velocity);
        double[] g = metric.componentsAt(point);
        int n = metric.dimension();
        // The square is a (u^0)² + 2 b u^0 + c + its wanted value.
        double a = g[0];
        double b = 0;
        double c = -signature.square(causality);
        for (int i = 1; i < n; i++) {
            b += g[i] * velocity[i];
            for (int j = 1; j < n; j++) {
                c += g[i * n + j] * velocity[i] * velocity[j];
            }
        }
        double solution = QuadraticRoots.solve(a, b, c, root);
        if (!Double.isFinite(solution)) {
            throw new NormalizationException("at " + Arrays.toString(point) + " no time component makes the velocity "
                    + name(causality) + " with the components " + Arrays.toString(Arrays.copyOfRange(velocity, 1, n))
                    + " in space");
        }
        velocity[0] = solution;
    }

    /**
     * Scales a velocity to unit length, keeping its direction.
     *
     * @param point the coordinates; only read
     * @param velocity the components u^k; scaled in place
     * @param causality what the velocity is, timelike or spacelike
     * @throws NormalizationException if the velocity is not of that kind; it is then as it was
     * @throws IllegalArgumentException if null is asked for, since no factor makes a velocity null; or if an array has not
     *     one entry for each coordinate
     */
    public void rescale(double[] point, double[] velocity, Causality causality) {
        if (causality == Causality.NULL) {
            throw new IllegalArgumentException("no factor makes a velocity null: solve for the time component instead");
        }
        double square = metric.square(point, velocity);
        double factor = 1 / Math.sqrt(square * signature.square(causality));
        if (!(factor > 0) || !Double.isFinite(factor)) {
            throw new NormalizationException("at " + Arrays.toString(point) + " the velocity "
                    + Arrays.toString(velocity) + " is not " + name(causality) + ": its square is " + square);
        }
        for (int i = 0; i < velocity.length; i++) {
            velocity[i] *= factor;
        }
    }

    private static String name(Causality causality) {
        return causality.name().toLowerCase(Locale.ROOT);
    }
}
