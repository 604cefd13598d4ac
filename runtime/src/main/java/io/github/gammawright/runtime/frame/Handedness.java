package io.github.gammawright.runtime.frame;

/** The orientation of a frame e_0, e_1, … against that of the coordinates in index order. */
public enum Handedness {
    /** The determinant of the components e_a^i is positive, as for the coordinate basis itself. */
    RIGHT,
    /** The determinant is negative. */
    LEFT
}
