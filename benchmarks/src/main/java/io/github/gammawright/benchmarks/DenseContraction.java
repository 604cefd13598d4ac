package io.github.gammawright.benchmarks;

/** A geodesic's acceleration by way of all 64 Christoffel symbols: a^k = −Γ^k_ij u^i u^j, term by term. */
public final class DenseContraction {

    private static final int N = 4;

    private final ExpertFull christoffel;
    private final double[] gamma = new double[N * N * N];

    /** Takes the mass and the angular momentum per mass. */
    public DenseContraction(double mass, double spin) {
        this.christoffel = new ExpertFull(mass, spin);
    }

    /**
     * Evaluates the acceleration.
     *
     * @param point t, r, θ, φ
     * @param velocity u^k
     * @param acceleration receives a^k
     */
    public void evaluate(double[] point, double[] velocity, double[] acceleration) {
        christoffel.evaluate(point, gamma);
        for (int k = 0; k < N; k++) {
            double sum = 0;
            for (int i = 0; i < N; i++) {
                double row = 0;
                for (int j = 0; j < N; j++) {
                    row += gamma[(k * N + i) * N + j] * velocity[j];
                }
                sum -= row * velocity[i];
            }
            acceleration[k] = sum;
        }
    }
}
