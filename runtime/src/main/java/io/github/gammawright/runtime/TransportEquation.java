package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * A geodesic with vectors that are parallel-transported along it: dv^k/dλ = −Γ^k_ij u^i v^j (Misner, Thorne &amp; Wheeler
 * 1973, Gravitation, sec. 10.3; from memory). A gyroscope's spin and a photon's polarisation move so.
 *
 * <p>The state holds the point, the velocity, then the vectors one after the other, n doubles each.
 */
public final class TransportEquation extends CurveEquation {

    private final int vectors;
    private final PointVelocityKernel acceleration;
    private final PointVelocityVectorKernel transport;
    private final double[] point;
    private final double[] velocity;
    private final double[] vector;
    private final double[] result;

    /**
     * Takes the kernels that the right-hand side is made of.
     *
     * @param pointDimension how many coordinates there are
     * @param vectors how many vectors are transported, 0 or more
     * @param acceleration gives −Γ^k_ij u^i u^j, as kernels of the quantity {@code geodesic-acceleration} do
     * @param transport gives −Γ^k_ij u^i v^j, as kernels of the quantity {@code parallel-transport} do
     * @throws IllegalArgumentException if there is no coordinate, or fewer than no vectors
     */
    public TransportEquation(
            int pointDimension, int vectors, PointVelocityKernel acceleration, PointVelocityVectorKernel transport) {
        super(pointDimension, (2 + vectors) * pointDimension);
        if (vectors < 0) {
            throw new IllegalArgumentException("there can't be " + vectors + " vectors");
        }
        this.vectors = vectors;
        this.acceleration = Objects.requireNonNull(acceleration, "acceleration");
        this.transport = Objects.requireNonNull(transport, "transport");
        this.point = new double[pointDimension];
        this.velocity = new double[pointDimension];
        this.vector = new double[pointDimension];
        this.result = new double[pointDimension];
    }

    @Override
    public void derivatives(double parameter, double[] state, double[] derivatives) {
        requireLengths(state, derivatives);
        int n = point.length;
        for (int i = 0; i < n; i++) {
            point[i] = state[i];
            velocity[i] = state[n + i];
        }
        acceleration.evaluate(point, velocity, result);
        for (int i = 0; i < n; i++) {
            derivatives[i] = velocity[i];
            derivatives[n + i] = result[i];
        }
        for (int a = 0; a < vectors; a++) {
            int from = (2 + a) * n;
            for (int i = 0; i < n; i++) {
                vector[i] = state[from + i];
            }
            transport.evaluate(point, velocity, vector, result);
            for (int i = 0; i < n; i++) {
                derivatives[from + i] = result[i];
            }
        }
    }

    /**
     * Puts a state together.
     *
     * @param point the coordinates
     * @param velocity the velocity there
     * @param transported the vectors there
     * @throws IllegalArgumentException if the entries are not as many as a state has
     */
    public double[] state(double[] point, double[] velocity, double[]... transported) {
        double[][] parts = new double[2 + transported.length][];
        parts[0] = point;
        parts[1] = velocity;
        System.arraycopy(transported, 0, parts, 2, transported.length);
        return join(getDimension(), parts);
    }

    /**
     * Copies a transported vector out of a state.
     *
     * @param state only read
     * @param which its number, from 0
     * @param vector receives the components
     */
    public void vector(double[] state, int which, double[] vector) {
        Objects.checkIndex(which, vectors);
        System.arraycopy(state, (2 + which) * pointDimension(), vector, 0, pointDimension());
    }
}
