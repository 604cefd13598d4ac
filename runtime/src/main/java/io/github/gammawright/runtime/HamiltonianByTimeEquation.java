package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * Hamilton's equations of H = ½ g^ij p_i p_j by the coordinate time t = x^0: dx^k/dt and dp_k/dt, k ≥ 1.
 *
 * <p>The state holds x^1 … x^(n−1), then p_1 … p_(n−1); the parameter is the time. The kernel needs p_0 as well, which a
 * {@link TimeMomentum} supplies.
 */
public final class HamiltonianByTimeEquation extends CurveEquation {

    private final PointMomentumKernel flow;
    private final TimeMomentum timeMomentum;
    private final double[] point;
    private final double[] momentum;
    private final double[] result;

    /**
     * Takes the kernel that the right-hand side is made of.
     *
     * @param pointDimension how many coordinates there are, the time included
     * @param flow takes the point and all n components p_i and gives dx^k/dt, then dp_k/dt, k ≥ 1, as kernels of the
     *     quantity {@code hamiltonian-flow-by-time} do
     * @param timeMomentum supplies p_0
     * @throws IllegalArgumentException if there is no coordinate besides the time
     */
    public HamiltonianByTimeEquation(int pointDimension, PointMomentumKernel flow, TimeMomentum timeMomentum) {
        super(pointDimension, 2 * (pointDimension - 1));
        if (pointDimension < 2) {
            throw new IllegalArgumentException("by time there must be a coordinate besides the time");
        }
        this.flow = Objects.requireNonNull(flow, "flow");
        this.timeMomentum = Objects.requireNonNull(timeMomentum, "timeMomentum");
        this.point = new double[pointDimension];
        this.momentum = new double[pointDimension];
        this.result = new double[2 * (pointDimension - 1)];
    }

    @Override
    public void derivatives(double time, double[] state, double[] derivatives) {
        requireLengths(state, derivatives);
        momentum(time, state, momentum);
        point(time, state, point);
        flow.evaluate(point, momentum, result);
        for (int k = 0; k < result.length; k++) {
            derivatives[k] = result[k];
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
     * All components of the momentum in a state.
     *
     * @param time the parameter
     * @param state only read
     * @param momentum receives p_0 … p_(n−1)
     */
    public void momentum(double time, double[] state, double[] momentum) {
        int m = pointDimension() - 1;
        for (int k = 0; k < m; k++) {
            momentum[k + 1] = state[m + k];
        }
        point(time, state, point);
        momentum[0] = timeMomentum.at(point, momentum);
    }

    /**
     * Puts a state together; the time is the first coordinate and goes to the integrator.
     *
     * @param point the coordinates x^0 … x^(n−1)
     * @param momentum the components p_0 … p_(n−1), of which p_0 is left out
     * @return a new array: x^k, then p_k, k ≥ 1
     * @throws IllegalArgumentException if an array has not one entry for each coordinate
     */
    public double[] state(double[] point, double[] momentum) {
        int n = pointDimension();
        if (point.length != n || momentum.length != n) {
            throw new IllegalArgumentException(
                    "a state by time needs a point and a momentum of " + n + " entries each");
        }
        double[] state = new double[2 * (n - 1)];
        System.arraycopy(point, 1, state, 0, n - 1);
        System.arraycopy(momentum, 1, state, n - 1, n - 1);
        return state;
    }
}
