package io.github.gammawright.runtime;

/** A quantity of a point and a velocity there, such as the geodesic acceleration −Γ^k_ij u^i u^j. */
@FunctionalInterface
public interface PointVelocityKernel {

    /**
     * Evaluates the quantity.
     *
     * @param point the coordinates x^k, one for each dimension; only read
     * @param velocity the contravariant components u^k; only read
     * @param result receives every entry of the quantity, in the layout of the kernel
     * @throws IllegalArgumentException if an array has the wrong length, where the kernel checks it
     */
    void evaluate(double[] point, double[] velocity, double[] result);
}
