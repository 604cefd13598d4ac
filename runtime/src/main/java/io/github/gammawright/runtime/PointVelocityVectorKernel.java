package io.github.gammawright.runtime;

/**
 * A quantity of a point, a velocity and another vector there, such as the rate −Γ^k_ij u^i v^j of a transported vector or
 * the acceleration −R^k_ijl u^i ξ^j u^l of a separation.
 */
@FunctionalInterface
public interface PointVelocityVectorKernel {

    /**
     * Evaluates the quantity.
     *
     * @param point the coordinates x^k, one for each dimension; only read
     * @param velocity the contravariant components u^k; only read
     * @param vector the contravariant components of the other vector; only read
     * @param result receives every entry of the quantity, in the layout of the kernel
     * @throws IllegalArgumentException if an array has the wrong length, where the kernel checks it
     */
    void evaluate(double[] point, double[] velocity, double[] vector, double[] result);
}
