package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * The geodesic equation in position–velocity form, by an affine parameter λ: dx^k/dλ = u^k,
 * du^k/dλ = −Γ^k_ij u^i u^j (Misner, Thorne &amp; Wheeler 1973, Gravitation, ch. 10; from memory).
 *
 * <p>The state holds x^0 … x^(n−1), then u^0 … u^(n−1). The parameter is proper time where the velocity is normalised to
 * g_ij u^i u^j = ∓1 in the signature −+++ or +−−−.
 */
public final class GeodesicEquation extends PhaseSpaceEquation {

    private final PointVelocityKernel acceleration;
    private final double[] result;

    /**
     * Takes the kernel that the right-hand side is made of.
     *
     * @param dimension how many coordinates there are
     * @param acceleration gives −Γ^k_ij u^i u^j, as kernels of the quantity {@code geodesic-acceleration} do
     * @throws IllegalArgumentException if the dimension is below 1
     */
    public GeodesicEquation(int dimension, PointVelocityKernel acceleration) {
        super(dimension);
        this.acceleration = Objects.requireNonNull(acceleration, "acceleration");
        this.result = new double[dimension];
    }

    @Override
    void derivatives(double[] point, double[] velocity, double[] derivatives) {
        acceleration.evaluate(point, velocity, result);
        int n = result.length;
        for (int i = 0; i < n; i++) {
            derivatives[i] = velocity[i];
            derivatives[n + i] = result[i];
        }
    }
}
