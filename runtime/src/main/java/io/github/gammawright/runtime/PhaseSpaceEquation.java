package io.github.gammawright.runtime;

import org.hipparchus.ode.OrdinaryDifferentialEquation;

/**
 * A system y' = f(y) whose state is a point followed by a vector there, n doubles each.
 *
 * <p>{@link #derivatives} allocates nothing. {@link #computeDerivatives}, which Hipparchus calls, allocates the array
 * that it returns and nothing else: the integrators keep that array as a stage of the step, so that it can't be used
 * again.
 *
 * <p>An equation has memory of its own between the two halves of the state and the kernel. Give each thread its own
 * equation; they may share a kernel.
 */
public abstract sealed class PhaseSpaceEquation implements OrdinaryDifferentialEquation
        permits GeodesicEquation, HamiltonianEquation {

    private final int dimension;
    private final double[] point;
    private final double[] vector;

    PhaseSpaceEquation(int dimension) {
        if (dimension < 1) {
            throw new IllegalArgumentException("a point has at least one coordinate, not " + dimension);
        }
        this.dimension = dimension;
        this.point = new double[dimension];
        this.vector = new double[dimension];
    }

    /** The length of the state: twice the number of coordinates. */
    @Override
    public final int getDimension() {
        return 2 * dimension;
    }

    /**
     * The derivative of the state; equal in value to {@link #derivatives}.
     *
     * @param parameter the curve's parameter, on which nothing here depends
     * @param state the point, then the vector; only read
     * @return a new array as long as the state
     */
    @Override
    public final double[] computeDerivatives(double parameter, double[] state) {
        double[] derivatives = new double[2 * dimension];
        derivatives(state, derivatives);
        return derivatives;
    }

    /**
     * Computes the derivative of the state along the curve, without allocating.
     *
     * @param state the point, then the vector; only read
     * @param derivatives receives the derivative of each entry of the state; may be the state itself
     * @throws IllegalArgumentException if either array has not twice as many entries as there are coordinates
     */
    public final void derivatives(double[] state, double[] derivatives) {
        requireLength("state", state);
        requireLength("derivatives", derivatives);
        System.arraycopy(state, 0, point, 0, dimension);
        System.arraycopy(state, dimension, vector, 0, dimension);
        derivatives(point, vector, derivatives);
    }

    /**
     * Puts a state together.
     *
     * @param point the coordinates x^k
     * @param vector the velocity or momentum at that point
     * @return a new array: the point, then the vector
     * @throws IllegalArgumentException if either has not one entry for each coordinate
     */
    public final double[] state(double[] point, double[] vector) {
        if (point.length != dimension || vector.length != dimension) {
            throw new IllegalArgumentException("a state needs a point and a vector of " + dimension
                    + " entries each, not " + point.length + " and " + vector.length);
        }
        double[] state = new double[2 * dimension];
        System.arraycopy(point, 0, state, 0, dimension);
        System.arraycopy(vector, 0, state, dimension, dimension);
        return state;
    }

    /** The system itself; the first two arrays belong to this equation, and the last may not. */
    abstract void derivatives(double[] point, double[] vector, double[] derivatives);

    private void requireLength(String name, double[] array) {
        if (array.length != 2 * dimension) {
            throw new IllegalArgumentException(
                    name + " has " + array.length + " entries, and " + 2 * dimension + " are needed");
        }
    }
}
