package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * The geodesic equation by the coordinate time t = x^0: dx^k/dt = v^k, dv^k/dt = −Γ^k_ij v^i v^j + v^k Γ^0_ij v^i v^j,
 * k ≥ 1, with v^0 = 1 (Weinberg 1972, Gravitation and Cosmology, sec. 9.1; from memory).
 *
 * <p>The state holds x^1 … x^(n−1), then v^1 … v^(n−1); the parameter is the time.
 */
public final class GeodesicByTimeEquation extends CurveEquation {

    private final PointVelocityKernel acceleration;
    private final double[] point;
    private final double[] velocity;
    private final double[] result;

    /**
     * Takes the kernel that the right-hand side is made of.
     *
     * @param pointDimension how many coordinates there are, the time included
     * @param acceleration takes the point and the n − 1 components v^k and gives n − 1 components, as kernels of the
     *     quantity {@code geodesic-acceleration-by-time} do
     * @throws IllegalArgumentException if there is no coordinate besides the time
     */
    public GeodesicByTimeEquation(int pointDimension, PointVelocityKernel acceleration) {
        super(pointDimension, 2 * (pointDimension - 1));
        if (pointDimension < 2) {
            throw new IllegalArgumentException("by time there must be a coordinate besides the time");
        }
        this.acceleration = Objects.requireNonNull(acceleration, "acceleration");
        this.point = new double[pointDimension];
        this.velocity = new double[pointDimension - 1];
        this.result = new double[pointDimension - 1];
    }

    @Override
    public void derivatives(double time, double[] state, double[] derivatives) {
        requireLengths(state, derivatives);
        point(time, state, point);
        int m = velocity.length;
        for (int k = 0; k < m; k++) {
            velocity[k] = state[m + k];
        }
        acceleration.evaluate(point, velocity, result);
        for (int k = 0; k < m; k++) {
            derivatives[k] = velocity[k];
            derivatives[m + k] = result[k];
        }
    }

    @Override
    public void point(double time, double[] state, double[] point) {
        point[0] = time;
        for (int k = 1; k < point.length; k++) {
            point[k] = state[k - 1];
        }
    }

    /**
     * Puts a state together; the time is the first coordinate and goes to the integrator.
     *
     * @param point the coordinates x^0 … x^(n−1)
     * @param velocity u^0 … u^(n−1) by any parameter; only its direction counts
     * @return a new array: x^k, then v^k = u^k/u^0, k ≥ 1
     * @throws IllegalArgumentException if an array has not one entry for each coordinate, or u^0 is 0
     */
    public double[] state(double[] point, double[] velocity) {
        int n = pointDimension();
        if (point.length != n || velocity.length != n || velocity[0] == 0) {
            throw new IllegalArgumentException("a state by time needs a point and a velocity of " + n
                    + " entries each, and a velocity whose time component is not 0");
        }
        double[] state = new double[2 * (n - 1)];
        for (int k = 1; k < n; k++) {
            state[k - 1] = point[k];
            state[n - 2 + k] = velocity[k] / velocity[0];
        }
        return state;
    }
}
