package io.github.gammawright.runtime;

/**
 * Fast kernels of Kerr's metric of mass 1, for long tests: H = (Δ p_r² + p_θ² + (p_φ/sin θ + a sin θ p_t)² −
 * ((r² + a²) p_t + a p_φ)²/Δ)/(2Σ) (Carter 1968; Misner, Thorne &amp; Wheeler 1973, sec. 33.5; from memory).
 */
public final class KerrByHand {

    private final double a;

    public KerrByHand(double a) {
        this.a = a;
    }

    public boolean inDomain(double[] x) {
        return x[1] > 1 + Math.sqrt(1 - a * a) && x[2] > 0 && x[2] < Math.PI;
    }

    public void metric(double[] x, double[] g) {
        double r = x[1];
        double s = Math.sin(x[2]);
        double c = Math.cos(x[2]);
        double sigma = r * r + a * a * c * c;
        double h = 2 * r / sigma;
        java.util.Arrays.fill(g, 0);
        g[0] = h - 1;
        g[3] = g[12] = -h * a * s * s;
        g[5] = sigma / (r * r - 2 * r + a * a);
        g[10] = sigma;
        g[15] = s * s * (r * r + a * a + h * a * a * s * s);
    }

    public void flow(double[] x, double[] p, double[] result) {
        double r = x[1];
        double s = Math.sin(x[2]);
        double c = Math.cos(x[2]);
        double sigma = r * r + a * a * c * c;
        double delta = r * r - 2 * r + a * a;
        double w = p[3] / s + a * s * p[0];
        double q = (r * r + a * a) * p[0] + a * p[3];
        double ratio = q / delta;
        double twice = delta * p[1] * p[1] + p[2] * p[2] + w * w - q * ratio;
        result[0] = (w * a * s - ratio * (r * r + a * a)) / sigma;
        result[1] = delta * p[1] / sigma;
        result[2] = p[2] / sigma;
        result[3] = (w / s - ratio * a) / sigma;
        result[4] = 0;
        double ddelta = 2 * r - 2;
        double byR = ddelta * p[1] * p[1] - 4 * r * p[0] * ratio + ratio * ratio * ddelta;
        result[5] = -(byR - twice / sigma * 2 * r) / (2 * sigma);
        double byTheta = 2 * w * (a * p[0] * c - p[3] * c / (s * s));
        result[6] = -(byTheta + twice / sigma * 2 * a * a * s * c) / (2 * sigma);
        result[7] = 0;
    }
}
