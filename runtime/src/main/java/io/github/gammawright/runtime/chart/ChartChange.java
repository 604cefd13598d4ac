package io.github.gammawright.runtime.chart;

import io.github.gammawright.runtime.LinearSystem;
import io.github.gammawright.runtime.PointKernel;
import java.util.Arrays;
import java.util.Objects;

/**
 * A change of coordinates x → y, by a map and its Jacobian as kernels, for points, vectors, momenta and whole states.
 *
 * <p>Holds memory of its own: give each thread its own; they may share kernels.
 */
public final class ChartChange {

    private final int n;
    private final PointKernel map;
    private final PointKernel jacobian;
    private final double[] image;
    private final double[] matrix;
    private final double[] transposed;
    private final double[] vector;
    private final LinearSystem system;

    /**
     * Takes map and Jacobian.
     *
     * @param n how many coordinates there are, in both charts
     * @param map gives y^a from x^i
     * @param jacobian gives ∂y^a/∂x^i at a·n + i, from x^i
     */
    public ChartChange(int n, PointKernel map, PointKernel jacobian) {
        this.n = n;
        this.map = Objects.requireNonNull(map, "map");
        this.jacobian = Objects.requireNonNull(jacobian, "jacobian");
        this.image = new double[n];
        this.matrix = new double[n * n];
        this.transposed = new double[n * n];
        this.vector = new double[n];
        this.system = new LinearSystem(n);
    }

    /**
     * The point in the new coordinates.
     *
     * @param point x^i; only read
     * @return a new array
     * @throws ChartException if it has no finite image
     */
    public double[] point(double[] point) {
        map.evaluate(point, image);
        requireFinite(point, image);
        return image.clone();
    }

    /**
     * The contravariant components v^a = ∂y^a/∂x^i v^i of a vector.
     *
     * @param point x^i; only read
     * @param components v^i; only read
     * @return a new array
     * @throws ChartException if the Jacobian is not finite
     */
    public double[] vector(double[] point, double[] components) {
        jacobian.evaluate(point, matrix);
        requireFinite(point, matrix);
        double[] result = new double[n];
        for (int a = 0; a < n; a++) {
            for (int i = 0; i < n; i++) {
                result[a] += matrix[a * n + i] * components[i];
            }
        }
        return result;
    }

    /**
     * The covariant components p_a of a momentum: p_i = p_a ∂y^a/∂x^i.
     *
     * @param point x^i; only read
     * @param components p_i; only read
     * @return a new array
     * @throws ChartException if the Jacobian is not finite or has no inverse
     */
    public double[] momentum(double[] point, double[] components) {
        jacobian.evaluate(point, matrix);
        requireFinite(point, matrix);
        for (int a = 0; a < n; a++) {
            for (int i = 0; i < n; i++) {
                transposed[i * n + a] = matrix[a * n + i];
            }
        }
        double[] result = new double[n];
        if (!system.solve(transposed, components, result)) {
            throw new ChartException("at " + Arrays.toString(point) + " the change of coordinates cannot be undone");
        }
        return result;
    }

    /**
     * A state of a point and any number of vectors after it, a velocity and transported vectors say.
     *
     * @param state only read
     * @return a new array
     */
    public double[] velocityState(double[] state) {
        return state(state, false);
    }

    /**
     * A state of a point and a momentum.
     *
     * @param state only read
     * @return a new array
     */
    public double[] momentumState(double[] state) {
        return state(state, true);
    }

    private double[] state(double[] state, boolean covariant) {
        if (state.length < n || state.length % n != 0) {
            throw new IllegalArgumentException(
                    "a state of " + state.length + " entries is not made of a point and vectors of " + n);
        }
        double[] point = Arrays.copyOf(state, n);
        double[] result = new double[state.length];
        System.arraycopy(point(point), 0, result, 0, n);
        for (int from = n; from < state.length; from += n) {
            System.arraycopy(state, from, vector, 0, n);
            double[] changed = covariant ? momentum(point, vector) : vector(point, vector);
            System.arraycopy(changed, 0, result, from, n);
        }
        return result;
    }

    private static void requireFinite(double[] point, double[] values) {
        for (double value : values) {
            if (!Double.isFinite(value)) {
                throw new ChartException("the point " + Arrays.toString(point) + " lies outside the new chart");
            }
        }
    }
}
