package io.github.gammawright.runtime.orbit;

/** Which way a function goes through zero, as the run goes on. */
public enum Direction {
    /** From negative to positive. */
    INCREASING,
    /** From positive to negative. */
    DECREASING,
    /** Either way. */
    BOTH;

    /** Whether a crossing of the given kind counts. */
    public boolean accepts(boolean increasing) {
        return this == BOTH || increasing == (this == INCREASING);
    }
}
