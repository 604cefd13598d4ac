package io.github.gammawright.benchmarks;

import org.hipparchus.analysis.differentiation.Gradient;

/**
 * Kerr's metric in Boyer–Lindquist coordinates, for the contenders that differentiate it at run time. Components row by
 * row; the ones that are zero are left as they are.
 */
final class KerrMetric {

    private final double mass;
    private final double spin;

    KerrMetric(double mass, double spin) {
        this.mass = mass;
        this.spin = spin;
    }

    void evaluate(double r, double theta, double[] g) {
        double sine = Math.sin(theta);
        double cosine = Math.cos(theta);
        double s2 = sine * sine;
        double sigma = r * r + spin * spin * cosine * cosine;
        double twoH = 2 * mass * r / sigma;
        double drag = -twoH * spin * s2;
        g[0] = twoH - 1;
        g[3] = drag;
        g[12] = drag;
        g[5] = sigma / (r * r - 2 * mass * r + spin * spin);
        g[10] = sigma;
        g[15] = (r * r + spin * spin - drag * spin) * s2;
    }

    /** The same with derivatives. */
    void evaluate(Gradient r, Gradient theta, Gradient[] g) {
        Gradient sine = theta.sin();
        Gradient cosine = theta.cos();
        Gradient s2 = sine.multiply(sine);
        Gradient r2 = r.multiply(r);
        Gradient sigma = cosine.multiply(cosine).multiply(spin * spin).add(r2);
        Gradient twoH = r.multiply(2 * mass).divide(sigma);
        Gradient drag = twoH.multiply(s2).multiply(-spin);
        g[0] = twoH.subtract(1);
        g[3] = drag;
        g[12] = drag;
        g[5] = sigma.divide(r2.subtract(r.multiply(2 * mass)).add(spin * spin));
        g[10] = sigma;
        g[15] = r2.add(spin * spin).subtract(drag.multiply(spin)).multiply(s2);
    }
}
