package io.github.gammawright.benchmarks;

/**
 * Kerr's connection from central differences of the metric and a numeric inverse, all 64 symbols. Only the two
 * coordinates that the metric depends on are varied.
 */
public final class FiniteDifferences {

    /** About the cube root of the rounding unit, where rounding and truncation of a central difference balance. */
    private static final double STEP = 6e-6;

    private final KerrMetric metric;
    private final Connection connection = new Connection();
    private final double[] g = new double[16];
    private final double[] above = new double[16];
    private final double[] below = new double[16];
    private final double[] derivatives = new double[64];

    /** Takes the mass and the angular momentum per mass. */
    public FiniteDifferences(double mass, double spin) {
        this.metric = new KerrMetric(mass, spin);
    }

    /**
     * Evaluates all 64.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols row by row
     */
    public void evaluate(double[] point, double[] gamma) {
        double r = point[1];
        double theta = point[2];
        double step = STEP * r;
        metric.evaluate(r + step, theta, above);
        metric.evaluate(r - step, theta, below);
        difference(1, step);
        metric.evaluate(r, theta + STEP, above);
        metric.evaluate(r, theta - STEP, below);
        difference(2, STEP);
        metric.evaluate(r, theta, g);
        connection.evaluate(g, derivatives, gamma);
    }

    private void difference(int coordinate, double step) {
        double factor = 0.5 / step;
        for (int i = 0; i < 16; i++) {
            derivatives[16 * coordinate + i] = (above[i] - below[i]) * factor;
        }
    }
}
