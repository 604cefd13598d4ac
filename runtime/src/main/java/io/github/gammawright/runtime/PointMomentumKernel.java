package io.github.gammawright.runtime;

/** A quantity of a point and a momentum there, such as the flow of the Hamiltonian ½ g^ij p_i p_j. */
@FunctionalInterface
public interface PointMomentumKernel {

    /**
     * Evaluates the quantity.
     *
     * @param point the coordinates x^k, one for each dimension; only read
     * @param momentum the covariant components p_k; only read
     * @param result receives every entry of the quantity, in the layout of the kernel
     * @throws IllegalArgumentException if an array has the wrong length, where the kernel checks it
     */
    void evaluate(double[] point, double[] momentum, double[] result);
}
