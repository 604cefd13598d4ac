package io.github.gammawright.runtime;

import org.hipparchus.ode.OrdinaryDifferentialEquation;

/**
 * A system y' = f(λ, y) whose state begins with a point and a vector there, whatever else follows.
 *
 * <p>{@link #derivatives(double, double[], double[])} allocates nothing. {@link #computeDerivatives}, which Hipparchus
 * calls, allocates the array that it returns and nothing else: the integrators keep that array as a stage of the step, so
 * that it can't be used again.
 *
 * <p>An equation has memory of its own between the state and the kernels. Give each thread its own equation; they may
 * share kernels.
 */
public abstract class CurveEquation implements OrdinaryDifferentialEquation {

    private final int pointDimension;
    private final int dimension;

    /**
     * Takes the sizes.
     *
     * @param pointDimension how many coordinates a point has, the time included
     * @param dimension the length of a state
     * @throws IllegalArgumentException if there is no coordinate
     */
    protected CurveEquation(int pointDimension, int dimension) {
        if (pointDimension < 1) {
            throw new IllegalArgumentException("a point has at least one coordinate, not " + pointDimension);
        }
        this.pointDimension = pointDimension;
        this.dimension = dimension;
    }

    /** How many coordinates a point has, the time included. */
    public final int pointDimension() {
        return pointDimension;
    }

    /** The length of a state. */
    @Override
    public final int getDimension() {
        return dimension;
    }

    /**
     * Computes the derivative of the state along the curve, without allocating.
     *
     * @param parameter the curve's parameter: the time for equations by time, else without influence
     * @param state only read
     * @param derivatives receives the derivative of each entry of the state; may not be the state, unless said
     * @throws IllegalArgumentException if an array is not as long as a state
     */
    public abstract void derivatives(double parameter, double[] state, double[] derivatives);

    /**
     * Copies the point, all coordinates of it, out of a state.
     *
     * @param parameter the curve's parameter
     * @param state only read
     * @param point receives the coordinates, one for each dimension
     */
    public void point(double parameter, double[] state, double[] point) {
        for (int i = 0; i < pointDimension; i++) {
            point[i] = state[i];
        }
    }

    /**
     * The derivative of the state; equal in value to {@link #derivatives(double, double[], double[])}.
     *
     * @param parameter the curve's parameter
     * @param state only read
     * @return a new array as long as the state
     */
    @Override
    public final double[] computeDerivatives(double parameter, double[] state) {
        double[] derivatives = new double[dimension];
        derivatives(parameter, state, derivatives);
        return derivatives;
    }

    /** Refuses arrays that are not as long as a state. */
    protected final void requireLengths(double[] state, double[] derivatives) {
        if (state.length != dimension) {
            throw wrongLength("state", state.length);
        }
        if (derivatives.length != dimension) {
            throw wrongLength("derivatives", derivatives.length);
        }
    }

    /**
     * Puts a state together from its parts.
     *
     * @throws IllegalArgumentException if the parts have not as many entries together as a state has
     */
    static double[] join(int dimension, double[]... parts) {
        double[] state = new double[dimension];
        int length = 0;
        for (double[] part : parts) {
            if (length + part.length > dimension) {
                throw new IllegalArgumentException("the parts have more than the " + dimension + " entries of a state");
            }
            System.arraycopy(part, 0, state, length, part.length);
            length += part.length;
        }
        if (length != dimension) {
            throw new IllegalArgumentException(
                    "the parts have " + length + " entries together, and a state has " + dimension);
        }
        return state;
    }

    private IllegalArgumentException wrongLength(String name, int length) {
        return new IllegalArgumentException(name + " has " + length + " entries, and " + dimension + " are needed");
    }
}
