package io.github.gammawright.verification;

import java.util.function.DoubleSupplier;

/** Says of errors at one point whether they are within bounds. */
final class Judge {

    /** A component counts from this part of the largest one on. */
    private static final double SMALL = 1e-3;

    /** What a component that is zero may come out as, in parts of the largest one. */
    static final double NOISE = 1e-14;

    /** The relative bound does not forbid errors of this part of the bound in conditioning limits. */
    private static final double NATURE = 1e-2;

    private final CheckSettings settings;
    private final double largest;
    private final DoubleSupplier noise;
    private double knownNoise = Double.NaN;

    /**
     * A judge at a point.
     *
     * @param largest the absolute value of the largest component
     * @param noise the greatest error of a plain evaluation in doubles; asked for only when it matters
     */
    Judge(CheckSettings settings, double largest, DoubleSupplier noise) {
        this.settings = settings;
        this.largest = largest;
        this.noise = noise;
    }

    /** The error in units of what is allowed: more than 1 is out of bounds. */
    double excess(boolean zero, double size, double actual, double error, double limit) {
        if (!Double.isFinite(actual)) {
            return Double.POSITIVE_INFINITY;
        }
        if (error == 0) {
            return 0;
        }
        if (zero) {
            return error <= NOISE * largest ? 0 : error / Math.max(NOISE * largest, allowedNoise());
        }
        double byLimit = settings.limitMultiple() * limit;
        double relative = settings.relativeBound() * (size + SMALL * largest);
        double allowed = Math.min(Math.max(relative, NATURE * byLimit), byLimit);
        // Below the normal doubles nothing can be asked for.
        return error / Math.max(allowed, Double.MIN_NORMAL);
    }

    private double allowedNoise() {
        if (Double.isNaN(knownNoise)) {
            knownNoise = noise.getAsDouble();
        }
        return settings.limitMultiple() * knownNoise;
    }
}
