package io.github.gammawright.runtime;

/** Kernels written by hand, for tests; the formulas are those of any textbook (common practice, no source). */
final class Kernels {

    private Kernels() {}

    /** dr² + r² dφ². */
    static void polarPlaneMetric(double[] x, double[] g) {
        g[0] = 1;
        g[1] = 0;
        g[2] = 0;
        g[3] = x[0] * x[0];
    }

    static void polarPlaneAcceleration(double[] x, double[] u, double[] result) {
        result[0] = x[0] * u[1] * u[1];
        result[1] = -2 / x[0] * u[0] * u[1];
    }

    /** R² (dθ² + sin²θ dφ²); the radius drops out. */
    static void sphereAcceleration(double[] x, double[] u, double[] result) {
        double sine = Math.sin(x[0]);
        double cosine = Math.cos(x[0]);
        result[0] = sine * cosine * u[1] * u[1];
        result[1] = -2 * cosine / sine * u[0] * u[1];
    }

    /** The equatorial plane of Schwarzschild's metric of mass 1, coordinates t, r, φ, signature −++. */
    static void schwarzschildMetric(double[] x, double[] g) {
        java.util.Arrays.fill(g, 0);
        g[0] = -(1 - 2 / x[1]);
        g[4] = 1 / (1 - 2 / x[1]);
        g[8] = x[1] * x[1];
    }

    static void schwarzschildFlow(double[] x, double[] p, double[] result) {
        double r = x[1];
        double f = 1 - 2 / r;
        result[0] = -p[0] / f;
        result[1] = f * p[1];
        result[2] = p[2] / (r * r);
        result[3] = 0;
        result[4] = -(p[0] * p[0] / (f * f) + p[1] * p[1]) / (r * r) + p[2] * p[2] / (r * r * r);
        result[5] = 0;
    }

    /** The equatorial plane of Kerr's metric of mass 1 and a = 0.9 in Boyer–Lindquist coordinates t, r, φ. */
    static void kerrMetric(double[] x, double[] g) {
        double r = x[1];
        double a = 0.9;
        java.util.Arrays.fill(g, 0);
        g[0] = -(1 - 2 / r);
        g[2] = g[6] = -2 * a / r;
        g[4] = r * r / (r * r - 2 * r + a * a);
        g[8] = r * r + a * a + 2 * a * a / r;
    }
}
