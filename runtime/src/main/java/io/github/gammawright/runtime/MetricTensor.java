package io.github.gammawright.runtime;

import java.util.Arrays;
import java.util.Objects;

/**
 * The metric at a point as a scalar product of vectors, and as what lowers their indices.
 *
 * <p>It has memory of its own for g_ij, so that nothing is allocated in a call. Give each thread its own; they may share
 * a kernel.
 */
public final class MetricTensor {

    private final int dimension;
    private final PointKernel kernel;
    private final double[] components;
    private final LinearSystem system;

    /**
     * Takes the kernel that gives the components.
     *
     * @param dimension how many coordinates there are
     * @param kernel gives all n² components g_ij, row by row, as kernels of the quantity {@code metric} in the layout
     *     {@code full} do
     * @throws IllegalArgumentException if the dimension is below 1
     */
    public MetricTensor(int dimension, PointKernel kernel) {
        if (dimension < 1) {
            throw new IllegalArgumentException("a metric has at least one dimension, not " + dimension);
        }
        this.dimension = dimension;
        this.kernel = Objects.requireNonNull(kernel, "kernel");
        this.components = new double[dimension * dimension];
        this.system = new LinearSystem(dimension);
    }

    /** How many coordinates there are. */
    public int dimension() {
        return dimension;
    }

    /**
     * The scalar product g_ij u^i v^j.
     *
     * @param point the coordinates; only read
     * @param u a contravariant vector at that point; only read
     * @param v another; only read
     * @throws IllegalArgumentException if a vector has not one entry for each coordinate
     */
    public double product(double[] point, double[] u, double[] v) {
        requireLength(u);
        requireLength(v);
        componentsAt(point);
        double sum = 0;
        for (int i = 0; i < dimension; i++) {
            sum += u[i] * row(i, v);
        }
        return sum;
    }

    /** The square g_ij u^i u^j of a vector, which may have either sign; see {@link #product}. */
    public double square(double[] point, double[] u) {
        return product(point, u, u);
    }

    /**
     * Lowers the index of a vector: p_i = g_ij u^j, a momentum per unit of mass where u is a velocity.
     *
     * @param point the coordinates; only read
     * @param vector the contravariant components; only read
     * @param covector receives the covariant components; may not be the vector
     * @throws IllegalArgumentException if an array has not one entry for each coordinate, or both are the same
     */
    public void lower(double[] point, double[] vector, double[] covector) {
        requireLength(vector);
        requireLength(covector);
        if (vector == covector) {
            throw new IllegalArgumentException("the covector must be another array than the vector");
        }
        componentsAt(point);
        for (int i = 0; i < dimension; i++) {
            covector[i] = row(i, vector);
        }
    }

    /**
     * Raises the index of a covector: u^i with g_ij u^j = p_i, the velocity that belongs to a momentum per unit of mass.
     *
     * @param point the coordinates; only read
     * @param covector the covariant components; only read
     * @param vector receives the contravariant components; may be the covector
     * @throws IllegalArgumentException if an array has not one entry for each coordinate
     * @throws NormalizationException if the metric has no inverse there
     */
    public void raise(double[] point, double[] covector, double[] vector) {
        requireLength(covector);
        requireLength(vector);
        if (!system.solve(componentsAt(point), covector, vector)) {
            throw new NormalizationException("at " + Arrays.toString(point) + " the metric has no inverse");
        }
    }

    /** All components at a point, row by row, in an array of this object that the next call writes over. */
    public double[] componentsAt(double[] point) {
        kernel.evaluate(point, components);
        return components;
    }

    void requireLength(double[] vector) {
        if (vector.length != dimension) {
            throw new IllegalArgumentException(
                    "a vector has " + vector.length + " entries, and " + dimension + " are needed");
        }
    }

    private double row(int i, double[] vector) {
        double sum = 0;
        for (int j = 0; j < dimension; j++) {
            sum += components[i * dimension + j] * vector[j];
        }
        return sum;
    }
}
