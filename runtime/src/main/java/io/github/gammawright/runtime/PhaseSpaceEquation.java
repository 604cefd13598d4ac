package io.github.gammawright.runtime;

/** An equation whose state is a point followed by a vector there, n doubles each, and that is the same at any parameter. */
public abstract sealed class PhaseSpaceEquation extends CurveEquation permits GeodesicEquation, HamiltonianEquation {

    private final double[] point;
    private final double[] vector;

    PhaseSpaceEquation(int dimension) {
        super(dimension, 2 * dimension);
        this.point = new double[dimension];
        this.vector = new double[dimension];
    }

    /**
     * Computes the derivative of the state along the curve, without allocating.
     *
     * @param state the point, then the vector; only read
     * @param derivatives receives the derivative of each entry of the state; may be the state itself
     * @throws IllegalArgumentException if either array has not twice as many entries as there are coordinates
     */
    public final void derivatives(double[] state, double[] derivatives) {
        requireLengths(state, derivatives);
        double[] x = point;
        double[] v = vector;
        int n = x.length;
        if (n == 4) {
            // Four dimensions, the common case, without the loop: a tenth of a fast kernel's time.
            x[0] = state[0];
            x[1] = state[1];
            x[2] = state[2];
            x[3] = state[3];
            v[0] = state[4];
            v[1] = state[5];
            v[2] = state[6];
            v[3] = state[7];
        } else {
            for (int i = 0; i < n; i++) {
                x[i] = state[i];
                v[i] = state[n + i];
            }
        }
        derivatives(x, v, derivatives);
    }

    /** The same as {@link #derivatives(double[], double[])}, at any parameter. */
    @Override
    public final void derivatives(double parameter, double[] state, double[] derivatives) {
        derivatives(state, derivatives);
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
        int n = pointDimension();
        if (point.length != n || vector.length != n) {
            throw new IllegalArgumentException("a state needs a point and a vector of " + n + " entries each, not "
                    + point.length + " and " + vector.length);
        }
        return join(2 * n, point, vector);
    }

    /** The system itself; the first two arrays belong to this equation, and the last may not. */
    abstract void derivatives(double[] point, double[] vector, double[] derivatives);
}
