package io.github.gammawright.runtime.conserved;

/** A number that belongs to a point and a momentum. */
@FunctionalInterface
public interface PhaseFunction {

    /**
     * Evaluates it.
     *
     * @param point the coordinates x^k; only read
     * @param momentum the covariant components p_k; only read
     */
    double value(double[] point, double[] momentum);
}
