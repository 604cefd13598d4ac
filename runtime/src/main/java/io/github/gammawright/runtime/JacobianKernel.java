package io.github.gammawright.runtime;

/** The derivatives of a right-hand side by the state. */
@FunctionalInterface
public interface JacobianKernel {

    /**
     * Evaluates the matrix.
     *
     * @param parameter the curve's parameter
     * @param state as the equation has it; only read
     * @param jacobian receives ∂f_a/∂y_b at a·m + b, m being the length of the state
     */
    void evaluate(double parameter, double[] state, double[] jacobian);
}
