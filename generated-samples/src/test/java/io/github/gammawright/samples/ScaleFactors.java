package io.github.gammawright.samples;

/** Scale factors a(t) of expanding universes with their first derivatives, as kernels ask for them. */
final class ScaleFactors {

    /** The expansion rate of {@link #exponential}. */
    static final double RATE = 0.25;

    private ScaleFactors() {}

    /** A universe of dust, a = t^(2/3). */
    static void dust(double t, double[] a) {
        a[0] = Math.cbrt(t * t);
        a[1] = 2 * a[0] / (3 * t);
    }

    /** A universe of radiation, a = √t. */
    static void radiation(double t, double[] a) {
        a[0] = Math.sqrt(t);
        a[1] = 1 / (2 * a[0]);
    }

    /** An empty universe with a cosmological constant, a = exp(H t). */
    static void exponential(double t, double[] a) {
        a[0] = Math.exp(RATE * t);
        a[1] = RATE * a[0];
    }
}
