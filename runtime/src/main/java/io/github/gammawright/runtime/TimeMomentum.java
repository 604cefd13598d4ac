package io.github.gammawright.runtime;

/** The component p_0 of a momentum whose other components are known. */
@FunctionalInterface
public interface TimeMomentum {

    /**
     * Finds p_0.
     *
     * @param point the coordinates x^0 … x^(n−1); only read
     * @param momentum the components p_i, of which entry 0 is not read; nothing is written
     * @return p_0; NaN where there is none
     */
    double at(double[] point, double[] momentum);

    /** The same p_0 everywhere, as is right where no component of the metric depends on the time. */
    static TimeMomentum constant(double p0) {
        return (point, momentum) -> p0;
    }

    /**
     * From the mass shell, g^ij p_i p_j = value, for metrics that depend on the time.
     *
     * @param pointDimension how many coordinates there are
     * @param inverseMetric gives all n² components g^ij, row by row
     * @param value the square of the momentum: 0 for light, −m² for a mass m in the signature −+++
     * @param root which solution; to the future (dt/dλ &gt; 0) goes the smaller one in the signature −+++
     */
    static TimeMomentum onMassShell(int pointDimension, PointKernel inverseMetric, double value, Root root) {
        double[] g = new double[pointDimension * pointDimension];
        return (point, momentum) -> {
            inverseMetric.evaluate(point, g);
            double b = 0;
            double c = -value;
            for (int i = 1; i < pointDimension; i++) {
                b += g[i] * momentum[i];
                for (int j = 1; j < pointDimension; j++) {
                    c += g[i * pointDimension + j] * momentum[i] * momentum[j];
                }
            }
            return QuadraticRoots.solve(g[0], b, c, root);
        };
    }
}
