package io.github.gammawright.runtime;

/**
 * Which of the two time components that normalise a velocity is meant. Where x^0 is a time and ∂/∂x^0 is timelike, the
 * larger one points to the future and the smaller one to the past.
 */
public enum Root {
    LARGER,
    SMALLER
}
