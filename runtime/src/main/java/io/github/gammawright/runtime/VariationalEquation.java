package io.github.gammawright.runtime;

import java.util.Objects;

/**
 * An equation y' = f(λ, y) together with its state-transition matrix Φ = ∂y(λ)/∂y(λ_0): Φ' = (∂f/∂y) Φ, the variational
 * equations (Hairer, Nørsett &amp; Wanner 1993, Solving Ordinary Differential Equations I, sec. I.14; from memory).
 *
 * <p>The state holds the m entries of y, then the m² entries of Φ, row by row: Φ_ab at m + a·m + b.
 */
public final class VariationalEquation extends CurveEquation {

    private final CurveEquation base;
    private final JacobianKernel jacobian;
    private final double[] state;
    private final double[] rate;
    private final double[] matrix;

    /**
     * Takes the equation and its derivatives.
     *
     * @param base the equation for y
     * @param jacobian ∂f/∂y
     */
    public VariationalEquation(CurveEquation base, JacobianKernel jacobian) {
        super(base.pointDimension(), base.getDimension() * (1 + base.getDimension()));
        this.base = base;
        this.jacobian = Objects.requireNonNull(jacobian, "jacobian");
        int m = base.getDimension();
        this.state = new double[m];
        this.rate = new double[m];
        this.matrix = new double[m * m];
    }

    /**
     * The derivatives ∂f/∂y of the geodesic equation in position–velocity form.
     *
     * @param n how many coordinates there are
     * @param christoffel gives Γ^k_ij at (k·n + i)·n + j, as kernels of the quantity {@code christoffel} in the layout
     *     {@code full} do
     * @param christoffelDerivative gives ∂_l Γ^k_ij at ((l·n + k)·n + i)·n + j, as kernels of the quantity
     *     {@code christoffel-derivative} do
     */
    public static JacobianKernel ofGeodesics(int n, PointKernel christoffel, PointKernel christoffelDerivative) {
        double[] point = new double[n];
        double[] gamma = new double[n * n * n];
        double[] change = new double[n * n * n * n];
        return (parameter, y, result) -> {
            System.arraycopy(y, 0, point, 0, n);
            christoffel.evaluate(point, gamma);
            christoffelDerivative.evaluate(point, change);
            int m = 2 * n;
            for (int k = 0; k < n; k++) {
                for (int l = 0; l < n; l++) {
                    double byPoint = 0;
                    double byVelocity = 0;
                    for (int i = 0; i < n; i++) {
                        double u = y[n + i];
                        byVelocity -= 2 * gamma[(k * n + i) * n + l] * u;
                        for (int j = 0; j < n; j++) {
                            byPoint -= change[((l * n + k) * n + i) * n + j] * u * y[n + j];
                        }
                    }
                    result[k * m + l] = 0;
                    result[k * m + n + l] = k == l ? 1 : 0;
                    result[(n + k) * m + l] = byPoint;
                    result[(n + k) * m + n + l] = byVelocity;
                }
            }
        };
    }

    @Override
    public void derivatives(double parameter, double[] extended, double[] derivatives) {
        requireLengths(extended, derivatives);
        int m = state.length;
        System.arraycopy(extended, 0, state, 0, m);
        base.derivatives(parameter, state, rate);
        jacobian.evaluate(parameter, state, matrix);
        System.arraycopy(rate, 0, derivatives, 0, m);
        for (int a = 0; a < m; a++) {
            for (int b = 0; b < m; b++) {
                double sum = 0;
                for (int c = 0; c < m; c++) {
                    sum += matrix[a * m + c] * extended[m + c * m + b];
                }
                derivatives[m + a * m + b] = sum;
            }
        }
    }

    @Override
    public void point(double parameter, double[] extended, double[] point) {
        System.arraycopy(extended, 0, state, 0, state.length);
        base.point(parameter, state, point);
    }

    /**
     * The state at the start, where Φ is the unit matrix.
     *
     * @param start the entries of y
     * @throws IllegalArgumentException if they are not as many as the equation has
     */
    public double[] state(double[] start) {
        int m = state.length;
        double[] unit = new double[m * m];
        for (int a = 0; a < m; a++) {
            unit[a * m + a] = 1;
        }
        return join(getDimension(), start, unit);
    }

    /** Φ_ab = ∂y_a(λ)/∂y_b(λ_0) in a state of this equation. */
    public double transition(double[] extended, int a, int b) {
        return extended[state.length * (1 + a) + b];
    }
}
