package io.github.gammawright.runtime;

/** A quantity of a point alone: a metric, Christoffel symbols, curvature. */
@FunctionalInterface
public interface PointKernel {

    /**
     * Evaluates the quantity.
     *
     * @param point the coordinates x^k, one for each dimension; only read
     * @param result receives every entry of the quantity, in the layout of the kernel
     * @throws IllegalArgumentException if an array has the wrong length, where the kernel checks it
     */
    void evaluate(double[] point, double[] result);
}
