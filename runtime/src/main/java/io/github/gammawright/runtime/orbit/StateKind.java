package io.github.gammawright.runtime.orbit;

import java.util.Arrays;

/** What a state holds, which decides how large an error may be in which entry. */
public enum StateKind {
    /** Point and velocity of a body: orbits that are to keep their constants over many turns. */
    BODY(1e-14, 1e-14),
    /** Point and velocity, or momentum, of light that passes once. */
    LIGHT(1e-11, 1e-11),
    /** Point and momentum of a body. */
    CANONICAL(1e-14, 1e-14),
    /** Point, velocity and transported vectors or separations. */
    BUNDLE(1e-12, 1e-12),
    /** A path on a surface whose lengths, and parameter, are millions of units long, and coordinates are angles. */
    SURFACE(1e-16, 1e-14);

    private final double absolute;
    private final double relative;

    StateKind(double absolute, double relative) {
        this.absolute = absolute;
        this.relative = relative;
    }

    /** The error that a step may have in an entry of any size. */
    public double absoluteTolerance() {
        return absolute;
    }

    /** The error that a step may have beside that, over the size of the entry. */
    public double relativeTolerance() {
        return relative;
    }

    /** The absolute tolerance for each entry of a state. */
    double[] absoluteTolerances(int length) {
        double[] result = new double[length];
        Arrays.fill(result, absolute);
        return result;
    }
}
