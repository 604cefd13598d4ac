package io.github.gammawright.runtime;

/** A number that belongs to a state: a coordinate, a distance, a constant of the motion. */
@FunctionalInterface
public interface StateFunction {

    /**
     * Evaluates it.
     *
     * @param parameter the curve's parameter
     * @param state as the equation has it; only read
     */
    double value(double parameter, double[] state);

    /** Entry number {@code index} of the state. */
    static StateFunction entry(int index) {
        return (parameter, state) -> state[index];
    }
}
