package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * Hamilton's equations of H = ½ g^ij p_i p_j, whose solutions are the geodesics by an affine parameter λ:
 * dx^k/dλ = ∂H/∂p_k, dp_k/dλ = −∂H/∂x^k (Misner, Thorne &amp; Wheeler 1973, Gravitation, ch. 25; from memory).
 *
 * <p>The state holds x^0 … x^(n−1), then the covariant p_0 … p_(n−1). The momentum of a coordinate that the metric does
 * not depend on stays as it is, to the last bit.
 */
public final class HamiltonianEquation extends PhaseSpaceEquation {

    private final PointMomentumKernel flow;

    /**
     * Takes the kernel that the right-hand side is made of.
     *
     * @param dimension how many coordinates there are
     * @param flow gives dx^k/dλ and then dp_k/dλ, as kernels of the quantity {@code hamiltonian-flow} do
     * @throws IllegalArgumentException if the dimension is below 1
     */
    public HamiltonianEquation(int dimension, PointMomentumKernel flow) {
        super(dimension);
        this.flow = Objects.requireNonNull(flow, "flow");
    }

    @Override
    void derivatives(double[] point, double[] momentum, double[] derivatives) {
        flow.evaluate(point, momentum, derivatives);
    }
}
