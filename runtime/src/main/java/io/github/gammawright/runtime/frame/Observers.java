package io.github.gammawright.runtime.frame;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.NormalizationException;
import io.github.gammawright.runtime.Signature;
import java.util.Arrays;
import java.util.Objects;

/**
 * Velocities of observers and their frames, by Gram and Schmidt's method in the metric. The first coordinate is the time.
 *
 * <p>Give each thread its own, with a metric tensor of its own.
 */
public final class Observers {

    private final MetricTensor metric;
    private final Signature signature;
    private final Normalization normalization;

    /**
     * Takes the metric and its sign convention.
     *
     * @param metric the metric, of at least two dimensions
     * @param signature which sign the square of a timelike vector has in it
     */
    public Observers(MetricTensor metric, Signature signature) {
        this.metric = Objects.requireNonNull(metric, "metric");
        this.signature = Objects.requireNonNull(signature, "signature");
        this.normalization = new Normalization(metric, signature);
    }

    /**
     * The velocity of an observer whose coordinates but for the time stay: u^i ∝ (1, 0, 0, …).
     *
     * @param point the coordinates; only read
     * @return u^i, a new array
     * @throws NormalizationException where ∂/∂x^0 is not timelike, as inside an ergosphere
     */
    public double[] staticVelocity(double[] point) {
        double[] velocity = new double[metric.dimension()];
        velocity[0] = 1;
        try {
            normalization.rescale(point, velocity, Causality.TIMELIKE);
        } catch (NormalizationException cause) {
            throw new NormalizationException("at " + Arrays.toString(point)
                    + " nothing can be at rest, since the direction of x^0 is not timelike there: take an observer of zero"
                    + " angular momentum");
        }
        return velocity;
    }

    /**
     * The velocity of the observer at rest in the slices x^0 = constant: u_i ∝ (∓1, 0, 0, …), to the future. In Kerr's
     * metric in Boyer–Lindquist coordinates it has zero angular momentum (Bardeen, Press &amp; Teukolsky 1972, Astrophys.
     * J. 178, 347; from memory).
     *
     * @param point the coordinates; only read
     * @return u^i, a new array
     * @throws NormalizationException where x^0 = constant is not spacelike, as inside a horizon
     */
    public double[] zeroAngularMomentumVelocity(double[] point) {
        double[] velocity = new double[metric.dimension()];
        velocity[0] = signature == Signature.MOSTLY_PLUS ? -1 : 1;
        metric.raise(point, velocity, velocity);
        normalization.rescale(point, velocity, Causality.TIMELIKE);
        return velocity;
    }

    /**
     * The orthonormal frame of an observer: e_0 is the velocity, e_1 the first seed without its part along e_0, and so
     * on. The last vector is turned round where the handedness asks for it.
     *
     * @param point the coordinates; only read
     * @param velocity a timelike vector there, of any length; only read
     * @param handedness the orientation of e_0, e_1, … against the coordinates
     * @param seeds n − 1 vectors that are linearly independent together with the velocity; only read
     * @throws NormalizationException if the velocity is not timelike
     * @throws IllegalArgumentException if there are not n − 1 seeds or they are not independent
     */
    public OrthonormalFrame frame(double[] point, double[] velocity, Handedness handedness, double[]... seeds) {
        int n = metric.dimension();
        if (seeds.length != n - 1) {
            throw new IllegalArgumentException(
                    "a frame needs " + (n - 1) + " vectors besides the velocity, not " + seeds.length);
        }
        double[][] e = new double[n][];
        e[0] = velocity.clone();
        normalization.rescale(point, e[0], Causality.TIMELIKE);
        for (int a = 1; a < n; a++) {
            e[a] = seeds[a - 1].clone();
            // Twice is enough to make them orthogonal to the last digit (Kahan and Parlett; Parlett 1980).
            removeParts(point, e, a);
            removeParts(point, e, a);
            try {
                normalization.rescale(point, e[a], Causality.SPACELIKE);
            } catch (NormalizationException cause) {
                throw dependent(a, seeds);
            }
            if (Arrays.stream(e[a]).anyMatch(value -> !Double.isFinite(value))) {
                throw dependent(a, seeds);
            }
        }
        double determinant = determinant(e);
        if (determinant > 0 != (handedness == Handedness.RIGHT)) {
            for (int i = 0; i < n; i++) {
                e[n - 1][i] = -e[n - 1][i];
            }
        }
        return new OrthonormalFrame(point, e);
    }

    /** The frame of {@link #frame(double[], double[], Handedness, double[]...)} with seeds along the coordinates x^1, x^2, …. */
    public OrthonormalFrame frame(double[] point, double[] velocity, Handedness handedness) {
        double[][] seeds = new double[metric.dimension() - 1][metric.dimension()];
        for (int a = 0; a < seeds.length; a++) {
            seeds[a][a + 1] = 1;
        }
        return frame(point, velocity, handedness, seeds);
    }

    private void removeParts(double[] point, double[][] e, int a) {
        double before = Math.abs(metric.square(point, e[a]));
        for (int b = 0; b < a; b++) {
            double sign = signature.square(b == 0 ? Causality.TIMELIKE : Causality.SPACELIKE);
            double part = sign * metric.product(point, e[a], e[b]);
            for (int i = 0; i < e[a].length; i++) {
                e[a][i] -= part * e[b][i];
            }
        }
        // What is left of a seed that depends on the others is rounding.
        if (Math.abs(metric.square(point, e[a])) <= 1e-28 * before) {
            Arrays.fill(e[a], 0);
        }
    }

    private static IllegalArgumentException dependent(int a, double[][] seeds) {
        return new IllegalArgumentException("vector " + a + " of the frame, " + Arrays.toString(seeds[a - 1])
                + ", has no part orthogonal to the velocity and the vectors before it");
    }

    private static double determinant(double[][] rows) {
        int n = rows.length;
        double[][] work = new double[n][];
        for (int i = 0; i < n; i++) {
            work[i] = rows[i].clone();
        }
        double result = 1;
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int row = column + 1; row < n; row++) {
                if (Math.abs(work[row][column]) > Math.abs(work[pivot][column])) {
                    pivot = row;
                }
            }
            if (pivot != column) {
                double[] kept = work[pivot];
                work[pivot] = work[column];
                work[column] = kept;
                result = -result;
            }
            result *= work[column][column];
            for (int row = column + 1; row < n; row++) {
                double factor = work[row][column] / work[column][column];
                for (int j = column; j < n; j++) {
                    work[row][j] -= factor * work[column][j];
                }
            }
        }
        return result;
    }
}
