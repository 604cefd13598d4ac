package io.github.gammawright.verification;

/**
 * A double with a bound on its error. Sums and products carry the bound along, with the rounding of the operation itself.
 *
 * @param value the number
 * @param error the bound, not negative
 */
record Approximate(double value, double error) {

    private static final double ROUNDING = 0x1p-53;

    static final Approximate ZERO = new Approximate(0, 0);

    static Approximate exactly(double value) {
        return new Approximate(value, 0);
    }

    Approximate plus(Approximate other) {
        double sum = value + other.value;
        return new Approximate(sum, error + other.error + ROUNDING * Math.abs(sum));
    }

    Approximate minus(Approximate other) {
        return plus(new Approximate(-other.value, other.error));
    }

    Approximate times(Approximate other) {
        double product = value * other.value;
        return new Approximate(
                product,
                Math.abs(value) * other.error
                        + error * Math.abs(other.value)
                        + error * other.error
                        + ROUNDING * Math.abs(product)
                        + Double.MIN_NORMAL * (product == 0 ? 0 : 1));
    }

    Approximate times(double factor) {
        return times(exactly(factor));
    }

    /** The size of the value in units of its error: above 1 it is not 0. */
    double excess() {
        if (!Double.isFinite(value) || value == 0) {
            return value == 0 ? 0 : Double.POSITIVE_INFINITY;
        }
        return Math.abs(value) / Math.max(error, Double.MIN_NORMAL);
    }
}
