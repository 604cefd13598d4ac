package io.github.gammawright.benchmarks;

import org.hipparchus.analysis.differentiation.Gradient;

/**
 * Kerr's connection from Hipparchus's forward-mode automatic differentiation of the metric and a numeric inverse, all 64
 * symbols. The two coordinates that the metric depends on are its free parameters.
 */
public final class AutomaticDifferentiation {

    private final KerrMetric metric;
    private final Connection connection = new Connection();
    private final Gradient[] components = new Gradient[16];
    private final double[] g = new double[16];
    private final double[] derivatives = new double[64];

    /** Takes the mass and the angular momentum per mass. */
    public AutomaticDifferentiation(double mass, double spin) {
        this.metric = new KerrMetric(mass, spin);
    }

    /**
     * Evaluates all 64.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols row by row
     */
    public void evaluate(double[] point, double[] gamma) {
        metric.evaluate(Gradient.variable(2, 0, point[1]), Gradient.variable(2, 1, point[2]), components);
        for (int i = 0; i < 16; i++) {
            if (components[i] != null) {
                g[i] = components[i].getValue();
                derivatives[16 + i] = components[i].getPartialDerivative(0);
                derivatives[32 + i] = components[i].getPartialDerivative(1);
            }
        }
        connection.evaluate(g, derivatives, gamma);
    }
}
