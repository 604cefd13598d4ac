package io.github.gammawright.runtime.orbit;

/** Takes the states of a run one after the other, so that a long run needs no memory in proportion. */
@FunctionalInterface
public interface TrajectorySink {

    /**
     * Takes a state.
     *
     * @param parameter the curve's parameter
     * @param state may be written over after the call
     */
    void accept(double parameter, double[] state);
}
