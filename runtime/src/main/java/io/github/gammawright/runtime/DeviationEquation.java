package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * A geodesic with the separations of its neighbours: D²ξ^k/dλ² = −R^k_ijl u^i ξ^j u^l (Misner, Thorne &amp; Wheeler 1973,
 * Gravitation, eq. 11.10; number from memory). Written with η = Dξ/dλ, the covariant rate: dξ^k/dλ = η^k − Γ^k_ij u^i ξ^j
 * and dη^k/dλ = −R^k_ijl u^i ξ^j u^l − Γ^k_ij u^i η^j. A light bundle is a null geodesic with two separations.
 *
 * <p>The state holds the point, the velocity, then for each separation ξ and η, n doubles each.
 */
public final class DeviationEquation extends CurveEquation {

    private final int separations;
    private final PointVelocityKernel acceleration;
    private final PointVelocityVectorKernel transport;
    private final PointVelocityVectorKernel deviation;
    private final double[] point;
    private final double[] velocity;
    private final double[] vector;
    private final double[] first;
    private final double[] second;

    /**
     * Takes the kernels that the right-hand side is made of.
     *
     * @param pointDimension how many coordinates there are
     * @param separations how many neighbours there are, 1 or more
     * @param acceleration gives −Γ^k_ij u^i u^j, as kernels of the quantity {@code geodesic-acceleration} do
     * @param transport gives −Γ^k_ij u^i v^j, as kernels of the quantity {@code parallel-transport} do
     * @param deviation gives −R^k_ijl u^i ξ^j u^l, as kernels of the quantity {@code geodesic-deviation} do
     * @throws IllegalArgumentException if there is no coordinate or no separation
     */
    public DeviationEquation(
            int pointDimension,
            int separations,
            PointVelocityKernel acceleration,
            PointVelocityVectorKernel transport,
            PointVelocityVectorKernel deviation) {
        super(pointDimension, 2 * (1 + separations) * pointDimension);
        if (separations < 1) {
            throw new IllegalArgumentException("there must be a separation");
        }
        this.separations = separations;
        this.acceleration = Objects.requireNonNull(acceleration, "acceleration");
        this.transport = Objects.requireNonNull(transport, "transport");
        this.deviation = Objects.requireNonNull(deviation, "deviation");
        this.point = new double[pointDimension];
        this.velocity = new double[pointDimension];
        this.vector = new double[pointDimension];
        this.first = new double[pointDimension];
        this.second = new double[pointDimension];
    }

    @Override
    public void derivatives(double parameter, double[] state, double[] derivatives) {
        requireLengths(state, derivatives);
        int n = point.length;
        for (int i = 0; i < n; i++) {
            point[i] = state[i];
            velocity[i] = state[n + i];
        }
        acceleration.evaluate(point, velocity, first);
        for (int i = 0; i < n; i++) {
            derivatives[i] = velocity[i];
            derivatives[n + i] = first[i];
        }
        for (int a = 0; a < separations; a++) {
            int xi = 2 * (1 + a) * n;
            int eta = xi + n;
            copy(state, xi);
            transport.evaluate(point, velocity, vector, first);
            deviation.evaluate(point, velocity, vector, second);
            copy(state, eta);
            for (int i = 0; i < n; i++) {
                derivatives[xi + i] = vector[i] + first[i];
            }
            transport.evaluate(point, velocity, vector, first);
            for (int i = 0; i < n; i++) {
                derivatives[eta + i] = second[i] + first[i];
            }
        }
    }

    private void copy(double[] state, int from) {
        for (int i = 0; i < vector.length; i++) {
            vector[i] = state[from + i];
        }
    }

    /**
     * Puts a state together.
     *
     * @param point the coordinates
     * @param velocity the velocity there
     * @param separationsAndRates ξ and Dξ/dλ of the first neighbour, then of the second, …
     * @throws IllegalArgumentException if the entries are not as many as a state has
     */
    public double[] state(double[] point, double[] velocity, double[]... separationsAndRates) {
        double[][] parts = new double[2 + separationsAndRates.length][];
        parts[0] = point;
        parts[1] = velocity;
        System.arraycopy(separationsAndRates, 0, parts, 2, separationsAndRates.length);
        return join(getDimension(), parts);
    }

    /**
     * Copies a separation ξ out of a state.
     *
     * @param state only read
     * @param which its number, from 0
     * @param separation receives the components
     */
    public void separation(double[] state, int which, double[] separation) {
        Objects.checkIndex(which, separations);
        System.arraycopy(state, 2 * (1 + which) * pointDimension(), separation, 0, pointDimension());
    }

    /**
     * Copies the covariant rate Dξ/dλ of a separation out of a state.
     *
     * @param state only read
     * @param which its number, from 0
     * @param rate receives the components
     */
    public void rate(double[] state, int which, double[] rate) {
        Objects.checkIndex(which, separations);
        System.arraycopy(state, (3 + 2 * which) * pointDimension(), rate, 0, pointDimension());
    }
}
