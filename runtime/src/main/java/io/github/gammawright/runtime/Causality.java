package io.github.gammawright.runtime;

/** What a velocity may be in a metric with one time. */
public enum Causality {
    /** That of a body with mass: the square is −1 in the signature −+++ and +1 in +−−−. */
    TIMELIKE,
    /** That of light: the square is 0. */
    NULL,
    /** The square is +1 in the signature −+++ and −1 in +−−−. */
    SPACELIKE
}
